using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases.Reference;

/// <summary>Round trips through every pair, the laws that tie the properties together, and the low-pressure limit.</summary>
public class ReferenceStateTests
{
    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    [InlineData("Air")]
    public void One_phase_comes_back_through_every_pair(string gas)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        Equations.OnePhase(fluid).Each(at => RoundTrips(fluid, at), 1500);
    }

    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    public void Wet_states_come_back_through_every_pair(string gas)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        Equations.Wet(fluid).Each(
            at =>
            {
                Assert.Equal(Phase.Wet, at.Phase);
                RoundTrips(fluid, at);
                Assert.Equal(Outcome.Ok, fluid.FromPX(at.p, at.x, out FluidState px));
                Assert.Equal(at.T, px.T, 1e-11 * at.T);

                // Beside the critical point a pressure holds fewer digits of the two densities.
                Assert.Equal(at.h, px.h, 1e-8 * Math.Max(Math.Abs(at.h), 1e3));
                fluid.FromPS(at.p, at.s, default, out FluidState ps);
                Assert.Equal(at.x, ps.x, 1e-9);
            },
            700);
    }

    // dh = T ds + v dp, cp = (dh/dT)p, w^2 = (dp/drho)s: central differences of 1e-5 and their square, times what the critical region makes of it.
    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    [InlineData("Air")]
    public void Properties_obey_the_laws(string gas)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        EquationParameters range = fluid.Equation.Parameters;
        int checkedStates = 0;
        Gen.Select(Gen.Double[Math.Log(1e3), Math.Log(1e8)], Gen.Double[range.Tleast * 1.05, range.Tmost * 0.99]).Each(
            (lnp, T) =>
            {
                double p = Math.Exp(lnp);
                FluidState at = Equations.At(fluid, p, T), hot = Equations.At(fluid, p, T * (1 + 1e-5)), cold = Equations.At(fluid, p, T * (1 - 1e-5));
                if (at.Phase == Phase.None || hot.Phase != at.Phase || cold.Phase != at.Phase) return;
                if (Math.Abs(T - fluid.Boundary.Tc) < 0.03 * T && Math.Abs(p - fluid.Boundary.pc) < 0.3 * p) return;
                Assert.Equal(at.cp, (hot.h - cold.h) / (2e-5 * T), 1e-5 * at.cp);
                Assert.Equal(at.cp / T, (hot.s - cold.s) / (2e-5 * T), 1e-5 * at.cp / T);
                if (fluid.FromPS(p * (1 + 1e-5), at.s, at, out FluidState up) != Outcome.Ok || fluid.FromPS(p * (1 - 1e-5), at.s, at, out FluidState down) != Outcome.Ok) return;
                if (up.Phase != at.Phase || down.Phase != at.Phase) return;

                // A cold liquid changes its density by less than the rounding of it allows differences to see.
                double rounding = 1e-14 * at.rho * at.w * at.w / (1e-5 * p);
                Assert.Equal(1, (up.p - down.p) / (up.rho - down.rho) / (at.w * at.w), 1e-5 + rounding);
                Assert.Equal(1, (up.h - down.h) / (up.p - down.p) / at.v, 1e-5 + (1e-14 * Math.Abs(at.h) / (1e-5 * p * at.v)));
                checkedStates++;
            },
            1000);
        Assert.True(checkedStates > 700, $"{checkedStates}");
    }

    // The wet speed of sound by differences on an isentrope.
    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    public void Sound_in_a_mixture_is_the_derivative_on_its_isentrope(string gas)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        Equations.Wet(fluid).Each(
            at =>
            {
                if (fluid.FromPS(at.p * (1 + 1e-5), at.s, default, out FluidState up) != Outcome.Ok || up.Phase != Phase.Wet) return;
                if (fluid.FromPS(at.p * (1 - 1e-5), at.s, default, out FluidState down) != Outcome.Ok || down.Phase != Phase.Wet) return;
                Assert.Equal(1, at.v * Math.Sqrt((up.p - down.p) / (down.v - up.v)) / at.w, 1e-4);
            },
            300);
    }

    // At a millionth of the critical pressure what is left of the real gas is B p/(R T), under 1e-5 down to the cold end; h, cp and w are those of the ideal part.
    [Theory]
    [InlineData("N2")]
    [InlineData("CO2")]
    [InlineData("Air")]
    public void Thin_gas_is_the_ideal_gas_of_its_equation(string gas)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        (HelmholtzEquation of, double R) = (fluid.Equation, fluid.Equation.R);
        for (double T = of.Parameters.Tleast * 1.05; T < of.Parameters.Tmost; T *= 1.2)
        {
            double p = 1e-6 * fluid.Boundary.pc;
            Assert.Equal(Outcome.Ok, fluid.FromPT(p, T, out FluidState at));
            of.Ideal(of.Treducing / T, out _, out double gy, out double gyy);
            double cp = R * (1 - gyy);
            Assert.Equal(R * T / p, at.v, 1e-4 * at.v);
            Assert.Equal(cp, at.cp, 1e-3 * cp);
            Assert.Equal(R * T * (1 + gy), at.h, 1e-4 * R * T);
            Assert.Equal(Math.Sqrt(cp / (cp - R) * R * T), at.w, 1e-4 * at.w);
        }
    }

    // The heat capacity of the ideal part against NASA/TP-2002-211556 (2002): two evaluations of spectroscopic data, 0.1 % (air 0.15 %: another composition).
    [Theory]
    [InlineData("N2", 1000, 0.001)]
    [InlineData("CO2", 1000, 0.001)]
    [InlineData("Air", 1500, 0.0015)]
    public void The_ideal_part_agrees_with_the_nasa_record(string gas, double Tmost, double tolerance)
    {
        HelmholtzFluid fluid = Equations.Of(gas);
        for (double T = 220; T < Tmost; T += 40)
        {
            fluid.Equation.Ideal(fluid.Equation.Treducing / T, out _, out _, out double gyy);
            Assert.Equal(Outcome.Ok, GasCatalogue.Find(gas)!.FromPT(1e5, T, out FluidState ideal));
            Assert.Equal(1, fluid.Equation.R * (1 - gyy) / ideal.cp, tolerance);
        }
    }

    [Fact]
    public void States_allocate_nothing()
    {
        HelmholtzFluid fluid = ReferenceEquations.CarbonDioxide;
        Walk(fluid);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 20; i++) Walk(fluid);
        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
    }

    [Theory]
    [InlineData("N2", 1e5, 60, nameof(Outcome.TemperatureTooLow))]
    [InlineData("N2", 3e7, 65, nameof(Outcome.TemperatureTooLow))] // frozen: the melting line is at 69.5 K
    [InlineData("N2", 1e5, 1001, nameof(Outcome.TemperatureTooHigh))]
    [InlineData("N2", 2.3e9, 900, nameof(Outcome.PressureTooHigh))]
    [InlineData("N2", 0.5, 300, nameof(Outcome.PressureTooLow))]
    [InlineData("CO2", 1e5, double.NaN, nameof(Outcome.TemperatureTooHigh))]
    [InlineData("CO2", double.NaN, 300, nameof(Outcome.PressureTooLow))]
    [InlineData("Air", 3.1e6, 128, nameof(Outcome.BetweenPhases))]
    [InlineData("Air", 1e5, 80, nameof(Outcome.BetweenPhases))]
    public void What_lies_outside_is_refused_with_its_limit(string gas, double p, double T, string name)
    {
        Outcome expected = Enum.Parse<Outcome>(name);
        HelmholtzFluid fluid = Equations.Of(gas);
        Assert.Equal(expected, fluid.FromPT(p, T, out _));
        RangeViolation why = fluid.Explain(expected, StatePair.PT, p, T);
        Assert.True(double.IsFinite(why.Limit) && why.Source.Length > 10);
        if (expected == Outcome.PressureTooLow) return;
        Assert.Contains("J. Phys. Chem. Ref. Data", why.Source, StringComparison.Ordinal);
    }

    private static void Walk(HelmholtzFluid fluid)
    {
        fluid.FromPT(8e6, 310, out FluidState at);
        fluid.FromPS(4e6, at.s, at, out FluidState wet);
        fluid.FromPH(wet.p, wet.h, default, out _);
        fluid.FromHS(wet.h, wet.s, default, out _);
        fluid.FromPRho(wet.p, wet.rho, out _);
        fluid.TrySaturationOnIsentrope(wet.s, out _);
    }

    private static void RoundTrips(HelmholtzFluid fluid, in FluidState at)
    {
        Assert.True(at.w > 0 && double.IsFinite(at.w) && double.IsFinite(at.cp), $"p={at.p:R} T={at.T:R}");
        Closes(fluid.FromPH(at.p, at.h, default, out FluidState ph), "p, h", at);
        Close(at.h, ph.h, 1e3, "p, h", at);
        Closes(fluid.FromPS(at.p, at.s, default, out FluidState ps), "p, s", at);
        Close(at.s, ps.s, 1, "p, s", at);
        Closes(fluid.FromHS(at.h, at.s, default, out FluidState hs), "h, s", at);
        Close(at.h, hs.h, 1e3, "h, s", at);
        Close(at.s, hs.s, 1, "h, s", at);
        Closes(fluid.FromPRho(at.p, at.rho, out FluidState pr), "p, rho", at);
        Close(at.rho, pr.rho, 1, "p, rho", at);
        foreach (FluidState back in (FluidState[])[ph, ps, hs, pr])
        {
            // Near the critical point a pair holds fewer digits of temperature: dT = dh/cp.
            Assert.True(Math.Abs(back.T - at.T) <= 1e-7 * at.T && back.w > 0, $"p={at.p:R} T={at.T:R} back T={back.T:R}");
            if (!back.HasQuality) ClosesInPressure(fluid, back);
            bool edge = at.HasQuality || back.HasQuality || Math.Abs(at.T - fluid.Boundary.Tc) < 1e-9 * at.T || Math.Abs(at.p - fluid.Boundary.pc) < 1e-9 * at.p;
            Assert.True(edge || back.Phase == at.Phase, $"p={at.p:R} T={at.T:R} {at.Phase} {back.Phase}");
        }
    }

    // A cold liquid keeps p to the rounding of rho dp/drho.
    private static void ClosesInPressure(HelmholtzFluid fluid, in FluidState at)
    {
        HelmholtzPoint point = fluid.Equation.At(at.rho, at.T);
        Assert.True(Math.Abs(point.p - at.p) <= (1e-11 * at.p) + (3e-12 * at.rho * point.prho), $"p={at.p:R} T={at.T:R}: the equation has {point.p:R}");
    }

    private static void Closes(Outcome outcome, string pair, in FluidState at) => Assert.True(outcome == Outcome.Ok, $"({pair}) p={at.p:R} T={at.T:R} x={at.x:R}: {outcome}");

    private static void Close(double expected, double actual, double scale, string pair, in FluidState at) =>
        Assert.True(Math.Abs(actual - expected) <= 1e-11 * Math.Max(Math.Abs(expected), scale), $"({pair}) p={at.p:R} T={at.T:R} x={at.x:R}: {expected:R} {actual:R}");
}
