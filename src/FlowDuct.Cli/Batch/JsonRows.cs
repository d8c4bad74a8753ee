using System.Text;
using System.Text.Json;
using FlowDuct.Cli.Rendering;
using FlowDuct.Devices;
using FlowDuct.Errors;
using FlowDuct.Findings;
using FlowDuct.Sheets.Batch;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Cli.Batch;

/// <summary>Results as JSON: the answers of single commands, one to the line, with the row, the tag and the case.</summary>
/// <param name="lines">True for lines of their own, false for one array.</param>
/// <param name="options">How answers are shown.</param>
internal sealed class JsonRows(bool lines, RenderOptions options) : RowRenderer
{
    internal override void Begin(ByteSink to)
    {
        if (!lines) to.Write((byte)'[');
    }

    internal override void Row(ByteSink to, in RowPlace row, in RowAnswer answer, IReadOnlyList<Finding> findings, RowVerdict verdict)
    {
        if (!lines) to.Write(row.IsFirst ? "\n"u8 : ",\n"u8);
        using var memory = new MemoryStream(4096);
        RenderOptions ofRow = options with { Row = new JsonRow(row.Number, Text(row.Tag), Text(row.Case)) };
        if (answer.Device is DeviceAnswer device) JsonAnswer.Write(memory, device, null, ofRow);
        else if (answer.State is StateAnswer state) StateJson.Write(memory, state, ofRow);
        else Unsolved(memory, answer, ofRow.Row!);
        ReadOnlySpan<byte> bytes = memory.GetBuffer().AsSpan(0, (int)memory.Length);
        to.Write(lines ? bytes : bytes.TrimEnd((byte)'\n'));
    }

    internal override void End(ByteSink to)
    {
        if (!lines) to.Write("\n]\n"u8);
    }

    private static string? Text(ReadOnlySpan<byte> cell) => cell.IsEmpty ? null : Encoding.UTF8.GetString(cell);

    private static void Unsolved(MemoryStream to, in RowAnswer answer, JsonRow row)
    {
        using var json = new Utf8JsonWriter(to);
        json.WriteStartObject();
        JsonHead.WriteTool(json, "unsolved", row);
        json.WriteStartObject("case");
        JsonHead.WriteName(json, row);
        json.WriteEndObject();
        json.WriteStartObject("error");
        json.WriteString("kind", KindWord(answer));
        json.WriteString("place", answer.Refusal?.Place);
        json.WriteString("reason", answer.Refusal?.Reason ?? answer.Defect!.GetType().Name);
        json.WriteString("next", answer.Refusal?.NextStep);
        json.WriteEndObject();
        json.WriteEndObject();
        json.Flush();
        to.WriteByte((byte)'\n');
    }

    private static string KindWord(in RowAnswer answer) => answer.Refusal?.Kind switch
    {
        null => "defect",
        RefusalKind.NoAnswer => "no-answer",
        _ => "not-understood",
    };
}
