using FlowDuct.Errors;
using FlowDuct.Quantities;

namespace FlowDuct.Sheets;

/// <summary>Which results a run writes.</summary>
internal static class ResultSet
{
    private static readonly string[] s_ofDevices = ["regime", "exit.p", "exit.T", "exit.x", "exit.V", "exit.M", "mass_flow", "area_ratio", "isentropic_efficiency", "recovery"];
    private static readonly string[] s_ofStates = ["at.p", "at.T", "at.x", "at.h", "at.s", "at.rho"];

    /// <summary>The set for a sheet that asks about devices, states or both.</summary>
    internal static IReadOnlyList<ResultColumn> Default(IReadOnlyList<SheetColumn> columns, DisplayText units)
    {
        bool states = columns.Any(column => column.List == StationLists.At);
        bool devices = !states || columns.Any(column => column.Kind == ColumnKind.Figure && column.List is not (StationLists.At or StationLists.Ambient));
        IEnumerable<string> names = (devices ? s_ofDevices : []).Concat(states ? s_ofStates : []);
        return [.. names.Select(name => ResultColumn.Parse(name, name, units))];
    }

    /// <summary>Reads a list such as "exit.T [degC], regime, mass_flow [kg/h]".</summary>
    /// <exception cref="FlowDuctException">One of them is no result, or stands there twice; kind NotUnderstood.</exception>
    internal static IReadOnlyList<ResultColumn> Parse(string list, DisplayText units)
    {
        List<ResultColumn> results = [];
        foreach (string piece in list.Split(',', StringSplitOptions.TrimEntries))
        {
            ResultColumn result = OfPiece(piece, units);
            if (results.Exists(earlier => earlier.Title == result.Title)) throw Refuse($"{Echo.Ascii(piece)} stands there twice", "keep one of them");
            results.Add(result);
        }

        return results;
    }

    private static ResultColumn OfPiece(string piece, DisplayText units)
    {
        try
        {
            return ResultColumn.Parse(piece, piece, units);
        }
        catch (FlowDuctException refused)
        {
            throw Refuse(refused.Refusal.Reason, refused.Refusal.NextStep);
        }
    }

    private static FlowDuctException Refuse(string reason, string next) => new(new Refusal(RefusalKind.NotUnderstood, "--show", reason, next));
}
