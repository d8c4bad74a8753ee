using System.Text;
using FlowDuct.Sheets.Batch;
using Xunit;

namespace FlowDuct.Sheets.Tests.Batch;

/// <summary>Rows: order, errors in their place, workers, shares.</summary>
public class BatchRunTests
{
    private const string Show = "exit.T, exit.x, exit.V, exit.M, exit.p0, throat.p, regime, isentropic_efficiency, loss_coefficient";

    private static readonly string s_many = ManyRows.Steam(5000);

    [Theory]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(7)]
    public void Workers_change_no_byte(int jobs)
    {
        SheetRun one = SheetRun.Of(s_many, Show), several = SheetRun.Of(s_many, Show, new BatchRequest { Jobs = jobs });
        Assert.Equal(one.Output, several.Output);
        Assert.Equal(one.End.Tally.ToCounts(), several.End.Tally.ToCounts());
        Assert.Equal(one.End.Tally.FirstFailure, several.End.Tally.FirstFailure);
    }

    [Fact]
    public void Rows_keep_their_order_and_number()
    {
        string[] lines = SheetRun.Of(s_many, "regime", new BatchRequest { Jobs = 3 }).Lines;
        Assert.Equal(5001, lines.Length);
        for (int row = 1; row <= 5000; row++) Assert.StartsWith($"N-{row},", lines[row], StringComparison.Ordinal);
        Assert.Equal("2500", lines[2500].Split(',')[9]);
    }

    [Fact]
    public void A_row_without_an_answer_keeps_its_place_and_the_gravest_decides()
    {
        SheetRun run = SheetRun.Of(s_many, "exit.T");
        Assert.EndsWith(",,97,exit.p [bar(a)]: x is not a number; write for example 1.5 or 2e5,", run.Lines[97], StringComparison.Ordinal);
        Assert.Contains(",,89,\"exit: p=500 bar is not below the stagnation pressure", run.Lines[89], StringComparison.Ordinal);
        Assert.Equal(5000 / 97, run.End.Tally[RowVerdict.NotUnderstood]);
        Assert.Equal(RowVerdict.NotUnderstood, run.End.Tally.Gravest);
        Assert.StartsWith("row 89, line 90: exit: p=500 bar", run.End.Tally.FirstFailure, StringComparison.Ordinal);
    }

    [Fact]
    public void Shares_are_disjoint_and_complete()
    {
        string[] whole = SheetRun.Of(s_many, Show).Lines;
        var merged = new string[whole.Length];
        for (int share = 1; share <= 4; share++)
        {
            string[] lines = SheetRun.Of(s_many, Show, new BatchRequest { Shard = Shard.Parse($"{share}/4"), Jobs = 2 }).Lines;
            Assert.Equal(whole[0], lines[0]);
            Assert.Equal(1250, lines.Length - 1);
            foreach (string line in lines[1..])
            {
                int row = int.Parse(line.Split(',')[0][2..], System.Globalization.CultureInfo.InvariantCulture);
                Assert.Null(merged[row]);
                merged[row] = line;
            }
        }

        Assert.Equal(whole[1..], merged[1..]);
    }

    [Theory]
    [InlineData("0/4")]
    [InlineData("5/4")]
    [InlineData("1")]
    [InlineData("a/b")]
    [InlineData("1/2/3")]
    [InlineData("-1/2")]
    [InlineData("1/99999999999")]
    public void A_share_that_is_none_is_refused(string text) => Assert.Throws<Errors.FlowDuctException>(() => Shard.Parse(text));

    [Fact]
    public void A_key_that_occurs_again_is_refused_in_its_row_in_every_share()
    {
        var sheet = new StringBuilder("tag,case,device,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)]\n");
        for (int i = 1; i <= 3000; i++) sheet.Append(System.Globalization.CultureInfo.InvariantCulture, $"T-{i % 1500},{(i == 2999 ? "b" : "a")},nozzle,air,7,40,5\n");
        SheetRun run = SheetRun.Of(sheet.ToString(), "regime", new BatchRequest { Jobs = 2 });
        Assert.Equal(1499, run.End.Tally[RowVerdict.NotUnderstood]);
        Assert.EndsWith(",,1501,tag: T-1 a stands in row 1 already; tag and case together name a row; number the cases of a tag,", run.Lines[1501], StringComparison.Ordinal);
        Assert.Contains(",subsonic,2999,ok,", run.Lines[2999], StringComparison.Ordinal);
        SheetRun share = SheetRun.Of(sheet.ToString(), "regime", new BatchRequest { Shard = Shard.Parse("2/2") });
        Assert.Equal(run.Lines[1502], share.Lines[751]);
    }

    [Fact]
    public void Devices_fluids_and_units_may_be_mixed()
    {
        SheetRun run = SheetRun.Of(
            "device,fluid,fractions,inlet.p [barg],inlet.T [degC],inlet.V [m/s],exit.p,flow [kg/h],at.p [kPa(a)],at.x\n"
            + "nozzle,steam,,8,230,25,3.2 bar(a),1000,,\n"
            + "diffuser,air,,0,70 degF,540 ft/s,0.1 barg,,,\n"
            + "state,water,,,,,,,100,1\n"
            + "nozzle,\"N2=0.79,O2=0.21\",mass,2,300 K,,1 barg,500 Nm3/h,,\n",
            "exit.V, mass_flow [kg/h], recovery, at.T");
        Assert.Equal(4, run.End.Tally[RowVerdict.Passed]);
        Assert.Matches("^nozzle,steam,,8,.*,1000,,,[0-9.]+,1000,,,1,ok,", run.Lines[1]);
        Assert.Matches("^diffuser,.*,,,,[0-9.]+,,0\\.[0-9]+,,2,ok,", run.Lines[2]);
        // IAPWS-IF97 saturation temperature at 100 kPa, 99.606 degC: R7-97(2012), Table 36 gives 372.755919 K at 0.1 MPa.
        Assert.Equal("state,water,,,,,,,100,1,,,,99.60592,3,ok,", run.Lines[3]);
    }

    [Theory]
    [InlineData("gauge", "8", "9.01325")]
    [InlineData("absolute", "8", "8")]
    [InlineData("gauge", "8 bar(a)", "8")]
    [InlineData("absolute", "8 barg", "9.01325")]
    [InlineData("gauge", "8 bar", "9.01325")]
    [InlineData("absolute", "8 bar", "8")]
    public void A_declared_basis_serves_what_does_not_say_its_own(string basis, string cell, string absolute)
    {
        SheetRun run = SheetRun.Of($"device,fluid,pressure-basis,at.p [bar],at.T [degC]\nstate,steam,{basis},{cell},230\n", "at.p");
        Assert.Equal($"state,steam,{basis},{cell},230,{absolute},1,ok,", run.Lines[1]);
    }

    [Theory]
    [InlineData("at.p [bar(a)]", "", "8 bar", "8 bar does not say whether it is absolute or gauge; write for example 8 bar(a) or 8 bar(g)")]
    [InlineData("at.p", "", "8 bar", "8 bar does not say whether it is absolute or gauge")]
    [InlineData("at.p [MPa]", "gauge", "0.8", "MPa is absolute, and the pressure-basis of this row is gauge; write [MPa(a)] or [MPa(g)] in the heading")]
    [InlineData("at.p [bar(a)]", "guage", "8", "guage is not one of absolute, gauge")]
    [InlineData("at.p", "", "8", "8 has no unit")]
    [InlineData("at.p [bar(a)]", "", "NaN", "NaN is not a finite number")]
    [InlineData("at.p [bar(a)]", "", "1e400", "1e400 is too large")]
    [InlineData("at.p [bar(a)]", "", "-1", "pressure -1 is not above 0")]
    public void A_cell_that_can_be_misread_is_refused(string heading, string basis, string cell, string words)
    {
        SheetRun run = SheetRun.Of($"device,fluid,pressure-basis,{heading},at.T [degC]\nstate,steam,{basis},{cell},230\n", "at.p");
        Assert.Contains(words, run.Lines[1], StringComparison.Ordinal);
        Assert.Equal(1, run.End.Tally[RowVerdict.NotUnderstood]);
    }

    [Theory]
    [InlineData("diffuser,air,1,40,100,,,0.02,convergent", "shape: a diffuser does not take it")]
    [InlineData("state,air,,,,1,40,0.02,", "throat.d [m]: a property question (device state) does not take it")]
    [InlineData("nozzle,air,7,40,,1,40,,", "at.p [bar(a)]: a nozzle does not take it")]
    [InlineData("diffuser,air,1,40,100,,,,convergent", "shape: a diffuser does not take it")]
    [InlineData("nozzle,air,7,40,,,,,conical", "shape: conical is not one of convergent, convergent-divergent")]
    [InlineData("ventury,air,7,40,,,,,", "device: ventury is not one of nozzle, diffuser, venturi, state; did you mean venturi?")]
    [InlineData(",air,7,40,,,,,", "device: it is empty; write nozzle, diffuser, venturi or state")]
    [InlineData("nozzle,,7,40,,,,,", "fluid: it is empty; write for example steam")]
    [InlineData("nozzle,steem,7,40,,,,,", "fluid: steem is not a fluid of this version; did you mean steam?")]
    public void What_a_device_does_not_take_is_refused_and_never_left_unread(string row, string words)
    {
        SheetRun run = SheetRun.Of("device,fluid,inlet.p [bar(a)],inlet.T [degC],inlet.V [m/s],at.p [bar(a)],at.T [degC],throat.d [m],shape\n" + row + "\n", "exit.T");
        Assert.Contains(words, run.Lines[1], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("300 scfm", "", "flow: 300 scfm names no reference state (conventions differ by up to 8.7 %)")]
    [InlineData("3 kg/s", "\"T=60 degF, p=1 atm\"", "reference-state: nothing is counted at it")]
    [InlineData("", "\"T=60 degF, p=1 atm\"", "reference-state: nothing is counted at it")]
    [InlineData("3 kg/s dry", "", "flow: 3 kg/s dry: a mass flow and an actual volume flow are of the whole gas")]
    [InlineData("300 scfm", "T=60 degF", "reference-state: p is missing: a reference state has both")]
    public void A_volume_of_gas_says_where_it_is_counted(string flow, string state, string words)
    {
        SheetRun run = SheetRun.Of($"device,fluid,inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)],flow,reference-state\nnozzle,air,7,40,5,{flow},{state}\n", "mass_flow");
        Assert.Contains(words, run.Lines[1], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("water", "reference", "equation-of-state: water has one equation of state here")]
    [InlineData("argon", "reference", "equation-of-state: argon has no reference equation of state here; leave the cell empty for an ideal gas; air, nitrogen, carbon-dioxide have one")]
    [InlineData("air", "real", "equation-of-state: real is not one of ideal, reference")]
    public void An_equation_of_state_is_one_that_the_fluid_has(string fluid, string equation, string words)
    {
        SheetRun run = SheetRun.Of($"device,fluid,at.p [bar(a)],at.T [degC],equation-of-state\nstate,{fluid},7,240,{equation}\n", "at.rho");
        Assert.Contains(words, run.Lines[1], StringComparison.Ordinal);
    }

    [Fact]
    public void Impossible_figures_are_marked_and_counted()
    {
        SheetRun run = SheetRun.Of("device,fluid,inlet.p [bar(a)],inlet.T [degC],inlet.V [m/s],exit.p [bar(a)],exit.V [m/s]\nnozzle,steam,9,230,25,3.2,700\n", "isentropic_efficiency");
        Assert.Matches(",1\\.18[0-9]+,1,impossible,second-law ", run.Lines[1]);
        Assert.Equal(1, run.End.Tally[RowVerdict.Impossible]);
    }

    // A cell of ours that begins like a formula is text to a spreadsheet; the reader's own cells stay as they are.
    [Fact]
    public void A_spreadsheet_runs_nothing_of_ours()
    {
        var sink = new FlowDuct.Sheets.Csv.ByteSink();
        foreach (string text in new[] { "=1+1", "+1", "-1", "@SUM(A1)", "\t=1", "ok", "a,b" })
        {
            FlowDuct.Sheets.Csv.CellText.Write(sink, text, (byte)',');
            sink.Write((byte)';');
        }

        Assert.Equal("'=1+1;'+1;'-1;'@SUM(A1);'\t=1;ok;\"a,b\";", Encoding.UTF8.GetString(sink.Written));
    }

    [Fact]
    public void Tags_that_became_dates_are_told()
    {
        SheetRun run = SheetRun.Of("tag,device,fluid,at.p [bar(a)],at.T [degC]\nN-1,state,air,1,20\n12-Mar,state,air,1,20\n13-Mar,state,air,1,20\n", "at.rho");
        Assert.Equal(2, run.End.Tally.Dates);
        Assert.Equal("row 2: 12-Mar", run.End.Tally.FirstDate);
    }

    [Fact]
    public void A_run_that_is_stopped_writes_no_more()
    {
        int asked = 0;
        SheetRun run = SheetRun.Of(s_many, "regime", new BatchRequest { Stop = () => ++asked > 2, Jobs = 2 });
        Assert.True(run.End.Stopped);
        Assert.Equal(1 + (2 * FlowDuct.Sheets.Csv.RecordSource.BlockRows), run.Lines.Length);
    }

    [Fact]
    public void A_reader_that_goes_away_stops_the_work()
    {
        int writes = 0;
        using var input = new MemoryStream(Encoding.UTF8.GetBytes(s_many));
        BatchEnd end = SheetRun.Run(input, new StreamTarget(_ => ++writes < 2), "regime", new BatchRequest { Jobs = 2 });
        Assert.True(end.Stopped);
        Assert.Equal(2, writes);
    }
}
