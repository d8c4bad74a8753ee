using FlowDuct.Quantities;

namespace FlowDuct.Devices.Inverse;

/// <summary>One number of an answer by its name, such as mass_flow, shock.area_ratio or exit.V.</summary>
/// <param name="Name">The name as typed.</param>
/// <param name="Row">The quantity.</param>
/// <param name="Station">inlet, throat or exit; empty for a figure of the device.</param>
internal sealed record ResultName(string Name, QuantityRow Row, string Station)
{
    /// <summary>Finds a number by name; null where no answer has it.</summary>
    internal static ResultName? Find(string name)
    {
        string underscored = name.Replace('-', '_');
        if (QuantityCatalogue.TryFindPerformance(underscored, out QuantityRow? row) && !row.IsText) return new ResultName(name, row, string.Empty);
        int point = name.IndexOf('.', StringComparison.Ordinal);
        if (point < 0 || name[..point] is not ("inlet" or "throat" or "exit")) return null;
        bool known = QuantityCatalogue.TryFindStationQuantity(name.AsSpan(point + 1), out row) && !row.IsText
            && Array.Exists(StationFigureTable.All, figure => figure.Key == row.Key);
        return known ? new ResultName(name, row!, name[..point]) : null;
    }

    /// <summary>The number in an answer; null where it cannot be known.</summary>
    internal double? Read(DeviceAnswer answer)
    {
        StationAnswer? at = Station switch { "inlet" => answer.Inlet, "throat" => answer.Throat, _ => answer.Exit };
        if (Station.Length == 0) return PerformanceFigures.Read(answer.Performance, Row.Key);
        return at is null ? null : StationFigureTable.Read(answer.Fluid, at, Row.Key);
    }
}
