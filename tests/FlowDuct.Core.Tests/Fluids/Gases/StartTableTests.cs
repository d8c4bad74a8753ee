using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Gases.Coefficients;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>The start must be good enough for one Newton step: slower code would pass every other test.</summary>
public class StartTableTests
{
    private static readonly CaloricCurve Curve = new(Nasa9Records.Air(), IdealGas.MolarGasConstant);

    [Fact]
    public void Start_from_enthalpy_is_within_a_ten_thousandth_of_a_kelvin()
    {
        StartTable table = StartTable.OfEnthalpy(Curve);
        Assert.InRange(Worst(T => table.Start(Curve.At(T).h)), 0, 1e-4);
    }

    [Fact]
    public void Start_from_entropy_is_within_a_ten_thousandth_of_a_kelvin()
    {
        StartTable table = StartTable.OfEntropy(Curve);
        Assert.InRange(Worst(T => table.Start(Curve.At(T).s0)), 0, 1e-4);
    }

    private static double Worst(Func<double, double> start) =>
        Enumerable.Range(0, 59501).Select(i => 50 + (0.1 * i)).Max(T => Math.Abs(start(T) - T));
}
