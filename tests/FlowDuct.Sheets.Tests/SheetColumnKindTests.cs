using FlowDuct.Errors;
using FlowDuct.Quantities;
using FlowDuct.Sheets.Batch;
using Xunit;

namespace FlowDuct.Sheets.Tests;

/// <summary>Headings: what each is for, and what is refused with file, line and column.</summary>
public class SheetColumnKindTests
{
    [Theory]
    [InlineData("tag", nameof(ColumnKind.Tag))]
    [InlineData("case", nameof(ColumnKind.Case))]
    [InlineData("device", nameof(ColumnKind.Device))]
    [InlineData("pressure-basis", nameof(ColumnKind.PressureBasis))]
    [InlineData("pressure_basis", nameof(ColumnKind.PressureBasis))]
    [InlineData("recovery-basis", nameof(ColumnKind.Choice))]
    [InlineData("back.p [barg]", nameof(ColumnKind.Figure))]
    [InlineData("ambient.altitude [m]", nameof(ColumnKind.Figure))]
    [InlineData("flow [m3/h]", nameof(ColumnKind.Figure))]
    [InlineData("heat [kW]", nameof(ColumnKind.Figure))]
    [InlineData("expect exit.T [degC]", nameof(ColumnKind.Expected))]
    [InlineData("expect regime", nameof(ColumnKind.Expected))]
    [InlineData("expect status", nameof(ColumnKind.Expected))]
    [InlineData("expect findings", nameof(ColumnKind.Expected))]
    [InlineData("within exit.T [K]", nameof(ColumnKind.Within))]
    [InlineData("within mass_flow [%]", nameof(ColumnKind.Within))]
    [InlineData("flow [scfm]", nameof(ColumnKind.Figure))]
    [InlineData("reference-state", nameof(ColumnKind.ReferenceState))]
    [InlineData("equation-of-state", nameof(ColumnKind.Choice))]
    [InlineData("waiver", nameof(ColumnKind.Waiver))]
    [InlineData("expected life", nameof(ColumnKind.PassThrough))]
    [InlineData("calculated by", nameof(ColumnKind.PassThrough))]
    [InlineData("remark", nameof(ColumnKind.PassThrough))]
    public void A_heading_says_what_its_column_is_for(string heading, string kind) => Assert.Equal(kind, SheetColumn.Parse(heading).Kind.ToString());

    [Theory]
    [InlineData("expect exit.Q", "exit.Q is no result")]
    [InlineData("expect mas_flow", "did you mean mass_flow?")]
    [InlineData("expect", "it names no result")]
    [InlineData("within exit.TT [K]", "exit.TT is no result")]
    [InlineData("calc exit.T [degC]", "it names a result")]
    [InlineData("inlett.p [bar(a)]", "did you mean inlet?")]
    [InlineData("throat.T0 [K]", "T0 is no quantity that throat takes")]
    [InlineData("eficiency [%]", "did you mean efficiency?")]
    [InlineData("find", "a question that a sheet does not take")]
    [InlineData("inlet.p [inHg]", "inHg on a pressure needs its basis")]
    public void A_heading_that_claims_to_be_known_must_be(string heading, string words)
    {
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => SheetColumn.Parse(heading));
        Assert.Contains(words, refused.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("device,fluid,inlet.p [bar]", "f line 1, column 3, \"inlet.p [bar]\": bar does not say whether it is absolute or gauge\n  write [bar(a)] or [bar(g)], or add a column pressure-basis")]
    [InlineData("device,fluid,tag,tag", "f line 1, column 4, \"tag\": column 3 has the same meaning\n  leave one of them out")]
    [InlineData("device,fluid,remark,remark", "f line 1, column 4, \"remark\": column 3 has the same meaning\n  leave one of them out")]
    [InlineData("device,fluid,inlet.p [barg],inlet.pressure [psig]", "f line 1, column 4, \"inlet.pressure [psig]\": column 3 has the same meaning\n  leave one of them out")]
    [InlineData("device,tag", "f line 1, heading: there is no column fluid\n  add it, with cells such as steam")]
    [InlineData("fluid,tag", "f line 1, heading: there is no column device\n  add it, with cells such as nozzle")]
    public void A_heading_is_refused_with_file_line_and_column(string headings, string message)
    {
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => SheetPlan.Compile(headings.Split(','), (byte)'.', "f line 1"));
        Assert.Equal(message, refused.Message);
    }

    [Theory]
    [InlineData("device,fluid,inlet.p [Pa],exit.p [MPa]")]
    [InlineData("device,fluid,inlet.p [bar(a)],exit.p [psig],throat.d [mm],back.p [kPa(g)]")]
    [InlineData("device,fluid,inlet.p [bar],pressure-basis")]
    [InlineData("device,fluid,ambient.p [mbar],exit.dp [bar],inlet.p")]
    public void A_visible_or_declared_basis_is_enough(string headings) => Assert.NotNull(SheetPlan.Compile(headings.Split(','), (byte)'.', "f"));

    [Fact]
    public void A_result_of_the_sheet_itself_is_refused()
    {
        SheetPlan plan = SheetPlan.Compile(["device", "fluid", "status"], (byte)'.', "f line 1");
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => plan.RequireFree(CsvRows.Titles(ResultSet.Parse("exit.T", DisplayText.Metric)), "f line 1"));
        Assert.StartsWith("f line 1, column 3, \"status\": it names a result", refused.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("exit.T [degF], exit.p, regime, mass-flow [kg/h], shock.area_ratio", "exit.T [degF]|exit.p [bar(a)]|regime|mass_flow [kg/h]|shock.area_ratio")]
    [InlineData("exit.p [barg],throat.V,pressure_change [kPa]", "exit.p [barg]|throat.V [m/s]|pressure_change [kPa]")]
    public void Results_are_named_with_their_units(string list, string titles) =>
        Assert.Equal(titles, string.Join('|', ResultSet.Parse(list, DisplayText.Metric).Select(result => result.Title)));

    [Theory]
    [InlineData("exit.T, exit.T", "stands there twice")]
    [InlineData("exit.t", "did you mean exit.T?")]
    [InlineData("exit.T [bar]", "unit of")]
    [InlineData("", "it names no result")]
    public void A_result_that_is_none_is_refused(string list, string words)
    {
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => ResultSet.Parse(list, DisplayText.Metric));
        Assert.Equal("--show", refused.Refusal.Place);
        Assert.Contains(words, refused.Message, StringComparison.Ordinal);
    }
}
