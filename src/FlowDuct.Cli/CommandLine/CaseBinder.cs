using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Turns typed options into a case: units are applied here, once.</summary>
internal sealed class CaseBinder
{
    private readonly Arguments _arguments;
    private bool _usesGauge;

    internal CaseBinder(Arguments arguments)
    {
        _arguments = arguments;
        ReadAmbient();
    }

    internal double AmbientPressure { get; private set; } = 101325;

    private double AmbientTemperature { get; set; } = 288.15;

    private AmbientAltitude? AmbientAltitude { get; set; }

    /// <summary>The fluid by its name or composition.</summary>
    internal Fluid Fluid()
    {
        string name = _arguments.Value("--fluid")!;
        FractionBasis basis = Choice("--fractions", FractionBasis.Mole, ("mole", FractionBasis.Mole), ("mass", FractionBasis.Mass));
        if (FluidCatalogue.Find(name, basis) is Fluid fluid) return RefuseIdleFractions(fluid);
        string? near = Usage.Nearest(name, FluidCatalogue.Words);
        throw Usage.Refuse("--fluid", $"{Echo.Ascii(name)} is not a fluid of this version", near is null ? "flowduct fluids lists them" : $"did you mean {near}?");
    }

    /// <summary>The slots of a property question.</summary>
    internal GivenSlots At()
    {
        GivenSlots slots = default;
        Fill(ref slots, "--at", Station.At);
        return slots;
    }

    /// <summary>The case of a device.</summary>
    internal DeviceCase Device(DeviceKind kind)
    {
        Fluid fluid = Fluid();
        GivenSlots inlet = default, exit = default;
        Fill(ref inlet, "--inlet", Station.Inlet);
        if (_arguments.Has("--exit")) Fill(ref exit, "--exit", Station.Exit);
        (GivenSlots options, bool flowIsVolume) = Options(fluid);
        var c = new DeviceCase
        {
            Device = kind,
            Fluid = fluid,
            Shape = Choice("--shape", NozzleShape.Auto, ("convergent", NozzleShape.Convergent), ("convergent-divergent", NozzleShape.ConvergentDivergent)),
            Branch = Choice("--branch", Branch.Ask, ("subsonic", Branch.Subsonic), ("supersonic", Branch.Supersonic)),
            RecoveryBasis = Choice("--recovery-basis", RecoveryBasis.Stagnation, ("stagnation", RecoveryBasis.Stagnation), ("dynamic", RecoveryBasis.Dynamic)),
            AmbientPressure = AmbientPressure,
            AmbientTemperature = AmbientTemperature,
            AmbientGiven = _arguments.Has("--ambient"),
            AmbientAltitude = AmbientAltitude,
            UsesGauge = _usesGauge,
            FlowIsVolume = flowIsVolume,
        };
        (c.Inlet, c.Exit, c.Options) = (inlet, exit, options);
        return c;
    }

    /// <summary>One of a few words, or the default where the option is not given.</summary>
    internal T Choice<T>(string option, T otherwise, params (string Word, T Value)[] choices)
    {
        if (_arguments.Value(option) is not string typed) return otherwise;
        foreach ((string word, T value) in choices)
        {
            if (word == typed) return value;
        }

        throw Usage.NotOneOf(option, typed, [.. choices.Select(choice => choice.Word)]);
    }

    private Fluid RefuseIdleFractions(Fluid fluid) => !_arguments.Has("--fractions") || fluid is IdealGas { Mixture: not null }
        ? fluid
        : throw Usage.Refuse("--fractions", $"{fluid.Name} is no mixture and has no fractions", "leave it out, or give --fluid such as N2=0.72,CO2=0.13,H2O=0.15");

    private void ReadAmbient()
    {
        if (_arguments.Value("--ambient") is not string list) return;
        bool p = false, T = false;
        double? altitude = null;
        foreach (StationItem item in StationListParser.Parse("--ambient", Station.Ambient, list, AmbientPressure))
        {
            if (item.Slot == StationSymbol.Pressure) (AmbientPressure, p) = (item.Value.Si, true);
            else if (item.Slot == StationSymbol.Temperature) (AmbientTemperature, T) = (item.Value.Si, true);
            else altitude = item.Value.Si;
        }

        if (altitude is double z) StandAt(z, p, T);
    }

    // The altitude stands in for what is not typed beside it. The list has refused one outside the atmosphere.
    private void StandAt(double z, bool pressureTyped, bool temperatureTyped)
    {
        if (!StandardAtmosphere.TryAtAltitude(z, out double p, out double T)) return;
        if (!pressureTyped) AmbientPressure = p;
        if (!temperatureTyped) AmbientTemperature = T;
        AmbientAltitude = new AmbientAltitude(z, !pressureTyped, !temperatureTyped);
    }

    private void Fill(ref GivenSlots slots, string option, Station station)
    {
        foreach (StationItem item in StationListParser.Parse(option, station, _arguments.Value(option)!, AmbientPressure))
        {
            slots.Set((int)item.Slot, item.Value.Si, item.Value.HalfWidth);
            _usesGauge |= item.Value.WasGauge;
        }
    }

    private (GivenSlots Options, bool FlowIsVolume) Options(Fluid fluid)
    {
        GivenSlots slots = default;
        bool volume = false;
        foreach (QuantityRow row in QuantityCatalogue.Options)
        {
            string name = "--" + row.Word;
            if (row.OptionSlot is not CaseOption option || _arguments.Value(name) is not string text) continue;
            GivenValue value = ValueParser.Parse(name, row, text, AmbientPressure);
            double size = option switch
            {
                CaseOption.Flow => AmountToMass(fluid, value.Unit.Dimension),
                CaseOption.Heat or CaseOption.HeatLoss when value.Unit.Dimension == Dimension.HeatRate => 1 / MassFlow(name, slots, volume),
                _ => 1,
            };
            volume |= option == CaseOption.Flow && value.Unit.Dimension == Dimension.VolumeFlow;
            slots.Set((int)option, value.Si * size, value.HalfWidth * size);
        }

        RefuseRecoveryAboveOne(slots);
        return (slots, volume);
    }

    // On the stagnation head a recovery of one stops the flow; on the dynamic head compressibility adds a little.
    private void RefuseRecoveryAboveOne(in GivenSlots slots)
    {
        bool dynamic = _arguments.Value("--recovery-basis") == "dynamic";
        if (!dynamic && slots.Has((int)CaseOption.Recovery) && slots.Value((int)CaseOption.Recovery) > 1)
            throw Usage.Refuse("--recovery", $"{_arguments.Value("--recovery")} is above 1, the recovery of a flow brought to rest without loss", "give a ratio up to 1, or --recovery-basis dynamic");
    }

    private static double AmountToMass(Fluid fluid, Dimension dimension)
    {
        if (dimension is not (Dimension.NormalVolumeFlow or Dimension.StandardVolumeFlow)) return 1;
        return ReferenceVolume.Density(fluid, dimension) ?? throw Usage.Refuse(
            "--flow", $"normal and standard volumes are amounts of ideal gas, and {fluid.Name} is none", "give a mass flow, or an actual volume flow in m3/h");
    }

    // Options come in the order of the catalogue, in which the flow stands before the heat.
    private static double MassFlow(string name, in GivenSlots slots, bool volume) => slots.Has((int)CaseOption.Flow) && !volume
        ? slots.Value((int)CaseOption.Flow)
        : throw Usage.Refuse(name, "a heat rate needs the mass flow that takes it", "add --flow in kg/s, or give the heat in kJ/kg");
}
