using FlowDuct.Findings;
using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>The whole answer to a case.</summary>
internal sealed record DeviceAnswer : IStations
{
    // In a box of its own: an answer is copied several times while it grows, and most have none.
    private readonly System.Runtime.CompilerServices.StrongBox<Rating.NozzleRating>? _rating;

    internal required DeviceCase Case { get; init; }

    internal required StationAnswer Inlet { get; init; }

    internal StationAnswer? Throat { get; init; }

    internal required StationAnswer Exit { get; init; }

    internal required Performance Performance { get; init; }

    /// <summary>Null where the exit is known by an interval only.</summary>
    internal Ledger? Ledger { get; init; }

    /// <summary>The judgement of the three laws.</summary>
    internal required Audit Audit { get; init; }

    /// <summary>True where the inlet was given by static properties alone and is taken at rest.</summary>
    internal bool InletTakenAtRest { get; init; }

    /// <summary>True where no loss was given and none is implied: the expansion is taken isentropic.</summary>
    internal bool TakenIdeal { get; init; }

    /// <summary>True where the exit reading lies on the saturation line and names a set of states.</summary>
    internal bool SaturatedReading { get; init; }

    /// <summary>True where the efficiency follows from measured figures, false where it was given or assumed.</summary>
    internal bool EfficiencyImplied { get; init; }

    /// <summary>What was decided for the reader, in words.</summary>
    internal IReadOnlyList<string> Assumptions { get; init; } = [];

    /// <summary>The rating behind the answer, where sections and a back pressure were given; else null.</summary>
    internal Rating.NozzleRating? Rating
    {
        get => _rating?.Value;
        init => _rating = value is Rating.NozzleRating rating ? new(rating) : null;
    }

    /// <summary>Form, shock and loss of a diffuser; null of a nozzle.</summary>
    internal Diffusers.DiffuserAnswer? Diffuser { get; init; }

    /// <summary>The divergence of a venturi as a diffuser from the throat on; null of other devices.</summary>
    internal DeviceAnswer? Divergence { get; init; }

    /// <summary>True where a back pressure below that of choking fixes the exit of a venturi.</summary>
    internal bool BackFixesExit { get; init; }

    /// <summary>The figure that was found for a target; null where none was asked for.</summary>
    internal Inverse.FoundFigure? Found { get; init; }

    /// <summary>The fluid along the device: the one of the case, or it with the phase of the inlet held.</summary>
    internal Fluid ExpandingFluid { get => field ?? Case.Fluid; init; }

    /// <summary>The back pressure that the rating used, Pa; null where none was given.</summary>
    internal double? BackPressure { get; init; }

    internal IReadOnlyList<Finding> Findings { get; init; } = [];

    internal Fluid Fluid => Case.Fluid;

    /// <summary>True where no finding is an error and, if strict, none is a caution either.</summary>
    internal bool Passes(bool strict) => FindingRules.Pass(Findings, strict);

    /// <inheritdoc/>
    public StationAnswer? StationWith(Notices notice)
    {
        if ((Inlet.State.Notices & notice) != 0) return Inlet;
        if (Throat is not null && (Throat.State.Notices & notice) != 0) return Throat;
        return (Exit.State.Notices & notice) != 0 ? Exit : null;
    }

    /// <inheritdoc/>
    public IEnumerable<StationAnswer> Known => new[] { Inlet, Throat, Exit }.OfType<StationAnswer>().Where(at => at.HasState);
}
