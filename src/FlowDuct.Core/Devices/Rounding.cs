using FlowDuct.Errors;

namespace FlowDuct.Devices;

/// <summary>How far the printed rounding of the given figures can move a result.</summary>
internal static class Rounding
{
    /// <summary>
    /// Moves each printed figure by half of its last place, solves again, and adds the sizes of the effects: the worst case, since
    /// roundings have no reason to cancel. A figure that cannot be moved up without leaving the formulation is moved down.
    /// </summary>
    internal static double Effect(DeviceCase c, Func<DeviceAnswer, double?> result, double now)
    {
        double sum = 0;
        for (int slot = 0; slot < GivenSlots.Count; slot++)
        {
            sum += Of(c, result, now, slot, c.Inlet, (copy, value) => copy.Inlet.Set(slot, value));
            sum += Of(c, result, now, slot, c.Exit, (copy, value) => copy.Exit.Set(slot, value));
            sum += Of(c, result, now, slot, c.Throat, (copy, value) => copy.Throat.Set(slot, value));
            sum += Of(c, result, now, slot, c.Back, (copy, value) => copy.Back.Set(slot, value));
            sum += Of(c, result, now, slot, c.Options, (copy, value) => copy.Options.Set(slot, value));
        }

        return sum;
    }

    private static double Of(
        DeviceCase c, Func<DeviceAnswer, double?> result, double now, int slot, in GivenSlots slots, Action<DeviceCase, double> set)
    {
        if (!slots.Has(slot) || slots.HalfPlace(slot) == 0) return 0;
        double half = slots.HalfPlace(slot), value = slots.Value(slot);
        return Math.Max(Moved(value + half), Moved(value - half));

        double Moved(double to)
        {
            DeviceCase copy = c with { };
            set(copy, to);
            try
            {
                return result(DeviceSolver.Stations(copy, Extent.WithoutExitHead)) is double there ? Math.Abs(there - now) : 0;
            }
            catch (FlowDuctException)
            {
                return 0;
            }
        }
    }
}
