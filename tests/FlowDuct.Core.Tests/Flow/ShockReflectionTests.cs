using FlowDuct.Flow;
using Xunit;

namespace FlowDuct.Core.Tests.Flow;

/// <summary>Regular and Mach reflection of an oblique shock.</summary>
public class ShockReflectionTests
{
    // A. Chpoun, D. Passerel, H. Li and G. Ben-Dor, J. Fluid Mech. 301 (1995) 19-35: at M = 4.96 in air the von Neumann angle is 30.9
    // deg and the angle of detachment 39.3 deg (from memory; half a unit of the last digit).
    [Fact]
    public void The_limits_are_those_of_the_literature()
    {
        Assert.Equal(30.9, Limit(4.96, kind => kind == ReflectionKind.Regular), 0.05);
        Assert.Equal(39.3, Limit(4.96, kind => kind != ReflectionKind.Mach), 0.05);
    }

    [Fact]
    public void Detachment_is_the_same_in_both_members()
    {
        Stream at = Streams.OfPerfectGas(5);
        HashSet<ReflectionKind> seen = [];
        foreach (double degrees in (double[])[15, 21, 25, 30, 35, 39, 40, 45, 60, 80])
        {
            Assert.True(ObliqueShock.TryAtAngle(at.Fluid, at.State, at.V, Streams.Radians(degrees), out ObliqueWave wave));
            Assert.True(ShockReflection.TryKind(at.Fluid, at.State, at.V, wave, out ReflectionKind kind));
            Assert.Equal(kind != ReflectionKind.Mach, ShockReflection.RegularReflectionPossible(at.Fluid, wave));
            seen.Add(kind);
        }

        Assert.Equal([ReflectionKind.Regular, ReflectionKind.Either, ReflectionKind.Mach], seen.Order());
    }

    [Fact]
    public void Behind_a_strong_shock_the_stream_cannot_turn_back()
    {
        Stream at = Streams.OfPerfectGas(3);
        Assert.True(ObliqueShock.TryStrong(at.Fluid, at.State, at.V, 0.1, out ObliqueWave strong));
        Assert.False(ShockReflection.RegularReflectionPossible(at.Fluid, strong));
    }

    // The wave angle, in degrees, up to which the condition holds.
    private static double Limit(double M, Func<ReflectionKind, bool> holds)
    {
        Stream at = Streams.OfPerfectGas(M);
        (double low, double high) = (Math.Asin(1 / M) + 0.01, 1);
        while (high - low > 1e-6)
        {
            double beta = (low + high) / 2;
            Assert.True(ObliqueShock.TryAtAngle(at.Fluid, at.State, at.V, beta, out ObliqueWave wave));
            Assert.True(ShockReflection.TryKind(at.Fluid, at.State, at.V, wave, out ReflectionKind kind));
            if (holds(kind)) low = beta;
            else high = beta;
        }

        return Streams.Degrees(low);
    }
}
