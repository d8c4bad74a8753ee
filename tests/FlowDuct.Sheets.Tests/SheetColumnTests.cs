using FlowDuct.Errors;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Sheets.Tests;

public class SheetColumnTests
{
    [Theory]
    [InlineData("inlet.p [barg]", StationSymbol.Pressure, "barg")]
    [InlineData("throat.d [mm]", StationSymbol.Diameter, "mm")]
    [InlineData(" exit.T [degC] ", StationSymbol.Temperature, "degC")]
    public void A_station_column_knows_its_slot_and_unit(string heading, object slot, string unit)
    {
        var column = SheetColumn.Parse(heading);
        Assert.Equal(slot, column.Row!.StationSlot);
        Assert.Equal(unit, column.Unit!.Value.Spelling);
    }

    [Theory]
    [InlineData("flow [kg/s]", CaseOption.Flow)]
    [InlineData("efficiency [%]", CaseOption.Efficiency)]
    [InlineData("velocity-coefficient", CaseOption.VelocityCoefficient)]
    [InlineData("velocity_coefficient", CaseOption.VelocityCoefficient)]
    public void An_option_column_takes_hyphen_or_underscore(string heading, object slot) =>
        Assert.Equal(slot, SheetColumn.Parse(heading).Row!.OptionSlot);

    [Fact]
    public void Other_columns_pass_through() => Assert.Null(SheetColumn.Parse("remark of the shift").Row);

    [Theory]
    [InlineData("outlet.p [bar]", "outlet is no station")]
    [InlineData("inlet.q [bar]", "q is no quantity")]
    [InlineData("inlet.p [barr]", "did you mean bar")]
    [InlineData("inlet.p [bar", "not closed")]
    [InlineData("remark [mm]", "remark is no quantity")]
    public void A_heading_that_looks_known_must_be_known(string heading, string words)
    {
        var refusal = Assert.Throws<FlowDuctException>(() => SheetColumn.Parse(heading));
        Assert.Contains(words, refusal.Message, StringComparison.Ordinal);
        Assert.Contains("column", refusal.Refusal.Place, StringComparison.Ordinal);
    }
}
