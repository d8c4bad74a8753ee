namespace FlowDuct.Quantities;

/// <summary>Slips of the pen in a unit: other spellings in use, wrong case, a letter too many.</summary>
internal static class Slips
{
    /// <summary>The listed spelling that another common spelling stands for, or null.</summary>
    public static string? Meant(string spelling, Dimension dimension) => (UnitTable.RowsOf(dimension), spelling) switch
    {
        (Dimension.Temperature, "C" or "c" or "\u00b0C" or "\u00baC" or "celsius" or "Celsius" or "\u2103") => "degC",
        (Dimension.Temperature, "F" or "f" or "\u00b0F" or "\u00baF" or "fahrenheit" or "Fahrenheit" or "\u2109") => "degF",
        (Dimension.Temperature, "R" or "\u00b0R" or "rankine" or "Rankine") => "degR",
        (Dimension.Temperature, "kelvin" or "Kelvin" or "degK" or "\u00b0K") => "K",
        (Dimension.Pressure, "kPag" or "kPaG") => "kPa(g)",
        (Dimension.Pressure, "kPaa" or "kPaA") => "kPa(a)",
        (Dimension.Pressure, "MPag" or "MPaG") => "MPa(g)",
        (Dimension.Pressure, "MPaa" or "MPaA") => "MPa(a)",
        (Dimension.Pressure, "mbarg") => "mbar(g)",
        (Dimension.Pressure, "mbara") => "mbar(a)",
        (Dimension.Pressure, "ata") => "at(a)",
        (Dimension.Pressure, "ate" or "atu" or "at\u00fc") => "at(g)",
        (Dimension.Pressure, "inwc" or "inWC" or "in.wc" or "inwg") => "inH2O(g)",
        (Dimension.Area, "sqin") => "in2",
        (Dimension.Area, "sqft") => "ft2",
        (Dimension.Area, "sqmm") => "mm2",
        (Dimension.Length, "\"" or "inch" or "inches") => "in",
        (Dimension.Length, "'" or "feet" or "foot") => "ft",
        (Dimension.Length, "micron" or "\u00b5m" or "\u03bcm") => "um",
        (Dimension.Velocity, "kt" or "kts" or "knots") => "kn",
        (Dimension.Velocity, "fps") => "ft/s",
        (Dimension.Velocity, "fpm") => "ft/min",
        (Dimension.Velocity, "kmh" or "kph") => "km/h",
        (Dimension.VolumeFlow or Dimension.MassFlow, "cfm") => "acfm",
        (Dimension.MassFlow, "pph" or "lbs/h" or "lb/hr" or "lbm/h") => "lb/h",
        (Dimension.MassFlow, "kg/hr") => "kg/h",
        (Dimension.MassFlow, "tph") => "t/h",
        (Dimension.Angle, "\u00b0") => "deg",
        _ => Rewritten(spelling),
    };

    /// <summary>Listed spellings nearest to a text: the same letters in another case, else the fewest edits.</summary>
    public static List<string> Nearest(string spelling, Dimension dimension)
    {
        List<string> near = [];
        int most = spelling.Length >= 5 ? 2 : 1;
        int best = most + 1;
        foreach (Unit unit in UnitTable.All)
        {
            if (unit.Dimension == UnitTable.RowsOf(dimension) && UnitTable.TryFind(unit.Spelling, dimension, out _))
                Keep(unit.Spelling, Distance(spelling, unit.Spelling), near, ref best);
        }

        return near;
    }

    /// <summary>The word at the least distance, if it is near enough to be a slip; null otherwise.</summary>
    public static string? NearestWord(string word, IEnumerable<string> words)
    {
        string? best = null;
        int least = Math.Max(1, word.Length / 3) + 1;
        foreach (string candidate in words)
        {
            int distance = Distance(word, candidate);
            if (candidate.StartsWith(word, StringComparison.Ordinal) && word.Length > 3) distance = 1;
            if (distance < least) (least, best) = (distance, candidate);
        }

        return best;
    }

    /// <summary>Edit distance; letters that differ in case only count nothing.</summary>
    public static int Distance(string a, string b)
    {
        int[] row = new int[b.Length + 1];
        for (int j = 0; j <= b.Length; j++)
            row[j] = j;
        for (int i = 1; i <= a.Length; i++)
            Advance(row, a[i - 1], i, b);
        return row[b.Length];
    }

    private static void Advance(int[] row, char letter, int i, string b)
    {
        int diagonal = row[0];
        row[0] = i;
        for (int j = 1; j <= b.Length; j++)
        {
            int change = diagonal + (char.ToUpperInvariant(letter) == char.ToUpperInvariant(b[j - 1]) ? 0 : 1);
            diagonal = row[j];
            row[j] = Math.Min(change, Math.Min(row[j], row[j - 1]) + 1);
        }
    }

    private static void Keep(string candidate, int distance, List<string> near, ref int best)
    {
        // One edit turns any one-letter unit into any other: such a guess would say nothing.
        if (distance > best || distance >= candidate.Length)
            return;
        if (distance < best)
            near.Clear();
        best = distance;
        near.Add(candidate);
    }

    /// <summary>Superscripts, middle dots, carets and blanks written the ASCII way.</summary>
    private static string? Rewritten(string spelling)
    {
        string ascii = spelling
            .Replace('\u00b2', '2').Replace('\u00b3', '3').Replace('\u00b7', '.').Replace('\u22c5', '.').Replace('*', '.')
            .Replace("^", string.Empty, StringComparison.Ordinal).Replace(" ", string.Empty, StringComparison.Ordinal)
            .Replace("\u2082", "2", StringComparison.Ordinal).Replace("kgK", "(kg.K)", StringComparison.Ordinal)
            .Replace("/kg.K", "/(kg.K)", StringComparison.Ordinal).Replace("/kg/K", "/(kg.K)", StringComparison.Ordinal)
            .Replace("((", "(", StringComparison.Ordinal).Replace("))", ")", StringComparison.Ordinal)
            .Replace("/hr", "/h", StringComparison.Ordinal).Replace("lbm", "lb", StringComparison.Ordinal);
        return ascii == spelling ? null : ascii;
    }
}
