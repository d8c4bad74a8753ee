using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Gases.Coefficients;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>The records in code are the rows of the CSV beside them (NASA/TP-2002-211556, 2002), each under its own words.</summary>
public class Nasa9RecordsTests
{
    private const string Folder = "src/FlowDuct.Core/Fluids/Gases/Coefficients/";
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> Rows = ReferenceTable.Read(SourceTree.File(Folder + "nasa9.csv"));
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> Names = ReferenceTable.Read(SourceTree.File(Folder + "gas_names.csv"));

    public static TheoryData<string, string> Words() => [.. Names.Select(row => (row["name"], row["formula"]))];

    [Theory]
    [MemberData(nameof(Words))]
    public void Code_and_csv_hold_the_same_numbers(string name, string formula)
    {
        Species gas = Nasa9Records.Find(name)!;
        Assert.Equal((name, formula), (gas.Name, gas.Formula));
        IReadOnlyDictionary<string, string>[] rows = [.. Rows.Where(row => row["record"] == gas.ReportRecord)];
        Assert.InRange(rows.Length, 2, 3);
        Assert.Equal(rows.Length, gas.Intervals.Length);
        foreach ((IReadOnlyDictionary<string, string> row, Nasa9Interval interval) in rows.Zip(gas.Intervals))
        {
            Dictionary<string, double> code = Numbers(gas, interval);
            Assert.Equal(row.Keys.Where(key => key != "record"), code.Keys);
            foreach ((string column, double value) in code)
                Assert.True(value == Number(row[column]), $"{column} of {interval.Tlow} K: {value} in code, {row[column]} in the CSV");
        }
    }

    [Fact]
    public void Every_record_has_a_name_and_every_name_a_record()
    {
        Assert.Equal(71, Rows.Count);
        Assert.Equal(30, Names.Count);
        Assert.Equal(Rows.Select(row => row["record"]).Distinct().Order(), Names.Select(row => row["record"]).Order());
        Assert.Equal(Names.Select(row => new GasWord(row["name"], row["formula"])), Nasa9Records.Words());
        Assert.Equal(60, Names.SelectMany(row => new[] { row["name"], row["formula"] }).Distinct().Count());
    }

    [Theory]
    [InlineData("nasa9.csv", "NASA/TP-2002-211556 (2002)")]
    [InlineData("gas_names.csv", "nasa9.csv")]
    public void First_line_of_a_table_names_its_source(string file, string source) =>
        Assert.Contains(source, File.ReadLines(SourceTree.File(Folder + file)).First(), StringComparison.Ordinal);

    [Theory]
    [MemberData(nameof(Words))]
    public void Intervals_join_end_to_end(string name, string formula)
    {
        Species gas = Nasa9Records.Find(formula)!;
        Assert.Equal(name, gas.Name);
        Assert.Equal(200, gas.Intervals[0].Tlow);
        Assert.All(gas.Intervals.Zip(gas.Intervals.Skip(1)), pair => Assert.Equal(pair.First.Thigh, pair.Second.Tlow));
    }

    [Theory]
    [MemberData(nameof(Words))]
    public void Fit_returns_the_printed_enthalpy_of_formation(string name, string formula)
    {
        // The report's own check: h(298.15 K) of the fit is hf298, with the gas constant it was fitted with; b1 has ten printed digits,
        // and the fit of a few records meets hf298 to 5 J/mol only.
        Species gas = Nasa9Records.Find(name)!;
        Reduced at = new CaloricPiece(gas.Intervals[0]).At(298.15);
        Assert.Equal(gas.HeatOfFormation298, at.h * 8.314510, formula == "Air" ? 0.0005 : 5);
    }

    [Theory]
    [MemberData(nameof(Words))]
    public void Only_gases_of_level_heat_capacity_go_on_below_their_fit(string name, string formula)
    {
        Species gas = Nasa9Records.Find(name)!;
        string[] continued = ["N2", "O2", "Ar", "He", "CO", "Air"];
        Assert.Equal(continued.Contains(formula) ? 50 : 200, gas.ContinuedDownTo);
        if (gas.ContinuedDownTo == 200) return;

        // Translation and rotation at their classical values: 5/2 R of atoms, 7/2 R of two-atom molecules; air has 0.9365 % argon.
        double level = formula is "Ar" or "He" ? 2.5 : formula == "Air" ? 3.5 - 0.009365 : 3.5;
        Assert.Equal(level, new CaloricPiece(gas.Intervals[0]).At(200).cp, 0.001 * level);
    }

    [Theory]
    [InlineData("n2")]
    [InlineData("Nitrogen")]
    [InlineData("Co")]
    [InlineData("co2")]
    [InlineData("")]
    public void Words_are_case_sensitive(string word)
    {
        Assert.Null(Nasa9Records.Find(word));
        Assert.Null(FluidCatalogue.Find(word));
    }

    [Theory]
    [MemberData(nameof(Words))]
    public void A_fluid_is_found_by_both_words_and_built_once(string name, string formula)
    {
        Fluid gas = FluidCatalogue.Find(name)!;
        Assert.Same(gas, FluidCatalogue.Find(formula));
        Assert.Equal(name, gas.Name);
        Assert.Contains(gas, GasCatalogue.All);
        Assert.Contains(FluidCatalogue.Names, row => row.Name == name && row.Fluid() == gas);
    }

    private static Dictionary<string, double> Numbers(Species gas, Nasa9Interval i) => new()
    {
        ["molar_mass_g_per_mol"] = gas.MolarMass,
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
        ["hf298_J_per_mol"] = gas.HeatOfFormation298,
        ["h298_minus_h0_J_per_mol"] = gas.EnthalpyAbove0KAt298,
    };

    private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
}
