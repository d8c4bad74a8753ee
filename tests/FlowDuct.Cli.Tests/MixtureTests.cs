using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Mixtures on the command line.</summary>
public class MixtureTests
{
    private const string At = " --at \"p=5 bar, T=800 K\"";

    [Fact]
    public void A_composition_is_a_fluid_of_every_answering_command()
    {
        CommandRun run = CommandRun.RunLine("flowduct nozzle --fluid \"N2=0.72,CO2=0.13,H2O=0.15\" --inlet \"p=5 bar, T=800 K, V=20 m/s\" --exit \"p=4 bar\"");
        Assert.Equal(0, run.Status);
        Assert.StartsWith("nozzle, N2=0.72,CO2=0.13,H2O=0.15\n", run.Output, StringComparison.Ordinal);
        Assert.Contains("records N2, CO2, H2O, ideal-gas", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Mole_is_the_default_basis_and_mass_another_answer()
    {
        const string Start = "flowduct state --fluid N2=0.5,He=0.5";
        string plain = CommandRun.RunLine(Start + At).Output;
        Assert.Equal(plain, CommandRun.RunLine(Start + At + " --fractions mole").Output);
        string mass = CommandRun.RunLine(Start + At + " --fractions mass").Output;
        Assert.StartsWith("state, N2=0.5,He=0.5 by mass\n", mass, StringComparison.Ordinal);
        Assert.NotEqual(plain, mass);
    }

    [Theory]
    [InlineData("flowduct state --fluid air --fractions mass" + At, "--fractions: air is no mixture and has no fractions\n  leave it out, or give --fluid such as N2=0.72,CO2=0.13,H2O=0.15")]
    [InlineData("flowduct state --fluid N2=1 --fractions volume" + At, "--fractions: volume is not one of mole, mass")]
    [InlineData("flowduct state --fluid N2=0.9,co=0.1" + At, "--fluid: co is not a gas of this version (case matters)\n  did you mean CO?")]
    [InlineData("flowduct state --fluid co2" + At, "--fluid: co2 is not a fluid of this version\n  did you mean CO2?")]
    public void A_slip_is_status_2(string line, string message)
    {
        CommandRun run = CommandRun.RunLine(line);
        Assert.Equal("flowduct: " + message + "\n", run.Error);
        Assert.Equal(2, run.Status);
    }
}
