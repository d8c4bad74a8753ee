using System.Globalization;
using CsCheck;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;

namespace FlowDuct.Core.Tests.Fluids.Gases.Reference;

/// <summary>The reference equations of state by name, and states of them that are the same on every run.</summary>
internal static class Equations
{
    internal static readonly HelmholtzFluid[] All = [ReferenceEquations.Nitrogen, ReferenceEquations.CarbonDioxide, ReferenceEquations.Air];

    internal static HelmholtzFluid Of(string fluid) => fluid switch
    {
        "Nitrogen" or "N2" or "nitrogen" => ReferenceEquations.Nitrogen,
        "CarbonDioxide" or "CO2" or "carbon-dioxide" => ReferenceEquations.CarbonDioxide,
        _ => ReferenceEquations.Air,
    };

    internal static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    /// <summary>States of one phase anywhere in the range, around the critical point, and within a part of 1e-4 of it.</summary>
    internal static Gen<FluidState> OnePhase(HelmholtzFluid fluid)
    {
        EquationParameters range = fluid.Equation.Parameters;
        (double Tc, double pc) = (fluid.Boundary.Tc, fluid.Boundary.pc);
        Gen<(double p, double T)> anywhere = Gen.Select(Gen.Double[0, Math.Log(range.pMost)], Gen.Double[range.Tleast, range.Tmost]).Select((lnp, T) => (Math.Exp(lnp), T));
        Gen<(double p, double T)> Around(double width) => Gen.Select(Gen.Double[-width, width], Gen.Double[-width, width]).Select((a, b) => (pc * (1 + a), Tc * (1 + b)));
        return Gen.OneOf(anywhere, Around(0.3), Around(0.01), Around(1e-4)).Select(pair => At(fluid, pair.p, pair.T)).Where(at => at.Phase != Phase.None);
    }

    /// <summary>Wet states from the triple point to 0.01 K below the critical one.</summary>
    internal static Gen<FluidState> Wet(HelmholtzFluid fluid) => Gen.Select(Gen.Double[fluid.Equation.Parameters.Tleast, fluid.Boundary.Tc - 0.01], Gen.Double[0.001, 0.999]).Select((T, x) =>
    {
        fluid.FromTX(T, x, out FluidState at);
        return at;
    });

    // No state, where the range or the lines of air end.
    internal static FluidState At(HelmholtzFluid fluid, double p, double T) => fluid.FromPT(p, T, out FluidState at) == Outcome.Ok ? at : default;
}
