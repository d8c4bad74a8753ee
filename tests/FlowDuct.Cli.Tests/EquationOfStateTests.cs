using System.Text.Json;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Real gases on the command line.</summary>
public class EquationOfStateTests
{
    private const string At = " --at \"p=10 MPa, T=500 K\"";

    // Span et al. (2000) and Span, Wagner (1996) print 2.3024 mol/dm3 (64.498 kg/m3 with 28.01348 g/mol) and 113.07 kg/m3 at 500 K, 10 MPa.
    [Theory]
    [InlineData("nitrogen", 64.498, "Ref. Data 29 (2000) 1361", "63.151 K to 1000 K")]
    [InlineData("N2", 64.498, "Ref. Data 29 (2000) 1361", "up to 2200 MPa")]
    [InlineData("CO2", 113.07, "Ref. Data 25 (1996) 1509", "216.592 K to 1100 K")]
    public void The_reference_equation_answers_with_its_name_and_range(string fluid, double rho, string paper, string range)
    {
        CommandRun run = CommandRun.RunLine($"flowduct state --fluid {fluid} --equation-of-state reference --format json{At}");
        Assert.Equal(0, run.Status);
        using var json = JsonDocument.Parse(run.Output);
        Assert.Equal(rho, json.RootElement.GetProperty("stations").GetProperty("at").GetProperty("rho").GetDouble(), 3e-3);
        string method = json.RootElement.GetProperty("method").EnumerateObject().Single().Value.GetString()!;
        Assert.Contains(paper, method, StringComparison.Ordinal);
        Assert.Contains(range, method, StringComparison.Ordinal);
        Assert.Equal(0, json.RootElement.GetProperty("findings").GetArrayLength());
    }

    [Fact]
    public void Ideal_is_the_default_and_is_cautioned()
    {
        string plain = CommandRun.RunLine("flowduct state --fluid CO2" + At).Output;
        Assert.Equal(plain, CommandRun.RunLine("flowduct state --fluid CO2 --equation-of-state ideal" + At).Output);
        Assert.Contains("real-gas", plain, StringComparison.Ordinal);
        Assert.DoesNotContain("real-gas", CommandRun.RunLine("flowduct state --fluid CO2 --equation-of-state reference" + At).Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("argon --equation-of-state reference", 2, "--equation-of-state: argon has no reference equation of state here\n  leave it out for an ideal gas; air, nitrogen, carbon-dioxide have one")]
    [InlineData("N2=0.5,O2=0.5 --equation-of-state reference", 2, "--equation-of-state: N2=0.5,O2=0.5 has no reference equation of state here\n  leave it out for an ideal gas; air, nitrogen, carbon-dioxide have one")]
    [InlineData("water --equation-of-state reference", 2, "--equation-of-state: water has one equation of state here, IAPWS R7-97(2012)\n  leave it out")]
    [InlineData("air --equation-of-state real", 2, "--equation-of-state: real is not one of ideal, reference")]
    public void A_fluid_without_one_is_told_which_have(string fluid, int status, string message)
    {
        CommandRun run = CommandRun.RunLine($"flowduct state --fluid {fluid}{At}");
        Assert.Equal("flowduct: " + message + "\n", run.Error);
        Assert.Equal(status, run.Status);
    }

    [Theory]
    [InlineData("air", "p=30 bar, T=127 K", "dew line of air, J. Phys. Chem. Ref. Data 29 (2000) 331: between it and the bubble line")]
    [InlineData("air", "p=30 bar, x=0.5", "has no quality between its dew and bubble lines")]
    [InlineData("N2", "p=300 bar, T=65 K", "melting line at this pressure, J. Phys. Chem. Ref. Data 29 (2000) 1361")]
    [InlineData("CO2", "p=1 bar, T=200 K", "triple point, J. Phys. Chem. Ref. Data 25 (1996) 1509")]
    [InlineData("CO2", "p=80 bar, x=0.5", "the saturation line, J. Phys. Chem. Ref. Data 25 (1996) 1509")]
    public void A_state_outside_is_refused_with_its_limit(string fluid, string at, string words)
    {
        CommandRun run = CommandRun.RunLine($"flowduct state --fluid {fluid} --equation-of-state reference --at \"{at}\"");
        Assert.Equal(3, run.Status);
        Assert.Contains(words, run.Error, StringComparison.Ordinal);
    }

    // DIN 1343: a normal cubic metre is 44.615 mol of ideal gas (101325/(8.314463 x 273.15)), whatever the equation of state.
    [Fact]
    public void Normal_volumes_count_moles()
    {
        const string Nozzle = "flowduct nozzle --fluid CO2 --equation-of-state reference --inlet \"p0=60 bar, T0=60 degC\" --exit \"p=40 bar\" --format json --flow ";
        using var normal = JsonDocument.Parse(CommandRun.RunLine(Nozzle + "\"1000 Nm3/h\"").Output);
        double flow = normal.RootElement.GetProperty("performance").GetProperty("mass_flow").GetDouble();
        Assert.Equal(1000 * 44.615 * 0.0440098 / 3600, flow, 1e-5);
    }
}
