using FlowDuct.Fluids;

namespace FlowDuct.Devices;

/// <summary>An answer with one or more stations, for rules that look at states alone.</summary>
internal interface IStations
{
    /// <summary>The first station, along the flow, whose state carries a notice; null where none does.</summary>
    StationAnswer? StationWith(Notices notice);

    /// <summary>The stations whose whole static state is known, along the flow; at least one.</summary>
    IEnumerable<StationAnswer> Known { get; }
}
