using CsCheck;
using FlowDuct.Core.Tests.Support;
using FlowDuct.Flow;
using FlowDuct.Fluids;
using Xunit;

namespace FlowDuct.Core.Tests.Flow;

/// <summary>Oblique shocks: NACA Report 1135, 1953, for constant heat capacity; the balances of both directions for real fluids.</summary>
public class ObliqueShockTests
{
    private static IReadOnlyList<IReadOnlyDictionary<string, string>> Rows => ReferenceTable.Read("flow/oblique_shock_g14.csv");

    // Twelve digits of the computed columns; 1e-9 is asked.
    [Fact]
    public void Weak_and_strong_shocks_follow_the_table()
    {
        int printed = 0;
        foreach (IReadOnlyDictionary<string, string> row in Rows)
        {
            Stream at = Streams.OfPerfectGas(Streams.Number(row, "M1"));
            double theta = Streams.Radians(Streams.Number(row, "theta_deg"));
            Assert.True(ObliqueShock.TryWeak(at.Fluid, at.State, at.V, theta, out ObliqueWave weak));
            Assert.True(ObliqueShock.TryStrong(at.Fluid, at.State, at.V, theta, out ObliqueWave strong));
            Near(row, "beta_weak_deg", Streams.Degrees(weak.Beta));
            Near(row, "p2_p1_weak", weak.State.p / at.State.p);
            Near(row, "M2_weak", weak.M);
            Near(row, "T2_T1_weak", weak.State.T / at.State.T);
            Near(row, "pt2_pt1_weak", TotalPressureRatio(at, weak));
            Near(row, "beta_strong_deg", Streams.Degrees(strong.Beta));
            Near(row, "p2_p1_strong", strong.State.p / at.State.p);
            Near(row, "M2_strong", strong.M);
            if (row["printed_M2"].Length == 0) continue;
            Assert.True(Printed.Parse(row["printed_beta_deg"]).Agrees(Streams.Degrees(weak.Beta)));
            Assert.True(Printed.Parse(row["printed_p2_p1"]).Agrees(weak.State.p / at.State.p));
            Assert.True(Printed.Parse(row["printed_M2"]).Agrees(weak.M));
            printed++;
        }

        Assert.Equal(6, printed);
    }

    // The same rows entered by the pressure behind the shock: the lip of an overexpanded nozzle.
    [Fact]
    public void A_pressure_behind_gives_the_angles_of_the_table()
    {
        foreach (IReadOnlyDictionary<string, string> row in Rows)
        {
            Stream at = Streams.OfPerfectGas(Streams.Number(row, "M1"));
            Assert.True(ObliqueShock.TryToPressure(at.Fluid, at.State, at.V, at.State.p * Streams.Number(row, "p2_p1_weak"), out ObliqueWave wave));
            Near(row, "beta_weak_deg", Streams.Degrees(wave.Beta));
            Near(row, "theta_deg", Streams.Degrees(wave.Theta));
            Near(row, "M2_weak", wave.M);
        }
    }

    [Fact]
    public void The_largest_deflection_follows_the_table()
    {
        foreach (IReadOnlyDictionary<string, string> row in ReferenceTable.Read("flow/attachment_and_starting_g14.csv"))
        {
            Stream at = Streams.OfPerfectGas(Streams.Number(row, "M"));
            Assert.True(ObliqueShock.TryLargestDeflection(at.Fluid, at.State, at.V, out ObliqueWave most));
            Near(row, "theta_max_deg", Streams.Degrees(most.Theta));
            Near(row, "beta_at_theta_max_deg", Streams.Degrees(most.Beta));
            Assert.True(NormalShock.TryFind(at.Fluid, at.State, at.V, out FluidState behind, out double V2));
            Near(row, "normal_shock_recovery", TotalPressureRatio(at, new ObliqueWave(0, 0, behind, V2)));
            Assert.False(ObliqueShock.TryWeak(at.Fluid, at.State, at.V, most.Theta * (1 + 1e-9), out _));
            Assert.True(ObliqueShock.TryWeak(at.Fluid, at.State, at.V, most.Theta * (1 - 1e-9), out _));
        }
    }

    [Fact]
    public void A_nudged_deflection_misses_the_table()
    {
        IReadOnlyDictionary<string, string> row = Rows.First(r => r["M1"] == "3" && r["theta_deg"] == "20");
        Stream at = Streams.OfPerfectGas(3);
        Assert.True(ObliqueShock.TryWeak(at.Fluid, at.State, at.V, Streams.Radians(20 * (1 + 1e-8)), out ObliqueWave wave));
        Assert.NotInRange(Streams.Degrees(wave.Beta) / Streams.Number(row, "beta_weak_deg"), 1 - 1e-9, 1 + 1e-9);
    }

    [Fact]
    public void A_shock_square_to_the_stream_is_the_normal_shock() => Streams.All.Each(
        at =>
        {
            Assert.True(NormalShock.TryFind(at.Fluid, at.State, at.V, out FluidState behind, out double V2));
            Assert.True(ObliqueShock.TryAtAngle(at.Fluid, at.State, at.V, Math.PI / 2, out ObliqueWave wave));
            Assert.Equal(behind.p, wave.State.p);
            Assert.Equal(V2, wave.V, 1e-12 * V2);
            Assert.InRange(wave.Theta, 0, 1e-15);
            Assert.True(ObliqueShock.TryStrong(at.Fluid, at.State, at.V, 0, out ObliqueWave strong));
            Assert.Equal(behind.p, strong.State.p);
        },
        300);

    // The balance of momentum along and across the stream before the shock knows nothing of normal and tangential components.
    [Fact]
    public void Momentum_closes_along_and_across_the_stream() => Waves(300, (at, wave) =>
    {
        double Vx = wave.V * Math.Cos(wave.Theta), Vy = wave.V * Math.Sin(wave.Theta), flux = at.V * at.State.rho;
        double jump = (wave.State.p - at.State.p) / Math.Tan(wave.Beta), momentum = at.State.p + (flux * at.V);
        Assert.InRange((flux * (Vx - at.V)) + (wave.State.p - at.State.p), -1e-10 * momentum, 1e-10 * momentum);
        Assert.InRange((flux * Vy) - jump, -1e-10 * momentum, 1e-10 * momentum);
        double h0 = wave.State.h + (wave.V * wave.V / 2);
        Assert.Equal(at.h0, h0, 1e-10 * h0);
    });

    // Weak shocks lose digits of the jump: dp/p is only 1e-3 to 1e-4 of what the equation of state rounds.
    [Fact]
    public void Angle_pressure_and_deflection_lead_to_the_same_shock() => Waves(300, (at, wave) =>
    {
        Assert.True(ObliqueShock.TryToPressure(at.Fluid, at.State, at.V, wave.State.p, out ObliqueWave byPressure), at.ToString());
        Assert.Equal(wave.Beta, byPressure.Beta, 1e-7);
        Assert.Equal(wave.Theta, byPressure.Theta, 1e-9);
        Assert.True(ObliqueShock.TryLargestDeflection(at.Fluid, at.State, at.V, out ObliqueWave most), at.ToString());
        Assert.True(most.Theta >= wave.Theta, at.ToString());
        bool found = wave.Beta < most.Beta
            ? ObliqueShock.TryWeak(at.Fluid, at.State, at.V, wave.Theta, out ObliqueWave byTurning)
            : ObliqueShock.TryStrong(at.Fluid, at.State, at.V, wave.Theta, out byTurning);
        Assert.True(found, at.ToString());
        Assert.Equal(wave.Theta, byTurning.Theta, 1e-10);
        if (most.Theta - wave.Theta > 1e-6) Assert.Equal(wave.Beta, byTurning.Beta, 1e-6);
    });

    // The derivative that leads to the largest deflection against the deflections around it.
    [Fact]
    public void No_neighbour_turns_more_than_the_largest_deflection() => Streams.All.Where(at => at.M > 1.02).Each(
        at =>
        {
            Assert.True(ObliqueShock.TryLargestDeflection(at.Fluid, at.State, at.V, out ObliqueWave most), at.ToString());
            foreach (double step in (double[])[-1e-3, 1e-3])
            {
                Assert.True(ObliqueShock.TryAtAngle(at.Fluid, at.State, at.V, most.Beta + step, out ObliqueWave near), at.ToString());
                Assert.True(near.Theta < most.Theta, at.ToString());
            }
        },
        300);

    [Fact]
    public void A_pressure_out_of_reach_has_no_shock()
    {
        Stream at = Streams.OfPerfectGas(2);
        Assert.True(ObliqueShock.TryToPressure(at.Fluid, at.State, at.V, 4.5 * at.State.p, out ObliqueWave normal));
        Assert.Equal(Math.PI / 2, normal.Beta, 1e-7);
        Assert.False(ObliqueShock.TryToPressure(at.Fluid, at.State, at.V, 4.5001 * at.State.p, out _));
        Assert.False(ObliqueShock.TryToPressure(at.Fluid, at.State, at.V, 0.99 * at.State.p, out _));
        Assert.True(ObliqueShock.TryToPressure(at.Fluid, at.State, at.V, at.State.p, out ObliqueWave wave));
        Assert.Equal(Math.PI / 6, wave.Beta, 1e-14);
        Assert.Equal(0, wave.Theta);
        Assert.False(ObliqueShock.TryToPressure(at.Fluid, at.State, 0.9 * at.State.w, 1.1 * at.State.p, out _));
        Assert.False(ObliqueShock.TryWeak(at.Fluid, at.State, at.V, -0.1, out _));
        Assert.False(ObliqueShock.TryAtAngle(at.Fluid, at.State, at.V, 0.999 * Math.PI / 6, out _));
    }

    // Streams of M > 1.01 with a wave anywhere between the Mach angle and the normal.
    private static void Waves(int count, Action<Stream, ObliqueWave> check) =>
        Gen.Select(Streams.All.Where(at => at.M > 1.01), Gen.Double[0.05, 0.99]).Each(
            (at, part) =>
            {
                double least = Math.Asin(1 / at.M), beta = least + (part * ((Math.PI / 2) - least));
                Assert.True(ObliqueShock.TryAtAngle(at.Fluid, at.State, at.V, beta, out ObliqueWave wave), at.ToString());
                check(at, wave);
            },
            count);

    private static double TotalPressureRatio(Stream at, in ObliqueWave wave)
    {
        Stagnation.Of(at.Fluid, at.State, at.V, out FluidState total1);
        Stagnation.Of(at.Fluid, wave.State, wave.V, out FluidState total2);
        return total2.p / total1.p;
    }

    private static void Near(IReadOnlyDictionary<string, string> row, string column, double computed) =>
        Assert.Equal(Streams.Number(row, column), computed, 1e-9 * Streams.Number(row, column));
}
