using FlowDuct.Flow;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Devices.Rating;

/// <summary>One section along a nozzle.</summary>
/// <param name="Position">Distance from the inlet, m; null where no length is known.</param>
/// <param name="Area">Area of all openings together, m2.</param>
/// <param name="At">State and velocity.</param>
internal readonly record struct PathPoint(double? Position, double Area, StationAnswer At);

/// <summary>A section to be solved.</summary>
/// <param name="Position">Distance from the inlet, m; null where no length is known.</param>
/// <param name="Area">Area of all openings together, m2.</param>
/// <param name="Divergent">True behind the throat.</param>
internal readonly record struct PathSection(double? Position, double Area, bool Divergent);

/// <summary>The states along a rated nozzle: subsonic to the throat, then as the regime says, a shock with both its sides.</summary>
internal static class NozzlePath
{
    // Without an inlet section the path begins where the flow is slow: M is about 0.15 there.
    private const double OpenInlet = 4;

    /// <summary>Sections evenly spaced in bore from inlet to exit, with positions where angles gave lengths.</summary>
    internal static IReadOnlyList<PathSection> Sections(DeviceAnswer a, int count)
    {
        (double inlet, double throat, double exit) = Areas(a);
        bool divergent = a.Throat is not null && exit > throat;
        int before = divergent ? Math.Max(2, (count + 1) / 2) : count, behind = count - before;
        double? lengthIn = a.Performance.ConvergentLength, lengthOut = a.Performance.DivergentLength;
        List<PathSection> sections = [];
        for (int i = 0; i < before; i++)
        {
            double u = before == 1 ? 1 : (double)i / (before - 1);
            sections.Add(new PathSection(lengthIn * u, Between(inlet, throat, u), false));
        }

        for (int i = 1; i <= behind; i++)
        {
            double u = (double)i / behind;
            sections.Add(new PathSection(lengthIn + (lengthOut * u), Between(throat, exit, u), true));
        }

        return sections;
    }

    /// <summary>The states in sections; one that the flow cannot pass is left out. A shock appears as two points of one area.</summary>
    internal static IReadOnlyList<PathPoint> Solve(DeviceAnswer a, IEnumerable<PathSection> sections)
    {
        var along = new Along(a);
        List<PathPoint> points = [];
        foreach (PathSection section in sections)
        {
            foreach ((FluidState state, double V, double area, double? position) in along.At(section))
                points.Add(new PathPoint(position, area, StationAnswer.From(along.Fluid, state, V) with { Area = area }));
        }

        return points;
    }

    /// <summary>Areas of inlet, throat and exit, all openings together; an inlet without a section is taken four throats wide.</summary>
    internal static (double Inlet, double Throat, double Exit) Areas(DeviceAnswer a)
    {
        StationAnswer narrow = a.Throat ?? a.Exit;
        double throat = narrow.Area!.Value * narrow.Openings, exit = a.Exit.Area!.Value * a.Exit.Openings;
        bool given = StationFigures.HaveSection(a.Case.Inlet);
        return (given ? a.Inlet.Area!.Value * a.Inlet.Openings : OpenInlet * throat, throat, exit);
    }

    private static double Between(double from, double to, double u)
    {
        double bore = Math.Sqrt(from) + (u * (Math.Sqrt(to) - Math.Sqrt(from)));
        return bore * bore;
    }

    private sealed class Along
    {
        private readonly NozzleRating _rating;
        private readonly double _h0, _s, _p0, _throatArea, _exitArea, _coefficient, _efficiency;
        private readonly DivergentLimits? _limits;
        private bool _shockPassed;
        private PathSection _before;

        internal Along(DeviceAnswer a)
        {
            _rating = a.Rating!.Value;
            Fluid = a.ExpandingFluid;
            FluidState rest = a.Inlet.Stagnation!.Value;
            (_h0, _s, _p0) = (rest.h, rest.s, rest.p);
            (_, _throatArea, _exitArea) = Areas(a);
            _coefficient = a.Performance.DischargeCoefficient ?? 1;
            _efficiency = a.Case.GivenEfficiency ?? 1;
            var geometry = new NozzleGeometry(_throatArea, _exitArea, _efficiency, _coefficient);
            RatingOutcome outcome = DivergentLimits.Find(new RatingInlet(Fluid, _h0, _s, _p0), geometry, out DivergentLimits limits);
            _limits = a.Throat is not null && outcome == RatingOutcome.Ok ? limits : null;
        }

        internal Fluid Fluid { get; }

        internal IEnumerable<(FluidState State, double V, double Area, double? Position)> At(PathSection section)
        {
            double flux = _rating.MassFlow / section.Area;
            if (!section.Divergent)
            {
                _before = section;
                if (Slow(_s, 1, _rating.MassFlow / (section.Area * _coefficient), Throat(section) ? 0 : _rating.CriticalPressure, out FluidState state, out double V))
                    yield return (state, V, section.Area, section.Position);
                yield break;
            }

            if (_rating.Shock is ShockAnswer shock && !_shockPassed && section.Area >= shock.AreaRatio * _throatArea)
            {
                _shockPassed = true;
                double at = shock.AreaRatio * _throatArea;
                double? position = Position(section, at);
                yield return (shock.Upstream, shock.V1, at, position);
                yield return (shock.Downstream, shock.V2, at, position);
            }

            _before = section;
            if (Divergent(section.Area, flux, out FluidState behind, out double speed)) yield return (behind, speed, section.Area, section.Position);
        }

        // Between two sections the bore grows evenly.
        private double? Position(PathSection section, double area)
        {
            double share = (Math.Sqrt(area) - Math.Sqrt(_before.Area)) / (Math.Sqrt(section.Area) - Math.Sqrt(_before.Area));
            return _before.Position + (share * (section.Position - _before.Position));
        }

        private bool Throat(PathSection section) => Math.Abs(section.Area - _throatArea) < 1e-9 * _throatArea;

        private bool Divergent(double area, double flux, out FluidState state, out double V)
        {
            bool subsonic = !_rating.Choked || _rating.Regime == Regime.ChokedSubsonicExit || _shockPassed;
            if (!subsonic) return Fast(flux, out state, out V);
            (double s, double from) = _rating.Shock is ShockAnswer shock ? (shock.Downstream.s, shock.AreaRatio * _throatArea) : (_s, _throatArea);

            // The loss of the subsonic part is spread over the growth of area, as in the rating.
            double share = (area - from) / (_exitArea - _throatArea);
            return Slow(s, 1 - ((1 - _efficiency) * Math.Clamp(share, 0, 1)), flux, 0, out state, out V);
        }

        // The slower root at a flux; in the throat of a choked nozzle the state is known.
        private bool Slow(double s, double efficiency, double flux, double least, out FluidState state, out double V)
        {
            if (least == 0 && _rating.Choked && s == _s && _rating.Throat.p > 0 && flux >= _rating.ThroatVelocity / _rating.Throat.v * (1 - 1e-9))
            {
                (state, V) = (_rating.Throat, _rating.ThroatVelocity);
                return true;
            }

            (state, V) = (default, 0);
            Fluid fluid = _shockPassed && _rating.Shock!.Value.Upstream.Phase == Phase.Wet ? Fluid.Relaxed : Fluid;
            if (fluid.FromHS(_h0, s, default, out FluidState rest) != Outcome.Ok) return false;
            double low = Choking.TryFind(fluid, _h0, s, rest.p, out FluidState critical, out _) ? critical.p : Math.Max(least, _rating.Exit.p);
            return FluxRoot.TryFind(new LossPath(fluid, _h0, _h0, s, efficiency), flux, low, rest.p, (low + rest.p) / 2, out state, out V);
        }

        private bool Fast(double flux, out FluidState state, out double V)
        {
            (state, V) = (default, 0);
            if (_limits is not DivergentLimits limits || limits.Exit.p <= 0) return false;
            var path = new LossPath(Fluid, _h0, limits.Throat.h, _s, limits.DivergenceEfficiency);
            if (flux <= limits.ExitVelocity / limits.Exit.v * (1 + 1e-9))
            {
                (state, V) = (limits.Exit, limits.ExitVelocity);
                return true;
            }

            return FluxRoot.TryFind(path, flux, limits.Throat.p, limits.Exit.p * 0.999, (limits.Throat.p + limits.Exit.p) / 2, out state, out V);
        }
    }
}
