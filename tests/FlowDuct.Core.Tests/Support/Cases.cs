using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Quantities;

namespace FlowDuct.Core.Tests.Support;

/// <summary>Builds cases from the same station lists that the command line takes.</summary>
internal static class Cases
{
    internal const double Ambient = 101325;

    internal static DeviceCase Nozzle(Fluid fluid, string inlet, string exit, params (CaseOption Option, string Value)[] options) =>
        Build(new DeviceCase { Device = DeviceKind.Nozzle, Fluid = fluid }, inlet, exit, options);

    internal static DeviceCase Diffuser(Fluid fluid, string inlet, string exit, params (CaseOption Option, string Value)[] options) =>
        Build(new DeviceCase { Device = DeviceKind.Diffuser, Fluid = fluid }, inlet, exit, options);

    internal static DeviceCase Build(DeviceCase c, string inlet, string exit, params (CaseOption Option, string Value)[] options)
    {
        if (inlet.Length > 0) Fill(ref c.Inlet, Station.Inlet, inlet);
        if (exit.Length > 0) Fill(ref c.Exit, Station.Exit, exit);
        foreach ((CaseOption option, string value) in options)
        {
            GivenValue given = ValueParser.Parse("--option", QuantityCatalogue.Of(option), value, Ambient);
            c.Options.Set((int)option, given.Si, given.HalfWidth);
        }

        return c;
    }

    /// <summary>A nozzle by its sections: lists of inlet, throat, exit and the space beyond, empty where nothing is given.</summary>
    internal static DeviceCase Rated(
        Fluid fluid, string inlet, string throat, string exit, string back, params (CaseOption Option, string Value)[] options)
    {
        DeviceCase c = Nozzle(fluid, inlet, exit, options);
        if (throat.Length > 0) Fill(ref c.Throat, Station.Throat, throat);
        if (back.Length > 0) Fill(ref c.Back, StationLists.Back, back);
        return c;
    }

    internal static GivenSlots At(string list)
    {
        GivenSlots slots = default;
        Fill(ref slots, Station.At, list);
        return slots;
    }

    /// <summary>A case from exact SI numbers, without any printed rounding.</summary>
    internal static DeviceCase Exact(
        DeviceKind device, Fluid fluid, (StationSymbol Symbol, double Value)[] inlet, (StationSymbol Symbol, double Value)[] exit,
        params (CaseOption Option, double Value)[] options)
    {
        var c = new DeviceCase { Device = device, Fluid = fluid };
        foreach ((StationSymbol symbol, double value) in inlet) c.Inlet.Set((int)symbol, value);
        foreach ((StationSymbol symbol, double value) in exit) c.Exit.Set((int)symbol, value);
        foreach ((CaseOption option, double value) in options) c.Options.Set((int)option, value);
        return c;
    }

    private static void Fill(ref GivenSlots slots, Station station, string list) => Fill(ref slots, station.ToList(), list);

    private static void Fill(ref GivenSlots slots, StationLists station, string list)
    {
        foreach (StationItem item in StationListParser.Parse("--" + station.ToString().ToUpperInvariant(), station, list, Ambient))
            slots.Set(item);
    }
}
