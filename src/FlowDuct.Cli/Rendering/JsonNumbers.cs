using System.Text.Json;

namespace FlowDuct.Cli.Rendering;

/// <summary>Numbers of JSON answers: shortest digits that read back the same double; null where there is none.</summary>
internal static class JsonNumbers
{
    internal static void Write(Utf8JsonWriter json, string key, double? value)
    {
        if (value is double number) json.WriteNumber(key, number == 0 ? 0 : number);
        else json.WriteNull(key);
    }

    /// <summary>Options of every JSON writer here: indented by two, one line end everywhere, ASCII.</summary>
    internal static JsonWriterOptions Options => new() { Indented = true, NewLine = "\n" };

    /// <summary>The options of an answer: a row of a sheet takes one line.</summary>
    internal static JsonWriterOptions OptionsOf(RenderOptions options) => options.Row is null ? Options : default;
}
