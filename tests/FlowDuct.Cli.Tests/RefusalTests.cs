using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Wrong inputs: exit status, nothing on stdout, and the approved message, which names the place and the way out.</summary>
public class RefusalTests
{
    private const string Steam = "flowduct nozzle --fluid steam --inlet ";
    private const string Air = "flowduct nozzle --fluid air --inlet ";

    [Theory]
    [InlineData(2, Steam + "\"p=9 bar, T=200\" --exit \"p=3 bar\"", "--inlet: T=200 has no unit; write for example T=200 degC")]
    [InlineData(2, Steam + "\"p=9 bar, T=230,5 degC\" --exit \"p=3 bar\"", "--inlet: T=230,5 degC has a decimal comma\n  write T=230.5 degC")]
    [InlineData(2, Steam + "\"p=NaN bar, T=230 degC\" --exit \"p=3 bar\"", "--inlet: p=NaN is not a finite number\n  write for example p=9 bar")]
    [InlineData(2, Steam + "\"p=1e400 bar, T=230 degC\" --exit \"p=3 bar\"", "--inlet: 1e400 is too large; the greatest number is 1.79e308\n  write for example p=9 bar")]
    [InlineData(2, Steam + "\"p=9 barr, T=230 degC\" --exit \"p=3 bar\"", "--inlet: p=9 barr: barr is not a unit here; did you mean bar or bara or barg?")]
    [InlineData(2, Steam + "\"p=9 mpa, T=230 degC\" --exit \"p=3 bar\"", "--inlet: p=9 mpa: mpa is not a unit here; did you mean MPa?")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC\" --exti \"p=3 bar\"", "--exti is not an option\n  did you mean --exit?")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC, h=2900 kJ/kg\" --exit \"p=3 bar\"", "--inlet: p, T, h are more than fixes the state\n  leave out h: p, T is enough")]
    [InlineData(2, Steam + "\"p=9 bar, x=0.9, moisture=2%\" --exit \"p=3 bar\"", "--inlet: x is given more than once, under two names\n  keep one of them")]
    [InlineData(2, Steam + "\"p=9 bar\" --exit \"p=3 bar\"", "--inlet: p alone does not fix the state\n  add one of T, h, s, u, rho, x, superheat, p0, T0, h0")]
    [InlineData(3, Steam + "\"p=9 bar, T=2400 degC\" --exit \"p=3 bar\"", "--inlet: T=2400 degC is above the limit 2000 degC of IAPWS R7-97(2012)\n  valid range: 0 to 800 degC up to 1000 bar; 800 to 2000 degC up to 500 bar")]
    [InlineData(3, "flowduct state --fluid water --at \"p=620 bar, T=900 degC\"", "--at: p=620 bar is above the limit 500 bar of IAPWS R7-97(2012) above 1073.15 K (region 5)\n  valid range: 0 to 800 degC up to 1000 bar; 800 to 2000 degC up to 500 bar")]
    [InlineData(2, Steam + "\"p=-2 bar, T=230 degC\" --exit \"p=3 bar\"", "--inlet: p=-2 bar is not above 0: a bare unit is absolute; for gauge write bar(g)\n  write for example p=9 bar")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC\"", "--exit: nothing says where the flow leaves\n  give one of p, dp, p/p0, V, T, h, x; for example --exit \"p=3.2 bar\"")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC\" --exit \"p=3 bar\" --heat --efficiency 0.9", "--heat: has no value\n  write for example --heat \"12 kJ/kg\"")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC\" --exit", "--exit: has no value\n  write for example --exit \"p=3.2 bar\"")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC\" --exit \"p=3 bar\" --exit \"p=2 bar\"", "--exit: is given twice\n  keep one of them")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC\" --exit \"p=3 bar\" --recovery 0.5", "--recovery is not an option of nozzle\n  it belongs to diffuser")]
    [InlineData(2, Steam + "@plant --exit \"p=3 bar\"", "--inlet: @plant has no equals sign\n  write symbol=value, for example p=9 bar")]
    [InlineData(2, "flowduct [diagram] nozzle", "[diagram] is not a command\n  write one of state, nozzle, diffuser, venturi, sweep, run, selfcheck, fluids, units")]
    [InlineData(2, Steam + "p=9 bar --exit \"p=3 bar\"", "bar belongs to no option\n  quote lists that hold spaces: --inlet \"p=9 bar, T=230 degC\"")]
    [InlineData(2, "flowduct nozzel --fluid steam", "nozzel is not a command\n  did you mean nozzle?")]
    [InlineData(2, "flowduct nozzle --inlet \"p=9 bar, T=230 degC\"", "--fluid: is missing\n  write for example --fluid steam")]
    [InlineData(2, "flowduct nozzle --fluid steem --inlet \"p=9 bar, T=230 degC\" --exit \"p=3 bar\"", "--fluid: steem is not a fluid of this version\n  did you mean steam?")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC\" --exit \"p=3 bar\" --efficiency 130%", "--efficiency: efficiency 130% is outside 0 to 100 %\n  write for example 96%")]
    [InlineData(2, Steam + "\"p=9 bar, T=230 degC\" --exit \"p=3 bar, T=150 degC, x=0.9\"", "--exit: p, T, x are more than fixes the exit\n  an exit takes one figure with one of efficiency, velocity coefficient, recovery or loss coefficient, or two measured figures")]
    [InlineData(3, Steam + "\"p=9 bar, T=230 degC\" --exit \"p=12 bar\"", "--exit: p=12 bar is not below the stagnation pressure at the inlet, 9 bar: nothing drives the flow\n  give an exit pressure below it")]
    [InlineData(3, Steam + "\"p=9 bar, T=175.3 degC\" --exit \"p=3 bar\"", "--inlet: p=9 bar and T=175.3 degC lie on the saturation line (175.358 degC): one figure, not two\n  give x, h or superheat instead of T")]
    [InlineData(3, Steam + "\"p=9 bar, T=230 degC\" --exit \"p=3 bar\" --shape convergent", "--exit: p=3 bar is below the critical pressure 4.9028 bar: a convergent nozzle cannot reach it in its exit plane\n  if that is the pressure of the space, write --back; if the nozzle has a throat before its exit, write --shape convergent-divergent")]
    [InlineData(2, Steam + "\"p=9 bar, v=30 m/s\" --exit \"p=3 bar\"", "--inlet: v is specific volume, m3/kg; for velocity write V=30 m/s")]
    [InlineData(2, "flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC\" --exit \"p=3 bar\" --flow \"300 Nm3/h\"", "--flow: normal and standard volumes are amounts of ideal gas, and water is none\n  give a mass flow, or an actual volume flow in m3/h")]
    [InlineData(2, "flowduct units colour", "units: colour is no kind of quantity\n  write one of ratio, count, pressure, temperature, energy per mass, entropy or heat capacity per mass, specific volume, density, velocity, length, area, mass flow, volume flow, normal volume flow, standard volume flow, reference volume flow, heat rate, acceleration, force, angle, mass flux, dynamic viscosity, kinematic viscosity, thermal conductivity, surface tension")]
    [InlineData(3, "flowduct state --fluid air --at \"p=1 bar, x=0.5\"", "--at: air is an ideal gas here and has no saturation line\n  give p with T, h, s or rho")]
    [InlineData(3, "flowduct state --fluid air --at \"p=1 bar, T=6800 degC\"", "--at: T=6800 degC is above the limit 5726.85 degC of NASA/TP-2002-211556 (2002), record Air\n  valid range: 50 K to 6000 K, 1 Pa to 1 GPa; below 200 K the heat capacity keeps its 200 K value")]
    [InlineData(2, "flowduct diffuser --fluid air --inlet \"p=1 bar, T=300 K, V=90 m/s\" --exit \"V=20 m/s\" --recovery 1.2", "--recovery: 1.2 is above 1, the recovery of a flow brought to rest without loss\n  give a ratio up to 1, or --recovery-basis dynamic")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p=5 bar, T=300 K\" --exit \"p=4 bar, T=290 K\" --heat \"5 kW\"", "--heat: a heat rate needs the mass flow that takes it\n  add --flow in kg/s, or give the heat in kJ/kg")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p=5 bar, T=300 K\" --exit \"p=4 bar, T=290 K\" --heat \"5 kJ/kg\" --heat-loss \"2 kJ/kg\"", "--heat-loss: the heat is given too, as --heat\n  keep one of them; --heat takes a minus sign for a loss")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p=5 bar, T=300 K\" --exit \"p=4 bar\" --flow \"300 scfm\"", "--flow: 300 scfm names no reference state (conventions differ by up to 8.7 %)\n  add --reference-state, for example --reference-state \"T=60 degF, p=14.696 psi\", or give Nm3/h (0 degC) or Sm3/h (15 degC)")]
    [InlineData(2, "flowduct state --fluid water --at \"p=1 bar, T=300 K\" --digits 40", "--digits: 40 is not a whole number from 1 to 15\n  write for example --digits 7")]
    [InlineData(2, "flowduct state --fluid water --at \"p=1 bar, T=300 K\" --format xml", "--format: xml is not one of text, json, csv")]
    [InlineData(2, Air + "\"p=9 bar, T=200\" --exit \"p=8 bar\"", "--inlet: T=200 has no unit; write for example T=200 degC")]
    [InlineData(2, Air + "\"p=9 bar, T=230,5 degC\" --exit \"p=8 bar\"", "--inlet: T=230,5 degC has a decimal comma\n  write T=230.5 degC")]
    [InlineData(2, Air + "\"p=NaN bar, T=230 degC\" --exit \"p=8 bar\"", "--inlet: p=NaN is not a finite number\n  write for example p=9 bar")]
    [InlineData(2, Air + "\"p=1e400 bar, T=230 degC\" --exit \"p=8 bar\"", "--inlet: 1e400 is too large; the greatest number is 1.79e308\n  write for example p=9 bar")]
    [InlineData(2, Air + "\"p=9 barr, T=230 degC\" --exit \"p=8 bar\"", "--inlet: p=9 barr: barr is not a unit here; did you mean bar or bara or barg?")]
    [InlineData(2, Air + "\"p=9 bar, T=230 degC\" --exti \"p=8 bar\"", "--exti is not an option\n  did you mean --exit?")]
    [InlineData(2, Air + "\"p=9 bar, T=230 degC, rho=6 kg/m3\" --exit \"p=8 bar\"", "--inlet: p, T, rho are more than fixes the state\n  leave out rho: p, T is enough")]
    [InlineData(2, Air + "\"p=9 bar\" --exit \"p=8 bar\"", "--inlet: p alone does not fix the state\n  add one of T, h, s, u, rho, x, superheat, p0, T0, h0")]
    [InlineData(3, Air + "\"p=9 bar, T=7000 K\" --exit \"p=8 bar\"", "--inlet: T=6726.85 degC is above the limit 5726.85 degC of NASA/TP-2002-211556 (2002), record Air\n  valid range: 50 K to 6000 K, 1 Pa to 1 GPa; below 200 K the heat capacity keeps its 200 K value")]
    [InlineData(2, Air + "\"p=-2 bar, T=230 degC\" --exit \"p=8 bar\"", "--inlet: p=-2 bar is not above 0: a bare unit is absolute; for gauge write bar(g)\n  write for example p=9 bar")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=25 mm\" --exit \"d=18 mm\" --back \"p=1 bar\"", "--exit: the exit area 254.47 mm2 is smaller than the throat area 490.87 mm2: the exit would be the throat\n  give the narrowest section as --throat, or the exit bore alone for a convergent nozzle")]
    [InlineData(3, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=9 bar\"", "--back: p=9 bar is above the stagnation pressure at the inlet, 8 bar: the flow would turn round\n  give a back pressure below it")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\"", "--back: nothing says what the nozzle discharges into\n  give for example --back \"p=1 atm\"")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm, p=2 bar\" --back \"p=1 bar\"", "--throat: the throat pressure follows from inlet, sections and back pressure\n  give A or d (and n) of the throat only")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --exit \"d=25 mm, T=250 K\" --back \"p=1 bar\"", "--exit: with sections and a back pressure the exit follows; T is given too\n  leave it out, or leave --throat and --back out")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --exit \"d=25 mm, p=2 bar\" --back \"p=1 bar\"", "--exit: with sections the exit pressure follows from the back pressure; both are given\n  leave p of the exit out")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --exit \"d=25 mm\" --back \"p=1 bar, dp=2 bar\"", "--back: the back pressure is given more than once\n  keep one of p, dp, rise, p/p0, p/p1")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --exit \"d=25 mm\" --back \"p=1 bar\" --shape convergent", "--shape: convergent does not fit two different sections\n  leave --throat or --shape out")]
    [InlineData(3, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --heat \"5 kJ/kg\"", "--heat: heat beside a throat or choking is not modelled\n  leave the heat out, or give an exit above the critical pressure")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --loss-coefficient 0.1", "--loss-coefficient: a nozzle given by its sections takes its loss as an efficiency\n  give --efficiency or --velocity-coefficient")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --expansion supersaturated", "--expansion: supersaturated keeps a vapour from condensing, and this inlet is none of water\n  leave it out for equilibrium")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=6 bar\" --discharge-coefficient iso5167-isa1932", "--discharge-coefficient: an equation of ISO 5167 needs the static pressure and the bore of the pipe, and the throat alone with the pressure of its tap\n  give for example --inlet \"p=6 bar, T=40 degC, d=100 mm\" --throat \"d=60 mm\" --back \"dp=25 kPa\"")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --discharge-coefficient iso9300-toroid", "--discharge-coefficient: iso9300-toroid is not one of a number, iso9300-toroidal, iso9300-toroidal-accurate, iso9300-cylindrical, iso5167-isa1932, iso5167-long-radius, iso5167-venturi-nozzle, iso5167-venturi-cast, iso5167-venturi-machined, iso5167-venturi-welded\n  did you mean iso9300-toroidal?")]
    [InlineData(3, "flowduct nozzle --fluid steam --inlet \"p0=8 bar, T0=950 degC\" --throat \"d=18 mm\" --back \"p=1 bar\" --discharge-coefficient iso9300-toroidal", "--discharge-coefficient: there is no viscosity of water here, which the Reynolds number needs\n  give the coefficient as a number")]
    [InlineData(2, "flowduct nozzle --fluid steam --inlet \"p0=9 bar, x=1\" --throat \"d=18 mm\" --back \"p=1 bar\" --onset 3%", "--onset: at equilibrium no phase is held that could give way\n  add --expansion supersaturated or --expansion single-phase")]
    [InlineData(2, "flowduct nozzle --fluid steam --inlet \"p0=9 bar, x=1\" --throat \"d=18 mm\" --back \"p=1 bar\" --expansion supersaturated --onset 6%", "--onset: a moisture of 0.06 is beyond the end of the equation for supersaturated vapour, 0.05 (IAPWS R7-97(2012), Eq. (18))\n  give a smaller one, or leave it out to hold the vapour to that end")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --exit \"p=5 bar\" --expansion supersaturated", "--expansion: a held phase is solved for a nozzle with --back or --throat\n  add --back, for example --back \"p=1 bar\"")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --path 2", "--path: 2 is not a whole number from 3 to 10000\n  write for example --path 21")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --exit \"p=5 bar\" --path 9", "--path: the states along a nozzle need its sections and the back pressure\n  give --throat or --exit with A or d, and --back")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --path 9 --show \"rho, q\"", "--show: q is no quantity of a section\n  write for example rho, w, h, p0, p/p0, T/T0, rho/rho0, A/At")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --path 9 --show \"rho, p\"", "--show: p stands in the table already\n  leave it out")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --show rho", "--show: it chooses columns of the states along a nozzle, and none are asked for\n  add --path, for example --path 21")]
    [InlineData(2, "flowduct diffuser --fluid air --inlet \"p=1 bar, T=300 K, V=50 m/s, d=100 mm\" --exit \"d=150 mm\" --length \"1 m\" --included-angle \"8 deg\"", "--included-angle: the length and the sections fix it\n  leave --included-angle or --length out, or the exit section")]
    [InlineData(2, "flowduct diffuser --fluid air --inlet \"p=1 bar, T=300 K, V=50 m/s, d=100 mm\" --exit \"d=150 mm\" --loss-coefficient idelchick --included-angle \"8 deg\"", "--loss-coefficient: idelchick is not one of a number, idelchik, gibson, crane, best-planar, sudden-expansion\n  did you mean idelchik?")]
    [InlineData(2, "flowduct diffuser --fluid air --inlet \"p=1 bar, T=300 K, V=50 m/s, d=100 mm\" --exit \"d=150 mm\" --loss-coefficient idelchik", "--loss-coefficient: an estimate needs the form of the diffuser\n  give sections of inlet and exit, and --length or --included-angle")]
    [InlineData(2, "flowduct diffuser --fluid air --inlet \"p=1 bar, T=300 K, V=50 m/s, d=100 mm\" --exit \"d=150 mm\" --throat \"d=90 mm\"", "--throat: a subsonic diffuser has none; a nozzle before a diffuser is a venturi\n  leave it out, or use flowduct venturi")]
    [InlineData(2, "flowduct venturi --fluid air --inlet \"p=6 bar, T=40 degC, d=100 mm\" --throat \"d=60 mm\" --exit \"d=100 mm\"", "--throat: nothing says how much flows\n  give one of the throat's pressure (p or dp), --flow, --back")]
    [InlineData(3, "flowduct diffuser --fluid air --inlet \"p=0.3 bar, T=250 K, M=2, d=300 mm\" --exit \"d=450 mm\" --throat \"d=260 mm\"", "--throat: with 0.7511 of the inlet area the stream does not start by itself: behind a normal shock at the inlet it needs 0.8219 (Kantrowitz and Donaldson, NACA ACR L5D20, 1945)\n  give a wider throat, or leave it out to let the shock stand at the inlet")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --format csv", "--format: csv holds the states along a nozzle, and none are asked for\n  add --path, for example --path 21")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --wall nowhere.csv", "--wall: nowhere.csv could not be read: there is no such file\n  check the name")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --find back.p", "--find: nothing says what the figure has to reach\n  add --target, for example --target \"shock.area_ratio=1.5\"")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --target \"exit.V=200 m/s\"", "--target: a target needs the figure that may move\n  add --find, for example --find back.p")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --find bck.p --target \"exit.V=200 m/s\"", "--find: bck.p is no figure of a case\n  write for example inlet.p0, back.p, exit.d, throat.d, efficiency, flow")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --find back.p --target \"exit.W=200 m/s\"", "--target: exit.W is no result\n  write for example mass_flow, exit.V, shock.area_ratio, throat.p")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --find back.p --target \"exit.V=200\"", "--target: exit.V=200 has no unit; write for example exit.V=200 m/s")]
    [InlineData(3, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --find back.p --target \"mass_flow=5 kg/s\"", "--target: mass_flow reaches 0.08056 kg/s to 0.4651 kg/s, whatever back.p is\n  give a target between, or find another figure")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"p=1 bar\" --find back.p --target \"exit.V=200 m/s\"", "--find: back.p is given too\n  leave it out of the case, or find another figure")]
    [InlineData(3, "flowduct nozzle --fluid air --inlet \"p=8 bar, T=313 K, d=10 mm\" --throat \"d=18 mm\" --back \"p=1 bar\"", "--inlet: the inlet section passes less than the throat: it would choke first\n  check the bores of inlet and throat")]
    [InlineData(3, "flowduct nozzle --fluid air --inlet \"p=8 bar, T=313 K, V=600 m/s\" --throat \"d=18 mm\" --back \"p=1 bar\"", "--inlet: the inlet is faster than sound: a nozzle given by its sections is rated from a subsonic inlet\n  give a slower inlet")]
    [InlineData(3, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --back \"dp=9 bar\"", "--back: the pressure would be -1 bar absolute, and no fluid has that\n  give a smaller pressure drop")]
    [InlineData(3, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --exit \"dp=9 bar\"", "--exit: the pressure would be -1 bar absolute, and no fluid has that\n  give a smaller pressure drop")]
    [InlineData(2, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --exit \"d=25 mm, p=2 bar, dp=1 bar\"", "--exit: the back pressure is given more than once\n  keep one of p, dp, rise, p/p0, p/p1")]
    [InlineData(3, "flowduct nozzle --fluid air --inlet \"p0=8 bar, T0=313 K\" --throat \"d=18 mm\" --exit \"d=25 mm\" --find back.p --target \"shock.area_ratio=1.5\" --branch 2", "--branch: there is no value 2 of back.p: one alone meets the target\n  leave it out")]
    public void A_wrong_input_is_met_by_its_message(int status, string line, string message)
    {
        CommandRun run = CommandRun.RunLine(line);
        Assert.Equal("flowduct: " + message + "\n", run.Error);
        Assert.Equal(status, run.Status);
        Assert.Equal(string.Empty, run.Output);
        Assert.InRange(run.Error.Split('\n').Length - 1, 1, 4);
    }

    [Fact]
    public void An_output_that_cannot_be_written_is_status_4()
    {
        CommandRun run = CommandRun.RunLine("flowduct fluids-nowhere");
        Assert.Equal(2, run.Status);
        run = CommandRun.Run("state", "--fluid", "air", "--at", "p=1 bar, T=300 K", "--output", Path.Combine(Path.GetTempPath(), "no-such-folder-here", "x.txt"));
        Assert.Equal(4, run.Status);
        Assert.Equal(string.Empty, run.Output);
        Assert.Contains("could not be written", run.Error, StringComparison.Ordinal);
    }
}
