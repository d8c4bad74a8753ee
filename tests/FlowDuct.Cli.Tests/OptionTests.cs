using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>What counts as an option, a value and a word, where the parser's own habits would surprise.</summary>
public class OptionTests
{
    private const string Nozzle = "flowduct nozzle --fluid air --inlet \"p=5 bar, T=300 K, V=20 m/s\" --exit \"p=4 bar\"";

    [Theory]
    [InlineData(Nozzle + " --heat --fluid", "--heat: has no value\n  write for example --heat \"12 kJ/kg\"")]
    [InlineData("flowduct nozzle --fluid air --heat --inlet \"p=5 bar, T=300 K\"", "--heat: has no value\n  write for example --heat \"12 kJ/kg\"")]
    [InlineData(Nozzle + " --quiet false", "false belongs to no option\n  quote lists that hold spaces: --inlet \"p=9 bar, T=230 degC\"")]
    [InlineData(Nozzle + " --strict --strict", "--strict: is given twice\n  keep one of them")]
    [InlineData("flowduct nozzle [parse]", "[parse] belongs to no option\n  quote lists that hold spaces: --inlet \"p=9 bar, T=230 degC\"")]
    [InlineData("flowduct nozzle nozzle", "nozzle belongs to no option\n  quote lists that hold spaces: --inlet \"p=9 bar, T=230 degC\"")]
    [InlineData("flowduct nozzle @case.txt", "@case.txt belongs to no option\n  quote lists that hold spaces: --inlet \"p=9 bar, T=230 degC\"")]
    [InlineData("flowduct state --fluid @plant --at \"p=1 bar, T=300 K\"", "--fluid: @plant is not a fluid of this version\n  flowduct fluids lists them")]
    [InlineData("flowduct state --fluid [x] --at \"p=1 bar, T=300 K\"", "--fluid: [x] is not a fluid of this version\n  flowduct fluids lists them")]
    [InlineData("flowduct --hepl", "--hepl is not an option\n  did you mean --help?")]
    [InlineData("flowduct --fluid air", "--fluid comes before a command\n  begin with one of state, nozzle, diffuser, venturi, sweep, run, selfcheck, fluids, units")]
    [InlineData(Nozzle + " --chart \"p=1 bar\"", "--chart is not an option\n  flowduct nozzle --help lists the options")]
    [InlineData(Nozzle + " --effciency 90%", "--effciency is not an option\n  did you mean --efficiency?")]
    [InlineData(Nozzle + " -qs", "-qs is not an option\n  flowduct nozzle --help lists the options")]
    public void A_slip_is_status_2_with_nothing_on_stdout(string line, string message)
    {
        CommandRun run = CommandRun.RunLine(line);
        Assert.Equal("flowduct: " + message + "\n", run.Error);
        Assert.Equal(2, run.Status);
        Assert.Equal(string.Empty, run.Output);
    }

    [Theory]
    [InlineData("flowduct units [x]")]
    [InlineData("flowduct units units")]
    [InlineData("flowduct units [x] pressure")]
    public void A_word_in_front_is_read_and_not_dropped(string line)
    {
        CommandRun run = CommandRun.RunLine(line);
        Assert.Equal(2, run.Status);
        Assert.Contains("is no kind of quantity", run.Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("state")]
    [InlineData("nozzle")]
    [InlineData("diffuser")]
    [InlineData("fluids")]
    [InlineData("units")]
    public void Version_is_told_on_every_level(string command)
    {
        string told = CommandRun.Run("--version").Output;
        Assert.StartsWith("flowduct ", told, StringComparison.Ordinal);
        Assert.Equal(new CommandRun(0, told, string.Empty), CommandRun.Run(command, "--version"));
    }

    [Theory]
    [InlineData(false, "auto", null, false)]
    [InlineData(true, "auto", null, true)]
    [InlineData(true, "auto", "", true)]
    [InlineData(true, "auto", "1", false)]
    [InlineData(true, "never", null, false)]
    [InlineData(false, "always", null, true)]
    [InlineData(true, "always", "1", true)]
    public void Colour_follows_the_option_then_NO_COLOR_then_the_terminal(bool terminal, string option, string? noColor, bool coloured)
    {
        // From no-color.org: set and not empty means no colour; an option of the command line is the stronger wish.
        const string Wet = "flowduct nozzle --fluid steam --inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar\" --efficiency 96%";
        string? before = Environment.GetEnvironmentVariable("NO_COLOR");
        try
        {
            Environment.SetEnvironmentVariable("NO_COLOR", noColor);
            CommandRun run = CommandRun.Run(terminal, [.. CommandRun.Words(Wet).Skip(1), "--color", option]);
            Assert.Equal(coloured, run.Output.Contains('\u001b', StringComparison.Ordinal));
        }
        finally
        {
            Environment.SetEnvironmentVariable("NO_COLOR", before);
        }
    }
}
