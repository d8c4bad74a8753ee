using FlowDuct.Devices;
using FlowDuct.Devices.Inverse;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Errors;

/// <summary>Every refusal that the devices speak, in one place: reason with value, limit and source, then one next step.</summary>
internal static class Refusals
{
    private static DisplayText Units => DisplayText.Metric;

    internal static FlowDuctException Redundant(Station station, string names) => NotUnderstood(
        PlaceOf(station), $"{names} is given more than once, under two names", "keep one of them");

    internal static FlowDuctException InletMissing(Station station, StationFigures given, Figure suggestions)
    {
        string what = given.Given == Figure.None ? "no property is given" : $"{Figures.Names(given.Given)} alone does not fix the state";
        return NotUnderstood(PlaceOf(station), what, $"add one of {Figures.Names(suggestions)}");
    }

    internal static FlowDuctException InletRedundant(Station station, Figure given, Figure enough) => NotUnderstood(
        PlaceOf(station),
        $"{Figures.Names(given)} are more than fixes the state",
        $"leave out {Figures.Names(given & ~enough)}: {Figures.Names(enough)} is enough");

    internal static FlowDuctException PairNotSolved(Station station, Figure given) => NotUnderstood(
        PlaceOf(station),
        $"{Figures.Names(given)} is not a set that fixes the state",
        "give p with one of T, h, s, u, rho, x, superheat; or T with x or rho; or h with s; or p0 with T0");

    internal static FlowDuctException VelocityTwice(Figure given) => NotUnderstood(
        "--inlet", $"the velocity is given more than once ({Figures.Names(given)})", "keep one of V, M or the pair p and p0");

    internal static FlowDuctException VelocityMissing(Figure given) => NotUnderstood(
        "--inlet", $"{Figures.Names(given)} needs the velocity too", "add V, M, or A (or d) together with --flow");

    internal static FlowDuctException VelocityRedundant(Figure given) => NotUnderstood(
        "--inlet", $"with {Figures.Names(given)} the velocity follows; it is also given", "leave V, M or the section out");

    internal static FlowDuctException SectionWithoutFlow() => NotUnderstood(
        "--inlet", "a section (A or d) without a flow does not give the velocity", "add --flow, for example --flow \"1.4 kg/s\", or V");

    internal static FlowDuctException DiffuserAtRest() => NotUnderstood(
        "--inlet", "a diffuser slows a stream down, and this inlet has no velocity", "add V, M, p0, or A (or d) together with --flow");

    internal static FlowDuctException SaturatedInlet(Station station, double p, double T, double Tsat) => NoAnswer(
        PlaceOf(station),
        $"p={Units.Text(p, Dimension.Pressure)} and T={Units.Text(T, Dimension.Temperature)} lie on the saturation line ({Units.Text(Tsat, Dimension.Temperature, 6)}): one figure, not two",
        "give x, h or superheat instead of T");

    internal static FlowDuctException OutsideRange(
        Station station, Fluid fluid, Outcome outcome, StatePairs.Pair pair, double first, double second)
    {
        if (outcome == Outcome.NoSaturation && !fluid.HasSaturation)
        {
            string why = fluid is HelmholtzFluid ? "is taken as one pure fluid by this equation, which has no quality between its dew and bubble lines" : "is an ideal gas here and has no saturation line";
            return NoAnswer(PlaceOf(station), $"{fluid.Name} {why}", "give p with T, h, s or rho");
        }

        return NoAnswer(PlaceOf(station), Describe(fluid.Explain(outcome, pair.Call, first, second)), $"valid range: {fluid.RangeText}");
    }

    internal static FlowDuctException OutsideRange(string place, Fluid fluid, Outcome outcome, StatePair pair, double first, double second) =>
        NoAnswer(place, Describe(fluid.Explain(outcome, pair, first, second)), $"valid range: {fluid.RangeText}");

    internal static FlowDuctException NoSuchInlet(Figure given) => NoAnswer(
        "--inlet", $"no state has these figures ({Figures.Names(given)}) together", "check the velocity against the stagnation readings");

    internal static FlowDuctException ExitMissing(DeviceKind device) => NotUnderstood(
        "--exit",
        "nothing says where the flow leaves",
        device == DeviceKind.Nozzle
            ? "give one of p, dp, p/p0, V, T, h, x; for example --exit \"p=3.2 bar\""
            : "give one of p, rise, V, T, h; for example --exit \"p=1.05 bar\", or --recovery with --exit \"V=30 m/s\"");

    internal static FlowDuctException ExitRedundant(Figure given) => NotUnderstood(
        "--exit",
        $"{Figures.Names(given)} are more than fixes the exit",
        "an exit takes one figure with one of efficiency, velocity coefficient, recovery or loss coefficient, or two measured figures");

    internal static FlowDuctException ExitNotSolved(Figure given) => NotUnderstood(
        "--exit",
        $"{Figures.Names(given)} is not a set that fixes the exit",
        "give p with one other figure, or one of T, h, x, rho, V, M with an efficiency or loss coefficient");

    internal static FlowDuctException FixedByEnergy(string symbol) => NotUnderstood(
        "--exit", $"{symbol} at the exit follows from the energy balance and fixes nothing", "give p, T, h, x, V or p0 instead");

    internal static FlowDuctException RecoveryTwice() => NotUnderstood(
        "--recovery", "the recovery fixes the exit pressure, which is also given", "leave one of them out");

    internal static FlowDuctException LossTwice(string names) => NotUnderstood(
        "--efficiency", $"the loss is given more than once ({names})", "keep one of them");

    internal static FlowDuctException NotForDevice(string option, DeviceKind device) => NotUnderstood(
        option, $"this option does not belong to a {DeviceWords.Of(device)}", device == DeviceKind.Nozzle ? "it belongs to the diffuser" : "it belongs to the nozzle");

    internal static FlowDuctException NoExit(string figures, string range) => NoAnswer(
        "--exit", $"no exit state has {figures}", range);

    internal static FlowDuctException ExitAboveStagnation(double p, double p0) => NoAnswer(
        "--exit",
        $"p={Units.Text(p, Dimension.Pressure)} is not below the stagnation pressure at the inlet, {Units.Text(p0, Dimension.Pressure)}: nothing drives the flow",
        "give an exit pressure below it");

    internal static FlowDuctException TooFast(double V, double Vmost) => NoAnswer(
        "--exit",
        $"V={Units.Text(V, Dimension.Velocity)} needs more energy than the fluid can give (at most {Units.Text(Vmost, Dimension.Velocity)} inside the formulation)",
        "give a lower exit velocity, or more enthalpy at the inlet");

    internal static FlowDuctException NoPressureLeft(string place, double p) => NoAnswer(
        place, $"the pressure would be {Units.Text(p, Dimension.PressureDifference)} absolute, and no fluid has that", "give a smaller pressure drop");

    internal static FlowDuctException SeveralExits(IEnumerable<string> roots) => NoAnswer(
        "--exit", $"several exit states have these figures: {string.Join("; ", roots)}", "choose with --branch subsonic or --branch supersonic");

    internal static FlowDuctException ConvergentBelowCritical(double p, double pCritical) => NoAnswer(
        "--exit",
        $"p={Units.Text(p, Dimension.Pressure)} is below the critical pressure {Units.Text(pCritical, Dimension.Pressure)}: a convergent nozzle cannot reach it in its exit plane",
        "if that is the pressure of the space, write --back; if the nozzle has a throat before its exit, write --shape convergent-divergent");

    internal static FlowDuctException ExitNarrowerThanThroat(double throat, double exit) => NotUnderstood(
        "--exit",
        $"the exit area {Units.Text(exit, Dimension.Area)} is smaller than the throat area {Units.Text(throat, Dimension.Area)}: the exit would be the throat",
        "give the narrowest section as --throat, or the exit bore alone for a convergent nozzle");

    internal static FlowDuctException ShapeAgainstSections() => NotUnderstood(
        "--shape", "convergent does not fit two different sections", "leave --throat or --shape out");

    internal static FlowDuctException ExitFollows(Figure extra) => NotUnderstood(
        "--exit", $"with sections and a back pressure the exit follows; {Figures.Names(extra)} is given too", "leave it out, or leave --throat and --back out");

    internal static FlowDuctException ThroatFollows() => NotUnderstood(
        "--throat", "the throat pressure follows from inlet, sections and back pressure", "give A or d (and n) of the throat only");

    internal static FlowDuctException BackTwice(string place) => NotUnderstood(place, "the back pressure is given more than once", "keep one of p, dp, rise, p/p0, p/p1");

    internal static FlowDuctException ExitAndBack() => NotUnderstood(
        "--exit", "with sections the exit pressure follows from the back pressure; both are given", "leave p of the exit out");

    internal static FlowDuctException BackMissing() => NotUnderstood(
        "--back", "nothing says what the nozzle discharges into", "give for example --back \"p=1 atm\"");

    internal static FlowDuctException FindGiven(string name) => NotUnderstood(
        "--find", $"{name} is given too", "leave it out of the case, or find another figure");

    internal static FlowDuctException FindAnything(InverseQuestion question, double a, double b) => NoAnswer(
        "--find",
        $"{question.Target.Name} has the wanted value for any {question.Unknown.Name} from {Units.Text(a, question.Unknown.Row.Dimension, 3)} to {Units.Text(b, question.Unknown.Row.Dimension, 3)} at least",
        "the target does not depend on it there; ask for another figure");

    internal static FlowDuctException FindNowhere(InverseQuestion question, double a, double b) => NoAnswer(
        "--find",
        $"no {question.Unknown.Name} from {Units.Text(a, question.Unknown.Row.Dimension, 3)} to {Units.Text(b, question.Unknown.Row.Dimension, 3)} gives an answer that has {question.Target.Name}",
        "check the rest of the case with a value of your own");

    internal static FlowDuctException FindOutOfReach(InverseQuestion question, double least, double greatest) => NoAnswer(
        "--target",
        $"{question.Target.Name} reaches {Units.Text(least, question.Target.Row.Dimension, 4)} to {Units.Text(greatest, question.Target.Row.Dimension, 4)}, whatever {question.Unknown.Name} is",
        "give a target between, or find another figure");

    internal static FlowDuctException NotChosen(int? number, IReadOnlyList<FoundFigure> found) => found.Count == 1
        ? NoAnswer("--branch", $"there is no value {number} of {found[0].Question.Unknown.Name}: one alone meets the target", "leave it out")
        : NoAnswer(
            "--find",
            $"several values of {found[0].Question.Unknown.Name} meet the target: {string.Join("; ", found.Select((one, i) => $"{i + 1}: {Units.Text(one.Value, one.Question.Unknown.Row.Dimension, 6)}"))}",
            "choose with --branch 1, --branch 2 ...");

    internal static FlowDuctException WallIsAnother(string file, string bore, double ofWall, double ofCase) => NotUnderstood(
        "--wall",
        $"{file}: its {bore} is {Units.Text(ofWall, Dimension.Length)} wide, that of the case {Units.Text(ofCase, Dimension.Length)}",
        "give the bores of the wall as --throat and --exit");

    internal static FlowDuctException ExpansionDoesNotFit(ExpansionModel model) => NotUnderstood(
        "--expansion",
        model == ExpansionModel.SinglePhase ? "single-phase keeps a liquid from flashing, and this inlet is none of water" : "supersaturated keeps a vapour from condensing, and this inlet is none of water",
        "leave it out for equilibrium");

    internal static FlowDuctException OnsetWithoutHeldPhase() => NotUnderstood(
        "--onset", "at equilibrium no phase is held that could give way", "add --expansion supersaturated or --expansion single-phase");

    internal static FlowDuctException OnsetBeyondEquation(double moisture, double most) => NotUnderstood(
        "--onset", $"a moisture of {Units.Text(moisture, Dimension.Ratio)} is beyond the end of the equation for supersaturated vapour, {Units.Text(most, Dimension.Ratio)} (IAPWS R7-97(2012), Eq. (18))",
        "give a smaller one, or leave it out to hold the vapour to that end");

    internal static FlowDuctException ExpansionWithoutSections() => NotUnderstood(
        "--expansion", "a held phase is solved for a nozzle with --back or --throat", "add --back, for example --back \"p=1 bar\"");

    internal static FlowDuctException CorrelationWithoutSection() => NotUnderstood(
        "--discharge-coefficient", "a correlation needs the bore of the throat", "add --throat, for example --throat \"d=18 mm\"");

    internal static FlowDuctException VenturiSections() => NotUnderstood(
        "--throat", "a venturi has a section at its inlet, its throat and its exit", "give for example --inlet \"p=6 bar, T=40 degC, d=100 mm\" --throat \"d=60 mm, dp=25 kPa\" --exit \"d=100 mm\"");

    internal static FlowDuctException VenturiFollows(Devices.Figure extra) => NotUnderstood(
        "--exit", $"{Devices.Figures.Names(extra)} behind the inlet follows from the sections and one reading", "give sections there, and one of the throat's pressure, --flow, --back");

    internal static FlowDuctException VenturiReadings(int given) => NotUnderstood(
        "--throat", given == 0 ? "nothing says how much flows" : "the flow is given more than once", "give one of the throat's pressure (p or dp), --flow, --back");

    internal static FlowDuctException NoFlowThrough(double back, double most) => NoAnswer(
        "--back", $"{Units.Text(back, Dimension.Pressure)} leaves no flow: without one it is {Units.Text(most, Dimension.Pressure)}", "give a lower one");

    internal static FlowDuctException MoreThanChoked(double flow, double most) => NoAnswer(
        "--flow", $"{Units.Text(flow, Dimension.MassFlow)} is more than the choked throat passes, {Units.Text(most, Dimension.MassFlow)}", "give a smaller one, or a wider throat");

    internal static FlowDuctException VenturiSupersonic(double back) => NoAnswer(
        "--back", $"at {Units.Text(back, Dimension.Pressure)} the divergence stays supersonic to its exit", "use flowduct nozzle with --throat, --exit and --back");

    internal static FlowDuctException LengthTwice() => NotUnderstood(
        "--included-angle", "the length and the sections fix it", "leave --included-angle or --length out, or the exit section");

    internal static FlowDuctException LengthWithoutSection() => NotUnderstood(
        "--length", "an angle follows from it with the section of the inlet only", "add d, A, rect or annulus to --inlet");

    internal static FlowDuctException ProfileOfStagnation() => NotUnderstood(
        "--kinetic-energy-coefficient", "it belongs to the mean velocity of a static state, and a stagnation figure of the inlet holds it already", "give p, T and V of the inlet");

    internal static FlowDuctException ThroatOfSubsonicDiffuser() => NotUnderstood(
        "--throat", "a subsonic diffuser has none; a nozzle before a diffuser is a venturi", "leave it out, or use flowduct venturi");

    internal static FlowDuctException DiffuserThroat() => NotUnderstood(
        "--throat", "a supersonic diffuser takes the section of its throat beside that of its inlet, and no other figure", "give for example --inlet \"..., d=120 mm\" --throat \"d=112 mm\"");

    internal static FlowDuctException ThroatWiderThanInlet() => NotUnderstood("--throat", "it is wider than the inlet", "give the narrowest section");

    internal static FlowDuctException DoesNotStart(double ratio, double least) => NoAnswer(
        "--throat",
        $"with {Units.Text(ratio, Dimension.Ratio, 4)} of the inlet area the stream does not start by itself: behind a normal shock at the inlet it needs {Units.Text(least, Dimension.Ratio, 4)} (Kantrowitz and Donaldson, NACA ACR L5D20, 1945)",
        "give a wider throat, or leave it out to let the shock stand at the inlet");

    internal static FlowDuctException NoShock() => NoAnswer(
        "--inlet", "the state behind a normal shock in this stream lies outside the range of the fluid", "give a slower inlet");

    internal static FlowDuctException SuddenOfSupersonic() => NoAnswer(
        "--loss-coefficient", "a sudden expansion of a supersonic stream is not modelled", "give another loss");

    internal static FlowDuctException LossWithoutForm() => NotUnderstood(
        "--loss-coefficient", "an estimate needs the form of the diffuser", "give sections of inlet and exit, and --length or --included-angle");

    internal static FlowDuctException LossOfAnotherShape(Devices.Diffusers.DiffuserLoss row) => NotUnderstood(
        "--loss-coefficient", $"{row.Name} is an estimate of {(row.Cone ? "cones, and this diffuser is planar" : "planar diffusers, and this one is none")}",
        row.Cone ? "give best-planar" : "give idelchik, or rect for the sections");

    internal static FlowDuctException BetaWithoutInlet(Station station) => NotUnderstood(
        PlaceOf(station), "beta is a diameter over that of the inlet, which is not given", "add d to --inlet, or give d here");

    internal static FlowDuctException CorrelationWithoutPipe() => NotUnderstood(
        "--discharge-coefficient",
        "an equation of ISO 5167 needs the static pressure and the bore of the pipe, and the throat alone with the pressure of its tap",
        "give for example --inlet \"p=6 bar, T=40 degC, d=100 mm\" --throat \"d=60 mm\" --back \"dp=25 kPa\"");

    internal static FlowDuctException CorrelationWithFlow() => NotUnderstood(
        "--discharge-coefficient", "the flow is given too, which implies the coefficient", "leave --flow or the correlation out");

    internal static FlowDuctException CorrelationWithoutBack() => NotUnderstood(
        "--discharge-coefficient", "a correlation needs the flow of a rated throat", "add --throat and --back");

    internal static FlowDuctException NoViscosity(Fluid fluid) => NoAnswer(
        "--discharge-coefficient", $"there is no viscosity of {fluid.Name} here, which the Reynolds number needs", "give the coefficient as a number");

    internal static FlowDuctException LossWithSections() => NotUnderstood(
        "--loss-coefficient", "a nozzle given by its sections takes its loss as an efficiency", "give --efficiency or --velocity-coefficient");

    internal static FlowDuctException ElevationWithThroat() => NoAnswer(
        "--exit", "elevation beside a throat is not modelled", "leave z out: ten metres are 0.1 kJ/kg");

    internal static FlowDuctException SupersonicInlet() => NoAnswer(
        "--inlet", "the inlet is faster than sound: a nozzle given by its sections is rated from a subsonic inlet", "give a slower inlet");

    internal static FlowDuctException InletSectionTooNarrow() => NoAnswer(
        "--inlet", "the inlet section passes less than the throat: it would choke first", "check the bores of inlet and throat");

    internal static FlowDuctException InletSectionTooWide() => NoAnswer(
        "--inlet", "so wide an inlet is at rest", "leave its section out");

    internal static FlowDuctException NotRated(Devices.Rating.RatingOutcome outcome, Fluid fluid, double back, double p0) => outcome switch
    {
        Devices.Rating.RatingOutcome.Reversed => NoAnswer(
            "--back",
            $"p={Units.Text(back, Dimension.Pressure)} is above the stagnation pressure at the inlet, {Units.Text(p0, Dimension.Pressure)}: the flow would turn round",
            "give a back pressure below it"),
        Devices.Rating.RatingOutcome.TooGreatALoss => NoAnswer(
            "--efficiency", "so great a loss leaves no flow from this throat through this exit", "give a higher efficiency or a larger exit"),
        Devices.Rating.RatingOutcome.InsideReversion => NoAnswer(
            "--exit", "the held phase gives way where the stream then has no steady way on: in the throat while slower than sound, or across the exit plane", "give another exit section or --onset, or leave --expansion out"),
        Devices.Rating.RatingOutcome.NoThroat or Devices.Rating.RatingOutcome.OutsideRange => NoAnswer(
            "--inlet", "the expansion leaves the range of the fluid before it is solved", $"valid range: {fluid.RangeText}"),
        _ => throw new InvalidOperationException($"a bracketed search of the rating did not close ({outcome})"),
    };

    internal static FlowDuctException HeatWithChoking() => NoAnswer(
        "--heat", "heat beside a throat or choking is not modelled", "leave the heat out, or give an exit above the critical pressure");

    internal static FlowDuctException EfficiencyWithHeat() => NotUnderstood(
        "--efficiency", "with heat an efficiency can be implied by measured figures, not given", "give two exit figures instead");

    internal static FlowDuctException HeatTwice() => NotUnderstood(
        "--heat-loss", "the heat is given too, as --heat", "keep one of them; --heat takes a minus sign for a loss");

    internal static string PlaceOf(Station station) => station switch
    {
        Station.Inlet => "--inlet",
        Station.Throat => "--throat",
        Station.Exit => "--exit",
        Station.Ambient => "--ambient",
        _ => "--at",
    };

    private static string Describe(RangeViolation v)
    {
        Dimension dimension = DimensionOf(v.Symbol);
        string side = v.IsUpper ? "above" : "below";
        return $"{v.Symbol}={Units.Text(v.Value, dimension, 6)} is {side} the limit {Units.Text(v.Limit, dimension, 6)} of {v.Source}";
    }

    private static Dimension DimensionOf(string symbol) => symbol switch
    {
        "p" => Dimension.Pressure,
        "T" => Dimension.Temperature,
        "h" => Dimension.SpecificEnergy,
        "s" => Dimension.SpecificEntropy,
        "rho" => Dimension.Density,
        _ => Dimension.Ratio,
    };


    private static FlowDuctException NotUnderstood(string place, string reason, string next) =>
        new(new Refusal(RefusalKind.NotUnderstood, place, reason, next));

    private static FlowDuctException NoAnswer(string place, string reason, string next) =>
        new(new Refusal(RefusalKind.NoAnswer, place, reason, next));
}
