namespace FlowDuct.Devices;

/// <summary>The figures of the device as a whole, SI. Null is "cannot be known from what was given".</summary>
internal sealed record Performance
{
    // In boxes of their own: the figures are copied several times while they grow, and most have neither.
    private readonly System.Runtime.CompilerServices.StrongBox<Rating.ShockAnswer>? _shock;
    private readonly System.Runtime.CompilerServices.StrongBox<Rating.MetastableAnswer>? _metastable;

    internal string? Regime { get; init; }

    internal bool? Choked { get; init; }

    internal double? MassFlow { get; init; }

    /// <summary>Actual volume flow at the inlet's static state, m3/s.</summary>
    internal double? VolumeFlow { get; init; }

    /// <summary>Volume flow at 0 degC, 101.325 kPa, m3/s; of an ideal gas only.</summary>
    internal double? NormalVolumeFlow { get; init; }

    /// <summary>Volume flow at 15 degC, 101.325 kPa, m3/s; of an ideal gas only.</summary>
    internal double? StandardVolumeFlow { get; init; }

    internal double? IsentropicEfficiency { get; init; }

    /// <summary>Least and greatest efficiency that the readings allow, where they fix no single one.</summary>
    internal Interval? EfficiencyRange { get; init; }

    internal double? VelocityCoefficient { get; init; }

    internal double? CriticalPressureRatio { get; init; }

    internal double? AreaRatio { get; init; }

    internal double? ThroatAreaRatio { get; init; }

    internal double? ConvergentLength { get; init; }

    internal double? DivergentLength { get; init; }

    /// <summary>Mass flow over isentropic flow of the throat.</summary>
    internal double? DischargeCoefficient { get; init; }

    /// <summary>Reynolds number of the throat on its bore, with the viscosity of the stagnation state.</summary>
    internal double? ReynoldsThroat { get; init; }

    internal Rating.BackPressureLimits Limits { get; init; }

    internal Rating.ShockAnswer? Shock
    {
        get => _shock?.Value;
        init => _shock = value is Rating.ShockAnswer shock ? new(shock) : null;
    }

    /// <summary>Stagnation pressure behind the shock over that before it.</summary>
    internal double? ShockStagnationPressureRatio { get; init; }

    internal Rating.JetAnswer? Jet { get; init; }

    internal Rating.MetastableAnswer? Metastable
    {
        get => _metastable?.Value;
        init => _metastable = value is Rating.MetastableAnswer held ? new(held) : null;
    }

    internal double? EntropyRise { get; init; }

    internal double? ExitVelocityIdeal { get; init; }

    /// <summary>Least and greatest exit velocity that the readings allow, where they fix no single one.</summary>
    internal Interval? ExitVelocityRange { get; init; }

    internal double? PressureChange { get; init; }

    internal double? StagnationPressureRatio { get; init; }

    internal double? Recovery { get; init; }

    internal double? RecoveryDynamic { get; init; }

    internal double? IdealRecovery { get; init; }

    internal double? Effectiveness { get; init; }

    internal double? LossCoefficient { get; init; }

    internal double? PolytropicEfficiency { get; init; }

    /// <summary>Figures that only a diffuser has.</summary>
    internal Diffusers.DiffuserFigures? Diffuser { get; init; }

    /// <summary>Figures that only a venturi has.</summary>
    internal Venturis.VenturiFigures? Venturi { get; init; }

    internal double? Thrust { get; init; }

    internal double? AxialForce { get; init; }

    internal double? HeatRate { get; init; }

    /// <summary>Work lost to irreversibility at the temperature of the surroundings, J/kg.</summary>
    internal double? LostWork { get; init; }
}

/// <summary>Least and greatest value.</summary>
internal readonly record struct Interval(double Least, double Greatest);
