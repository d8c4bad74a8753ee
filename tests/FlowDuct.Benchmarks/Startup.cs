using System.Diagnostics;

namespace FlowDuct.Benchmarks;

/// <summary>Wall-clock time of whole processes. Commands take turns, so that a busy moment of the machine hits all of them.</summary>
internal static class Startup
{
    private const int WarmUps = 5;

    internal static int Run(string[] args)
    {
        Arguments arguments = Arguments.Parse(args, defaultRuns: 101);
        if (arguments.Output is null || arguments.Rest.Count == 0)
        {
            Console.Error.WriteLine("startup needs --output FILE (children inherit the terminal; send it to /dev/null) and a command");
            return 2;
        }

        string[][] commands = [.. arguments.Rest.Select(Words)];
        double[][] times = [.. commands.Select(_ => new double[arguments.Runs])];
        for (int round = -WarmUps; round < arguments.Runs; round++)
        {
            for (int turn = 0; turn < commands.Length; turn++)
            {
                int i = (turn + round + WarmUps) % commands.Length; // each command goes first equally often
                double ms = Time(commands[i]);
                if (round >= 0)
                    times[i][round] = ms;
            }
        }

        Write(arguments, times);
        return 0;
    }

    private static double Time(string[] command)
    {
        ProcessStartInfo start = new(command[0], command.Skip(1)) { UseShellExecute = false };
        long began = Stopwatch.GetTimestamp();
        using Process process = Process.Start(start) ?? throw new InvalidOperationException($"{command[0]} did not start");
        process.WaitForExit();
        double ms = Stopwatch.GetElapsedTime(began).TotalMilliseconds;
        return process.ExitCode == 0 ? ms : throw new InvalidOperationException($"{command[0]} ended with {process.ExitCode}");
    }

    private static void Write(Arguments arguments, double[][] times)
    {
        Report report = new();
        report.Note($"whole process, start to exit, {arguments.Runs} interleaved rounds; ratio: median over rounds of time over baseline");
        report.Row("command", "median_ms", "p10_ms", "p90_ms", "ratio_to_first");
        for (int i = 0; i < times.Length; i++)
        {
            double ratio = Sample.Median(times[i].Zip(times[0], (own, baseline) => own / baseline));
            report.Row(
                arguments.Rest[i], Ms(times[i], 0.5), Ms(times[i], 0.1), Ms(times[i], 0.9), Math.Round(ratio, 2));
        }

        report.Write(arguments.Output);
    }

    private static double Ms(double[] times, double share) => Math.Round(Sample.Quantile(times, share), 3);

    // Words part at blanks; double quotes hold a word together.
    private static string[] Words(string command) =>
        [.. command.Split('"').SelectMany((part, i) => i % 2 == 1 ? [part] : part.Split(' ', StringSplitOptions.RemoveEmptyEntries))];
}
