using System.Globalization;
using FlowDuct.Devices;
using FlowDuct.Devices.Coefficients;
using FlowDuct.Devices.Diffusers;
using FlowDuct.Devices.Inverse;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using FlowDuct.Sheets;

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
        if (Mixtures() is IReadOnlyDictionary<string, Fluid> mixtures && mixtures.TryGetValue(name, out Fluid? named)) return _arguments.Has("--fractions") ? RefuseIdleFractions(named, name) : ByEquation(name, named);
        if (FluidCatalogue.Find(name, basis) is Fluid fluid) return ByEquation(name, RefuseIdleFractions(fluid));
        string? near = Usage.Nearest(name, FluidCatalogue.Words);
        throw Usage.Refuse("--fluid", $"{Echo.Ascii(name)} is not a fluid of this version", near is null ? "flowduct fluids lists them" : $"did you mean {near}?");
    }

    /// <summary>Mixtures under names of the user's own; null where no file is given.</summary>
    internal IReadOnlyDictionary<string, Fluid>? Mixtures()
    {
        if (_arguments.Value("--mixtures") is not string file) return null;
        try
        {
            using var content = new FileStream(file, FileMode.Open, FileAccess.Read, FileShare.ReadWrite);
            return MixtureFile.Read(Echo.Ascii(file), content);
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException or NotSupportedException or ArgumentException)
        {
            string reason = failure is FileNotFoundException ? "there is no such file" : OutputFile.Reason(failure);
            throw Usage.Refuse("--mixtures", $"{Echo.Ascii(file)} could not be read: {reason}", "check the name");
        }
    }

    /// <summary>The slots of a property question.</summary>
    internal GivenSlots At()
    {
        GivenSlots slots = default;
        Fill(ref slots, "--at", Station.At);
        return slots;
    }

    /// <summary>The range of a property question, with the slots that stay; null where it asks for one state.</summary>
    internal (StationRange Range, GivenSlots Fixed)? AtRange()
    {
        if (StationRange.Find("--at", StationLists.At, _arguments.Value("--at")!, AmbientPressure) is not StationRange range) return null;
        GivenSlots slots = default;
        if (range.Rest.Length > 0) Fill(ref slots, "--at", StationLists.At, range.Rest);
        return slots.Has((int)range.Row.StationSlot!.Value) ? throw Usage.Refuse("--at", $"{range.Row.Symbol} is given twice", string.Empty) : (range, slots);
    }

    /// <summary>The case of a device.</summary>
    internal DeviceCase Device(DeviceKind kind)
    {
        Fluid fluid = Fluid();
        GivenSlots inlet = default, exit = default, throat = default, back = default;
        Fill(ref inlet, "--inlet", Station.Inlet);
        if (_arguments.Has("--exit")) Fill(ref exit, "--exit", Station.Exit);
        if (_arguments.Has("--throat")) Fill(ref throat, "--throat", Station.Throat);
        if (_arguments.Has("--back")) Fill(ref back, "--back", StationLists.Back);
        FlowReference? reference = new FlowReferenceReader("--flow", "--reference-state").Read(_arguments.Value("--flow"), _arguments.Value("--reference-state"), fluid);
        RefuseHeatRateOfUnknownMass(reference, fluid);
        (GivenSlots options, bool flowIsVolume, bool onsetIsDifference) = Options(reference?.MassPerVolume(fluid) ?? 1, kind != DeviceKind.Nozzle);
        var c = new DeviceCase
        {
            Device = kind,
            Fluid = fluid,
            Shape = Choice("--shape", NozzleShape.Auto, ("convergent", NozzleShape.Convergent), ("convergent-divergent", NozzleShape.ConvergentDivergent)),
            Branch = RootNumber is null ? Choice("--branch", Branch.Ask, ("subsonic", Branch.Subsonic), ("supersonic", Branch.Supersonic)) : Branch.Ask,
            DischargeCorrelation = Correlation,
            Expansion = Choice(
                "--expansion", ExpansionModel.Equilibrium, ("equilibrium", ExpansionModel.Equilibrium), ("supersaturated", ExpansionModel.Supersaturated),
                ("single-phase", ExpansionModel.SinglePhase)),
            LossWord = kind != DeviceKind.Nozzle ? LossWord : null,
            RecoveryBasis = Choice("--recovery-basis", RecoveryBasis.Stagnation, ("stagnation", RecoveryBasis.Stagnation), ("dynamic", RecoveryBasis.Dynamic)),
            AmbientPressure = AmbientPressure,
            AmbientTemperature = AmbientTemperature,
            AmbientGiven = _arguments.Has("--ambient"),
            AmbientAltitude = AmbientAltitude,
            UsesGauge = _usesGauge,
            FlowIsVolume = flowIsVolume,
            FlowReference = reference,
            OnsetIsDifference = onsetIsDifference,
        };
        (c.Inlet, c.Exit, c.Options, c.Throat, c.Back) = (inlet, exit, options, throat, back);
        return c;
    }

    /// <summary>The number of the answer chosen among several, counted from 1; null where --branch is a word or not given.</summary>
    internal int? RootNumber => _arguments.Has("--find") && int.TryParse(_arguments.Value("--branch"), NumberStyles.None, CultureInfo.InvariantCulture, out int number) ? number : null;

    // A name stands where a number could.
    private DischargeCorrelation? Correlation
    {
        get
        {
            if (_arguments.Value("--discharge-coefficient") is not string text || text.Length == 0 || !char.IsAsciiLetter(text[0])) return null;
            return DischargeCorrelation.Find(text) ?? throw Usage.NotOneOf("--discharge-coefficient", text, ["a number", .. DischargeCorrelation.All.Select(row => row.Name)]);
        }
    }

    private string? LossWord
    {
        get
        {
            if (_arguments.Value("--loss-coefficient") is not string text || text.Length == 0 || !char.IsAsciiLetter(text[0])) return null;
            return DiffuserLoss.Words.Contains(text) ? text : throw Usage.NotOneOf("--loss-coefficient", text, ["a number", .. DiffuserLoss.Words]);
        }
    }

    /// <summary>What is asked backwards; null where nothing is.</summary>
    internal InverseQuestion? Question()
    {
        if (!_arguments.Has("--find") && !_arguments.Has("--target")) return null;
        string name = _arguments.Value("--find") ?? throw Usage.Refuse("--target", "a target needs the figure that may move", "add --find, for example --find back.p");
        string target = _arguments.Value("--target") ?? throw Usage.Refuse("--find", "nothing says what the figure has to reach", "add --target, for example --target \"shock.area_ratio=1.5\"");
        CaseSlot unknown = CaseSlot.Find(name.Replace('-', '_')) ?? throw Usage.Refuse("--find", $"{Echo.Ascii(name)} is no figure of a case", "write for example inlet.p0, back.p, exit.d, throat.d, efficiency, flow");
        int equals = target.IndexOf('=', StringComparison.Ordinal);
        string left = equals < 0 ? target : target[..equals].Trim();
        ResultName result = ResultName.Find(left) ?? throw Usage.Refuse("--target", $"{Echo.Ascii(left)} is no result", "write for example mass_flow, exit.V, shock.area_ratio, throat.p");
        if (equals < 0) throw Usage.Refuse("--target", $"{Echo.Ascii(target)} has no value", $"write for example --target \"{left}=...\" with its unit");
        GivenValue value = ValueParser.Parse(new ValueContext("--target", result.Row, left + "="), target[(equals + 1)..].Trim(), AmbientPressure);
        return new InverseQuestion(unknown, result, value.Si);
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

    private static Fluid RefuseIdleFractions(Fluid fluid, string name) => throw Usage.Refuse(
        "--fractions", $"the file of mixtures says what the fractions of {Echo.Ascii(name)} ({fluid.Name}) count", "leave it out, or write mass in the column fractions");

    private Fluid RefuseIdleFractions(Fluid fluid) => !_arguments.Has("--fractions") || fluid is IdealGas { Mixture.IsHumidAir: false }
        ? fluid
        : throw Usage.Refuse("--fractions", $"{fluid.Name} is no mixture and has no fractions", "leave it out, or give --fluid such as N2=0.72,CO2=0.13,H2O=0.15");

    private Fluid ByEquation(string name, Fluid fluid)
    {
        EquationOfState chosen = Choice("--equation-of-state", EquationOfState.Ideal, ("ideal", EquationOfState.Ideal), ("reference", EquationOfState.Reference));
        if (!_arguments.Has("--equation-of-state")) return fluid;
        if (fluid is not IdealGas) throw Usage.Refuse("--equation-of-state", $"{fluid.Name} has one equation of state here, {fluid.Source}", "leave it out");
        if (chosen == EquationOfState.Ideal) return fluid;
        return ReferenceEquations.Find(name) ?? throw Usage.Refuse(
            "--equation-of-state", $"{Echo.Ascii(name)} has no reference equation of state here", $"leave it out for an ideal gas; {string.Join(", ", ReferenceEquations.Names)} have one");
    }

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

    private void Fill(ref GivenSlots slots, string option, Station station) => Fill(ref slots, option, station.ToList());

    private void Fill(ref GivenSlots slots, string option, StationLists list) => Fill(ref slots, option, list, _arguments.Value(option)!);

    private void Fill(ref GivenSlots slots, string option, StationLists list, string text)
    {
        foreach (StationItem item in StationListParser.Parse(option, list, text, AmbientPressure))
        {
            slots.Set(item);
            _usesGauge |= item.Value.WasGauge;
        }
    }

    private (GivenSlots Options, bool FlowIsVolume, bool OnsetIsDifference) Options(double massPerVolume, bool isDiffuser)
    {
        GivenSlots slots = default;
        bool volume = false, difference = false;
        foreach (QuantityRow row in QuantityCatalogue.Options)
        {
            string name = "--" + row.Word;
            if (row.OptionSlot is not CaseOption option || _arguments.Value(name) is not string typed) continue;
            string text = option == CaseOption.Flow ? FlowReferenceReader.WithoutMoisture(typed) : typed;
            if ((option == CaseOption.DischargeCoefficient && Correlation is not null) || (option == CaseOption.LossCoefficient && isDiffuser && LossWord is not null)) continue;
            GivenValue value = ValueParser.Parse(name, row, text, AmbientPressure);
            double size = option switch
            {
                CaseOption.Flow => massPerVolume,
                CaseOption.Heat or CaseOption.HeatLoss when value.Unit.Dimension == Dimension.HeatRate => 1 / OptionRules.MassFlowBeside(name, slots, volume),
                _ => 1,
            };
            volume |= option == CaseOption.Flow && value.Unit.Dimension == Dimension.VolumeFlow;
            difference |= option == CaseOption.Onset && value.Unit.Dimension == Dimension.TemperatureDifference;
            slots.Set((int)option, value.Si * size, value.HalfWidth * size);
        }

        OptionRules.RequireRecovery("--recovery", slots, _arguments.Value("--recovery-basis") == "dynamic");
        return (slots, volume, difference);
    }

    // The mass that goes with a reference volume of humid air is known only once the inlet is.
    private void RefuseHeatRateOfUnknownMass(FlowReference? reference, Fluid fluid)
    {
        if (reference is null) return;
        foreach (string option in (string[])["--heat", "--heat-loss"])
        {
            if (_arguments.Value(option) is string text && ValueParser.Parse(option, QuantityCatalogue.Of(CaseOption.Heat), text, AmbientPressure).Unit.Dimension == Dimension.HeatRate)
                OptionRules.RequireKnownMass(option, reference, fluid);
        }
    }
}
