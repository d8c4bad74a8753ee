namespace FlowDuct.Devices.Coefficients;

/// <summary>A published equation for the discharge coefficient of a throat.</summary>
/// <param name="Name">The name on the command line.</param>
/// <param name="Description">The kind of throat.</param>
/// <param name="Standing">The standard, and how its numbers are known.</param>
internal abstract record DischargeCorrelation(string Name, string Description, string Standing)
{
    /// <summary>Rounds of flow and Reynolds number until they agree: the coefficient hangs on it weakly, each round gains three digits.</summary>
    internal const int Rounds = 6;

    /// <summary>All of them, in the order in which they are offered.</summary>
    internal static readonly DischargeCorrelation[] All = [.. CriticalFlowCd.Rows, .. PressureDifferenceCd.Rows];

    /// <summary>
    /// True where the coefficient belongs to a pipe with pressure taps: it refers to the isentropic flow with the approach velocity of that
    /// flow, and the throat has the pressure of its tap.
    /// </summary>
    internal abstract bool NeedsPipe { get; }

    /// <summary>Finds one by its name; null where none has it.</summary>
    internal static DischargeCorrelation? Find(string name) => Array.Find(All, row => row.Name == name);

    /// <summary>The coefficient.</summary>
    internal abstract double At(in ThroatFlow throat);

    /// <summary>Expanded uncertainty (k = 2), as a part of the coefficient.</summary>
    internal abstract double UncertaintyAt(in ThroatFlow throat);

    /// <summary>The first limit of its range that a throat crosses; null inside.</summary>
    internal abstract Crossing? CrossedBy(in ThroatFlow throat);

    /// <summary>True where it holds for a throat that runs like this, choked or not.</summary>
    internal bool Fits(in ThroatFlow throat) => throat.Choked != NeedsPipe;
}
