using FlowDuct.Errors;

namespace FlowDuct.Sheets.Batch;

/// <summary>A refusal as one line of a sheet: options are columns there, so they lose their hyphens.</summary>
internal static class RefusalText
{
    internal static string Of(Refusal refusal) => WithoutHyphens(refusal.ToString().Replace("\n  ", "; ", StringComparison.Ordinal).Replace('\n', ' '));

    private static string WithoutHyphens(string text)
    {
        int at = 0;
        while ((at = text.IndexOf("--", at, StringComparison.Ordinal)) >= 0 && at + 2 < text.Length)
        {
            bool option = char.IsAsciiLetterLower(text[at + 2]) && (at == 0 || text[at - 1] is ' ' or '(');
            if (option) text = text.Remove(at, 2);
            else at += 2;
        }

        return text;
    }
}
