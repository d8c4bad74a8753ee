using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>Every option of every command, in the order of help.</summary>
internal static class OptionTable
{
    internal static readonly OptionRow[] All =
    [
        new("--fluid", "NAME", "Fluid by name, or a mixture of gases such as N2=0.72,CO2=0.13,H2O=0.15; flowduct fluids lists them.", "steam", CommandName.Answering, IsRequired: true),
        new("--fractions", "BASIS", "What the fractions of a mixture count: mole (the default) or mass.", "mass", CommandName.Answering),
        new("--mixtures", "FILE", "Mixtures under names of your own: a CSV with the columns name, composition and, if need be, fractions (mole or mass).", "mixtures.csv", CommandName.Answering | CommandName.Run),
        new("--equation-of-state", "MODEL", "ideal (the default) or reference: the real gas by its published equation of state; for air, nitrogen, carbon-dioxide.", "reference", CommandName.Answering),
        new("--at", "LIST", "Two independent properties, each with its unit; one may be a range (T=300..600 K by 50 K, p=1..9 bar in 5 points). Of an ideal gas T=200..1000 K by 100 K alone prints the gas table: h, u, s0, p_r, v_r.", "\"p=7 bar, superheat=20 K\"", CommandName.State, IsRequired: true),
        new("--inlet", "LIST", "State and velocity at the inlet.", "\"p=9 bar, T=230 degC, V=25 m/s\"", CommandName.Devices, IsRequired: true),
        new("--throat", "LIST", "Section of the throat; of a diffuser that of a supersonic one.", "\"d=18 mm\"", CommandName.Devices),
        new("--exit", "LIST", "What is known of the exit plane.", "\"p=3.2 bar\"", CommandName.Devices),
        new("--back", "LIST", "Pressure of the space that the exit discharges into.", "\"p=1 atm\"", CommandName.Convergent),
        new("--ambient", "LIST", "Pressure and temperature of the surroundings, or their altitude; 1 atm, 15 degC if not given.", "\"p=0.98 bar\"", CommandName.Answering),
        Of(CaseOption.Flow, "FLOW", CommandName.Devices),
        new("--reference-state", "LIST", "State at which a flow in scfm, NL/min or the like is counted: T and p.", "\"T=60 degF, p=14.696 psi\"", CommandName.Devices),
        Of(CaseOption.Efficiency, "RATIO", CommandName.Nozzle | CommandName.Diffuser),
        Of(CaseOption.VelocityCoefficient, "RATIO", CommandName.Nozzle),
        Of(CaseOption.DischargeCoefficient, "RATIO", CommandName.Convergent),
        Of(CaseOption.ConvergentAngle, "ANGLE", CommandName.Nozzle),
        Of(CaseOption.DivergentAngle, "ANGLE", CommandName.Nozzle),
        Of(CaseOption.Onset, "PART", CommandName.Nozzle),
        Of(CaseOption.Recovery, "RATIO", CommandName.Diffuser),
        new("--recovery-basis", "HEAD", "Head of the recovery: stagnation (p0,1 - p1, the default) or dynamic (rho V^2/2).", "dynamic", CommandName.Diffuser),
        Of(CaseOption.LossCoefficient, "RATIO", CommandName.Devices),
        Of(CaseOption.Length, "LENGTH", CommandName.Divergent),
        Of(CaseOption.IncludedAngle, "ANGLE", CommandName.Divergent),
        Of(CaseOption.InletBlockage, "PART", CommandName.Divergent),
        Of(CaseOption.KineticEnergyCoefficient, "RATIO", CommandName.Diffuser),
        Of(CaseOption.Roughness, "LENGTH", CommandName.Divergent),
        Of(CaseOption.Heat, "HEAT", CommandName.Nozzle | CommandName.Diffuser),
        Of(CaseOption.HeatLoss, "HEAT", CommandName.Nozzle | CommandName.Diffuser),
        Of(CaseOption.BoundaryTemperature, "TEMP", CommandName.Nozzle | CommandName.Diffuser),
        Of(CaseOption.Gravity, "ACCEL", CommandName.Nozzle | CommandName.Diffuser),
        new("--shape", "SHAPE", "convergent or convergent-divergent; decided by the figures if not given.", "convergent", CommandName.Nozzle),
        new("--expansion", "MODEL", "equilibrium (the default), supersaturated (vapour does not condense) or single-phase (liquid does not flash).", "supersaturated", CommandName.Nozzle),
        new("--find", "NAME", "A figure of the case to be found for a --target, such as inlet.p0, back.p, exit.d, efficiency.", "back.p", CommandName.Devices),
        new("--target", "NAME=VALUE", "The result that it has to reach.", "\"shock.area_ratio=1.5\"", CommandName.Devices),
        new("--branch", "BRANCH", "subsonic or supersonic, where two exits have the same figures; a number, where --find has several answers.", "subsonic", CommandName.Devices),
        new("--path", "N", "States in N sections from inlet to exit, of a nozzle given by its sections.", "21", CommandName.Nozzle),
        new("--wall", "FILE", "Sections of your own instead: a CSV with the columns position [unit], diameter [unit].", "wall.csv", CommandName.Nozzle),
        new("--show", "LIST", "More columns of the states along a nozzle: quantities of a station, or p/p0, T/T0, rho/rho0, A/At.", "\"rho, p/p0\"", CommandName.Nozzle, OfTheCase: false),
        new("--vary", "NAME=VALUES", "An input and its values: A..B UNIT by STEP, A..B UNIT in N points (log), or a list A,B,C UNIT; may be given again.", "\"inlet.p=4..12 bar by 0.5 bar\"", CommandName.Sweep, IsRequired: true) { IsRepeatable = true },
        new("--dry-run", "", "Print how many points there are, and answer none.", "", CommandName.Sweep, OfTheCase: false),
        new("--format", "FORMAT", "text (the default), json (coherent SI whatever the units); with --path, --wall or a range also csv.", "json", CommandName.Answering | CommandName.SelfCheck, OfTheCase: false),
        new("--format", "FORMAT", "csv (the default), jsonl (a JSON answer to the line) or json (an array of them).", "jsonl", CommandName.Batch, OfTheCase: false),
        new("--output", "FILE", "Write to a file, whole or not at all.", "answer.txt", CommandName.Answering | CommandName.SelfCheck | CommandName.Batch, OfTheCase: false),
        new("--show", "LIST", "Results to write, each with its unit if it is not the usual one.", "\"exit.T [degC], exit.x, regime, mass_flow [kg/h]\"", CommandName.Batch, OfTheCase: false),
        new("--jobs", "N", "Workers; as many as there are processors if not given. The results are the same bytes.", "2", CommandName.Run, OfTheCase: false),
        new("--shard", "I/N", "Only the rows I, I+N, I+2N, ...: one of N shares.", "2/8", CommandName.Run, OfTheCase: false),
        new("--resume", "", "Go on with a broken run into the same --output.", "", CommandName.Run, OfTheCase: false),
        new("--decimal", "MARK", "Decimal mark of the numbers in the sheet and in the results: point (the default) or comma.", "comma", CommandName.Run, OfTheCase: false),
        new("--units", "SYSTEM", "metric (the default) or us.", "us", CommandName.Answering | CommandName.Batch, OfTheCase: false),
        new("--show-in", "LIST", "Units of your own for some quantities.", "\"T=degF, p=inH2O(g)\"", CommandName.Answering | CommandName.Batch, OfTheCase: false),
        new("--digits", "N", "Significant digits, 1 to 15; of run 7 if not given.", "7", CommandName.Answering | CommandName.Batch, OfTheCase: false),
        new("--quiet", "", "Leave notes and assumptions out; of selfcheck the values that are met; of run the summary and warnings.", "", CommandName.Answering | CommandName.SelfCheck | CommandName.Batch, OfTheCase: false),
        new("--strict", "", "A caution fails the answer: exit status 1.", "", CommandName.Answering | CommandName.Batch, OfTheCase: false),
        new("--color", "WHEN", "auto (the default), always or never; NO_COLOR is honoured.", "never", CommandName.Answering, OfTheCase: false),
        new("--help", "", "This help; also -h.", "", CommandName.All, OfTheCase: false),
        new("--version", "", "Version and commit of flowduct.", "", CommandName.All, OfTheCase: false),
    ];

    /// <summary>The options of a command, in the order of help.</summary>
    internal static IEnumerable<OptionRow> Of(CommandName command) => All.Where(row => (row.Commands & command) != 0);

    /// <summary>The options of a sweep over a device: its own, and those of the device's case that ask for one answer.</summary>
    internal static IEnumerable<OptionRow> OfSweep(CommandName device) => All.Where(row =>
        (row.Commands & CommandName.Sweep) != 0 || (row.OfTheCase && (row.Commands & device) != 0 && row.Name is not ("--find" or "--target" or "--path" or "--wall")));

    /// <summary>The value placeholder and help of a numeric option stand in the catalogue of quantities.</summary>
    private static OptionRow Of(CaseOption option, string value, CommandName commands)
    {
        QuantityRow row = QuantityCatalogue.Of(option);
        string example = row.Example.Contains(' ', StringComparison.Ordinal) ? $"\"{row.Example}\"" : row.Example;
        return new OptionRow("--" + row.Word, value, row.Help, example, commands);
    }
}
