using FlowDuct.Cli.Rendering;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;

namespace FlowDuct.Cli.CommandLine;

/// <summary>The lists of fluids and units.</summary>
internal static class Listings
{
    // As many as every double keeps.
    private const int Digits = 15;

    internal static void Fluids(TextWriter to)
    {
        foreach (FluidName row in FluidCatalogue.Names)
        {
            Fluid fluid = row.Fluid();
            to.WriteLine(row.Name);
            TextWrap.Write(to, "  what        ", row.Description, 14);
            TextWrap.Write(to, "  properties  ", fluid.Formulation, 14);
            TextWrap.Write(to, "  range       ", fluid.RangeText, 14);
            if (ReferenceEquations.Find(row.Name) is HelmholtzFluid real) TextWrap.Write(to, "  reference   ", $"--equation-of-state reference: {real.Source}, {real.RangeText}", 14);
        }
    }

    internal static void Units(TextWriter to, IReadOnlyList<string> words)
    {
        Dimension[] all = [.. Enum.GetValues<Dimension>().Where(dimension => UnitTable.RowsOf(dimension) == dimension)];
        Dimension[] chosen = words.Count == 0 ? all : [.. all.Where(dimension => Heading(dimension).Contains(string.Join(' ', words), StringComparison.Ordinal))];
        if (chosen.Length == 0)
        {
            throw Usage.Refuse("units", $"{Echo.Ascii(string.Join(' ', words))} is no kind of quantity", $"write one of {string.Join(", ", all.Select(Heading))}");
        }

        foreach (Dimension dimension in chosen) Kind(to, dimension);
    }

    // In a sentence it is "a ratio"; a heading goes without the article.
    private static string Heading(Dimension dimension) => DimensionWords.Of(dimension) is var words && words.StartsWith("a ", StringComparison.Ordinal) ? words[2..] : words;

    private static void Kind(TextWriter to, Dimension dimension)
    {
        to.WriteLine($"{Heading(dimension)}, SI {DimensionWords.SiUnit(dimension)}");
        foreach (Unit unit in UnitTable.All)
        {
            if (unit.Dimension != dimension) continue;
            string factor = NumberFormatter.Shortest(unit.Factor, Digits);
            string offset = unit.Offset == 0 ? string.Empty : $" after adding {NumberFormatter.Shortest(unit.Offset, Digits)}";
            TextWrap.Write(to, $"  {unit.Spelling,-14}", $" {factor}{offset} ({unit.Source})", 17);
        }
    }
}
