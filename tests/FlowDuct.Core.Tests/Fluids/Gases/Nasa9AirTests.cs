using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Gases.Coefficients;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>The table in code is the table in the CSV beside it (record "Air" of NASA/TP-2002-211556, 2002).</summary>
public class Nasa9AirTests
{
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> Rows =
        ReferenceTable.Read(SourceTree.File("src/FlowDuct.Core/Fluids/Gases/Coefficients/nasa9_air.csv"));

    [Fact]
    public void Code_and_csv_hold_the_same_numbers()
    {
        Species air = Nasa9Air.Record;
        Assert.Equal(2, Rows.Count);
        Assert.Equal(Rows.Count, air.Intervals.Length);
        foreach ((IReadOnlyDictionary<string, string> row, Nasa9Interval interval) in Rows.Zip(air.Intervals))
        {
            Assert.Equal(row["record"], air.ReportRecord);
            Dictionary<string, double> code = Numbers(air, interval);
            Assert.Equal(row.Keys.Where(key => key != "record"), code.Keys);
            foreach ((string column, double value) in code)
                Assert.True(value == Number(row, column), $"{column} of {interval.Tlow} K: {value} in code, {row[column]} in the CSV");
        }
    }

    [Fact]
    public void First_line_of_the_csv_names_its_source()
    {
        string path = SourceTree.File("src/FlowDuct.Core/Fluids/Gases/Coefficients/nasa9_air.csv");
        Assert.Contains("NASA/TP-2002-211556 (2002)", File.ReadLines(path).First(), StringComparison.Ordinal);
    }

    [Fact]
    public void Fit_returns_the_printed_enthalpy_of_formation()
    {
        // The report's own check: h(298.15 K) of the fit is hf298, with the gas constant it was fitted with.
        Reduced at = new CaloricPiece(Nasa9Air.Record.Intervals[0]).At(298.15);
        Assert.Equal(Nasa9Air.Record.HeatOfFormation298, at.h * 8.314510, 0.0005);
    }

    private static Dictionary<string, double> Numbers(Species air, Nasa9Interval i) => new()
    {
        ["molar_mass_g_per_mol"] = air.MolarMass,
        ["T_low_K"] = i.Tlow,
        ["T_high_K"] = i.Thigh,
        ["a1"] = i.a1,
        ["a2"] = i.a2,
        ["a3"] = i.a3,
        ["a4"] = i.a4,
        ["a5"] = i.a5,
        ["a6"] = i.a6,
        ["a7"] = i.a7,
        ["b1"] = i.b1,
        ["b2"] = i.b2,
        ["hf298_J_per_mol"] = air.HeatOfFormation298,
        ["h298_minus_h0_J_per_mol"] = air.EnthalpyAbove0KAt298,
    };

    private static double Number(IReadOnlyDictionary<string, string> row, string column) =>
        double.Parse(row[column], NumberStyles.Float, CultureInfo.InvariantCulture);
}
