namespace FlowDuct.Quantities;

/// <content>Results of the device as a whole.</content>
internal static partial class QuantityCatalogue
{
    /// <summary>Flow, efficiency and change of state, in the order of the JSON answer.</summary>
    private static QuantityRow[] DeviceRows() =>
    [
        Result("regime", "", "regime", Dimension.Ratio, "Regime of the flow in words, such as choked-subsonic-exit.", isText: true),
        Result("choked", "", "choked", Dimension.Ratio, "Whether the throat passes the greatest flow it can.", isText: true),
        Result("mass_flow", "qm", "mass flow", Dimension.MassFlow, "Mass flow of all openings together."),
        Result("volume_flow", "qV", "volume flow", Dimension.VolumeFlow, "Volume flow at inlet static conditions."),
        Result("normal_volume_flow", "qVn", "normal volume flow", Dimension.NormalVolumeFlow,
            "Volume of the flow as an ideal gas at 0 degC, 101.325 kPa (DIN 1343), its water vapour counted."),
        Result("standard_volume_flow", "qVs", "standard volume flow", Dimension.StandardVolumeFlow,
            "Volume of the flow as an ideal gas at 15 degC, 101.325 kPa (ISO 13443), its water vapour counted."),
        Result("isentropic_efficiency", "eta", "isentropic efficiency", Dimension.Ratio,
            "Kinetic energy reached over that of the isentropic expansion; for a diffuser the isentropic over the actual enthalpy rise."),
        Result("velocity_coefficient", "phi", "velocity coefficient", Dimension.Ratio, "Exit velocity over isentropic exit velocity."),
        Result("discharge_coefficient", "Cd", "discharge coefficient", Dimension.Ratio,
            "Mass flow over the isentropic flow of the throat."),
        Result("critical_pressure_ratio", "p*/p0", "critical pressure ratio", Dimension.Ratio,
            "Throat pressure at choking over inlet stagnation pressure."),
        Result("area_ratio", "A2/A1", "area ratio", Dimension.Ratio, "Exit area over inlet area."),
        Result("throat_area_ratio", "A2/At", "throat area ratio", Dimension.Ratio, "Exit area over throat area."),
        Result("convergent_length", "Lc", "length of the convergence", Dimension.Length, "Axial length from inlet to throat bore at the included angle."),
        Result("divergent_length", "Ld", "length of the divergence", Dimension.Length, "Axial length from throat to exit bore at the included angle."),
        Result("entropy_rise", "s2-s1", "entropy rise", Dimension.SpecificEntropy, "Entropy of the exit minus entropy of the inlet."),
        Result("exit_velocity_ideal", "V2s", "isentropic exit velocity", Dimension.Velocity,
            "Exit velocity of the isentropic expansion to the exit pressure."),
        Result("exit_velocity_range.least", "V2min", "least exit velocity", Dimension.Velocity,
            "Least exit velocity that a reading on the saturation line allows."),
        Result("exit_velocity_range.greatest", "V2max", "greatest exit velocity", Dimension.Velocity,
            "Greatest exit velocity that a reading on the saturation line allows."),
        Result("efficiency_range.least", "eta_min", "least efficiency", Dimension.Ratio,
            "Least isentropic efficiency that a reading on the saturation line allows."),
        Result("efficiency_range.greatest", "eta_max", "greatest efficiency", Dimension.Ratio,
            "Greatest isentropic efficiency that a reading on the saturation line allows."),
        Result("pressure_change", "p2-p1", "pressure change", Dimension.PressureDifference,
            "Exit static pressure minus inlet static pressure."),
        Result("stagnation_pressure_ratio", "p02/p01", "stagnation pressure ratio", Dimension.Ratio,
            "Exit stagnation pressure over inlet stagnation pressure."),
    ];

    /// <summary>Recovery, loss and coefficients.</summary>
    private static QuantityRow[] CoefficientRows() =>
    [
        Result("recovery", "Cp", "pressure-recovery coefficient", Dimension.Ratio,
            "Static pressure rise over inlet stagnation minus static pressure."),
        Result("recovery_dynamic", "Cpd", "dynamic pressure recovery", Dimension.Ratio,
            "Static pressure rise over half density times velocity squared at the inlet."),
        Result("ideal_recovery", "Cpi", "ideal recovery", Dimension.Ratio, "Recovery of the isentropic flow at the actual area ratio."),
        Result("effectiveness", "eps", "effectiveness", Dimension.Ratio, "Recovery over ideal recovery."),
        Result("loss_coefficient", "zeta", "loss coefficient", Dimension.Ratio,
            "Loss of stagnation pressure over the dynamic pressure of the narrower end."),
        Result("polytropic_efficiency", "etap", "polytropic efficiency", Dimension.Ratio,
            "Efficiency of an infinitely small step of the process."),
        Result("ideal_recovery_incompressible", "Cpi0", "ideal recovery, incompressible", Dimension.Ratio, "1 - 1/AR^2 at the actual area ratio."),
        Result("recovery_range.least", "Cp_min", "least recovery", Dimension.Ratio, "Estimated recovery less its uncertainty."),
        Result("recovery_range.greatest", "Cp_max", "greatest recovery", Dimension.Ratio, "Estimated recovery and its uncertainty, held to the ideal."),
        Result("sudden_expansion_recovery", "Cp_sudden", "recovery of a sudden expansion", Dimension.Ratio, "Recovery of a sudden expansion of the same area ratio."),
        Result("exit_loss", "zeta_exit", "dynamic pressure left at the exit", Dimension.Ratio,
            "Stagnation minus static pressure of the exit over that of the inlet: lost where the exit discharges into a space."),
        Result("reynolds_throat", "Re", "throat Reynolds number", Dimension.Ratio, "Reynolds number of the throat on its bore."),
    ];

    /// <summary>Forces, energy and limits of the back pressure.</summary>
    private static QuantityRow[] ForceAndLimitRows() =>
    [
        Result("thrust", "F", "thrust", Dimension.Force, "Momentum of the jet plus the excess of exit pressure over the surroundings."),
        Result("axial_force", "Fx", "axial force", Dimension.Force,
            "Force of the fluid on the device with ambient pressure outside, positive downstream."),
        Result("heat_rate", "Q", "heat rate", Dimension.HeatRate, "Heat added to the whole flow."),
        Result("lost_work", "wl", "lost work", Dimension.SpecificEnergy,
            "Ambient temperature times the entropy generated, per mass."),
        Result("back_pressure_limits.subsonic", "p_sub", "back pressure, choking up to", Dimension.Pressure,
            "Above this back pressure the throat is not choked."),
        Result("back_pressure_limits.shock_at_exit", "p_shock", "back pressure, shock at the exit", Dimension.Pressure,
            "Back pressure at which a normal shock stands in the exit plane."),
        Result("back_pressure_limits.full_expansion", "p_full", "back pressure, full expansion", Dimension.Pressure,
            "Back pressure equal to that of the supersonic exit plane."),
    ];

    /// <summary>The normal shock.</summary>
    private static QuantityRow[] ShockRows() =>
    [
        Result("shock.p_upstream", "p_up", "pressure before the shock", Dimension.Pressure, "Static pressure just before the shock."),
        Result("shock.p_downstream", "p_dn", "pressure behind the shock", Dimension.Pressure, "Static pressure just behind the shock."),
        Result("shock.M_upstream", "M_up", "Mach number before the shock", Dimension.Ratio, "Mach number just before the shock."),
        Result("shock.M_downstream", "M_dn", "Mach number behind the shock", Dimension.Ratio, "Mach number just behind the shock."),
        Result("shock.area_ratio", "As/At", "shock area ratio", Dimension.Ratio, "Area at the shock over throat area."),
        Result("shock.stagnation_pressure_ratio", "p0dn/p0up", "stagnation pressure ratio, shock", Dimension.Ratio,
            "Stagnation pressure behind the shock over that before it."),
        Result("jet.pressure_ratio", "p2/pb", "exit plane over back pressure", Dimension.Ratio, "Pressure in the exit plane over back pressure."),
        Result("jet.wave_angle", "beta", "shock angle at the lip", Dimension.Angle, "Angle of the oblique shock at the lip to the jet (overexpanded)."),
        Result("jet.turning_angle", "delta", "turning of the jet at the lip", Dimension.Angle,
            "Angle by which the jet turns at the lip: inwards overexpanded, outwards underexpanded."),
    ];

    /// <summary>A phase that is held past saturation.</summary>
    private static QuantityRow[] MetastableRows() =>
    [
        Result("metastable.undercooling", "dTu", "greatest undercooling", Dimension.TemperatureDifference,
            "Saturation temperature minus temperature of the held phase, in the exit or where it gives way before; negative is superheat of a liquid."),
        Result("metastable.supersaturation_ratio", "p/psat", "supersaturation ratio", Dimension.Ratio,
            "Pressure over saturation pressure at the temperature of the held phase there."),
        Result("metastable.equilibrium_flow", "qm_eq", "mass flow at equilibrium", Dimension.MassFlow,
            "Flow of the same nozzle with both phases in equilibrium."),
        Result("metastable.reverted_moisture", "y_rev", "moisture after reversion", Dimension.Ratio,
            "Moisture after the return to equilibrium at constant pressure, velocity and enthalpy."),
        Result("metastable.flux_change", "G/G", "mass flux after reversion", Dimension.Ratio,
            "Mass flux behind the return to equilibrium over that before it: the duct would have to widen by its inverse."),
        Result("metastable.onset_pressure", "p_on", "pressure at the onset", Dimension.Pressure,
            "Where the held phase gives way inside the nozzle."),
        Result("metastable.onset_area_ratio", "A_on/At", "section at the onset", Dimension.Ratio,
            "Section where the held phase gives way over the throat."),
    ];

    /// <summary>What only a diffuser has.</summary>
    private static QuantityRow[] DiffuserRows() =>
    [
        Result("form.length", "N", "axial length", Dimension.Length, "Axial length of the diffuser."),
        Result("form.included_angle", "2theta", "included angle", Dimension.Angle, "Angle between the diverging walls; of the cone of the same areas and length where it is none."),
        Result("form.relative_length", "N/R1", "relative axial length", Dimension.Ratio,
            "Over the inlet radius of a cone, the inlet width of a planar diffuser."),
        Result("form.friction_factor", "f", "Darcy friction factor", Dimension.Ratio, "Of the inlet, as the estimated loss uses it."),
        Result("stall.angle", "2theta_s", "included angle of first stall", Dimension.Angle, "Angle up to which such a diffuser is met unstalled."),
        Result("stall.margin", "m_s", "stall margin", Dimension.Ratio, "Angle of first stall over the angle, less one: below zero past it."),
        Result("best.area_ratio", "AR_best", "best area ratio at this length", Dimension.Ratio, "Area ratio of the cone of greatest recovery at this length, by the equation of Idelchik."),
        Result("best.recovery", "Cp_best", "its recovery", Dimension.Ratio, "Recovery of the best area ratio at this length, incompressible."),
        Result("best.included_angle", "2theta_best", "best angle at this area ratio", Dimension.Angle, "Included angle of least loss at this area ratio, by the equation of Idelchik."),
        Result("best.relative_length", "N/R1_best", "its length over inlet radius", Dimension.Ratio, "Axial length of the best angle over the inlet radius."),
        Result("best.measured", "Cp_meas", "greatest measured at this blockage", Dimension.Ratio, "Greatest recovery measured at this inlet blockage, whatever the geometry."),
        Result("supersonic.starting_area_ratio", "At/A1", "throat over inlet, self-starting", Dimension.Ratio,
            "Least throat area over inlet area through which the supersonic stream starts by itself."),
        Result("supersonic.isentropic_area_ratio", "At*/A1", "throat over inlet, isentropic", Dimension.Ratio, "Throat area over inlet area at which the started stream is sonic there."),
        Result("supersonic.standard_recovery", "pi_std", "standard ram recovery", Dimension.Ratio, "Stagnation pressure ratio of the standard schedule at the inlet Mach number."),
        Result("supersonic.pitot_pressure", "p_pitot", "pitot pressure", Dimension.Pressure, "Stagnation pressure behind a normal shock in the inlet stream: the reading of a pitot tube."),
        Result("cavitation.margin", "p-pv", "margin to the vapour pressure", Dimension.PressureDifference, "Lowest static pressure minus vapour pressure of the liquid."),
        Result("cavitation.number", "sigma_c", "cavitation number", Dimension.Ratio, "That margin over the inlet dynamic pressure."),
        Result("venturi.throat_drop", "p1-pt", "pressure drop to the throat", Dimension.PressureDifference, "Inlet static pressure minus that of the throat."),
        Result("venturi.permanent_loss", "p1-p2", "permanent pressure loss", Dimension.PressureDifference, "Inlet static pressure minus that of the exit."),
        Result("venturi.loss_over_drop", "loss/drop", "permanent loss over drop", Dimension.Ratio, "Permanent pressure loss over the drop to the throat."),
        Result("venturi.choking_pressure_ratio", "p2*/p0", "choking pressure ratio", Dimension.Ratio, "Exit pressure over inlet stagnation pressure at which the throat just chokes."),
    ];

    private static QuantityRow Result(
        string key, string symbol, string name, Dimension dimension, string help, bool isText = false) => new()
        {
            Key = key,
            Symbol = symbol.Length == 0 ? key : symbol,
            Name = name,
            Dimension = dimension,
            Kind = QuantityKind.Performance,
            JsonKey = key,
            IsText = isText,
            Help = help,
        };
}
