namespace FlowDuct.Devices.Coefficients;

/// <summary>Discharge coefficient C of a nozzle or Venturi tube in a pipe: qm = C times the isentropic flow between its pressure taps.</summary>
/// <remarks>
/// ISO 5167-3:2003 and ISO 5167-4:2003: qm = C/sqrt(1 - beta^4) eps (pi/4) d^2 sqrt(2 dp rho1), where eps/sqrt(1 - beta^4) is isentropic flow with its
/// own approach velocity. The formulas were read as quoted in public files; limits and uncertainties are from memory. Check them against
/// the printed standard before quoting.
/// </remarks>
/// <param name="Name">The name on the command line.</param>
/// <param name="Description">The device and its taps.</param>
/// <param name="Standard">Part and year.</param>
/// <param name="Formula">C as a function of beta = d/D and the Reynolds number of the pipe.</param>
/// <param name="PipeBore">Published range of the bore of the pipe, m.</param>
/// <param name="Beta">Published range of the diameter ratio.</param>
/// <param name="Reynolds">Published range of the Reynolds number of the pipe, at a diameter ratio.</param>
/// <param name="Uncertainty">Expanded uncertainty (k = 2) as a part, at a diameter ratio.</param>
internal sealed record PressureDifferenceCd(
    string Name,
    string Description,
    string Standard,
    Func<double, double, double> Formula,
    ArgumentRange PipeBore,
    ArgumentRange Beta,
    Func<double, ArgumentRange> Reynolds,
    Func<double, double> Uncertainty)
    : DischargeCorrelation(Name, Description, Standard + ", formula as quoted elsewhere, limits from memory")
{
    // Below this the expansion is too large for the standard, whatever the device.
    private static readonly ArgumentRange s_pressureRatio = new("p2/p1", 0.75, 1);

    internal static readonly PressureDifferenceCd[] Rows =
    [
        new("iso5167-isa1932", "ISA 1932 nozzle, corner taps", "ISO 5167-3:2003", Isa1932, new("D", 0.05, 0.5), new("beta", 0.3, 0.8),
            beta => new("Re_D", beta < 0.44 ? 7e4 : 2e4, 1e7), beta => beta <= 0.6 ? 0.008 : 0.01 * ((2 * beta) - 0.4)),
        new("iso5167-long-radius", "long-radius nozzle, taps at D and D/2", "ISO 5167-3:2003", LongRadius, new("D", 0.05, 0.63), new("beta", 0.2, 0.8),
            _ => new("Re_D", 1e4, 1e7), _ => 0.02),
        new("iso5167-venturi-nozzle", "Venturi nozzle", "ISO 5167-3:2003", (beta, _) => 0.9858 - (0.196 * Math.Pow(beta, 4.5)), new("D", 0.065, 0.5), new("beta", 0.316, 0.775),
            _ => new("Re_D", 1.5e5, 2e6), beta => 0.01 * (1.2 + (1.5 * beta * beta * beta * beta))) { Bore = new("d", 0.05, double.PositiveInfinity) },
        new("iso5167-venturi-cast", "classical Venturi tube, as-cast convergent", "ISO 5167-4:2003", (_, _) => 0.984, new("D", 0.1, 0.8), new("beta", 0.3, 0.75),
            _ => new("Re_D", 2e5, 2e6), _ => 0.007),
        new("iso5167-venturi-machined", "classical Venturi tube, machined convergent", "ISO 5167-4:2003", (_, _) => 0.995, new("D", 0.05, 0.25), new("beta", 0.4, 0.75),
            _ => new("Re_D", 2e5, 1e6), _ => 0.01),
        new("iso5167-venturi-welded", "classical Venturi tube, rough-welded sheet-iron convergent", "ISO 5167-4:2003", (_, _) => 0.985, new("D", 0.2, 1.2), new("beta", 0.4, 0.7),
            _ => new("Re_D", 2e5, 2e6), _ => 0.015),
    ];

    /// <summary>Published range of the bore of the throat, m.</summary>
    internal ArgumentRange Bore { get; init; } = new("d", 0, double.PositiveInfinity);

    internal override bool NeedsPipe => true;

    internal override double At(in ThroatFlow throat) => Formula(throat.beta, throat.PipeRe);

    internal override double UncertaintyAt(in ThroatFlow throat) => Uncertainty(throat.beta);

    internal override Crossing? CrossedBy(in ThroatFlow throat) =>
        Beta.Cross(throat.beta) ?? Reynolds(throat.beta).Cross(throat.PipeRe) ?? PipeBore.Cross(throat.Pipe) ?? Bore.Cross(throat.Bore)
        ?? s_pressureRatio.Cross(throat.PressureRatio);

    private static double Isa1932(double beta, double Re) =>
        0.9900 - (0.2262 * Math.Pow(beta, 4.1)) - (((0.00175 * beta * beta) - (0.0033 * Math.Pow(beta, 4.15))) * Math.Pow(1e6 / Re, 1.15));

    private static double LongRadius(double beta, double Re) => 0.9965 - (0.00653 * Math.Sqrt(beta * 1e6 / Re));
}
