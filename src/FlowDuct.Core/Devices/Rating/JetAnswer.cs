using FlowDuct.Flow;
using FlowDuct.Fluids;

namespace FlowDuct.Devices.Rating;

/// <summary>What happens to a supersonic jet at the lip.</summary>
/// <param name="PressureRatio">Exit plane over back pressure.</param>
/// <param name="WaveAngle">Angle of the oblique shock, rad; null where the jet expands.</param>
/// <param name="TurningAngle">Turning of the jet, rad; null where it lies outside what the wave theory or the fluid holds.</param>
/// <param name="RegularReflection">False where the shock cannot reflect at the axis as a plane wave: a Mach disk stands there.</param>
internal readonly record struct JetAnswer(double PressureRatio, double? WaveAngle, double? TurningAngle, bool? RegularReflection)
{
    /// <summary>The jet of a supersonic exit plane at a back pressure, Pa; null of a subsonic or matched one.</summary>
    internal static JetAnswer? Of(Fluid fluid, in NozzleRating rating, double back)
    {
        double ratio = rating.Exit.p / back;
        if (rating.Regime == Regime.Overexpanded)
        {
            bool found = ObliqueShock.TryToPressure(fluid, rating.Exit, rating.ExitVelocity, back, out ObliqueWave wave);
            return new JetAnswer(
                ratio, found ? wave.Beta : null, found ? wave.Theta : null, found ? ShockReflection.RegularReflectionPossible(fluid, wave) : null);
        }

        if (rating.Regime != Regime.Underexpanded && !(rating.Regime == Regime.Choked && back < rating.Exit.p)) return null;
        double h0 = rating.Exit.h + (rating.ExitVelocity * rating.ExitVelocity / 2);
        bool turned = PrandtlMeyer.TryTurning(fluid, h0, rating.Exit.s, rating.Exit.p, back, out double nu);

        // A jet that would turn back past its own lip is no plane fan: flashing water, or a space near vacuum.
        return new JetAnswer(ratio, null, turned && nu <= Math.PI / 2 ? nu : null, null);
    }
}
