namespace FlowDuct.Core.Tests.Support;

/// <summary>Finds files of the source tree from the folder of the tests, for checks of code against the data beside it.</summary>
public static class SourceTree
{
    /// <summary>Full path of a file named relative to the folder of the solution.</summary>
    public static string File(string path)
    {
        for (DirectoryInfo? folder = new(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (folder.EnumerateFiles("FlowDuct.sln").Any())
                return Path.Combine(folder.FullName, path);
        }

        throw new DirectoryNotFoundException("FlowDuct.sln is in no folder above the tests");
    }
}
