using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>Works out the figures of the device from its stations, by the definitions of the design.</summary>
internal static class Performances
{
    internal static Performance Of(DeviceAnswer a)
    {
        StationAnswer inlet = a.Inlet, exit = a.Exit;
        FluidState first = inlet.State;
        double p01 = inlet.Stagnation!.Value.p;
        double? flow = a.Performance.MassFlow, p02 = exit.Stagnation?.p;
        Performance performance = a.Performance with
        {
            VolumeFlow = flow * first.v,
            NormalVolumeFlow = flow / ReferenceVolume.Density(a.Fluid, Dimension.NormalVolumeFlow),
            StandardVolumeFlow = flow / ReferenceVolume.Density(a.Fluid, Dimension.StandardVolumeFlow),
            EntropyRise = EntropyRise(a),
            LostWork = a.Audit.Entropy == Verdict.Broken ? null : LostWork(a),
            HeatRate = a.Case.Heat != 0 ? flow * a.Case.Heat : null,
            PressureChange = exit.State.p - first.p,
            StagnationPressureRatio = p02 / p01,
            AreaRatio = Sections(exit, inlet) ?? Quotient(inlet.Flux, exit.Flux),
            ThroatAreaRatio = a.Throat is null ? null : Sections(exit, a.Throat) ?? Quotient(a.Throat.Flux, exit.Flux),
            Jet = a.Rating is Rating.NozzleRating rating ? Rating.JetAnswer.Of(a.ExpandingFluid, rating, a.BackPressure!.Value) : null,
            ConvergentLength = Length(a, CaseOption.ConvergentAngle, inlet, a.Throat ?? exit),
            DivergentLength = a.Throat is null ? null : Length(a, CaseOption.DivergentAngle, exit, a.Throat),
            Metastable = Rating.MetastableAnswer.Of(a),
            Thrust = Thrust(a, flow),
            AxialForce = AxialForce(a, flow),
        };
        return a.Case.Device switch
        {
            DeviceKind.Nozzle => NozzlePerformance.Add(a, performance),
            DeviceKind.Diffuser => DiffuserPerformance.Add(a, performance),
            _ => Venturis.VenturiPerformance.Add(a, performance),
        };
    }

    private static double? Sections(StationAnswer of, StationAnswer to) => of.Area * of.Openings / (to.Area * to.Openings);

    // Between two bores on one axis; several openings of one end have no common cone.
    private static double? Length(DeviceAnswer a, CaseOption angle, StationAnswer wide, StationAnswer narrow) =>
        a.Case.Has(angle) && wide.Openings == narrow.Openings && wide.Diameter - narrow.Diameter is double growth and > 0
            ? growth / (2 * Math.Tan(a.Case.Value(angle) / 2))
            : null;

    internal static double? Quotient(double? numerator, double? denominator) => denominator is double d && d > 0 && numerator > 0 ? numerator / d : null;

    // Below the closure of the property inverses a rise is rounding: zero.
    private static double? EntropyRise(DeviceAnswer a)
    {
        if (!a.Exit.HasState) return null;
        double rise = a.Exit.State.s - a.Inlet.State.s;
        return Math.Abs(rise) < Auditor.EntropyFloor ? 0 : rise;
    }

    // Entropy made inside the device, at the temperature of the surroundings.
    private static double? LostWork(DeviceAnswer a)
    {
        if (EntropyRise(a) is not double made) return null;
        if (a.Case.Heat != 0) made -= a.Case.Heat / a.Case.ValueOr(CaseOption.BoundaryTemperature, a.Case.AmbientTemperature);
        return made * a.Case.AmbientTemperature;
    }

    // Against the exit pressure while the jet is slower than sound, else against the ambient pressure.
    private static double? Thrust(DeviceAnswer a, double? flow)
    {
        if (a.Case.Device != DeviceKind.Nozzle || a.Exit.Area is not double A2) return null;
        double pa = a.BackPressure ?? (a.Exit.Mach < 1 ? a.Exit.State.p : a.Case.AmbientPressure);
        return (flow * a.Exit.Velocity) + ((a.Exit.State.p - pa) * A2 * a.Exit.Openings);
    }

    private static double? AxialForce(DeviceAnswer a, double? flow)
    {
        if (a.Inlet.Area is not double A1 || a.Exit.Area is not double A2) return null;
        double pa = a.Case.AmbientPressure;
        return ((a.Inlet.State.p - pa) * A1 * a.Inlet.Openings) + (flow * a.Inlet.Velocity)
            - ((a.Exit.State.p - pa) * A2 * a.Exit.Openings) - (flow * a.Exit.Velocity);
    }
}
