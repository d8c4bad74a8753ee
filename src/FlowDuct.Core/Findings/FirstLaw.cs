using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Findings;

/// <summary>The static enthalpy at the exit alone exceeds the energy that came in.</summary>
internal static class FirstLaw
{
    internal static Finding? Check(DeviceAnswer a)
    {
        if (a.Audit.Energy != Verdict.Broken) return null;
        double? shortfall = a.Audit.EnergyShortfall;
        return new Finding("first-law", Severity.Error, shortfall, 0, "first law of thermodynamics", text =>
            shortfall is double missing
                ? $"impossible: the exit state needs {text.Text(missing, Dimension.SpecificEnergy, 4)} more than the inlet brings, so no velocity is left; check the exit figures, or give the heat"
                : "impossible: every state that the exit reading allows needs more energy than the inlet brings");
    }
}
