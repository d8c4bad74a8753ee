using FlowDuct.Benchmarks;

return args switch
{
    ["kernels", .. string[] rest] => Kernels.Run(rest),
    ["backward", .. string[] rest] => Backward.Run(rest),
    ["water", .. string[] rest] => Water.Run(rest),
    ["nozzles", .. string[] rest] => Nozzles.Run(rest),
    ["startup", .. string[] rest] => Startup.Run(rest),
    _ => Usage(),
};

static int Usage()
{
    Console.Error.WriteLine("""
        Timings of FlowDuct; results are CSV with the machine and the versions on top.
          kernels [--output FILE]                              ns per property call, one thread
          backward [--output FILE]                             ns per call of the supplementary water equations
          water [--output FILE]                                water beside a multiply-add loop and python3-iapws, as ratios
          nozzles [--output FILE]                              nozzle solves a second, states and bytes a solve
          startup [--runs N] --output FILE COMMAND [COMMAND]   whole processes, interleaved; the first command is the baseline
        Quote ratios from one run, never absolute times from two.
        """);
    return 2;
}
