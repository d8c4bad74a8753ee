using FlowDuct.Core.Tests.Support;
using FlowDuct.Devices;
using FlowDuct.Devices.Inverse;
using FlowDuct.Errors;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;
using Xunit;

namespace FlowDuct.Core.Tests.Devices;

/// <summary>Questions asked backwards lead back to the case they were made from.</summary>
public class InverseQuestionTests
{
    private const string Inlet = "p0=8 bar, T0=313 K";

    [Theory]
    [InlineData("", "d=18 mm", "d=25 mm", "p=5 bar", "inlet.p0", "shock.area_ratio", 8e5, "T0=313 K")]
    [InlineData(Inlet, "d=18 mm", "d=25 mm", "", "back.p", "shock.area_ratio", 5e5, Inlet)]
    [InlineData(Inlet, "", "", "p=1 bar", "exit.d", "mass_flow", 0.018, Inlet)]
    public void A_result_of_a_known_case_finds_its_figure(
        string knownInlet, string throat, string exit, string back, string unknown, string target, double expected, string openInlet)
    {
        DeviceCase known = Cases.Rated(GasCatalogue.Air, knownInlet.Length > 0 ? knownInlet : Inlet, throat, unknown == "exit.d" ? "d=18 mm" : exit, back.Length > 0 ? back : "p=5 bar");
        ResultName result = ResultName.Find(target)!;
        double value = result.Read(DeviceSolver.Solve(known))!.Value;
        DeviceCase open = Cases.Rated(GasCatalogue.Air, openInlet, throat, exit, back);
        IReadOnlyList<(DeviceAnswer Answer, FoundFigure Found)> roots = new InverseQuestion(CaseSlot.Find(unknown)!, result, value).Solve(open);
        Assert.Single(roots);
        Assert.Equal(1, roots[0].Found.Value / expected, 1e-8);
        Assert.NotNull(roots[0].Found.Sensitivity);
    }

    // A choked flow is proportional to the stagnation pressure of an ideal gas: one per cent for one per cent.
    [Fact]
    public void Sensitivity_is_the_logarithmic_derivative()
    {
        DeviceCase open = Cases.Rated(GasCatalogue.Air, "T0=313 K", "d=18 mm", "", "p=1 bar");
        Assert.Equal(1, new InverseQuestion(CaseSlot.Find("inlet.p0")!, ResultName.Find("mass_flow")!, 0.4).Solve(open)[0].Found.Sensitivity!.Value, 1e-6);
    }

    // The subsonic and the supersonic section of one pressure ratio: a flux has two exit pressures.
    [Fact]
    public void All_roots_are_listed()
    {
        DeviceCase open = Cases.Nozzle(WaterFluid.Instance, "p0=9 bar, T0=500 K", "", (CaseOption.Flow, "1 kg/s"));
        IReadOnlyList<(DeviceAnswer Answer, FoundFigure Found)> roots = new InverseQuestion(CaseSlot.Find("exit.p")!, ResultName.Find("exit.A")!, 1e-3).Solve(open);
        Assert.Equal(2, roots.Count);
        Assert.True(roots[0].Answer.Exit.Mach > 1 && roots[1].Answer.Exit.Mach < 1);
    }

    [Fact]
    public void A_number_chooses_among_roots_and_one_beyond_them_is_refused()
    {
        DeviceCase open = Cases.Nozzle(WaterFluid.Instance, "p0=9 bar, T0=500 K", "", (CaseOption.Flow, "1 kg/s"));
        var question = new InverseQuestion(CaseSlot.Find("exit.p")!, ResultName.Find("exit.A")!, 1e-3);
        Assert.True(question.Answer(open, 1).Exit.Mach > 1);
        Assert.True(question.Answer(open, 2).Exit.Mach < 1);
        foreach (int? number in (int?[])[null, 0, 3])
            Assert.Equal(RefusalKind.NoAnswer, Assert.Throws<FlowDuctException>(() => question.Answer(open, number)).Refusal.Kind);
    }

    [Fact]
    public void A_target_out_of_reach_is_refused_with_what_is_reached()
    {
        DeviceCase open = Cases.Rated(GasCatalogue.Air, Inlet, "d=18 mm", "", "");
        FlowDuctException refused = Assert.Throws<FlowDuctException>(() => new InverseQuestion(CaseSlot.Find("back.p")!, ResultName.Find("mass_flow")!, 5).Solve(open));
        Assert.Equal(RefusalKind.NoAnswer, refused.Refusal.Kind);
    }

    [Fact]
    public void A_target_that_does_not_feel_the_figure_is_refused()
    {
        DeviceCase open = Cases.Rated(GasCatalogue.Air, Inlet, "d=18 mm", "", "");
        double choked = DeviceSolver.Solve(Cases.Rated(GasCatalogue.Air, Inlet, "d=18 mm", "", "p=1 bar")).Performance.MassFlow!.Value;
        Assert.Throws<FlowDuctException>(() => new InverseQuestion(CaseSlot.Find("back.p")!, ResultName.Find("mass_flow")!, choked).Solve(open));
    }

    [Theory]
    [InlineData("bck.p")]
    [InlineData("inlet.phase")]
    [InlineData("x")]
    public void An_unknown_figure_has_no_slot(string name) => Assert.Null(CaseSlot.Find(name));

    [Theory]
    [InlineData("regime")]
    [InlineData("exit.phase")]
    [InlineData("nothing")]
    public void A_word_is_no_target(string name) => Assert.Null(ResultName.Find(name));
}
