using System.Text;
using FlowDuct.Errors;
using FlowDuct.Sheets.Batch;
using Xunit;

namespace FlowDuct.Sheets.Tests.Batch;

/// <summary>Files of results: whole or not at all, and a broken run goes on where it stopped.</summary>
public sealed class PartFileTests : IDisposable
{
    private static readonly string s_many = ManyRows.Steam(4000);

    private readonly string _folder = Directory.CreateTempSubdirectory("flowduct").FullName;

    private string File => Path.Combine(_folder, "results.csv");

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void A_finished_run_leaves_its_file_and_nothing_else()
    {
        System.IO.File.WriteAllText(File, "older");
        using (var part = new PartFile(File, "v", "s", resume: false)) Run(s_many, part);
        Assert.Equal(SheetRun.Of(s_many).Output, System.IO.File.ReadAllText(File));
        Assert.Equal([File], Directory.GetFiles(_folder));
    }

    [Fact]
    public void A_run_that_ends_before_its_first_mark_leaves_nothing()
    {
        using (var part = new PartFile(File, "v", "s", resume: false)) part.Write("half"u8);
        Assert.Empty(Directory.GetFiles(_folder));
    }

    [Theory]
    [InlineData(1024, 0)]
    [InlineData(2048, 17)]
    [InlineData(3072, 5000)]
    public void A_broken_run_goes_on_to_the_same_bytes_and_counts(long marked, int strayBytes)
    {
        Break(marked, strayBytes);
        BatchEnd end;
        using (var part = new PartFile(File, "v", "s", resume: true))
        {
            Assert.Equal(marked, part.SafeRow);
            end = Run(s_many, part);
        }

        SheetRun whole = SheetRun.Of(s_many);
        Assert.Equal(whole.Output, System.IO.File.ReadAllText(File));
        Assert.Equal(whole.End.Tally.ToCounts(), end.Tally.ToCounts());
        Assert.Equal([File], Directory.GetFiles(_folder));
    }

    [Fact]
    public void A_sheet_that_has_changed_before_the_mark_is_refused()
    {
        Break(2048, 0);
        using var part = new PartFile(File, "v", "s", resume: true);
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => Run(s_many.Replace("N-1000,", "N-x,", StringComparison.Ordinal), part));
        Assert.Contains("the rows up to 2048 are not those that the broken run has read", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_sheet_that_ends_before_the_mark_is_refused()
    {
        Break(2048, 0);
        using var part = new PartFile(File, "v", "s", resume: true);
        Assert.Throws<FlowDuctException>(() => Run(ManyRows.Steam(1500), part));
    }

    [Theory]
    [InlineData("v2", "s", "version v, this is v2")]
    [InlineData("v", "s2", "was asked for other results")]
    public void Another_version_or_other_results_are_refused(string version, string settings, string words)
    {
        Break(1024, 0);
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => new PartFile(File, version, settings, resume: true));
        Assert.Contains(words, refused.Message, StringComparison.Ordinal);
        Assert.True(System.IO.File.Exists(PartFile.PartName(File)));
    }

    [Fact]
    public void Nothing_to_go_on_from_is_told() =>
        Assert.Contains("there is nothing to go on from", Assert.Throws<FlowDuctException>(() => new PartFile(File, "v", "s", resume: true)).Message, StringComparison.Ordinal);

    [Fact]
    public void A_mark_cut_off_by_the_break_does_not_count()
    {
        Break(1024, 0);
        System.IO.File.AppendAllText(PartFile.MarksName(File), "v,s,12ab");
        using var part = new PartFile(File, "v", "s", resume: true);
        Assert.Equal(1024, part.SafeRow);
    }

    [Fact]
    public void A_foreign_file_in_the_way_is_left_alone()
    {
        System.IO.File.WriteAllText(PartFile.PartName(File), "theirs");
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => new PartFile(File, "v", "s", resume: false));
        Assert.Equal(RefusalKind.NotWritten, refused.Refusal.Kind);
        Assert.Equal("theirs", System.IO.File.ReadAllText(PartFile.PartName(File)));
    }

    [Fact]
    public void Two_runs_into_one_file_are_kept_apart()
    {
        using var first = new PartFile(File, "v", "s", resume: false);
        Assert.Throws<IOException>(() => new PartFile(File, "v", "s", resume: false));
    }

    // RFC 3720, appendix B.4: the CRC-32C of 32 bytes of zeros, of ones, and of 0 to 31.
    [Theory]
    [InlineData(0, 0, 0x8A9136AAu)]
    [InlineData(0xFF, 0, 0x62A8AB43u)]
    [InlineData(0, 1, 0x46DD794Eu)]
    public void The_check_sum_is_that_of_the_standard(byte first, int step, uint expected)
    {
        var check = new RecordCheck();
        byte[] bytes = [.. Enumerable.Range(0, 32).Select(i => (byte)(first + (i * step)))];
        check.Add(bytes.AsSpan(0, 11));
        check.Add(bytes.AsSpan(11));
        Assert.Equal(expected, check.Value);
    }

    // As a kill would leave it: a mark, and results of unknown length behind what it speaks of.
    private void Break(long marked, int strayBytes)
    {
        List<RunMark> marks = [];
        using (var recorder = new Recorder(marks)) Run(s_many, recorder);
        RunMark mark = marks.Single(one => one.Row == marked);
        byte[] whole = Encoding.UTF8.GetBytes(SheetRun.Of(s_many).Output);
        System.IO.File.WriteAllBytes(PartFile.PartName(File), whole[..(int)(mark.Bytes + strayBytes)]);
        System.IO.File.WriteAllText(PartFile.MarksName(File), mark.ToLine("v", "s") + "\n");
    }

    private static BatchEnd Run(string sheet, ResultTarget target)
    {
        using var input = new MemoryStream(Encoding.UTF8.GetBytes(sheet));
        return SheetRun.Run(input, target, "exit.T, exit.V, regime", new BatchRequest { Jobs = 2 });
    }

    private sealed class Recorder(List<RunMark> marks) : ResultTarget, IDisposable
    {
        public void Dispose()
        {
        }

        internal override bool Write(ReadOnlySpan<byte> bytes) => true;

        internal override void Reached(RunMark mark) => marks.Add(mark);
    }
}
