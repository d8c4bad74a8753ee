using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>A station lies outside the fit of the gas, inside its documented continuation.</summary>
internal static class Extrapolated
{
    internal static Finding? Check(Fluid fluid, IStations stations)
    {
        StationAnswer? cold = stations.StationWith(Notices.Extrapolated);
        return cold is null ? null : new Finding("extrapolated", Severity.Note, cold.State.T, 200, fluid.Formulation, text =>
            $"{text.Text(cold.State.T, Dimension.Temperature, 4)} lies below the fit, which begins at {text.Text(200, Dimension.Temperature, 4)}: the heat capacity is held at its value there");
    }
}
