using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Devices;

/// <summary>The figures of the exit with pressures relative to the inlet made absolute, and the given loss beside them.</summary>
internal static class ExitFigures
{
    internal static StationFigures Read(DeviceCase c, Inlet inlet)
    {
        StationFigures given = StationFigures.Read(c.Exit, Station.Exit, c.Inlet);
        if (given.Has(Figure.T0)) throw Refusals.FixedByEnergy("T0");
        if (given.Has(Figure.H0)) throw Refusals.FixedByEnergy("h0");
        foreach (double p in RelativePressures.Read("--exit", c.Exit, inlet.State.p, inlet.Station.Stagnation!.Value.p)) given.Add(Figure.P, p, Station.Exit);
        AddRecovery(c, inlet, given);
        AddLoss(c, given);
        return given;
    }

    private static void AddRecovery(DeviceCase c, Inlet inlet, StationFigures given)
    {
        if (!c.Has(CaseOption.Recovery)) return;
        if (c.Device == DeviceKind.Nozzle) throw Refusals.NotForDevice("--recovery", c.Device);
        if (given.Has(Figure.P)) throw Refusals.RecoveryTwice();
        double p1 = inlet.State.p;
        double head = c.RecoveryBasis == RecoveryBasis.Stagnation
            ? inlet.Station.Stagnation!.Value.p - p1
            : inlet.State.rho * inlet.V * inlet.V / 2;
        double p2 = p1 + (c.Value(CaseOption.Recovery) * head);
        given.Add(Figure.P, RelativePressures.AboveZero("--recovery", p2), Station.Exit);
    }

    private static void AddLoss(DeviceCase c, StationFigures given)
    {
        bool efficiency = c.Has(CaseOption.Efficiency), coefficient = c.Has(CaseOption.VelocityCoefficient), loss = c.Has(CaseOption.LossCoefficient);
        if (coefficient && c.Device == DeviceKind.Diffuser) throw Refusals.NotForDevice("--velocity-coefficient", c.Device);
        if ((efficiency ? 1 : 0) + (coefficient ? 1 : 0) + (loss ? 1 : 0) > 1)
            throw Refusals.LossTwice("efficiency, velocity coefficient, loss coefficient");
        if (efficiency && c.Heat != 0) throw Refusals.EfficiencyWithHeat();
        if (c.GivenEfficiency is double eta) given.Add(Figure.Efficiency, eta, Station.Exit);
        if (loss) given.Add(Figure.Loss, c.Value(CaseOption.LossCoefficient), Station.Exit);
    }
}
