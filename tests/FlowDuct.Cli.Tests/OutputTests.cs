using System.Text;
using FlowDuct.Cli.CommandLine;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Where the answer goes: files whole or not at all, links followed, broken streams told by the exit status.</summary>
public sealed class OutputTests : IDisposable
{
    private static readonly string[] s_state = ["state", "--fluid", "air", "--at", "p=1 bar, T=300 K"];

    private readonly string _folder = Directory.CreateTempSubdirectory("flowduct-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void A_link_keeps_leading_to_its_file()
    {
        string file = Path.Combine(_folder, "answer.txt"), link = Path.Combine(_folder, "link.txt");
        File.WriteAllText(file, "before");
        File.CreateSymbolicLink(link, file);
        CommandRun run = CommandRun.Run([.. s_state, "--output", link]);
        Assert.Equal(0, run.Status);
        Assert.Equal(file, File.ResolveLinkTarget(link, returnFinalTarget: true)?.FullName);
        Assert.Equal(CommandRun.Run(s_state).Output, File.ReadAllText(file));
        Assert.Equal(2, Directory.GetFiles(_folder).Length);
    }

    [Fact]
    public void A_file_beside_the_answer_is_left_alone()
    {
        string file = Path.Combine(_folder, "answer.txt"), other = file + ".part";
        File.WriteAllText(other, "somebody else's");
        Assert.Equal(0, CommandRun.Run([.. s_state, "--output", file]).Status);
        Assert.Equal("somebody else's", File.ReadAllText(other));
    }

    [Fact]
    public void A_longer_answer_is_replaced_to_its_end()
    {
        string file = Path.Combine(_folder, "answer.txt");
        File.WriteAllText(file, new string('x', 100_000));
        Assert.Equal(0, CommandRun.Run([.. s_state, "--output", file]).Status);
        Assert.Equal(CommandRun.Run(s_state).Output, File.ReadAllText(file));
    }

    [Fact]
    public void A_refused_case_leaves_the_file_as_it_was()
    {
        string file = Path.Combine(_folder, "answer.txt");
        File.WriteAllText(file, "before");
        CommandRun run = CommandRun.Run("state", "--fluid", "air", "--at", "p=1 bar", "--output", file);
        Assert.Equal(2, run.Status);
        Assert.Equal("before", File.ReadAllText(file));
        Assert.Single(Directory.GetFiles(_folder));
    }

    [Fact]
    public void A_folder_that_is_missing_is_said_in_words()
    {
        string file = Path.Combine(_folder, "missing", "answer.txt");
        CommandRun run = CommandRun.Run([.. s_state, "--output", file]);
        Assert.Equal(4, run.Status);
        Assert.Equal($"flowduct: --output {file}: could not be written: its folder does not exist\n  free some space or name another file\n", run.Error);
    }

    [Theory]
    [InlineData(32, 0, "")]
    [InlineData(28, 4, "flowduct: standard output: could not be written: ")]
    public void A_closed_pipe_is_quiet_and_a_full_disk_is_status_4(int error, int status, string start)
    {
        using var broken = new BrokenStream(new IOException("no more", error));
        using var errors = new MemoryStream();
        Assert.Equal(status, Application.Run(s_state, broken, errors, terminal: false));
        Assert.StartsWith(start, Encoding.UTF8.GetString(errors.ToArray()), StringComparison.Ordinal);
        Assert.Equal(status == 0, errors.Length == 0);
    }

    [Fact]
    public void A_defect_is_status_70_in_words_without_a_stack_trace()
    {
        using var broken = new BrokenStream(new InvalidOperationException("bent"));
        using var errors = new MemoryStream();
        Assert.Equal(70, Application.Run(s_state, broken, errors, terminal: false));
        string told = Encoding.UTF8.GetString(errors.ToArray());
        Assert.StartsWith("flowduct: defect: ", told, StringComparison.Ordinal);
        Assert.Contains("please report", told, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", told, StringComparison.Ordinal);
        Assert.InRange(told.Split('\n').Length - 1, 1, 4);
    }

    private sealed class BrokenStream(Exception failure) : MemoryStream
    {
        public override void Write(byte[] buffer, int offset, int count) => throw failure;

        public override void Write(ReadOnlySpan<byte> buffer) => throw failure;
    }
}
