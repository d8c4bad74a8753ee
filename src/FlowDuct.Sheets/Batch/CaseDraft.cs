using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>A case while its figures come in, and used again for the next row.</summary>
internal sealed class CaseDraft
{
    private CaseFrame _made;
    private DeviceCase? _case;
    private GivenSlots _at;
    private GivenSlots _ambient;
    private CaseFrame _frame = new();
    private DeviceCase _slots = Empty();

    /// <summary>What the row asks about.</summary>
    internal SheetDevice Device { get; set; }

    /// <summary>Choices that were given, a bit each.</summary>
    internal int Choices { get; set; }

    internal ref CaseFrame Frame => ref _frame;

    /// <summary>The figures of the one station of a property question.</summary>
    internal ref GivenSlots At => ref _at;

    internal ref GivenSlots Ambient => ref _ambient;

    internal ref GivenSlots Options => ref _slots.Options;

    /// <summary>The figures of a station or space.</summary>
    internal ref GivenSlots Of(StationLists list)
    {
        switch (list)
        {
            case StationLists.Inlet: return ref _slots.Inlet;
            case StationLists.Throat: return ref _slots.Throat;
            case StationLists.Exit: return ref _slots.Exit;
            case StationLists.Back: return ref _slots.Back;
            case StationLists.Ambient: return ref _ambient;
            case StationLists.At: return ref _at;
            default: return ref _slots.Options;
        }
    }

    /// <summary>Forgets the row before.</summary>
    internal void Begin()
    {
        _frame = new CaseFrame();
        Choices = 0;
        _slots.Inlet.Empty();
        _slots.Throat.Empty();
        _slots.Exit.Empty();
        _slots.Back.Empty();
        _slots.Options.Empty();
        _at.Empty();
        _ambient.Empty();
    }

    /// <summary>The case of a nozzle or diffuser; valid until the next row begins.</summary>
    internal DeviceCase Case()
    {
        if (_case is null || _frame != _made) (_case, _made) = (Make(), _frame);
        _slots = _case;
        return _case;
    }

    private static DeviceCase Empty() => new() { Device = DeviceKind.Nozzle, Fluid = null! };

    private DeviceCase Make() => _slots with
    {
        Device = _frame.Device,
        Fluid = _frame.Fluid!,
        Shape = _frame.Shape,
        Branch = _frame.Branch,
        Expansion = _frame.Expansion,
        DischargeCorrelation = _frame.Correlation,
        LossWord = _frame.LossWord,
        RecoveryBasis = _frame.RecoveryBasis,
        AmbientPressure = _frame.AmbientPressure,
        AmbientTemperature = _frame.AmbientTemperature,
        AmbientGiven = _frame.AmbientGiven,
        AmbientAltitude = _frame.Altitude,
        FlowReference = _frame.FlowReference,
        FlowIsVolume = _frame.FlowIsVolume,
        OnsetIsDifference = _frame.OnsetIsDifference,
        UsesGauge = _frame.UsesGauge,
    };
}
