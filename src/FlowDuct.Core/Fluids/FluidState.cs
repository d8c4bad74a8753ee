namespace FlowDuct.Fluids;

/// <summary>One thermodynamic state, SI inside. Density and internal energy follow from the fields.</summary>
/// <remarks>Fields that do not exist for the phase are flagged, never NaN: <see cref="HasQuality"/>, <see cref="HasHeatCapacities"/>.</remarks>
public readonly struct FluidState
{
    /// <summary>Pressure, Pa.</summary>
    internal readonly double p;

    /// <summary>Temperature, K.</summary>
    internal readonly double T;

    /// <summary>Specific volume, m3/kg.</summary>
    internal readonly double v;

    /// <summary>Specific enthalpy, J/kg.</summary>
    internal readonly double h;

    /// <summary>Specific entropy, J/(kg.K).</summary>
    internal readonly double s;

    /// <summary>Specific heat capacity at constant pressure, J/(kg.K); 0 where <see cref="HasHeatCapacities"/> is false.</summary>
    internal readonly double cp;

    /// <summary>Specific heat capacity at constant volume, J/(kg.K); 0 where <see cref="HasHeatCapacities"/> is false.</summary>
    internal readonly double cv;

    /// <summary>Speed of sound, m/s; of the homogeneous equilibrium mixture when wet. (dp/dv) at constant s is -(w/v)^2.</summary>
    internal readonly double w;

    /// <summary>Vapour mass fraction; 0 where <see cref="HasQuality"/> is false.</summary>
    internal readonly double x;

    internal FluidState(
        double p, double T, double v, double h, double s, double cp, double cv, double w, double x, Phase phase, Notices notices)
    {
        (this.p, this.T, this.v, this.h, this.s, this.cp, this.cv, this.w, this.x) = (p, T, v, h, s, cp, cv, w, x);
        (Phase, Notices) = (phase, notices);
    }

    /// <summary>The phase at this state.</summary>
    public Phase Phase { get; }

    /// <summary>Notices about how the state was obtained.</summary>
    public Notices Notices { get; }

    /// <summary>True on the saturation line and between its two sides, where a quality exists.</summary>
    public bool HasQuality => Phase is Phase.Wet or Phase.SaturatedLiquid or Phase.SaturatedVapour;

    /// <summary>True where heat capacities exist (everywhere but between the saturation lines).</summary>
    public bool HasHeatCapacities => Phase is not (Phase.Wet or Phase.None);

    /// <summary>True where cp is a number: not between the saturation lines, and not at the critical point, where it has no bound.</summary>
    public bool HasIsobaricHeatCapacity => HasHeatCapacities && cp > 0 && cp < 1e10;

    /// <summary>Density, kg/m3.</summary>
    internal double rho => 1 / v;

    /// <summary>Specific internal energy, J/kg.</summary>
    internal double u => h - (p * v);

    /// <summary>(dv/dp) at constant s, m3/(kg.Pa), of one phase or of the equilibrium mixture.</summary>
    internal double vpAtS => -(v / w) * (v / w);

    /// <summary>Isentropic exponent -(v/p)(dp/dv) at constant s; the ratio of heat capacities for an ideal gas only.</summary>
    internal double kappa => w * w / (p * v);
}
