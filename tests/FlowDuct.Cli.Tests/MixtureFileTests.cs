using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>Mixtures under names of the user's own.</summary>
public sealed class MixtureFileTests : IDisposable
{
    private const string At = "p=1 bar, T=400 degC";

    private readonly string _file = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName() + ".csv");

    public void Dispose() => File.Delete(_file);

    // The name stands for its composition, on the command line, in a sheet and in a sweep.
    [Theory]
    [InlineData("name,composition\nstack,\"N2=0.72,CO2=0.13,H2O=0.15\"\n", "N2=0.72,CO2=0.13,H2O=0.15", "mole")]
    [InlineData("name,composition,fractions\nother,\"N2=1\",\nstack,\"CH4=0.9,C2H6=0.1\",mass\n", "CH4=0.9,C2H6=0.1", "mass")]
    public void A_name_stands_for_its_composition(string content, string composition, string basis)
    {
        File.WriteAllText(_file, content);
        CommandRun plain = CommandRun.Run("state", "--fluid", composition, "--fractions", basis, "--at", At);
        Assert.Equal(0, plain.Status);
        Assert.Equal(plain.Output, CommandRun.Run("state", "--fluid", "stack", "--mixtures", _file, "--at", At).Output);
    }

    [Theory]
    [InlineData("name;mixture\nstack;N2=1\n", ": the heading is not name,composition or name,composition,fractions\n  write for example flue-gas,\"N2=0.72,CO2=0.13,H2O=0.15\"")]
    [InlineData("name,composition\n", ": it holds no mixture\n  write for example flue-gas,\"N2=0.72,CO2=0.13,H2O=0.15\"")]
    [InlineData("name,composition\nair,\"N2=0.8,O2=0.2\"\n", " row 1, name: air is a fluid already\n  choose another name")]
    [InlineData("name,composition\nstack,N2=1\nstack,O2=1\n", " row 2, name: stack stands there already\n  give each mixture one row")]
    [InlineData("name,composition\nstack,nitrogen\n", " row 1, composition: nitrogen is no composition\n  write for example \"N2=0.72,CO2=0.13,H2O=0.15\"")]
    [InlineData("name,composition\nstack,N2=0.7,O2=0.3\n", " row 1: the row has 3 cells, the heading 2\n  put quotes around the composition")]
    [InlineData("name,composition,fractions\nstack,N2=1,volume\n", " row 1, fractions: volume is not one of mole, mass")]
    [InlineData("name,composition\nstack,\"N2=0.50,O2=0.30\"\n", " row 1, composition: the fractions add up to 0.8")]
    [InlineData("name,composition\n\"stack,N2=1\n", ": a quote stands where none can stand, or is never closed\n  put quotes around the whole composition")]
    public void A_file_that_is_none_is_met_by_its_message(string content, string message)
    {
        File.WriteAllText(_file, content);
        CommandRun run = CommandRun.Run("state", "--fluid", "stack", "--mixtures", _file, "--at", At);
        Assert.Equal((2, string.Empty), (run.Status, run.Output));
        Assert.StartsWith($"flowduct: {_file}{message}", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_name_is_known_where_its_file_is_given_only()
    {
        File.WriteAllText(_file, "name,composition\nstack,N2=1\n");
        Assert.Contains("stack is not a fluid of this version", CommandRun.Run("state", "--fluid", "stack", "--at", At).Error, StringComparison.Ordinal);
        Assert.Contains("says what the fractions of stack", CommandRun.Run("state", "--fluid", "stack", "--mixtures", _file, "--fractions", "mass", "--at", At).Error, StringComparison.Ordinal);
        Assert.Contains("there is no such file", CommandRun.Run("state", "--fluid", "stack", "--mixtures", _file + "x", "--at", At).Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Rows_of_a_sheet_know_the_names_too()
    {
        File.WriteAllText(_file, "name,composition\nstack,\"N2=0.72,CO2=0.13,H2O=0.15\"\n");
        string sheet = Path.ChangeExtension(_file, ".sheet.csv");
        File.WriteAllText(sheet, "device,fluid,at.p [bar(a)],at.T [degC]\nstate,stack,1,400\nstate,\"N2=0.72,CO2=0.13,H2O=0.15\",1,400\n");
        try
        {
            string[] lines = CommandRun.Run("run", sheet, "--mixtures", _file, "--show", "at.rho").Output.Split('\n');
            Assert.Matches("^state,stack,1,400,[0-9.]+,1,ok,$", lines[1]);
            Assert.Equal(lines[1].Split(',')[4], lines[2].Split(',')[^4]);
        }
        finally
        {
            File.Delete(sheet);
        }
    }
}
