using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Every command of the README answers what the README shows, and its two commands are the ones that CI calls.</summary>
public class ReadmeTests
{
    private static readonly string s_root = Root();

    public static TheoryData<string, string> Commands()
    {
        var rows = new TheoryData<string, string>();
        foreach ((string command, string output) in Blocks(File.ReadAllText(Path.Combine(s_root, "README.md")))) rows.Add(command, output);
        return rows;
    }

    [Theory]
    [MemberData(nameof(Commands))]
    public void A_command_answers_what_is_shown(string command, string shown)
    {
        CommandRun run = CommandRun.RunLine(command);
        Assert.Equal(shown, run.Output + run.Error);
    }

    [Fact]
    public void The_first_screen_shows_a_command_and_there_are_several() => Assert.InRange(Commands().Count, 5, 50);

    [Fact]
    public void Continuous_integration_calls_the_test_command_of_the_readme()
    {
        Assert.Contains("\ndotnet test\n", File.ReadAllText(Path.Combine(s_root, "README.md")), StringComparison.Ordinal);
        Assert.Contains("    dotnet test 2>&1", File.ReadAllText(Path.Combine(s_root, ".ci", "run")), StringComparison.Ordinal);
    }

    [Fact]
    public void The_command_that_runs_from_source_is_an_example_that_answers()
    {
        const string Start = "dotnet run --project src/FlowDuct.Cli -- ";
        string line = File.ReadLines(Path.Combine(s_root, "README.md")).First(text => text.StartsWith(Start, StringComparison.Ordinal));
        Assert.Equal(0, CommandRun.RunLine("flowduct " + line[Start.Length..]).Status);
    }

    private static IEnumerable<(string Command, string Output)> Blocks(string text)
    {
        string[] lines = text.ReplaceLineEndings("\n").Split('\n');
        for (int i = 0; i < lines.Length; i++)
        {
            if (lines[i] != "```console") continue;
            string command = lines[++i][2..], output = string.Empty;
            while (lines[++i] != "```") output += lines[i] + "\n";
            yield return (command, output);
        }
    }

    private static string Root()
    {
        DirectoryInfo? folder = new(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "FlowDuct.sln"))) folder = folder.Parent;
        return folder?.FullName ?? throw new DirectoryNotFoundException("FlowDuct.sln is in no folder above the tests");
    }
}
