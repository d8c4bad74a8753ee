using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>All points of a path at which one figure has a wanted value.</summary>
/// <param name="path">The line of exit states.</param>
/// <param name="figure">The figure.</param>
/// <param name="target">Its value, SI.</param>
/// <param name="top">The highest pressure of the path, Pa.</param>
internal sealed class PathSearch(ExpansionPath path, Figure figure, double target, double top)
{
    // Fine enough that two roots in one cell differ by less than a plant gauge shows; a turning point between is refined.
    private const int Cells = 240;

    // A value that the path steps over is no root.
    private const double Closure = 1e-7;

    private readonly List<(double p, double f)> _samples = [];

    /// <summary>Every solution, from high to low pressure.</summary>
    internal List<FluidState> Roots()
    {
        Sample();
        Refine();
        List<FluidState> roots = [];
        for (int i = 1; i < _samples.Count; i++)
        {
            ((double pa, double fa), (double pb, double fb)) = (_samples[i - 1], _samples[i]);
            if (fb != 0 && Math.Sign(fa) == Math.Sign(fb)) continue;
            double p = fa == 0 ? pa : RootFinder.Find(Excess, pa, pb, fa, fb);
            bool known = roots.Count > 0 && Math.Abs(roots[^1].p - p) <= 1e-9 * p;
            if (!known && Math.Abs(Excess(p)) <= Closure * Scale && path.At(p, out FluidState at) == Outcome.Ok) roots.Add(at);
        }

        return roots;
    }

    internal string Wanted(IQuantityText text) => $"{Figures.Names(figure)}={text.Text(target, DimensionOf)}";

    /// <summary>The values that the path does reach.</summary>
    internal string RangeText(IQuantityText text)
    {
        if (_samples.Count == 0) return "no point of the path lies inside the formulation";
        double least = _samples.Min(at => at.f) + target, most = _samples.Max(at => at.f) + target;
        string range = $"on this path it lies between {text.Text(least, DimensionOf)} and {text.Text(most, DimensionOf)}";
        return target > least && target < most ? range + ", and steps over this value where the flow meets saturation" : range;
    }

    private double Scale => figure is Figure.X or Figure.M ? 1 : figure == Figure.Superheat ? 1e3 : Math.Max(Math.Abs(target), 1e-3);

    private Dimension DimensionOf => figure switch
    {
        Figure.T => Dimension.Temperature,
        Figure.H => Dimension.SpecificEnergy,
        Figure.S => Dimension.SpecificEntropy,
        Figure.Rho => Dimension.Density,
        Figure.Superheat => Dimension.TemperatureDifference,
        Figure.V => Dimension.Velocity,
        Figure.Section => Dimension.MassFlux,
        _ => Dimension.Ratio,
    };

    // Half of the cells are spaced near the top, where a small pressure drop makes a large velocity; half cover the decades below.
    private void Sample()
    {
        double floor = path.Fluid.LeastPressure * (1 + 1e-9);
        double bottom = Math.Log(floor / top);
        for (int i = 0; i <= Cells / 2; i++) Take(top * (1 - (0.6 * i * i / (Cells / 2.0 * Cells / 2.0))));
        double start = Math.Log(0.4);
        for (int i = 1; i <= Cells / 2; i++) Take(top * Math.Exp(start + ((bottom - start) * i / (Cells / 2.0))));
    }

    private void Take(double p)
    {
        double f = Excess(p);
        if (!double.IsNaN(f)) _samples.Add((p, f));
    }

    // Where three neighbours turn towards zero without crossing it, the turning point itself becomes a sample.
    private void Refine()
    {
        for (int i = _samples.Count - 2; i > 0; i--)
        {
            double f = _samples[i].f, sign = Math.Sign(f);
            bool turns = sign * (_samples[i - 1].f - f) > 0 && sign * (_samples[i + 1].f - f) > 0;
            if (!turns) continue;
            double p = TurningPoint(_samples[i - 1].p, _samples[i + 1].p, sign);
            int place = p < _samples[i].p ? i + 1 : i;
            _samples.Insert(place, (p, Excess(p)));
        }
    }

    private double TurningPoint(double a, double b, double sign)
    {
        const double Golden = 0.6180339887498949;
        for (int i = 0; i < 60; i++)
        {
            double c = b - (Golden * (b - a)), d = a + (Golden * (b - a));
            if (sign * Excess(c) < sign * Excess(d)) b = d;
            else a = c;
        }

        return (a + b) / 2;
    }

    private double Excess(double p)
    {
        if (path.At(p, out FluidState at) != Outcome.Ok) return double.NaN;
        double V = Energy.Velocity(path.h0, at.h);
        return figure switch
        {
            Figure.T => at.T,
            Figure.H => at.h,
            Figure.S => at.s,
            Figure.Rho => at.rho,
            Figure.X => QualityBeyond(at),
            Figure.Superheat => Superheat(at),
            Figure.V => V,
            Figure.M => V / at.w,
            _ => V / at.v,
        } - target;
    }

    // Beyond the saturation line the quality is continued so that a search sees on which side it is.
    private static double QualityBeyond(in FluidState at) => at.HasQuality ? at.x : at.Phase == Phase.Liquid ? -1 : 2;

    private double Superheat(in FluidState at) => path.Fluid.TrySaturationTemperature(at.p, out double T) ? at.T - T : double.NaN;
}
