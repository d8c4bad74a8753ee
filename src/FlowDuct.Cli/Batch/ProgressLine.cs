using System.Globalization;
using FlowDuct.Cli.CommandLine;

namespace FlowDuct.Cli.Batch;

/// <summary>One line on a terminal that says how far a run is, how fast, and how long it will take.</summary>
/// <param name="stderr">The terminal.</param>
/// <param name="length">Bytes of the sheet; 0 where they cannot be known.</param>
internal sealed class ProgressLine(Stream stderr, long length)
{
    private const long BetweenMilliseconds = 500;

    private readonly long _start = Environment.TickCount64;
    private long _last = Environment.TickCount64;
    private bool _shown;

    /// <summary>Shows how far the run is, at most twice a second.</summary>
    /// <param name="rows">Rows whose results are safe.</param>
    /// <param name="position">Bytes of the sheet that were read.</param>
    internal void Show(long rows, long position)
    {
        long now = Environment.TickCount64;
        if (now - _last < BetweenMilliseconds) return;
        _last = now;
        Write(Text(rows, position, (now - _start) / 1000.0));
        _shown = true;
    }

    /// <summary>Takes the line away.</summary>
    internal void End()
    {
        if (_shown) Write(string.Empty);
    }

    private string Text(long rows, long position, double seconds)
    {
        string text = string.Create(CultureInfo.InvariantCulture, $"{rows} rows, {rows / seconds:F0} rows/s");
        if (length == 0 || position == 0) return text;
        var left = TimeSpan.FromSeconds(seconds * Math.Max(0, length - position) / position);
        return text + string.Create(CultureInfo.InvariantCulture, $", {(int)left.TotalHours:00}:{left.Minutes:00}:{left.Seconds:00} left");
    }

    private void Write(string text)
    {
        try
        {
            Output.WriteAll(stderr, System.Text.Encoding.ASCII.GetBytes("\r\x1b[K" + text));
        }
        catch (IOException)
        {
            // A terminal that has gone needs no progress.
        }
    }
}
