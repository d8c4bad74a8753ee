using System.Globalization;
using System.Text.Json;
using FlowDuct.Cli.CommandLine;
using FlowDuct.Quantities;
using FlowDuct.Sheets;
using FlowDuct.Sheets.Batch;
using Xunit;

namespace FlowDuct.Cli.Tests;

/// <summary>The command run: its answers are those of single commands, its statuses those that are documented.</summary>
public class BatchTests
{
    private const string Heading = "tag,device,fluid,inlet.p [bar(a)],inlet.T [degC],inlet.V [m/s],exit.p [bar(a)],efficiency [%]\n";
    private const string Good = "N-1,nozzle,steam,9,230,25,3.2,96\n";
    private const string Impossible = "N-2,nozzle,steam,9,230,25,3.2,\n";
    private const string Unsolved = "N-3,nozzle,steam,9,230,25,12,96\n";
    private const string NotUnderstood = "N-4,nozzle,steam,9,230,25,3.2,130\n";

    /// <summary>A row of a sheet and the command that asks the same.</summary>
    public static TheoryData<string, string, string, string> Twins() => new()
    {
        { "inlet.p [bar(a)],inlet.T [degC],inlet.V [m/s],exit.p [bar(a)],efficiency [%]", "9,230,25,3.2,96", "nozzle --fluid steam", "--inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar\" --efficiency 96%" },
        { "inlet.p [bar(a)],inlet.T [degC],inlet.V [m/s],exit.p [bar(a)],exit.V [m/s]", "9,230,25,3.2,600", "nozzle --fluid steam", "--inlet \"p=9 bar, T=230 degC, V=25 m/s\" --exit \"p=3.2 bar, V=600 m/s\"" },
        { "inlet.p0 [barg],inlet.T0 [degC],exit.p [barg],ambient.p [bar],flow [Nm3/h]", "7,40,0.2,0.98,900", "nozzle --fluid air", "--inlet \"p0=7 barg, T0=40 degC\" --exit \"p=0.2 barg\" --ambient \"p=0.98 bar\" --flow \"900 Nm3/h\"" },
        { "inlet.p0 [bar(a)],inlet.T0 [degC],throat.d [mm],exit.d [mm],back.p [bar(a)],efficiency [%]", "9,230,18,25,5,96", "nozzle --fluid steam", "--inlet \"p0=9 bar, T0=230 degC\" --throat \"d=18 mm\" --exit \"d=25 mm\" --back \"p=5 bar\" --efficiency 96%" },
        { "inlet.p [psi(a)],inlet.T [degF],inlet.V [ft/s],exit.V [ft/s],recovery", "14.2,70,540,120,0.72", "diffuser --fluid air", "--inlet \"p=14.2 psi, T=70 degF, V=540 ft/s\" --exit \"V=120 ft/s\" --recovery 0.72" },
        { "inlet.p0 [bar(a)],inlet.moisture [%],exit.p/p0,flow [kg/s]", "12,2,0.35,1.4", "nozzle --fluid steam", "--inlet \"p0=12 bar, moisture=2%\" --exit \"p/p0=0.35\" --flow \"1.4 kg/s\"" },
        { "inlet.p0 [bar(a)],inlet.T0 [degC],throat.d [mm],back.p [bar(a)],expansion,onset [K]", "6,165,18,1.1,supersaturated,30", "nozzle --fluid steam", "--inlet \"p0=6 bar, T0=165 degC\" --throat \"d=18 mm\" --back \"p=1.1 bar\" --expansion supersaturated --onset \"30 K\"" },
        { "inlet.p [bar(a)],inlet.T [K],inlet.V [m/s],exit.p [bar(a)],exit.T [K],heat-loss [kW],flow [kg/s]", "5,300,60,4.8,295,5,2", "nozzle --fluid N2", "--inlet \"p=5 bar, T=300 K, V=60 m/s\" --exit \"p=4.8 bar, T=295 K\" --heat-loss \"5 kW\" --flow \"2 kg/s\"" },
        { "inlet.p [bar(a)],inlet.T [degC],inlet.d [mm],throat.d [mm],throat.dp [kPa],exit.d [mm],loss-coefficient,included-angle [deg]", "6,40,100,60,25,100,idelchik,8", "venturi --fluid air", "--inlet \"p=6 bar, T=40 degC, d=100 mm\" --throat \"d=60 mm, dp=25 kPa\" --exit \"d=100 mm\" --loss-coefficient idelchik --included-angle \"8 deg\"" },
        { "inlet.p [bar(a)],inlet.T [degC],inlet.V [m/s],inlet.rect [mm],exit.rect,length [mm],loss-coefficient", "1,20,90,600x400,900x400 mm,1200,best-planar", "diffuser --fluid air", "--inlet \"p=1 bar, T=20 degC, V=90 m/s, rect=600x400 mm\" --exit \"rect=900x400 mm\" --length \"1200 mm\" --loss-coefficient best-planar" },
        { "inlet.p0 [barg],inlet.T0 [degC],exit.p [barg],flow [scfm],reference-state", "7,40,0.2,300,\"T=60 degF, p=14.696 psi\"", "nozzle --fluid air", "--inlet \"p0=7 barg, T0=40 degC\" --exit \"p=0.2 barg\" --flow \"300 scfm\" --reference-state \"T=60 degF, p=14.696 psi\"" },
        { "inlet.p [bar(a)],inlet.T [degC],inlet.humidity [%],exit.p [bar(a)],flow [Nm3/h]", "1.2,30,60,1.1,900 Nm3/h dry", "nozzle --fluid humid-air", "--inlet \"p=1.2 bar, T=30 degC, humidity=60%\" --exit \"p=1.1 bar\" --flow \"900 Nm3/h dry\"" },
        { "inlet.p [bar(a)],inlet.T [degC],exit.p [bar(a)],equation-of-state", "80,40,50,reference", "nozzle --fluid nitrogen", "--inlet \"p=80 bar, T=40 degC\" --exit \"p=50 bar\" --equation-of-state reference" },
        { "inlet.p [barg],inlet.T [degC],inlet.V [m/s],exit.rise [mbar],ambient.altitude [m]", "0.02,20,90,30,1500", "diffuser --fluid air", "--inlet \"p=0.02 barg, T=20 degC, V=90 m/s\" --exit \"rise=30 mbar\" --ambient \"altitude=1500 m\"" },
    };

    [Theory]
    [MemberData(nameof(Twins))]
    public void A_row_is_answered_as_the_single_command(string headings, string cells, string device, string options)
    {
        CommandRun single = CommandRun.RunLine($"flowduct {device} {options} --format json");
        string[] words = device.Split(' ');
        string sheet = $"device,fluid,{headings}\n{words[0]},{words[2]},{cells}\n";
        string[] names = ["exit.p", "exit.T", "exit.V", "exit.s", "exit.p0", "inlet.h", "throat.p", "mass_flow", "isentropic_efficiency", "loss_coefficient", "recovery", "critical_pressure_ratio"];
        CommandRun row = CommandRun.RunOn(sheet, "run", "-", "--digits", "15", "--show", "exit.p [Pa], exit.T [K], exit.V [m/s], exit.s [J/(kg.K)], exit.p0 [Pa], inlet.h [J/kg], throat.p [Pa], mass_flow [kg/s], isentropic_efficiency, loss_coefficient, recovery, critical_pressure_ratio");
        string[] results = row.Output.Split('\n')[1].Split(',')[^(names.Length + 3)..];
        using var answer = JsonDocument.Parse(single.Output);
        for (int i = 0; i < names.Length; i++) Assert.Equal(Figure(answer.RootElement, names[i]), results[i]);
        Assert.Equal(string.Join(' ', answer.RootElement.GetProperty("findings").EnumerateArray().Select(finding => finding.GetProperty("code").GetString())), results[^1]);
        Assert.Equal(single.Status, row.Status);
    }

    // One path for all rows, one that leaves the exit's stagnation state out: what both give is the same.
    [Theory]
    [MemberData(nameof(Twins))]
    public void What_is_asked_for_changes_no_figure(string headings, string cells, string device, string options)
    {
        Assert.NotEmpty(options);
        string[] words = device.Split(' ');
        string sheet = $"device,fluid,{headings}\n{words[0]},{words[2]},{cells}\n";
        string few = CommandRun.RunOn(sheet, "run", "-", "--digits", "15", "--show", "exit.T, exit.V, isentropic_efficiency, mass_flow").Output;
        string more = CommandRun.RunOn(sheet, "run", "-", "--digits", "15", "--show", "exit.T, exit.V, isentropic_efficiency, mass_flow, exit.p0").Output;
        string[] left = few.Split('\n')[1].Split(','), right = more.Split('\n')[1].Split(',');
        Assert.Equal(left[..^3], right[..^4]);
        Assert.Equal(left[^3..], right[^3..]);
    }

    // Sheets know what a device takes without the command line; both tables say the same.
    [Fact]
    public void A_sheet_takes_of_a_device_what_its_command_takes()
    {
        (SheetDevice Device, CommandName Command)[] devices =
            [(SheetDevice.Nozzle, CommandName.Nozzle), (SheetDevice.Diffuser, CommandName.Diffuser), (SheetDevice.Venturi, CommandName.Venturi), (SheetDevice.State, CommandName.State)];
        foreach ((SheetDevice device, CommandName command) in devices)
        {
            string[] options = [.. OptionTable.Of(command).Select(row => row.Name)];
            foreach (CaseOption option in Enum.GetValues<CaseOption>())
                Assert.True(options.Contains("--" + QuantityCatalogue.Of(option).Word) == DeviceColumns.Takes(device, option), $"{device} {option}");
            foreach ((ChoiceColumn choice, string name, _) in ChoiceWords.All)
                Assert.True(options.Contains("--" + name) == DeviceColumns.Takes(device, choice), $"{device} {name}");
            foreach (StationLists list in new[] { StationLists.Inlet, StationLists.Throat, StationLists.Exit, StationLists.Back, StationLists.At })
                Assert.True(options.Contains("--" + StationWords.Of(list)) == DeviceColumns.Takes(device, list), $"{device} {list}");
        }
    }

    [Theory]
    [InlineData(0, Good)]
    [InlineData(1, Good + "N-5,nozzle,steam,9,230,25,3.2,\n", "--strict")]
    [InlineData(3, Good + Unsolved)]
    [InlineData(2, Good + NotUnderstood)]
    [InlineData(2, Unsolved + NotUnderstood + Impossible)]
    [InlineData(2, Good + "N-1,nozzle\n")]
    public void The_gravest_row_decides_the_status(int status, string rows, params string[] options) =>
        Assert.Equal(status, CommandRun.RunOn(Heading + rows, ["run", "-", .. options]).Status);

    [Fact]
    public void Figures_that_cannot_be_end_with_1() =>
        Assert.Equal(1, CommandRun.RunOn("device,fluid,inlet.p [bar(a)],inlet.T [degC],inlet.V [m/s],exit.p [bar(a)],exit.V [m/s]\nnozzle,steam,9,230,25,3.2,700\n", "run", "-").Status);

    [Fact]
    public void The_default_results_are_approved()
    {
        CommandRun run = CommandRun.RunOn(Heading + Good + Unsolved, "run", "-");
        Assert.Equal(
            Heading.TrimEnd() + ",calc regime,calc exit.p [bar(a)],calc exit.T [degC],calc exit.x,calc exit.V [m/s],calc exit.M,calc mass_flow [kg/s],calc area_ratio,calc isentropic_efficiency,calc recovery,row,status,findings\n"
            + "N-1,nozzle,steam,9,230,25,3.2,96,fully-expanded,3.2,135.74,0.9895342,629.0049,1.385365,,0.09036432,0.96,,1,ok,wet-exit choked\n"
            + "N-3,nozzle,steam,9,230,25,12,96,,,,,,,,,,,2,\"exit: p=12 bar is not below the stagnation pressure at the inlet, 9.0126 bar: nothing drives the flow; give an exit pressure below it\",\n",
            run.Output);
        Assert.Equal(
            "flowduct: standard input: 1 of 2 rows have no answer; the first is row 2, line 3: exit: p=12 bar is not below the stagnation pressure at the inlet, 9.0126 bar: nothing drives the flow; give an exit pressure below it\n",
            run.Error);
    }

    [Fact]
    public void Lines_of_json_are_answers_with_their_row()
    {
        CommandRun run = CommandRun.RunOn(Heading + Good + Unsolved + NotUnderstood, "run", "-", "--format", "jsonl", "--quiet");
        JsonElement[] lines = [.. run.Output.TrimEnd('\n').Split('\n').Select(line => JsonDocument.Parse(line).RootElement)];
        Assert.Equal(["pass", "unsolved", "unsolved"], lines.Select(line => line.GetProperty("verdict").GetString()));
        Assert.Equal([1, 2, 3], lines.Select(line => line.GetProperty("row").GetInt32()));
        Assert.Equal(["N-1", "N-3", "N-4"], lines.Select(line => line.GetProperty("case").GetProperty("tag").GetString()));
        Assert.Equal(["no-answer", "not-understood"], lines[1..].Select(line => line.GetProperty("error").GetProperty("kind").GetString()));
        Assert.Equal(string.Empty, run.Error);
    }

    [Theory]
    [InlineData("1/1", 3)]
    [InlineData("2/2", 1)]
    [InlineData("4/4", 0)]
    public void One_json_array_holds_the_answers_of_a_share(string share, int count)
    {
        CommandRun run = CommandRun.RunOn(Heading + Good + Unsolved + NotUnderstood, "run", "-", "--format", "json", "--quiet", "--shard", share);
        Assert.Equal(count, JsonDocument.Parse(run.Output).RootElement.GetArrayLength());
    }

    [Theory]
    [InlineData("run", "no sheet is named")]
    [InlineData("run a.csv b.csv", "b.csv belongs to no option")]
    [InlineData("run no/such.csv", "no/such.csv could not be read: its folder does not exist")]
    [InlineData("run nosuch.csv", "nosuch.csv could not be read: there is no such file")]
    [InlineData("run - --jobs 0", "--jobs: 0 is not a whole number from 1 to 1024")]
    [InlineData("run - --shard 3/2", "--shard: 3/2 is no share i/n with i from 1 to n")]
    [InlineData("run - --resume", "--resume: there is no file to go on with")]
    [InlineData("run - --format xml", "--format: xml is not one of csv, jsonl, json")]
    [InlineData("run - --show exit.Q", "--show: exit.Q is no result")]
    [InlineData("run - --decimal", "--decimal: has no value")]
    [InlineData("run - --show --jobs", "--show: has no value")]
    [InlineData("run - --fluid air", "--fluid is not an option of run")]
    [InlineData("run @cases", "@cases could not be read")]
    [InlineData("run [cases]", "[cases] could not be read")]
    public void A_slip_is_status_2_with_nothing_on_stdout(string line, string message)
    {
        CommandRun run = CommandRun.RunOn(Heading + Good, line.Split(' '));
        Assert.Equal(2, run.Status);
        Assert.Equal(string.Empty, run.Output);
        Assert.StartsWith("flowduct: " + message, run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_is_written_whole_or_not_at_all()
    {
        string folder = Directory.CreateTempSubdirectory("flowduct").FullName, file = Path.Combine(folder, "results.csv");
        try
        {
            CommandRun ragged = CommandRun.RunOn(Heading + Good + "N-1,nozzle\n", "run", "-", "--output", file);
            Assert.Equal(2, ragged.Status);
            Assert.Empty(Directory.GetFiles(folder));
            CommandRun whole = CommandRun.RunOn(Heading + Good, "run", "-", "--output", file);
            Assert.Equal(0, whole.Status);
            Assert.Equal(CommandRun.RunOn(Heading + Good, "run", "-").Output, File.ReadAllText(file));
            Assert.Equal([file], Directory.GetFiles(folder));
            Assert.Equal(4, CommandRun.RunOn(Heading + Good, "run", "-", "--output", Path.Combine(folder, "no", "such.csv")).Status);
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    [Fact]
    public void A_column_that_is_nearly_known_is_told()
    {
        CommandRun run = CommandRun.RunOn("device,fluid,at.p [bar(a)],at.T [degC],Tag\nstate,air,1,20,N-1\n", "run", "-");
        Assert.Equal(0, run.Status);
        Assert.Equal("flowduct: standard input: column \"Tag\" goes through unread; if it should be read, its name is tag\n", run.Error);
    }

    [Fact]
    public void A_full_disk_is_status_4()
    {
        using var full = new FullStream();
        using var error = new MemoryStream();
        Assert.Equal(4, Application.Run(["run", "-"], full, error, false, () => new MemoryStream(System.Text.Encoding.UTF8.GetBytes(Heading + Good))));
    }

    private static string Figure(JsonElement answer, string name)
    {
        string[] path = name.Split('.');
        JsonElement at = path.Length == 1 ? answer.GetProperty("performance") : answer.GetProperty("stations").GetProperty(path[0]);
        if (at.ValueKind == JsonValueKind.Null) return string.Empty;
        JsonElement value = at.GetProperty(path[^1]);
        return value.ValueKind == JsonValueKind.Null ? string.Empty : NumberFormatter.Shortest(double.Parse(value.GetRawText(), CultureInfo.InvariantCulture), 15);
    }

    private sealed class FullStream : MemoryStream
    {
        public override void Write(ReadOnlySpan<byte> buffer) => throw new IOException("No space left on device");
    }
}
