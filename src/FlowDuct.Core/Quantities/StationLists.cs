namespace FlowDuct.Quantities;

/// <summary>The station lists of the command line, as a set: the stations, and the space behind the exit.</summary>
[Flags]
internal enum StationLists
{
    /// <summary>No list.</summary>
    None = 0,

    /// <summary>--inlet.</summary>
    Inlet = 1 << Station.Inlet,

    /// <summary>--throat.</summary>
    Throat = 1 << Station.Throat,

    /// <summary>--exit.</summary>
    Exit = 1 << Station.Exit,

    /// <summary>--ambient.</summary>
    Ambient = 1 << Station.Ambient,

    /// <summary>--at.</summary>
    At = 1 << Station.At,

    /// <summary>--back, the space that the exit discharges into.</summary>
    Back = 1 << 5,

    /// <summary>--reference-state, at which a volume of gas is counted.</summary>
    Reference = 1 << 6,
}

/// <summary>Steps from a station to its list.</summary>
internal static class StationListsExtensions
{
    /// <summary>The list of a station.</summary>
    public static StationLists ToList(this Station station) => (StationLists)(1 << (int)station);
}
