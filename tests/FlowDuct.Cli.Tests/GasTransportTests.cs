using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Transport properties of gases in the answer of a property question.</summary>
public class GasTransportTests
{
    [Fact]
    public void Air_answers_viscosity_conductivity_and_Prandtl_number()
    {
        // 18.523 uPa.s and 26.3529 mW/(m.K) at zero density and 300 K: Lemmon, Jacobsen, Int. J. Thermophys. 25 (2004) 21.
        CommandRun run = CommandRun.RunLine("flowduct state --fluid air --at \"p=1 bar, T=300 K\" --digits 5");
        Assert.Matches(@"dynamic viscosity +mu +18\.523 uPa\.s\n", run.Output);
        Assert.Matches(@"thermal conductivity +lambda +26\.353 mW/\(m\.K\)\n", run.Output);
        Assert.Contains("Prandtl number", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Outside_its_fit_a_gas_answers_without_them()
    {
        CommandRun run = CommandRun.RunLine("flowduct state --fluid H2O --at \"p=1 bar, T=270 K\"");
        Assert.Equal(0, run.Status);
        Assert.DoesNotContain("viscosity", run.Output, StringComparison.Ordinal);
    }
}
