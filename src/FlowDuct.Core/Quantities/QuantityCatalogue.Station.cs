using FlowDuct.Fluids.Gases;

namespace FlowDuct.Quantities;

/// <content>Quantities of a section: flow, size, and pressures told relative to the inlet.</content>
internal static partial class QuantityCatalogue
{
    /// <summary>Velocity and size of a section.</summary>
    private static QuantityRow[] FlowRows() =>
    [
        new()
        {
            Key = "V",
            Symbol = "V",
            Word = "velocity",
            Name = "velocity",
            Dimension = Dimension.Velocity,
            Kind = QuantityKind.Both,
            StationSlot = StationSymbol.Velocity,
            TakenBy = StationLists.Inlet | StationLists.Throat | StationLists.Exit | StationLists.At,
            JsonKey = "V",
            Limits = QuantityLimits.NotNegative,
            Help = "Mean velocity through the section.",
            Example = "V=25 m/s",
        },
        new()
        {
            Key = "M",
            Symbol = "M",
            Word = "mach",
            Name = "Mach number",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.Both,
            StationSlot = StationSymbol.Mach,
            TakenBy = StationLists.Inlet | StationLists.Throat | StationLists.Exit | StationLists.At,
            JsonKey = "M",
            Limits = QuantityLimits.NotNegative,
            Help = "Velocity over the speed of sound.",
            Example = "M=0.3",
        },
        new()
        {
            Key = "A",
            Symbol = "A",
            Word = "area",
            Name = "area",
            Dimension = Dimension.Area,
            Kind = QuantityKind.Both,
            StationSlot = StationSymbol.Area,
            TakenBy = StationLists.Inlet | StationLists.Throat | StationLists.Exit,
            JsonKey = "A",
            Limits = QuantityLimits.Positive,
            Help = "Clear area normal to the flow, of one opening.",
            Example = "A=450 mm2",
        },
        new()
        {
            Key = "d",
            Symbol = "d",
            Word = "diameter",
            Name = "diameter",
            Dimension = Dimension.Length,
            Kind = QuantityKind.Both,
            StationSlot = StationSymbol.Diameter,
            TakenBy = StationLists.Inlet | StationLists.Throat | StationLists.Exit,
            JsonKey = "d",
            Limits = QuantityLimits.Positive,
            Help = "Circular bore of one opening.",
            Example = "d=18 mm",
        },
        new()
        {
            Key = "n",
            Symbol = "n",
            Name = "number of openings",
            Dimension = Dimension.Count,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.Openings,
            TakenBy = StationLists.Inlet | StationLists.Throat | StationLists.Exit,
            JsonKey = "n",
            Limits = new QuantityLimits(1, 100_000, true),
            Help = "Equal openings in parallel; A and d are of one, the flow is of all.",
            Example = "n=6",
        },
    ];

    /// <summary>Pressures relative to the inlet, and heights.</summary>
    private static QuantityRow[] RelativeRows() =>
    [
        new()
        {
            Key = "dp",
            Symbol = "dp",
            Word = "pressure-drop",
            Name = "pressure drop",
            Dimension = Dimension.PressureDifference,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.PressureDrop,
            TakenBy = StationLists.Throat | StationLists.Exit | StationLists.Back,
            JsonKey = "dp",
            Help = "Inlet static pressure minus this static pressure.",
            Example = "dp=0.4 bar",
        },
        new()
        {
            Key = "rise",
            Symbol = "rise",
            Name = "pressure rise",
            Dimension = Dimension.PressureDifference,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.PressureRise,
            TakenBy = StationLists.Throat | StationLists.Exit | StationLists.Back,
            JsonKey = "rise",
            Help = "This static pressure minus inlet static pressure.",
            Example = "rise=12 mbar",
        },
        new()
        {
            Key = "p/p0",
            Symbol = "p/p0",
            Name = "pressure over inlet stagnation pressure",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.PressureOverInletStagnation,
            TakenBy = StationLists.Throat | StationLists.Exit | StationLists.Back,
            JsonKey = "p_over_p0",
            Limits = QuantityLimits.Positive,
            Help = "This static pressure over inlet stagnation pressure.",
            Example = "p/p0=0.4",
        },
        new()
        {
            Key = "p/p1",
            Symbol = "p/p1",
            Name = "pressure over inlet pressure",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.PressureOverInlet,
            TakenBy = StationLists.Throat | StationLists.Exit | StationLists.Back,
            JsonKey = "p_over_p1",
            Limits = QuantityLimits.Positive,
            Help = "This static pressure over inlet static pressure.",
            Example = "p/p1=0.4",
        },
        new()
        {
            Key = "z",
            Symbol = "z",
            Word = "elevation",
            Name = "elevation",
            Dimension = Dimension.Length,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.Elevation,
            TakenBy = StationLists.Inlet | StationLists.Throat | StationLists.Exit,
            JsonKey = "z",
            OwnMetricUnit = "m",
            OwnUsUnit = "ft",
            Help = "Height above the inlet datum.",
            Example = "z=1.5 m",
        },
        new()
        {
            Key = "altitude",
            Symbol = "altitude",
            Name = "altitude",
            Dimension = Dimension.Length,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.Altitude,
            TakenBy = StationLists.Ambient,
            JsonKey = "altitude",
            Limits = new QuantityLimits(StandardAtmosphere.LeastAltitude, StandardAtmosphere.GreatestAltitude, true),
            OwnMetricUnit = "m",
            OwnUsUnit = "ft",
            Help = "Height above mean sea level; gives pressure and temperature of the standard atmosphere (ISO 2533:1975, above 32 km that of 1976).",
            Example = "altitude=600 m",
        },
        new()
        {
            Key = "rect",
            Symbol = "rect",
            Name = "rectangular section",
            Dimension = Dimension.Length,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.Rectangle,
            TakenBy = StationLists.Inlet | StationLists.Throat | StationLists.Exit,
            JsonKey = "rect",
            IsPair = true,
            Limits = QuantityLimits.Positive,
            Help = "Width x height of a rectangular section; the first side diverges in a diffuser.",
            Example = "rect=600x400 mm",
        },
        new()
        {
            Key = "annulus",
            Symbol = "annulus",
            Name = "annular section",
            Dimension = Dimension.Length,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.Annulus,
            TakenBy = StationLists.Inlet | StationLists.Throat | StationLists.Exit,
            JsonKey = "annulus",
            IsPair = true,
            Limits = QuantityLimits.Positive,
            Help = "Outer x inner diameter of a ring.",
            Example = "annulus=900x500 mm",
        },
        new()
        {
            Key = "beta",
            Symbol = "beta",
            Name = "diameter ratio",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.StationInput,
            StationSlot = StationSymbol.DiameterRatio,
            TakenBy = StationLists.Throat | StationLists.Exit,
            JsonKey = "beta",
            Limits = QuantityLimits.Positive,
            Help = "This diameter over inlet diameter.",
            Example = "beta=0.6",
        },
    ];

    private static QuantityRow Answer(string key, string symbol, string name, Dimension dimension, string help) => new()
    {
        Key = key,
        Symbol = symbol,
        Name = name,
        Dimension = dimension,
        Kind = QuantityKind.StationAnswer,
        JsonKey = key,
        Help = help,
    };

    /// <summary>Quantities that are answered only.</summary>
    private static QuantityRow[] StationAnswerRows() =>
    [
        new()
        {
            Key = "w",
            Symbol = "w",
            Word = "speed-of-sound",
            Name = "speed of sound",
            Dimension = Dimension.Velocity,
            Kind = QuantityKind.StationAnswer,
            JsonKey = "w",
            Help = "Speed of sound; of the equilibrium mixture where the fluid is wet.",
        },
        new()
        {
            Key = "cp",
            Symbol = "cp",
            Name = "isobaric heat capacity",
            Dimension = Dimension.SpecificEntropy,
            Kind = QuantityKind.StationAnswer,
            JsonKey = "cp",
            Help = "Heat capacity per mass at constant pressure.",
        },
        new()
        {
            Key = "cv",
            Symbol = "cv",
            Name = "isochoric heat capacity",
            Dimension = Dimension.SpecificEntropy,
            Kind = QuantityKind.StationAnswer,
            JsonKey = "cv",
            Help = "Heat capacity per mass at constant volume.",
        },
        Answer("kappa", "kappa", "isentropic exponent", Dimension.Ratio, "Isentropic exponent -(v/p)(dp/dv) at constant entropy; not the ratio of heat capacities."),
        Answer("w_wet", "w_wet", "speed of sound, wet side", Dimension.Velocity, "On the saturation line: speed of sound of the equilibrium mixture just inside the wet region."),
        Answer("mu", "mu", "dynamic viscosity", Dimension.DynamicViscosity, "Dynamic viscosity of one phase."),
        Answer("nu", "nu", "kinematic viscosity", Dimension.KinematicViscosity, "Dynamic viscosity over density."),
        Answer("lambda", "lambda", "thermal conductivity", Dimension.ThermalConductivity, "Thermal conductivity of one phase."),
        Answer("prandtl", "Pr", "Prandtl number", Dimension.Ratio, "Dynamic viscosity times isobaric heat capacity over thermal conductivity."),
        Answer("sigma", "sigma", "surface tension", Dimension.SurfaceTension, "Surface tension between liquid and vapour at saturation."),
        new()
        {
            Key = "phase",
            Symbol = "phase",
            Name = "phase",
            Dimension = Dimension.Ratio,
            Kind = QuantityKind.StationAnswer,
            JsonKey = "phase",
            IsText = true,
            Help = "Phase in words, such as superheated-vapour.",
        },
    ];
}
