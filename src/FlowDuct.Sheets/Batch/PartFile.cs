using System.Text;
using FlowDuct.Errors;

namespace FlowDuct.Sheets.Batch;

/// <summary>
/// Results that go to a file, whole or not at all: they grow in FILE.part, whose safe length stands in FILE.part.marks, and the file gets its
/// name at the end. A run that breaks leaves both behind, and another can go on from the last mark.
/// </summary>
internal sealed class PartFile : ResultTarget, IDisposable
{
    // A mark costs a wait for the disk; once a second loses little and costs nothing.
    private static readonly TimeSpan s_between = TimeSpan.FromSeconds(1);

    private readonly string _file;
    private readonly string _version;
    private readonly string _settings;
    private readonly FileStream _part;
    private readonly FileStream _marks;
    private long _lastMark = Environment.TickCount64;
    private bool _completed;

    /// <summary>Opens the files of a run.</summary>
    /// <param name="file">The file wanted.</param>
    /// <param name="version">Version of this program.</param>
    /// <param name="settings">Whatever else decides the bytes of the results, as one word.</param>
    /// <param name="resume">True to go on from the last mark.</param>
    /// <exception cref="FlowDuctException">There is nothing to go on from, or it is not of this run; kind NotUnderstood.</exception>
    internal PartFile(string file, string version, string settings, bool resume)
    {
        (_file, _version, _settings) = (file, version, settings);
        bool known = File.Exists(MarksName(file));
        if (resume && !known) throw ResumeRefusals.Nothing(MarksName(file));
        if (!known && File.Exists(PartName(file))) throw ResumeRefusals.Foreign(PartName(file));
        _part = Open(PartName(file));
        try
        {
            _marks = Open(MarksName(file));
        }
        catch
        {
            _part.Dispose();
            throw;
        }

        if (resume) Earlier = Continue();
        else Restart();
    }

    /// <inheritdoc/>
    internal override RunMark? Earlier { get; }

    /// <summary>True where a mark stands that another run can go on from.</summary>
    internal bool IsMarked => _marks.Length > 0;

    /// <summary>Where results grow.</summary>
    internal static string PartName(string file) => file + ".part";

    /// <summary>Where it stands how far they are safe.</summary>
    internal static string MarksName(string file) => file + ".part.marks";

    internal override bool Write(ReadOnlySpan<byte> bytes)
    {
        _part.Write(bytes);
        return true;
    }

    internal override void Reached(RunMark mark)
    {
        if (Environment.TickCount64 - _lastMark < s_between.TotalMilliseconds) return;
        _part.Flush(flushToDisk: true);
        _marks.Write(Encoding.ASCII.GetBytes(mark.ToLine(_version, _settings) + "\n"));
        _marks.Flush(flushToDisk: true);
        SafeRow = mark.Row;
        _lastMark = Environment.TickCount64;
    }

    internal override void Complete()
    {
        _part.Flush(flushToDisk: true);
        _part.Dispose();
        File.Move(PartName(_file), _file, overwrite: true);
        _completed = true;
    }

    /// <summary>Closes the files; what cannot be continued goes, what can stays.</summary>
    public void Dispose()
    {
        bool keep = !_completed && IsMarked;
        _part.Dispose();
        _marks.Dispose();
        if (keep) return;
        File.Delete(PartName(_file));
        File.Delete(MarksName(_file));
    }

    // Opened for this process alone: two runs into one file would ruin each other.
    private static FileStream Open(string name) => new(name, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None, bufferSize: 0);

    private void Restart()
    {
        _part.SetLength(0);
        _marks.SetLength(0);
    }

    private RunMark Continue()
    {
        string text = Encoding.ASCII.GetString(ReadAll(_marks));
        // A line that was cut off by the break has no end and does not count.
        string[] lines = text[..(text.LastIndexOf('\n') + 1)].Split('\n', StringSplitOptions.RemoveEmptyEntries);
        if (lines.Length == 0 || RunMark.OfLine(lines[^1], out string version, out string settings) is not RunMark mark || _part.Length < mark.Bytes)
            throw Leave(ResumeRefusals.Nothing(MarksName(_file)));
        if (version != _version) throw Leave(ResumeRefusals.OtherVersion(version, _version));
        if (settings != _settings) throw Leave(ResumeRefusals.OtherSettings());
        _part.SetLength(mark.Bytes);
        _part.Position = mark.Bytes;
        SafeRow = mark.Row;
        return mark;
    }

    private FlowDuctException Leave(FlowDuctException refusal)
    {
        _part.Dispose();
        _marks.Dispose();
        return refusal;
    }

    private static byte[] ReadAll(FileStream stream)
    {
        byte[] bytes = new byte[stream.Length];
        stream.ReadExactly(bytes);
        return bytes;
    }
}
