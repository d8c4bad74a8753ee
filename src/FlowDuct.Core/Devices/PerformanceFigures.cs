namespace FlowDuct.Devices;

/// <summary>Reads the numbers of a <see cref="Performance"/> by their key in the catalogue of quantities.</summary>
internal static class PerformanceFigures
{
    /// <summary>Every number that is worked out, by key; what the catalogue names beside these is not worked out yet and is null.</summary>
    internal static readonly (string Key, Func<Performance, double?> Read)[] All =
    [
        ("mass_flow", p => p.MassFlow),
        ("volume_flow", p => p.VolumeFlow),
        ("normal_volume_flow", p => p.NormalVolumeFlow),
        ("standard_volume_flow", p => p.StandardVolumeFlow),
        ("isentropic_efficiency", p => p.IsentropicEfficiency),
        ("velocity_coefficient", p => p.VelocityCoefficient),
        ("discharge_coefficient", p => p.DischargeCoefficient),
        ("critical_pressure_ratio", p => p.CriticalPressureRatio),
        ("area_ratio", p => p.AreaRatio),
        ("throat_area_ratio", p => p.ThroatAreaRatio),
        ("convergent_length", p => p.ConvergentLength),
        ("divergent_length", p => p.DivergentLength),
        ("entropy_rise", p => p.EntropyRise),
        ("exit_velocity_ideal", p => p.ExitVelocityIdeal),
        ("exit_velocity_range.least", p => p.ExitVelocityRange?.Least),
        ("exit_velocity_range.greatest", p => p.ExitVelocityRange?.Greatest),
        ("efficiency_range.least", p => p.EfficiencyRange?.Least),
        ("efficiency_range.greatest", p => p.EfficiencyRange?.Greatest),
        ("pressure_change", p => p.PressureChange),
        ("stagnation_pressure_ratio", p => p.StagnationPressureRatio),
        ("recovery", p => p.Recovery),
        ("recovery_dynamic", p => p.RecoveryDynamic),
        ("ideal_recovery", p => p.IdealRecovery),
        ("effectiveness", p => p.Effectiveness),
        ("loss_coefficient", p => p.LossCoefficient),
        ("polytropic_efficiency", p => p.PolytropicEfficiency),
        ("ideal_recovery_incompressible", p => p.Diffuser?.IdealIncompressible),
        ("recovery_range.least", p => p.Diffuser?.RecoveryRange?.Least),
        ("recovery_range.greatest", p => p.Diffuser?.RecoveryRange?.Greatest),
        ("sudden_expansion_recovery", p => p.Diffuser?.SuddenExpansion),
        ("exit_loss", p => p.Diffuser?.ExitLoss),
        ("form.length", p => p.Diffuser?.Length),
        ("form.included_angle", p => p.Diffuser?.IncludedAngle),
        ("form.relative_length", p => p.Diffuser?.RelativeLength),
        ("form.friction_factor", p => p.Diffuser?.FrictionFactor),
        ("stall.angle", p => p.Diffuser?.Stall?.Angle),
        ("stall.margin", p => p.Diffuser?.StallMargin),
        ("best.area_ratio", p => p.Diffuser?.Best?.AreaRatio),
        ("best.recovery", p => p.Diffuser?.Best?.Recovery),
        ("best.included_angle", p => p.Diffuser?.Best?.Angle),
        ("best.relative_length", p => p.Diffuser?.Best?.RelativeLength),
        ("best.measured", p => p.Diffuser?.GreatestMeasured),
        ("supersonic.starting_area_ratio", p => p.Diffuser?.Starting?.SelfStarting),
        ("supersonic.isentropic_area_ratio", p => p.Diffuser?.Starting?.Isentropic),
        ("supersonic.standard_recovery", p => p.Diffuser?.StandardRecovery),
        ("supersonic.pitot_pressure", p => p.Diffuser?.PitotPressure),
        ("cavitation.margin", p => p.Diffuser?.CavitationMargin),
        ("cavitation.number", p => p.Diffuser?.CavitationNumber),
        ("venturi.throat_drop", p => p.Venturi?.ThroatDrop),
        ("venturi.permanent_loss", p => p.Venturi?.PermanentLoss),
        ("venturi.loss_over_drop", p => p.Venturi?.LossOverDrop),
        ("venturi.choking_pressure_ratio", p => p.Venturi?.ChokingRatio),
        ("thrust", p => p.Thrust),
        ("axial_force", p => p.AxialForce),
        ("heat_rate", p => p.HeatRate),
        ("lost_work", p => p.LostWork),
        ("reynolds_throat", p => p.ReynoldsThroat),
        ("back_pressure_limits.subsonic", p => p.Limits.Subsonic),
        ("back_pressure_limits.shock_at_exit", p => p.Limits.ShockAtExit),
        ("back_pressure_limits.full_expansion", p => p.Limits.FullExpansion),
        ("shock.p_upstream", p => p.Shock?.Upstream.p),
        ("shock.p_downstream", p => p.Shock?.Downstream.p),
        ("shock.M_upstream", p => p.Shock?.V1 / p.Shock?.Upstream.w),
        ("shock.M_downstream", p => p.Shock?.V2 / p.Shock?.Downstream.w),
        ("shock.area_ratio", p => p.Shock?.AreaRatio),
        ("shock.stagnation_pressure_ratio", p => p.ShockStagnationPressureRatio),
        ("jet.pressure_ratio", p => p.Jet?.PressureRatio),
        ("jet.wave_angle", p => p.Jet?.WaveAngle),
        ("jet.turning_angle", p => p.Jet?.TurningAngle),
        ("metastable.undercooling", p => p.Metastable?.Undercooling),
        ("metastable.supersaturation_ratio", p => p.Metastable?.SupersaturationRatio),
        ("metastable.equilibrium_flow", p => p.Metastable?.EquilibriumFlow),
        ("metastable.reverted_moisture", p => p.Metastable?.RevertedMoisture),
        ("metastable.flux_change", p => p.Metastable?.FluxChange),
        ("metastable.onset_pressure", p => p.Metastable?.OnsetPressure),
        ("metastable.onset_area_ratio", p => p.Metastable?.OnsetAreaRatio),
    ];

    /// <summary>The number of a key, or null where it cannot be known.</summary>
    internal static double? Read(Performance performance, string key)
    {
        foreach ((string known, Func<Performance, double?> read) in All)
        {
            if (known == key) return read(performance);
        }

        return null;
    }
}
