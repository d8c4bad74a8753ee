namespace FlowDuct.Fluids.Gases.Coefficients;

/// <summary>The record "Air" of NASA/TP-2002-211556 (2002), number by number as in nasa9_air.csv beside this file.</summary>
internal static class Nasa9Air
{
    internal static readonly Species Record = new()
    {
        Name = "air",
        ReportRecord = "Air",
        MolarMass = 28.9651159,
        HeatOfFormation298 = -125.530,
        EnthalpyAbove0KAt298 = 8649.264,
        ContinuedDownTo = 50, // design choice of FlowDuct: supersonic air passes below the 200 K of the report
        Intervals =
        [
            new(200, 1000)
            {
                a1 = 1.009950160e+04,
                a2 = -1.968275610e+02,
                a3 = 5.009155110e+00,
                a4 = -5.761013730e-03,
                a5 = 1.066859930e-05,
                a6 = -7.940297970e-09,
                a7 = 2.185231910e-12,
                b1 = -1.767967310e+02,
                b2 = -3.921504225e+00,
            },
            new(1000, 6000)
            {
                a1 = 2.415214430e+05,
                a2 = -1.257874600e+03,
                a3 = 5.144558670e+00,
                a4 = -2.138541790e-04,
                a5 = 7.065227840e-08,
                a6 = -1.071483490e-11,
                a7 = 6.577800150e-16,
                b1 = 6.462263190e+03,
                b2 = -8.147411905e+00,
            },
        ],
    };
}
