using CsCheck;

namespace FlowDuct.Core.Tests.Support;

/// <summary>Draws the same cases on every run, so that a red build can be repeated; FLOWDUCT_CAMPAIGN multiplies their number.</summary>
internal static class FixedSample
{
    private const uint Stream = 7;
    private const ulong Seed = 20_261_201;

    internal static void Each<T>(this Gen<T> gen, Action<T> check, int count)
    {
        var pcg = new PCG(Stream, Seed);
        string? campaign = Environment.GetEnvironmentVariable("FLOWDUCT_CAMPAIGN");
        long total = count * (long.TryParse(campaign, out long factor) ? factor : 1);
        for (long i = 0; i < total; i++) check(gen.Generate(pcg, null, out _));
    }

    internal static void Each<T1, T2, T3>(this Gen<(T1 First, T2 Second, T3 Third)> gen, Action<T1, T2, T3> check, int count) =>
        gen.Each(all => check(all.First, all.Second, all.Third), count);

    internal static void Each<T1, T2>(this Gen<(T1 First, T2 Second)> gen, Action<T1, T2> check, int count) =>
        gen.Each(pair => check(pair.First, pair.Second), count);
}
