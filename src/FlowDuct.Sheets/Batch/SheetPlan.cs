using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets.Batch;

/// <summary>A heading, compiled once: which cell goes where, in the order in which cells are read.</summary>
internal sealed class SheetPlan
{
    private SheetPlan(IReadOnlyList<SheetColumn> columns, byte decimalMark)
    {
        Columns = columns;
        Tag = IndexOf(ColumnKind.Tag);
        Case = IndexOf(ColumnKind.Case);
        Device = IndexOf(ColumnKind.Device);
        Fluid = IndexOf(ColumnKind.Fluid);
        Basis = IndexOf(ColumnKind.PressureBasis);
        ReferenceState = IndexOf(ColumnKind.ReferenceState);
        FigureCell[] figures = [.. Of(ColumnKind.Figure).Select(index => new FigureCell(columns[index], index, decimalMark))];
        Ambient = [.. figures.Where(figure => figure.Column.List == StationLists.Ambient)];
        Stations = [.. figures.Where(figure => figure.Column.List is not (StationLists.Ambient or StationLists.None))];
        Options = [.. figures.Where(figure => figure.Column.List == StationLists.None).OrderBy(figure => figure.Slot)];
        Choices = [.. Of(ColumnKind.Choice)];
    }

    /// <summary>Every column, in the order of the sheet.</summary>
    internal IReadOnlyList<SheetColumn> Columns { get; }

    /// <summary>Mixtures of the user's own, by name.</summary>
    internal IReadOnlyDictionary<string, Fluids.Fluid> Mixtures { get; init; } = new Dictionary<string, Fluids.Fluid>();

    /// <summary>Which cell holds the tag, and so on; -1 where there is no such column.</summary>
    internal int Tag { get; }

    internal int Case { get; }

    internal int Device { get; }

    internal int Fluid { get; }

    internal int Basis { get; }

    internal int ReferenceState { get; }

    internal FigureCell[] Ambient { get; }

    internal FigureCell[] Stations { get; }

    /// <summary>In the order of the catalogue, in which the flow stands before the heat.</summary>
    internal FigureCell[] Options { get; }

    internal int[] Choices { get; }

    /// <summary>Columns that go through although their name is near one that is known.</summary>
    internal IEnumerable<(string Heading, string Near)> NearMisses =>
        from column in Columns
        where column.Kind == ColumnKind.PassThrough
        let near = NearOf(column.Heading.Trim())
        where near is not null
        select (column.Heading.Trim(), near);

    /// <summary>Compiles a heading.</summary>
    /// <param name="headings">The headings, unquoted.</param>
    /// <param name="decimalMark">Of the numbers in cells.</param>
    /// <param name="file">The file and the line of the heading, for refusals.</param>
    /// <param name="mixtures">Mixtures of the user's own, by name; null where there are none.</param>
    /// <exception cref="FlowDuctException">A heading that is not understood; kind NotUnderstood.</exception>
    internal static SheetPlan Compile(IReadOnlyList<string> headings, byte decimalMark, string file, IReadOnlyDictionary<string, Fluids.Fluid>? mixtures = null)
    {
        List<SheetColumn> columns = [];
        for (int i = 0; i < headings.Count; i++)
        {
            int index = i;
            columns.Add(At(file, i, () => Accept(headings[index], columns)));
        }

        var plan = new SheetPlan(columns, decimalMark) { Mixtures = mixtures ?? new Dictionary<string, Fluids.Fluid>() };
        for (int i = 0; i < columns.Count && plan.Basis < 0; i++)
        {
            SheetColumn column = columns[i];
            _ = At(file, i, () => column.NeedsBasis ? throw HeadingRefusals.NoBasis(column.Heading, column.Unit!.Value) : column);
        }

        return Complete(plan, file);
    }

    /// <summary>Refuses a sheet that holds the names that results take.</summary>
    internal void RequireFree(IReadOnlyCollection<string> titles, string file)
    {
        for (int i = 0; i < Columns.Count; i++)
        {
            string heading = Columns[i].Heading;
            _ = At(file, i, () => titles.Contains(heading.Trim()) ? throw HeadingRefusals.Result(heading) : Columns[0]);
        }
    }

    private static SheetColumn At(string file, int index, Func<SheetColumn> read)
    {
        try
        {
            return read();
        }
        catch (FlowDuctException refused)
        {
            Refusal refusal = refused.Refusal;
            throw new FlowDuctException(refusal with { Place = $"{file}, column {index + 1}, {refusal.Place.Replace("column ", string.Empty, StringComparison.Ordinal)}" });
        }
    }

    private static SheetColumn Accept(string heading, List<SheetColumn> columns)
    {
        var column = SheetColumn.Parse(heading);
        int twin = columns.FindIndex(earlier => AreSame(earlier, column));
        return twin < 0 ? column : throw HeadingRefusals.Twice(heading, twin + 1);
    }

    // inlet.p [bar(a)] and inlet.pressure [psig] are one figure under two names.
    private static bool AreSame(SheetColumn a, SheetColumn b)
    {
        if (a.Heading.Trim() == b.Heading.Trim()) return true;
        if (a.Kind != b.Kind) return false;
        return a.Kind switch
        {
            ColumnKind.Figure => a.List == b.List && ReferenceEquals(a.Row, b.Row),
            ColumnKind.Choice => a.Choice == b.Choice,
            ColumnKind.PassThrough => false,
            _ => a.Stated == b.Stated,
        };
    }

    private static SheetPlan Complete(SheetPlan plan, string file)
    {
        try
        {
            if (plan.Device < 0) throw HeadingRefusals.Missing("device", "nozzle");
            if (plan.Fluid < 0) throw HeadingRefusals.Missing("fluid", "steam");
        }
        catch (FlowDuctException refused)
        {
            throw new FlowDuctException(refused.Refusal with { Place = $"{file}, {refused.Refusal.Place}" });
        }

        return plan;
    }

    private int IndexOf(ColumnKind kind) => Of(kind).Append(-1).First();

    private IEnumerable<int> Of(ColumnKind kind) => Enumerable.Range(0, Columns.Count).Where(index => Columns[index].Kind == kind);

    private static string? NearOf(string heading)
    {
        string word = heading.Replace('_', '-').ToLowerInvariant();
        IEnumerable<string> known = ["tag", "case", "device", "fluid", "pressure-basis", "reference-state", "waiver", .. ChoiceWords.All.Select(row => row.Name), .. QuantityCatalogue.Options.Select(row => row.Word)];
        return word.Length >= 3 && Slips.NearestWord(word, known) is string near && (near == word || word.Length >= 5) ? near : null;
    }
}
