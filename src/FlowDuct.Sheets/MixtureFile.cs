using System.Text;
using CsvHelper;
using FlowDuct.Errors;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Quantities;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets;

/// <summary>Mixtures under names of the user's own: a small CSV with the columns name, composition and, if need be, fractions.</summary>
internal static class MixtureFile
{
    private const string Heading = "name,composition,fractions";

    /// <summary>Reads the mixtures of a file.</summary>
    /// <param name="file">The file as typed, for refusals.</param>
    /// <param name="content">Its content.</param>
    /// <exception cref="FlowDuctException">A row that is not understood; kind NotUnderstood, with file, row and column.</exception>
    internal static IReadOnlyDictionary<string, Fluid> Read(string file, Stream content)
    {
        (SheetDialect dialect, Stream rest) = SheetStart.Read(content, file, false);
        using var reader = CsvReader.Create(rest, RecordSource.Options(dialect.Separator), leaveOpen: true);
        Dictionary<string, Fluid> mixtures = [];
        try
        {
            if (!reader.Read() || !(Heading == Line(reader) || Heading.StartsWith(Line(reader) + ",", StringComparison.Ordinal) && reader.FieldCount == 2))
                throw Refuse(file, "the heading is not name,composition or name,composition,fractions", "write for example flue-gas,\"N2=0.72,CO2=0.13,H2O=0.15\"");
            int columns = reader.FieldCount;
            for (int row = 1; reader.Read(); row++) Add(mixtures, $"{file} row {row}", reader, columns);
        }
        catch (CsvFormatException)
        {
            throw Refuse(file, "a quote stands where none can stand, or is never closed", "put quotes around the whole composition");
        }

        return mixtures.Count > 0 ? mixtures : throw Refuse(file, "it holds no mixture", "write for example flue-gas,\"N2=0.72,CO2=0.13,H2O=0.15\"");
    }

    private static void Add(Dictionary<string, Fluid> mixtures, string row, CsvReader reader, int columns)
    {
        if (reader.FieldCount != columns) throw Refuse(row, $"the row has {reader.FieldCount} cells, the heading {columns}", "put quotes around the composition");
        string name = Cell(reader, 0);
        if (name.Length == 0 || GasMixtureParser.IsMixture(name)) throw Refuse($"{row}, name", "it is no name", "write a word such as flue-gas");
        if (FluidCatalogue.Words.Contains(name)) throw Refuse($"{row}, name", $"{Echo.Ascii(name)} is a fluid already", "choose another name");
        FractionBasis basis = columns < 3 || Cell(reader, 2) is "" or "mole" ? FractionBasis.Mole
            : Cell(reader, 2) == "mass" ? FractionBasis.Mass : throw Refuse($"{row}, fractions", $"{Echo.Ascii(Cell(reader, 2))} is not one of mole, mass", string.Empty);
        string composition = Cell(reader, 1);
        if (!GasMixtureParser.IsMixture(composition)) throw Refuse($"{row}, composition", $"{Echo.Ascii(composition)} is no composition", "write for example \"N2=0.72,CO2=0.13,H2O=0.15\"");
        if (!mixtures.TryAdd(name, GasMixtureParser.Parse($"{row}, composition", composition, basis).Gas)) throw Refuse($"{row}, name", $"{Echo.Ascii(name)} stands there already", "give each mixture one row");
    }

    private static string Cell(CsvReader reader, int index) => Encoding.UTF8.GetString(reader.GetSpan(index)).Trim();

    private static string Line(CsvReader reader) => string.Join(',', Enumerable.Range(0, reader.FieldCount).Select(index => Cell(reader, index)));

    private static FlowDuctException Refuse(string place, string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, place, reason, next));
}
