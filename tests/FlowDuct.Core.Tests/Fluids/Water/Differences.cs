using FlowDuct.Fluids.Water;

namespace FlowDuct.Core.Tests.Fluids.Water;

/// <summary>Differences between equations by the name the releases give them, in mK, %, kPa, kJ/kg or J/(kg.K).</summary>
internal static class Differences
{
    private const double BelowTc = 647.09;

    internal static IEnumerable<double> Of(string subject, string quantity) =>
        subject.StartsWith("basic equations at", StringComparison.Ordinal) ? BasicEdges.Of(subject, quantity)
        : subject.StartsWith("Eq", StringComparison.Ordinal) ? SaturationDifferences.Of(subject, quantity)
        : subject.StartsWith("metastable", StringComparison.Ordinal) ? BasicEdges.Metastable(quantity)
        : subject.Contains("v(p,T)", StringComparison.Ordinal) ? Volume(subject["subregion 3".Length] - 'a')
        : subject.Contains("(h,s) by", StringComparison.Ordinal) ? TwoSteps(subject)
        : subject.Contains("(p,", StringComparison.Ordinal) ? FromPressure(subject)
        : subject.Contains("p(h,s)", StringComparison.Ordinal) ? Pressure(subject)
        : Lines(subject);

    /// <summary>v(p,T) in every cell of the tables that name the subregion.</summary>
    private static IEnumerable<double> Volume(int subregion) =>
        from cell in SubregionCell.All
        where cell.Subregion == subregion
        from point in cell.Points(3000)
        select Percent(Region3Volume.Of(point.p * 1e6, point.T), 1 / Region3Density.Of(point.p * 1e6, point.T));

    private static IEnumerable<double> FromPressure(string subject) => subject switch
    {
        "region 1 T(p,h) against the basic equation" => WaterPoints.Region1(0, 100e6).Select(at => 1e3 * (Region1.TFromPH(at.p, at.h) - at.T)),
        "region 1 T(p,s) against the basic equation" => WaterPoints.Region1(0, 100e6).Select(at => 1e3 * (Region1.TFromPS(at.p, at.s) - at.T)),
        "subregion 2a T(p,h) against the basic equation" => Region2Points('a').Select(at => 1e3 * (Region2.TFromPH(at.p, at.h) - at.T)),
        "subregion 2b T(p,h) against the basic equation" =>
            Region2ByEnthalpy(upper: true).Select(at => 1e3 * (Region2.TFromPH(at.p, at.h) - at.T)),
        "subregion 2c T(p,h) against the basic equation" =>
            Region2ByEnthalpy(upper: false).Select(at => 1e3 * (Region2.TFromPH(at.p, at.h) - at.T)),
        "subregion 2a T(p,s) against the basic equation" => Region2Points('a').Select(at => 1e3 * (Region2.TFromPS(at.p, at.s) - at.T)),
        "subregion 2b T(p,s) against the basic equation" => Region2Points('b').Select(at => 1e3 * (Region2.TFromPS(at.p, at.s) - at.T)),
        "subregion 2c T(p,s) against the basic equation" => Region2Points('c').Select(at => 1e3 * (Region2.TFromPS(at.p, at.s) - at.T)),
        "subregion 3a T(p,h)" or "subregion 3b T(p,h)" =>
            Region3ByEnthalpy(subject[11]).Select(at => 1e3 * (Region3Backward.FromPH(at.p, at.h).T - at.T)),
        "subregion 3a v(p,h)" or "subregion 3b v(p,h)" =>
            Region3ByEnthalpy(subject[11]).Select(at => Percent(1 / Region3Backward.FromPH(at.p, at.h).rho, at.v)),
        "subregion 3a T(p,s)" or "subregion 3b T(p,s)" =>
            Region3ByEntropy(subject[11]).Select(at => 1e3 * (Region3Backward.FromPS(at.p, at.s).T - at.T)),
        "subregion 3a v(p,s)" or "subregion 3b v(p,s)" =>
            Region3ByEntropy(subject[11]).Select(at => Percent(1 / Region3Backward.FromPS(at.p, at.s).rho, at.v)),
        _ => throw new ArgumentOutOfRangeException(nameof(subject), subject, "no such comparison"),
    };

    private static IEnumerable<double> Pressure(string subject) => subject switch
    {
        "region 1 p(h,s), p <= 2.5 MPa" => WaterPoints.Region1(0, 2.5e6).Select(at => Percent(EnthalpyEntropyGuess.p1(at.h, at.s), at.p)),
        "region 1 p(h,s), p > 2.5 MPa" => WaterPoints.Region1(2.5e6, 100e6).Select(at => (EnthalpyEntropyGuess.p1(at.h, at.s) - at.p) / 1e3),
        "subregion 2a p(h,s)" or "subregion 2b p(h,s)" or "subregion 2c p(h,s)" =>
            Region2Points(subject[11]).Select(at => Percent(EnthalpyEntropyGuess.p2(at.h, at.s), at.p)),
        "subregion 3a p(h,s)" or "subregion 3b p(h,s)" =>
            Region3ByEntropy(subject[11]).Select(at => Percent(Region3EnthalpyEntropy.p3(at.h, at.s), at.p)),
        _ => throw new ArgumentOutOfRangeException(nameof(subject), subject, "no such comparison"),
    };

    private static IEnumerable<double> TwoSteps(string subject) => subject switch
    {
        "region 1 T(h,s) by p(h,s) then T(p,h)" =>
            WaterPoints.Region1(0, 100e6).Select(at => 1e3 * (Region1.TFromPH(EnthalpyEntropyGuess.p1(at.h, at.s), at.h) - at.T)),
        _ when subject.StartsWith("subregion 2", StringComparison.Ordinal) =>
            Region2Points(subject[11]).Select(at => 1e3 * (Region2.TFromPH(EnthalpyEntropyGuess.p2(at.h, at.s), at.h) - at.T)),
        _ when subject.Contains("then T(p,h)", StringComparison.Ordinal) =>
            Region3ByEntropy(subject[11]).Select(at => 1e3 * (Region3Backward.FromPH(Region3EnthalpyEntropy.p3(at.h, at.s), at.h).T - at.T)),
        _ => Region3ByEntropy(subject[11]).Select(at => Percent(1 / Region3Backward.FromPS(Region3EnthalpyEntropy.p3(at.h, at.s), at.s).rho, at.v)),
    };

    private static IEnumerable<double> Lines(string subject) => subject switch
    {
        "h2ab(s) against the 4 MPa isobar" => WaterPoints.Line(SaturationLine.Temperature(4e6), WaterConstants.T25)
            .Select(T => Region2.State(4e6, T)).Select(at => (EnthalpyEntropyGuess.h2ab(at.s) - at.h) / at.v / 1e3),
        "h3ab(p) against the critical isentrope" => WaterPoints.Line(22.1e6, 100e6).Select(EntropyOffH3ab),
        "p3sat(h) against Eq. (30)" => Phases(WaterConstants.T13, BelowTc).Select(at => Percent(Region3Saturation.PressureFromH(at.h), at.p)),
        "p3sat(s) against Eq. (30)" => Phases(WaterConstants.T13, BelowTc).Select(at => Percent(Region3Saturation.PressureFromS(at.s), at.p)),
        "h'1(s)" => WaterPoints.Saturation(WaterConstants.TLeast, WaterConstants.T13)
            .Select(pair => (SaturatedEnthalpy.Liquid1(pair.Liquid.s) - pair.Liquid.h) / 1e3),
        "h'3a(s)" => WaterPoints.Saturation(WaterConstants.T13 + 1e-6, BelowTc)
            .Select(pair => (SaturatedEnthalpy.Liquid3a(pair.Liquid.s) - pair.Liquid.h) / 1e3),
        "h\"2ab(s), region 2" => WaterPoints.Saturation(WaterConstants.TLeast, WaterConstants.T13).Where(pair => pair.Vapour.s >= 5850)
            .Select(pair => (SaturatedEnthalpy.Vapour2ab(pair.Vapour.s) - pair.Vapour.h) / 1e3),
        "h\"2c3b(s), region 2" => WaterPoints.Saturation(540, WaterConstants.T13).Where(pair => pair.Vapour.s < 5850)
            .Select(pair => (SaturatedEnthalpy.Vapour2c3b(pair.Vapour.s) - pair.Vapour.h) / 1e3),
        "h\"2c3b(s), region 3" => WaterPoints.Saturation(WaterConstants.T13 + 1e-6, BelowTc)
            .Select(pair => (SaturatedEnthalpy.Vapour2c3b(pair.Vapour.s) - pair.Vapour.h) / 1e3),
        "hB13(s) against the 623.15 K isotherm" => WaterPoints.Line(SaturationLine.pAtT13, 100e6).Select(TemperatureOffHB13),
        "p2c(h,s) against pB23(TB23(h,s)) on the boundary" => WaterPoints.Line(WaterConstants.T13, WaterConstants.TB23Most)
            .Select(T => Region2.State(Boundaries.pB23(T), T))
            .Select(at => Percent(EnthalpyEntropyGuess.p2c(at.h, at.s), Boundaries.pB23(EnthalpyEntropyEdges.TB23(at.h, at.s)))),
        _ => Wet(subject),
    };

    private static IEnumerable<double> Wet(string subject)
    {
        bool upper = subject.EndsWith("s >= 5.85 kJ/(kg K)", StringComparison.Ordinal);
        IEnumerable<(SaturatedPair Pair, double x, double h, double s)> points = WaterPoints.Wet().Where(at => at.s >= 5850 == upper);
        return subject[..subject.IndexOf(", s ", StringComparison.Ordinal)] switch
        {
            "Tsat(h,s)" => points.Select(at => 1e3 * (WetTemperature.Of(at.h, at.s) - at.Pair.T)),
            "psat(Tsat(h,s))" => points.Select(at => Percent(SaturationLine.Pressure(WetTemperature.Of(at.h, at.s)), at.Pair.p)),
            "x(h,s)" => points.Select(at => QualityAt(WetTemperature.Of(at.h, at.s), at.h) - at.x),
            _ => throw new ArgumentOutOfRangeException(nameof(subject), subject, "no such comparison"),
        };
    }

    private static double QualityAt(double T, double h)
    {
        double p = SaturationLine.Pressure(T);
        double liquid = Region1.State(p, T).h;
        return (h - liquid) / (Region2.State(p, T).h - liquid);
    }

    // At constant p, ds = dh/T.
    private static double EntropyOffH3ab(double p)
    {
        (double low, double high) = (WaterConstants.T13, WaterConstants.TB23Most);
        for (int i = 0; i < 60; i++)
        {
            double T = (low + high) / 2;
            if (WaterPoints.Dense(p, T).s < WaterConstants.sc) low = T;
            else high = T;
        }

        return (Boundaries.h3ab(p) - WaterPoints.Dense(p, low).h) / low;
    }

    // At constant s, dh = v dp and dT = T vT/cp dp; in mK.
    private static double TemperatureOffHB13(double p)
    {
        RegionState at = Region1.State(p, WaterConstants.T13);
        return 1e3 * (EnthalpyEntropyEdges.hB13(at.s) - at.h) * at.T * at.vT / (at.cp * at.v);
    }

    private static IEnumerable<RegionState> Phases(double from, double to) =>
        WaterPoints.Saturation(from + 1e-6, to).SelectMany(pair => new[] { pair.Liquid, pair.Vapour });

    private static IEnumerable<RegionState> Region2Points(char subregion) => subregion switch
    {
        'a' => WaterPoints.Region2a(),
        'b' => WaterPoints.Region2bc().Where(at => at.s >= 5850),
        _ => WaterPoints.Region2bc().Where(at => at.s < 5850),
    };

    private static IEnumerable<RegionState> Region2ByEnthalpy(bool upper) =>
        WaterPoints.Region2bc().Where(at => (at.p < 6.5467e6 || at.h >= Boundaries.h2bc(at.p)) == upper);

    private static IEnumerable<RegionState> Region3ByEnthalpy(char subregion) =>
        WaterPoints.Region3().Where(at => at.h <= Boundaries.h3ab(at.p) == (subregion == 'a'));

    private static IEnumerable<RegionState> Region3ByEntropy(char subregion) =>
        WaterPoints.Region3().Where(at => at.s <= WaterConstants.sc == (subregion == 'a'));

    private static double Percent(double other, double basic) => 100 * ((other / basic) - 1);
}
