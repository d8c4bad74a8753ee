using System.Text;
using FlowDuct.Errors;
using Xunit;

namespace FlowDuct.Sheets.Tests.Batch;

/// <summary>What goes in comes out: cells byte for byte, separator, decimal mark, line end, mark.</summary>
public class SheetDialectTests
{
    private const string Results = ",calc exit.T [degC],calc exit.V [m/s],calc regime,row,status,findings";

    [Fact]
    public void Cells_go_through_byte_for_byte()
    {
        const string Record = "\"a \"\"quoted\"\",\ntwo-line tag\",nozzle , air,7 bar(a),40,12.00, \u00b5\u00b0 =1+1";
        SheetRun run = SheetRun.Of("tag,device,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)],remark\n" + Record + "\n");
        Assert.Contains("\n" + Record + ",,,,1,\"exit: p=12 bar", run.Output, StringComparison.Ordinal);
    }

    // Bytes that are no UTF-8 are not ours to mend in a column that is not read.
    [Fact]
    public void Bytes_of_another_encoding_go_through_too()
    {
        byte[] sheet = [.. "device,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)],remark\nnozzle,air,7,40,5,"u8, 0xB0, 0xE9, (byte)'\n'];
        using var input = new MemoryStream(sheet);
        using var output = new MemoryStream();
        SheetRun.Run(input, output, "exit.T", new FlowDuct.Sheets.Batch.BatchRequest());
        Assert.True(output.ToArray().AsSpan().IndexOf((ReadOnlySpan<byte>)[(byte)',', 0xB0, 0xE9, (byte)',']) > 0);
    }

    [Fact]
    public void Mark_and_line_ends_of_a_spreadsheet_are_kept()
    {
        SheetRun run = SheetRun.Of("\uFEFFdevice,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)]\r\nnozzle,air,7,40,5\r\n");
        Assert.StartsWith("\uFEFFdevice,fluid", run.Output, StringComparison.Ordinal);
        Assert.Equal(2, run.Output.Split("\r\n").Length - 1);
        Assert.Equal(2, run.Output.Count(c => c == '\n'));
        Assert.Contains(Results + "\r\n", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(";", "sep=;\n")]
    [InlineData(";", "")]
    [InlineData("\t", "")]
    public void Other_separators_are_kept(string separator, string declaration)
    {
        string heading = string.Join(separator, "device", "fluid", "inlet.p [bar(a)]", "inlet.T [degC]", "exit.p [bar(a)]");
        string row = string.Join(separator, "nozzle", "air", "7", "40", "5.0");
        SheetRun run = SheetRun.Of(declaration + heading + "\n" + row + "\n", "regime");
        string results = string.Join(separator, "calc regime", "row", "status", "findings");
        Assert.StartsWith(declaration + heading + separator + results + "\n" + row + separator + "subsonic" + separator + "1" + separator + "ok", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_declared_decimal_comma_is_read_and_written()
    {
        const string Point = "device,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)]\nnozzle,air,7.25,40.5,5.5\n";
        const string Comma = "device;fluid;inlet.p [bar(a)];inlet.T [degC];exit.p [bar(a)]\nnozzle;air;7,25;40,5 degC;5,5\n";
        string[] point = SheetRun.Of(Point, "exit.T, exit.V").Lines[1].Split(',')[5..7];
        string[] comma = SheetRun.Of(Comma, "exit.T, exit.V", comma: true).Lines[1].Split(';')[5..7];
        Assert.Equal(point.Select(cell => cell.Replace('.', ',')), comma);
        Assert.All(comma, cell => Assert.Contains(',', cell));
    }

    [Fact]
    public void Beside_a_comma_as_separator_numbers_with_commas_are_quoted()
    {
        SheetRun run = SheetRun.Of("device,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)]\nnozzle,air,\"7,25\",40,\"5,5\"\n", "exit.T", comma: true);
        Assert.Matches("^nozzle,air,\"7,25\",40,\"5,5\",\"[0-9]+,[0-9]+\",1,ok,", run.Lines[1]);
    }

    [Theory]
    [InlineData("nozzle;air;7.25;40;5,5", "has a decimal point, and this sheet was declared to have decimal commas")]
    [InlineData("nozzle;air;1.234,5;40;5,5", "has a decimal point")]
    public void A_point_is_refused_where_commas_were_declared(string row, string words)
    {
        SheetRun run = SheetRun.Of("device;fluid;inlet.p [bar(a)];inlet.T [degC];exit.p [bar(a)]\n" + row + "\n", comma: true);
        Assert.Contains(words, run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_comma_that_was_not_declared_is_refused_and_never_read_as_15()
    {
        SheetRun run = SheetRun.Of("device;fluid;inlet.p [bar(a)];inlet.T [degC];exit.p [bar(a)]\nnozzle;air;1,5;40;1.2\n");
        Assert.Contains("1,5 has a decimal comma; write 1.5", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("device,fluid\nnozzle\n", "sheet.csv row 1, line 2, column 2: the row has 1 cells, the heading 2")]
    [InlineData("device,fluid\n\nnozzle,air\nnozzle,air,x\n", "sheet.csv row 2, line 4, column 3: the row has 3 cells, the heading 2")]
    [InlineData("device,fluid\nnozzle,\"air\n", "sheet.csv line 2: a quote stands where none can stand, or is never closed")]
    [InlineData("device,fluid\nnozzle,ai\"r\n", "sheet.csv line 2: a quote stands")]
    [InlineData("sep=;\ndevice;fluid\n\"a\nb\";air\nx\n", "sheet.csv row 2, line 5, column 2: the row has 1 cells")]
    [InlineData("", "sheet.csv: the sheet is empty")]
    [InlineData("\n\n", "sheet.csv: the sheet is empty")]
    [InlineData("d\0e\0v\0", "sheet.csv: the sheet is not UTF-8")]
    public void What_cannot_be_trusted_ends_the_run_with_its_place(string sheet, string words)
    {
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => SheetRun.Of(sheet));
        Assert.Equal(RefusalKind.NotUnderstood, refused.Refusal.Kind);
        Assert.StartsWith(words, refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Rows_before_a_ragged_one_are_answered()
    {
        const string Sheet = "device,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)]\nnozzle,air,7,40,5\nnozzle,air\n";
        using var input = new MemoryStream(Encoding.UTF8.GetBytes(Sheet));
        using var output = new MemoryStream();
        Assert.Throws<FlowDuctException>(() => SheetRun.Run(input, output, "regime", new FlowDuct.Sheets.Batch.BatchRequest()));
        Assert.EndsWith("nozzle,air,7,40,5,subsonic,1,ok,ideal-assumed inlet-at-rest\n", Encoding.UTF8.GetString(output.ToArray()), StringComparison.Ordinal);
    }
}
