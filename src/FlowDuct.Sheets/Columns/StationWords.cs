using FlowDuct.Quantities;

namespace FlowDuct.Sheets;

/// <summary>The words before the point of a heading.</summary>
internal static class StationWords
{
    private static readonly (string Word, StationLists List)[] s_all =
    [
        ("inlet", StationLists.Inlet), ("throat", StationLists.Throat), ("exit", StationLists.Exit), ("back", StationLists.Back),
        ("ambient", StationLists.Ambient), ("at", StationLists.At),
    ];

    /// <summary>Every word.</summary>
    internal static IEnumerable<string> All => s_all.Select(row => row.Word);

    /// <summary>The list of a word; None where it is no station.</summary>
    internal static StationLists Find(string word) => Array.Find(s_all, row => row.Word == word).List;

    /// <summary>The word of a list.</summary>
    internal static string Of(StationLists list) => Array.Find(s_all, row => row.List == list).Word;
}
