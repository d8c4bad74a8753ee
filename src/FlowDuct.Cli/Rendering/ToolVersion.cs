using System.Reflection;

namespace FlowDuct.Cli.Rendering;

/// <summary>Version and commit of this build.</summary>
internal static class ToolVersion
{
    /// <summary>The version, such as 0.1.0.</summary>
    internal static string Version => Informational.Split('+')[0];

    /// <summary>The commit it was built from; empty where it was built outside a repository.</summary>
    internal static string Commit => Informational.Contains('+', StringComparison.Ordinal) ? Informational.Split('+')[1] : string.Empty;

    private static string Informational =>
        typeof(ToolVersion).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion ?? "0.0.0";
}
