namespace FlowDuct.Fluids.Water.Verification;

/// <summary>The equations of the releases by the names that their check values carry, in the units of the releases: MPa, kJ and K.</summary>
internal static class CheckedEquations
{
    /// <summary>The value of a row, its first input (and, for conductivity, the second) multiplied by a factor: 1, or a nudge that has to miss.</summary>
    internal static double Of(CheckRow row, double nudge) => row.Source switch
    {
        "IAPWS R7-97(2012)" => BasicEquations.Of(row, row.First * nudge, row.Second),
        "IAPWS R12-08" or "IAPWS R15-11" or "IAPWS R1-76(2014)" or "IAPWS R14-08(2011)" => TransportEquations.Of(row, nudge),
        _ => SupplementaryEquations.Of(row.Equation, row.First * nudge, row.Second),
    };
}
