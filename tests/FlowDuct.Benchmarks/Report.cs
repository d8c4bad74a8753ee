using System.Globalization;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics.X86;

namespace FlowDuct.Benchmarks;

/// <summary>A CSV of results under lines that say when, where and with what they were made.</summary>
internal sealed class Report
{
    private readonly List<string> lines =
    [
        $"# made: {DateTime.UtcNow.ToString("yyyy-MM-dd HH:mm", CultureInfo.InvariantCulture)} UTC",
        $"# machine: {Processor()}; {Environment.ProcessorCount} processors; AVX2 {Avx2.IsSupported}, AVX-512 {Avx512F.IsSupported}",
        $"# system: {RuntimeInformation.OSDescription}; {RuntimeInformation.RuntimeIdentifier}; {RuntimeInformation.FrameworkDescription}",
        $"# FlowDuct: {typeof(Fluids.Fluid).Assembly.GetName().Version}; {Build()}",
    ];

    internal void Note(string text) => lines.Add("# " + text);

    internal void Row(params ReadOnlySpan<object> cells)
    {
        List<string> texts = [];
        foreach (object cell in cells)
            texts.Add(Cell(cell));
        lines.Add(string.Join(',', texts));
    }

    internal void Write(string? file)
    {
        if (file is null)
            Console.Out.WriteLine(string.Join(Environment.NewLine, lines));
        else
            File.WriteAllLines(file, lines);
    }

    private static string Cell(object cell)
    {
        string text = Convert.ToString(cell, CultureInfo.InvariantCulture) ?? string.Empty;
        bool needsQuotes = text.AsSpan().ContainsAny(',', '"');
        return needsQuotes ? $"\"{text.Replace("\"", "\"\"", StringComparison.Ordinal)}\"" : text;
    }

    private static string Processor()
    {
        const string Linux = "/proc/cpuinfo";
        string? line = File.Exists(Linux)
            ? File.ReadLines(Linux).FirstOrDefault(text => text.StartsWith("model name", StringComparison.Ordinal))
            : null;
        return line is null ? RuntimeInformation.ProcessArchitecture.ToString() : line[(line.IndexOf(':', StringComparison.Ordinal) + 2)..];
    }

    private static string Build() =>
#if DEBUG
        "Debug build: numbers mean nothing";
#else
        "Release build";
#endif
}
