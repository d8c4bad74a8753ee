namespace FlowDuct.Devices;

/// <summary>The energy balance term by term, J/kg; closure is what remains.</summary>
internal sealed record Ledger(
    double InletEnthalpy, double InletKinetic, double InletPotential, double Heat, double ExitEnthalpy, double ExitKinetic, double ExitPotential)
{
    internal double In => InletEnthalpy + InletKinetic + InletPotential + Heat;

    internal double Out => ExitEnthalpy + ExitKinetic + ExitPotential;

    internal double Closure => In - Out;
}
