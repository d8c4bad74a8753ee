using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Viscosity, conductivity, surface tension and ice lines against the printed values of their releases.</summary>
public class TransportTests
{
    private static readonly IReadOnlyList<IReadOnlyDictionary<string, string>> s_rows = ReferenceTable.Read("water/transport_check.csv");

    public static TheoryData<int, string> Rows { get; } = Name();

    [Theory]
    [MemberData(nameof(Rows))]
    public void The_printed_value_is_met(int index, string what)
    {
        Printed printed = Printed.Parse(s_rows[index]["output_value"]);
        double computed = Compute(s_rows[index], 1);
        Assert.True(Math.Abs(computed - printed.Value) <= 1.01 * printed.HalfDigit, $"{what}: printed {printed.Value:R}, computed {computed:R}");
    }

    // A third of a percent in the temperature moves every value but those of the dilute gas at two digits.
    [Theory]
    [MemberData(nameof(Rows))]
    public void A_nudged_input_misses_it(int index, string what)
    {
        Printed printed = Printed.Parse(s_rows[index]["output_value"]);
        Assert.True(Math.Abs(Compute(s_rows[index], 0.997) - printed.Value) > printed.HalfDigit, what);
    }

    [Theory]
    [InlineData("IAPWS R12-08", 11)]
    [InlineData("IAPWS R15-11", 83)]
    [InlineData("IAPWS R1-76(2014)", 75)]
    [InlineData("IAPWS R14-08(2011)", 2)]
    public void No_row_is_left_out(string source, int count) => Assert.Equal(count, s_rows.Count(row => row["source"] == source));

    [Fact]
    public void Transport_is_finite_and_positive_over_the_range() => Gen.Select(Gen.Double[Math.Log(1e3), Math.Log(100e6)], Gen.Double[273.16, 1173.15])
        .Where(at => at.Item1 <= Math.Log(50e6) || at.Item2 <= 1073.15).Each(
        (lnp, T) =>
        {
            Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPT(Math.Exp(lnp), T, out FluidState at));
            Assert.True(WaterFluid.Instance.TryTransport(at, out Transport transport));
            Assert.InRange(transport.mu, 5e-6, 3e-3);
            Assert.InRange(transport.lambda, 0.01, 20);
        },
        5000);

    // Heat capacity and conductivity grow without bound towards the critical point: large beside it, no number at it.
    [Fact]
    public void At_the_critical_point_there_is_no_heat_capacity_and_no_conductivity()
    {
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPX(WaterConstants.pc, 1, out FluidState at));
        Assert.False(at.HasIsobaricHeatCapacity);
        Assert.False(WaterFluid.Instance.TryTransport(at, out _));
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPT(WaterConstants.pc, WaterConstants.Tc + 0.01, out FluidState beside));
        Assert.True(WaterFluid.Instance.TryTransport(beside, out Transport transport));
        Assert.InRange(transport.lambda, 1, 20);
    }

    [Fact]
    public void Beyond_its_range_there_is_no_transport()
    {
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPT(1e5, 1173.2, out FluidState hot));
        Assert.False(WaterFluid.Instance.TryTransport(hot, out _));
        Assert.Equal(Outcome.Ok, WaterFluid.Instance.FromPX(1e5, 0.5, out FluidState wet));
        Assert.False(WaterFluid.Instance.TryTransport(wet, out _));
    }

    private static TheoryData<int, string> Name()
    {
        var rows = new TheoryData<int, string>();
        for (int i = 0; i < s_rows.Count; i++)
            rows.Add(i, $"{s_rows[i]["source"]} {s_rows[i]["table"]} {s_rows[i]["output_name"]}({s_rows[i]["input1_value"]}, {s_rows[i]["input2_value"]})");
        return rows;
    }

    private static double Compute(IReadOnlyDictionary<string, string> row, double nudge)
    {
        double first = Printed.Parse(row["input1_value"]).Value, second = row["input2_value"].Length == 0 ? 0 : Printed.Parse(row["input2_value"]).Value;
        double T = first * nudge;
        return row["source"] switch
        {
            "IAPWS R12-08" => Viscosity.Of(T, second) * 1e6,
            "IAPWS R1-76(2014)" => SurfaceTension.Of((first + 273.15) * nudge) * 1e3,
            "IAPWS R14-08(2011)" => (row["equation"].StartsWith("melting", StringComparison.Ordinal) ? IceLine.MeltingPressure(T) : IceLine.SublimationPressure(T)) / 1e6,
            _ => Conductivity(row, T, second * nudge),
        };
    }

    private static double Conductivity(IReadOnlyDictionary<string, string> row, double T, double second)
    {
        double t = T / WaterConstants.Tc, delta = second / WaterConstants.rhoc;
        string output = row["output_name"];
        if (row["table"] is "Table 4" or "Table 5")
        {
            return output switch
            {
                "lambda0" => ThermalConductivity.Dilute(t),
                "lambda1" => ThermalConductivity.Dense(t, delta),
                _ => ThermalConductivity.Dilute(t) * ThermalConductivity.Dense(t, delta),
            };
        }

        RegionState at = row["table"] switch
        {
            "Table 7" => Region1.State(second * 1e6, T),
            "Table 8" => Region2.State(second * 1e6, T),
            _ => Region3.State(second, T),
        };
        return Industrial(output, at);
    }

    private static double Industrial(string output, in RegionState at)
    {
        double t = at.T / WaterConstants.Tc, delta = 1 / (at.v * WaterConstants.rhoc), mu = Viscosity.Of(at.T, 1 / at.v);
        double byPressure = -at.vp / (at.v * at.v), zeta = byPressure * WaterConstants.pc / WaterConstants.rhoc;
        double critical = ThermalConductivity.Critical(t, delta, at.cp / 461.51805, at.cp / at.cv, zeta, mu * 1e6);
        double xi = ThermalConductivity.CorrelationLength(t, delta, zeta);
        return output switch
        {
            "lambda" => ThermalConductivity.Of(at, mu) * 1e3,
            "lambda0" => ThermalConductivity.Dilute(t),
            "lambda1" => ThermalConductivity.Dense(t, delta),
            "lambda2" => critical,
            "rho" => 1 / at.v,
            "drho_dp_T" => byPressure * 1e6,
            "drho_dp_TR" => ThermalConductivity.ReferenceZeta(delta) * WaterConstants.rhoc / (WaterConstants.pc / 1e6),
            "xi" => xi * 1e9,
            "cp" => at.cp / 1e3,
            "cv" => at.cv / 1e3,
            "Z" => critical / (177.8514 * delta * (at.cp / 461.51805) * t / (mu * 1e6)),
            "mu" => mu * 1e6,
            _ => throw new ArgumentOutOfRangeException(nameof(output), output, "no such property"),
        };
    }
}
