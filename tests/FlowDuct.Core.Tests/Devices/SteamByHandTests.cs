using System.Globalization;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Findings;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Nozzles and diffusers on water and steam, each worked by hand from printed property values.</summary>
public class SteamByHandTests
{
    // IAPWS R7-97(2012), Tables 15 and 42, printed to nine digits: h and s at the two states; the rest is arithmetic.
    // h1(0.5 MPa, 1500 K) = 5219.76855, s1 = 9.65408875; h2(0.0035 MPa, 700 K) = 3335.68375, s2 = 10.1749996.
    [Fact]
    public void Measured_exit_temperature_gives_velocity_and_entropy_rise()
    {
        DeviceAnswer a = Nozzle("p=0.5 MPa, T=1500 K", "p=0.0035 MPa, T=700 K");
        Assert.Equal(Math.Sqrt(2e3 * (5219.76855 - 3335.68375)), a.Exit.Velocity!.Value, 1e-5);
        Assert.Equal(1e3 * (10.1749996 - 9.65408875), a.Performance.EntropyRise!.Value, 1e-3);
        Assert.Equal(Verdict.Holds, a.Audit.Entropy);
        Assert.True(a.Passes(strict: false));
    }

    // Tables 15: h1(0.0035 MPa, 700 K), s1 as above; h2(0.0035 MPa, 300 K) = 2549.91145, s2 = 8.52238967: the entropy falls.
    [Fact]
    public void Figures_that_need_the_entropy_to_fall_are_impossible()
    {
        DeviceAnswer a = Nozzle("p=0.0035 MPa, T=700 K", "p=0.00350 MPa, T=300.0 K");
        Finding finding = Assert.Single(a.Findings, f => f.Code == "second-law");
        Assert.Equal(Severity.Error, finding.Severity);
        Assert.Equal(1e3 * (8.52238967 - 10.1749996), finding.Value!.Value, 1e-2);
        Assert.Equal(Math.Sqrt(2e3 * (3335.68375 - 2549.91145)), a.Exit.Velocity!.Value, 1e-4);

        // The second law allows no velocity at all without a pressure drop.
        Assert.Equal(0, finding.Limit!.Value, 1e-2);
        Assert.False(a.Passes(strict: false));
    }

    // Table 15: h(30 MPa, 700 K) = 2631.49474 is below h(0.0035 MPa, 700 K) = 3335.68375: the first law leaves no velocity.
    [Fact]
    public void An_exit_with_more_enthalpy_than_came_in_is_impossible()
    {
        DeviceAnswer a = Nozzle("p=30 MPa, T=700 K", "p=0.0035 MPa, T=700 K");
        Finding finding = Assert.Single(a.Findings, f => f.Code == "first-law");
        Assert.Equal(1e3 * (3335.68375 - 2631.49474), finding.Value!.Value, 1e-2);
        Assert.Null(a.Exit.Velocity);
    }

    // Bernoulli for a liquid: V = sqrt(2 v dp), with v = 0.00100215168 m3/kg at 3 MPa, 300 K (R7-97 Table 5). The compressibility
    // 1/(rho w^2) over 2.9 MPa moves v by 0.13 %, so half of that is the allowance.
    [Fact]
    public void A_water_jet_follows_Bernoulli()
    {
        DeviceAnswer a = Nozzle("p=3 MPa, T=300 K", "p=0.1 MPa");
        double bernoulli = Math.Sqrt(2 * 0.00100215168 * 2.9e6);
        Assert.Equal(bernoulli, a.Exit.Velocity!.Value, bernoulli * 7e-4);
        Assert.True(a.Exit.Velocity > bernoulli);
        Assert.Equal("subsonic", a.Performance.Regime);
    }

    // Torricelli: without a pressure drop the height alone drives the jet, V = sqrt(2 g z).
    [Fact]
    public void Height_alone_gives_Torricellis_velocity()
    {
        DeviceAnswer a = Nozzle("p=3 bar, T=20 degC, z=12 m", "p=3 bar");
        Assert.Equal(Math.Sqrt(2 * 9.80665 * 12), a.Exit.Velocity!.Value, 1e-6);
        Assert.InRange(Math.Abs(a.Ledger!.Closure), 0, 1e-7);
    }

    // Saturation values of printed steam tables, from memory: 10 bar, 250 degC: h 2943.1, s 6.9265; at 1 bar h' 417.5, h" 2674.9,
    // s' 1.3028, s" 7.3588. Four printed digits of s leave 0.1 % of V.
    [Fact]
    public void An_isentropic_expansion_into_the_wet_region_matches_the_lever_rule()
    {
        double x = (6.9265 - 1.3028) / (7.3588 - 1.3028);
        double h2 = 417.5 + (x * (2674.9 - 417.5));
        DeviceAnswer a = Nozzle("p=10 bar, T=250 degC", "p=1 bar");
        Assert.Equal(x, a.Exit.State.x, 2e-4);
        Assert.Equal(Math.Sqrt(2e3 * (2943.1 - h2)), a.Exit.Velocity!.Value, 1);
        Assert.Contains(a.Findings, f => f.Code == "wet-exit");
        Assert.Contains(a.Findings, f => f.Code == "choked");
        Assert.Equal("fully-expanded", a.Performance.Regime);
    }

    public static TheoryData<double, double, double, double> SaturatedChoking()
    {
        var rows = new TheoryData<double, double, double, double>();
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/steam_saturated_choking.csv"))
            rows.Add(Number(row, "p0_psia"), Number(row, "p_star_over_p0"), Number(row, "throat_quality"), Number(row, "W_equilibrium_lb_per_h_in2"));
        return rows;
    }

    // Four printed decimals of the ratio and of the quality, one of the flux.
    [Theory]
    [MemberData(nameof(SaturatedChoking))]
    public void Dry_saturated_steam_chokes_where_an_independent_solver_says(double psia, double ratio, double quality, double flux)
    {
        string inlet = FormattableString.Invariant($"p0={psia} psia, x=1");
        DeviceAnswer a = Nozzle(inlet, "p/p0=0.1");
        Assert.Equal(ratio, a.Performance.CriticalPressureRatio!.Value, 0.51e-4);
        Assert.Equal(quality, a.Throat!.State.x, 0.51e-4);
        double perInchAndHour = a.Throat.Flux!.Value / 0.45359237 * 0.0254 * 0.0254 * 3600;
        Assert.Equal(flux, perInchAndHour, 0.051 + (1e-5 * flux));
    }

    // The wet exit of a turbine nozzle printed as 3.2 bar, 135.7 degC: one figure, not liquid.
    [Fact]
    public void A_reading_on_the_saturation_line_is_an_interval()
    {
        DeviceAnswer a = Nozzle("p=9 bar, T=230 degC, V=25 m/s", "p=3.2 bar, T=135.7 degC");
        Assert.True(a.SaturatedReading);
        Assert.Contains(a.Findings, f => f.Code == "saturated-reading");
        Assert.Null(a.Exit.Velocity);
        Interval V = a.Performance.ExitVelocityRange!.Value;
        double ideal = a.Performance.ExitVelocityIdeal!.Value;
        Assert.Equal(ideal, V.Greatest, 1e-6 * ideal);
        Assert.InRange(V.Least, 0.5 * ideal, ideal);
        Assert.True(a.Passes(strict: false));
    }

    // From 9 bar, 400 degC the isentropic exit at 3.2 bar is far superheated, so every state of a saturated reading is impossible.
    [Fact]
    public void A_saturated_reading_is_impossible_only_as_a_whole()
    {
        DeviceAnswer a = Nozzle("p=9 bar, T=400 degC", "p=3.2 bar, T=135.7 degC");
        Assert.Contains(a.Findings, f => f.Code == "second-law");
        Assert.False(a.Passes(strict: false));
    }

    [Fact]
    public void An_inlet_on_the_saturation_line_is_refused()
    {
        var refusal = Assert.Throws<Errors.FlowDuctException>(() => Nozzle("p=9 bar, T=175.36 degC", "p=3.2 bar"));
        Assert.Equal(Errors.RefusalKind.NoAnswer, refusal.Refusal.Kind);
        Assert.Contains("saturation line", refusal.Message, StringComparison.Ordinal);
    }

    // Wet steam slows a jet to the same total enthalpy whatever the inlet's form: the x and h ways agree.
    [Fact]
    public void Moisture_and_quality_name_the_same_inlet()
    {
        DeviceAnswer a = Nozzle("p0=12 bar, moisture=2%", "p=4 bar"), b = Nozzle("p=12 bar, x=0.98", "p=4 bar");
        Assert.Equal(a.Exit.State.h, b.Exit.State.h, 1e-6);
    }

    // Supersaturation aside, hot water flashes: the exit is wet and slower than sound would allow a liquid.
    [Fact]
    public void Hot_water_flashes_and_chokes_at_saturation()
    {
        DeviceAnswer a = Nozzle("p=20 bar, T=180 degC", "p=2 bar");
        Assert.Contains(a.Findings, f => f.Code == "flashing");
        WaterFluid.Instance.TrySaturationPressure(453.15, out double pSat);
        double critical = a.Performance.CriticalPressureRatio!.Value * 20e5;
        Assert.InRange(critical, 0.9 * pSat, pSat);
    }

    [Fact]
    public void Printed_rounding_excuses_what_it_explains()
    {
        DeviceAnswer exact = Nozzle("p=9.00 bar, T=230.0 degC, V=25 m/s", "p=3.20 bar");
        double V = exact.Exit.Velocity!.Value;
        string printed = Math.Ceiling(V).ToString("F0", CultureInfo.InvariantCulture);
        DeviceAnswer rounded = Nozzle("p=9.00 bar, T=230 degC, V=25 m/s", $"p=3.20 bar, V={printed} m/s");
        Assert.Equal(Verdict.WithinRounding, rounded.Audit.Entropy);
        Assert.Contains(rounded.Findings, f => f.Code == "rounding-limited");
        Assert.True(rounded.Passes(strict: false));
        DeviceAnswer wrong = Nozzle("p=9.00 bar, T=230 degC, V=25 m/s", "p=3.20 bar, V=720 m/s");
        Assert.Equal(Verdict.Broken, wrong.Audit.Entropy);
        Assert.Equal(V, wrong.Audit.HighestExitVelocity!.Value, 1e-6);
    }

    private static DeviceAnswer Nozzle(string inlet, string exit, params (CaseOption, string)[] options) =>
        DeviceSolver.Solve(Cases.Nozzle(WaterFluid.Instance, inlet, exit, options));

    private static double Number(IReadOnlyDictionary<string, string> row, string column) =>
        double.Parse(row[column], CultureInfo.InvariantCulture);
}
