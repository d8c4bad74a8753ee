using CsCheck;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using Xunit;

namespace FlowDuct.Core.Tests.Fluids.Gases;

/// <summary>Laws that hold at every state of an ideal gas.</summary>
public class IdealGasPropertyTests
{
    private const double Closure = 1e-12;
    private static readonly IdealGas Air = GasCatalogue.Air;
    private static readonly Gen<(double p, double T)> AnyState =
        Gen.Select(Gen.Double[0, Math.Log(1e9)].Select(Math.Exp).Select(p => Math.Clamp(p, 1, 1e9)), Gen.Double[50, 6000]);

    [Fact]
    public void Pressure_and_enthalpy_return_the_state() =>
        AnyState.Sample(at => Closes(at, from => (Air.FromPH(from.p, from.h, default, out FluidState back), back)));

    [Fact]
    public void Pressure_and_entropy_return_the_state() =>
        AnyState.Sample(at => Closes(at, from => (Air.FromPS(from.p, from.s, default, out FluidState back), back)));

    [Fact]
    public void Enthalpy_and_entropy_return_the_state() =>
        AnyState.Sample(at => Closes(at, from => (Air.FromHS(from.h, from.s, default, out FluidState back), back)));

    [Fact]
    public void Pressure_and_density_return_the_state() =>
        AnyState.Sample(at => Closes(at, from => (Air.FromPRho(from.p, from.rho, out FluidState back), back)));

    [Theory]
    [InlineData(1, 50)]
    [InlineData(1, 6000)]
    [InlineData(1e9, 50)]
    [InlineData(1e9, 6000)]
    [InlineData(1e5, 200)]
    [InlineData(1e5, 1000)]
    public void Corners_and_joints_return_their_state(double p, double T)
    {
        Assert.True(Closes((p, T), from => (Air.FromPH(from.p, from.h, default, out FluidState back), back)));
        Assert.True(Closes((p, T), from => (Air.FromPS(from.p, from.s, default, out FluidState back), back)));
        Assert.True(Closes((p, T), from => (Air.FromHS(from.h, from.s, default, out FluidState back), back)));
        Assert.True(Closes((p, T), from => (Air.FromPRho(from.p, from.rho, out FluidState back), back)));
    }

    [Fact]
    public void Ideal_gas_relations_hold() => AnyState.Sample(at =>
    {
        FluidState state = State(at.p, at.T);
        return Near(state.p * state.v, Air.R * state.T)
            && Near(state.cp - state.cv, Air.R)
            && Near(state.w * state.w, state.cp / state.cv * Air.R * state.T)
            && Near(state.h - state.u, Air.R * state.T)
            && state is { Phase: Phase.Gas, HasQuality: false, HasHeatCapacities: true, x: 0 };
    });

    [Fact]
    public void Enthalpy_and_entropy_are_integrals_of_the_heat_capacity() => Gen.Double[51, 5999].Sample(T =>
    {
        // Simpson over 1 K inside one piece; a joint inside the step would add the kink of cp.
        if (Math.Abs(T - 200) < 1 || Math.Abs(T - 1000) < 1)
            return true;
        (FluidState a, FluidState m, FluidState b) = (State(1e5, T - 0.5), State(1e5, T), State(1e5, T + 0.5));
        double dh = (a.cp + (4 * m.cp) + b.cp) / 6;
        double ds = ((a.cp / a.T) + (4 * m.cp / m.T) + (b.cp / b.T)) / 6;
        return Math.Abs(b.h - a.h - dh) < 1e-8 * dh && Math.Abs(b.s - a.s - ds) < 1e-8 * ds;
    });

    [Theory]
    [InlineData(200, 1e-12)]
    [InlineData(1000, 2e-9)] // cp of the printed fits jumps by 7.8e-10 here; h and s are joined
    public void Properties_are_continuous_at_the_joints(double T, double jumpOfCp)
    {
        (FluidState below, FluidState above) = (State(1e5, Math.BitDecrement(T)), State(1e5, T));
        Assert.Equal(below.h, above.h, 1e-13 * above.h);
        Assert.Equal(below.s, above.s, 1e-13 * above.s);
        Assert.Equal(below.cp, above.cp, jumpOfCp * above.cp);
    }

    [Fact]
    public void Below_200_K_the_heat_capacity_stays_and_the_state_says_so()
    {
        FluidState held = State(1e5, 120);
        Assert.Equal(State(1e5, 200).cp, held.cp, 1e-10);
        Assert.Equal(Notices.Extrapolated, held.Notices);
        Assert.Equal(Notices.None, State(1e5, 200).Notices);
    }

    [Fact]
    public void A_wrong_state_does_not_close() =>
        Assert.False(Closes((1e5, 300), from => (Air.FromPT(from.p, from.T * (1 + 1e-11), out FluidState back), back)));

    [Fact]
    public void Calls_allocate_nothing()
    {
        AllCalls(); // once, so that tables and compiled code exist
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 100; i++)
            AllCalls();
        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
    }

    private static void AllCalls()
    {
        Air.FromPT(2e5, 320, out FluidState state);
        Air.FromPH(1e5, state.h, state, out _);
        Air.FromPS(1e5, state.s, state, out _);
        Air.FromHS(state.h, state.s, state, out _);
        Air.FromPRho(1e5, state.rho, out _);
    }

    private static bool Closes((double p, double T) at, Func<FluidState, (Outcome Outcome, FluidState State)> inverse)
    {
        FluidState there = State(at.p, at.T);
        (Outcome outcome, FluidState back) = inverse(there);
        if (outcome != Outcome.Ok)
            return false;
        FluidState forward = State(back.p, back.T);
        return Near(back.p, there.p) && Near(back.T, there.T) && Near(forward.h, there.h) && Near(forward.s, there.s)
            && Near(back.h, forward.h) && Near(back.s, forward.s) && Near(back.v, there.v);
    }

    private static bool Near(double a, double b) => Math.Abs(a - b) <= Closure * Math.Abs(b);

    private static FluidState State(double p, double T)
    {
        Assert.Equal(Outcome.Ok, Air.FromPT(p, T, out FluidState state));
        return state;
    }
}
