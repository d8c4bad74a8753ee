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
/// <param name="LeastRe">Least Reynolds number.</param>
/// <param name="GreatestRe">Greatest Reynolds number.</param>
/// <param name="Uncertainty">Expanded uncertainty (k = 2), as a part.</param>
internal sealed record CriticalFlowCd(
    string Name, string Description, double a, double b, double n, double LeastRe, double GreatestRe, double Uncertainty)
{
    internal const string Standing = "ISO 9300:2005, from memory";

    internal static readonly CriticalFlowCd[] All =
    [
        new("iso9300-toroidal", "toroidal throat, normally machined", 0.9959, 2.720, 0.5, 2.1e4, 3.2e7, 0.003),
        new("iso9300-toroidal-accurate", "toroidal throat, accurately machined", 0.9985, 3.412, 0.5, 2.1e4, 1.4e6, 0.002),
        new("iso9300-cylindrical", "cylindrical throat", 0.9976, 0.1388, 0.2, 3.5e5, 1.1e7, 0.002),
    ];

    /// <summary>Finds a correlation by its name; null where none has it.</summary>
    internal static CriticalFlowCd? Find(string name) => Array.Find(All, row => row.Name == name);

    /// <summary>The coefficient at a Reynolds number.</summary>
    internal double At(double Re) => a - (b * Math.Pow(Re, -n));

    /// <summary>True where the correlation holds.</summary>
    internal bool Holds(double Re) => Re >= LeastRe && Re <= GreatestRe;
}
