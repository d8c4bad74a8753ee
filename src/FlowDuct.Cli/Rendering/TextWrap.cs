namespace FlowDuct.Cli.Rendering;

/// <summary>Breaks prose at spaces so that no line passes 80 columns.</summary>
internal static class TextWrap
{
    internal const int Width = 80;

    /// <summary>A space at which no line breaks; it is written as a space.</summary>
    internal const char Tie = '\u00a0';

    /// <summary>Writes a first prefix and prose, continued under the prose; a broken line may end with a mark.</summary>
    internal static void Write(TextWriter to, string prefix, string prose, int indent, string mark = "")
    {
        string line = prefix;
        bool empty = true;
        foreach (string word in prose.Split(' '))
        {
            if (!empty && line.Length + 1 + word.Length + mark.Length > Width)
            {
                to.WriteLine(line + mark);
                line = new string(' ', indent);
                empty = true;
            }

            line += (empty ? word : " " + word).Replace(Tie, ' ');
            empty = false;
        }

        to.WriteLine(line);
    }
}
