using FlowDuct.Benchmarks;

return args switch
{
    ["kernels", .. string[] rest] => Kernels.Run(rest),
    ["startup", .. string[] rest] => Startup.Run(rest),
    _ => Usage(),
};

static int Usage()
{
    Console.Error.WriteLine("""
        Timings of FlowDuct; results are CSV with the machine and the versions on top.
          kernels [--output FILE]                              ns per property call, one thread
          startup [--runs N] --output FILE COMMAND [COMMAND]   whole processes, interleaved; the first command is the baseline
        Quote ratios from one run, never absolute times from two.
        """);
    return 2;
}
