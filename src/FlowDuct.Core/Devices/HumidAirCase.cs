using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Gives humid air its composition: the one whose vapour has the given humidity at the static state that it leads to.</summary>
internal static class HumidAirCase
{
    // Relative: the composition closes as tightly as the inverses of the gas do.
    private const double Closure = 1e-13;

    // A guess that falls short is stretched by this; it then lies beyond the root soon.
    private const double Stretch = 1.6;

    // Just short of pure vapour.
    private const double Most = 0.999999;

    /// <summary>The case with its fluid made up; a case of another fluid is itself.</summary>
    internal static DeviceCase Resolve(DeviceCase c)
    {
        if (GivenHumidity.Read(c.Fluid, c.Inlet, Station.Inlet) is not GivenHumidity given) return c;
        return With(c, Find(given, gas => InletState(With(c, gas))));
    }

    /// <summary>The fluid of a property question, made up where it is humid air.</summary>
    internal static Fluid Resolve(Fluid fluid, in GivenSlots slots, Func<Fluid, FluidState> solve) =>
        GivenHumidity.Read(fluid, slots, Station.At) is GivenHumidity given ? Find(given, solve) : fluid;

    private static FluidState InletState(DeviceCase c) =>
        c.Device == DeviceKind.Venturi ? Venturis.VenturiSolver.Stations(c).Inlet.State
        : Rating.NozzleGeometryReader.Asks(c) ? Rating.RatedInlet.Solve(c).Inlet.State
        : Inlet.Solve(c).State;

    // A reference volume is an amount of gas: its mass goes with the composition.
    private static DeviceCase With(DeviceCase c, IdealGas gas)
    {
        DeviceCase copy = c with { Fluid = gas };
        if (c.FlowReference is not FlowReference flow) return copy;
        double size = flow.MassPerVolume(gas)!.Value / flow.MassPerVolume(c.Fluid)!.Value;
        int slot = (int)CaseOption.Flow;
        copy.Options.Set(slot, c.Options.Value(slot) * size, c.Options.HalfPlace(slot) * size);
        return copy;
    }

    private static IdealGas Find(GivenHumidity given, Func<IdealGas, FluidState> solve)
    {
        double x = Fraction(given, solve);
        IdealGas gas = GasMixture.HumidAir(Math.Min(x, Most)).Gas;
        FluidState state = solve(gas);
        given.Require(x, state.p, state.T);
        return gas;
    }

    // Where p and T are given the second look closes. Else the static state, above all its temperature, hangs on the composition.
    private static double Fraction(GivenHumidity given, Func<IdealGas, FluidState> solve)
    {
        double low = 0, atLow = Excess(0), high = Math.Min(atLow, Most);
        if (atLow <= 0) return 0;
        double atHigh = Excess(high);
        while (atHigh > Closure * high && high < Most)
        {
            (low, atLow) = (high, atHigh);
            high = Math.Min(high * Stretch, Most);
            atHigh = Excess(high);
        }

        if (Math.Abs(atHigh) <= Closure * high) return high;
        return atHigh > 0 ? 1 : Flow.RootFinder.Find(Excess, low, high, atLow, atHigh);

        double Excess(double x)
        {
            FluidState state = solve(GasMixture.HumidAir(x).Gas);
            return given.FractionAt(state.p, state.T) - x;
        }
    }
}
