namespace FlowDuct.Devices.Coefficients;

/// <summary>Discharge coefficient of a critical-flow throat as a function of its Reynolds number: Cd = a - b Re^-n.</summary>
/// <remarks>
/// ISO 9300:2005; Re = 4 qm/(pi d mu0) with the viscosity of the stagnation state. The coefficients are from memory; those of the normally
/// machined torus were also read in two public files that cite the edition of 2022. Check them against the printed standard before quoting.
/// </remarks>
/// <param name="Name">The name on the command line.</param>
/// <param name="Description">The kind of throat.</param>
/// <param name="a">Limit of great Reynolds numbers.</param>
/// <param name="b">Factor of the boundary layer.</param>
/// <param name="n">Exponent: 1/2 laminar, 1/5 turbulent.</param>
/// <param name="Reynolds">Published range of the Reynolds number.</param>
/// <param name="Uncertainty">Expanded uncertainty (k = 2), as a part.</param>
internal sealed record CriticalFlowCd(string Name, string Description, double a, double b, double n, ArgumentRange Reynolds, double Uncertainty)
    : DischargeCorrelation(Name, Description, "ISO 9300:2005, from memory")
{
    internal static readonly CriticalFlowCd[] Rows =
    [
        new("iso9300-toroidal", "toroidal throat, normally machined", 0.9959, 2.720, 0.5, new("Re", 2.1e4, 3.2e7), 0.003),
        new("iso9300-toroidal-accurate", "toroidal throat, accurately machined", 0.9985, 3.412, 0.5, new("Re", 2.1e4, 1.4e6), 0.002),
        new("iso9300-cylindrical", "cylindrical throat", 0.9976, 0.1388, 0.2, new("Re", 3.5e5, 1.1e7), 0.002),
    ];

    internal override bool NeedsPipe => false;

    internal override double At(in ThroatFlow throat) => At(throat.Re);

    internal override double UncertaintyAt(in ThroatFlow throat) => Uncertainty;

    internal override Crossing? CrossedBy(in ThroatFlow throat) => Reynolds.Cross(throat.Re);

    /// <summary>The coefficient at a Reynolds number.</summary>
    internal double At(double Re) => a - (b * Math.Pow(Re, -n));
}
