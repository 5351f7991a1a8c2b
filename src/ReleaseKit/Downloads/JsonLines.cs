using System.Buffers;
using System.Text.Encodings.Web;
using System.Text.Json;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>
/// A JSON object a line and figure: what the long CSV has, with all digits, and what it takes to work the margin out again or to add figures up:
/// the law of one draw, which draws the figure holds, and the steps after the noise.
/// </summary>
internal sealed class JsonLines : IRowFile
{
    private const int Flush = 1 << 16;
    private static readonly JsonWriterOptions Options = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };
    private readonly Stream stream;
    private readonly ArrayBufferWriter<byte> lines = new(2 * Flush);
    private readonly Utf8JsonWriter json;
    private readonly Table table;
    private readonly SumParts parts;

    public JsonLines(Stream stream, Table table)
    {
        (this.stream, this.table, parts) = (stream, table, new SumParts(table));
        json = new Utf8JsonWriter(lines, Options);
    }

    public void Add(int row, IReadOnlyList<AppraisedFigure> figures)
    {
        foreach (var figure in figures)
            AddLine(figure);
    }

    public void Dispose()
    {
        Drain();
        json.Dispose();
        stream.Dispose();
    }

    private void AddLine(AppraisedFigure figure)
    {
        json.Reset(lines);
        json.WriteStartObject();
        WriteName(figure);
        WriteNumbers(figure, figure.Main);
        WriteNoise(figure);
        json.WriteEndObject();
        json.Flush();
        lines.Write("\n"u8);
        if (lines.WrittenCount >= Flush)
            Drain();
    }

    private void WriteName(AppraisedFigure figure)
    {
        json.WriteString("address", figure.Address);
        json.WriteStartObject("stub");
        foreach (var column in table.Stub)
            json.WriteString(column.Column, column.LabelOf(figure.Row).Value);
        json.WriteEndObject();
        json.WriteString("figure", figure.Measure.Column);
    }

    private void WriteNumbers(AppraisedFigure figure, FigureRange? range)
    {
        json.WriteNumberOrNull("value", figure.HasNumber ? figure.Value.ToString() : null);
        json.WriteNumberOrNull("margin", range?.Margin);
        json.WriteNumberOrNull("noiseMargin", range?.Margin);
        json.WriteNumberOrNull("low", range?.Low);
        json.WriteNumberOrNull("high", range?.High);
        json.WriteNumberOrNull("uncutLow", range?.UncutLow);
        json.WriteNumberOrNull("uncutHigh", range?.UncutHigh);
        json.WriteNumberOrNull("coverage", range?.Attained);
        json.WriteString("reliability", ReliabilityWord.Of(figure.Reliability));
        json.WriteString("status", figure.Status.ToString());
        json.WriteNull("changed");
    }

    private void WriteNoise(AppraisedFigure figure)
    {
        IReadOnlyList<BaseDraw> draws = figure.Error is null ? [] : parts.Below(figure.Measure, figure.Row).Draws;
        LawJson.Write(json, table, draws);
        json.WriteStartArray("draws");
        foreach (var draw in draws)
            WriteDraw(FigureAddress.Canonical(table, figure.Measure, draw.Row));
        json.WriteEndArray();
        json.WriteStartArray("afterwards");
        foreach (var step in figure.Error?.Steps ?? [])
            AfterStepJson.Write(json, step);
        json.WriteEndArray();
    }

    // A draw is known by the address of the figure that it was drawn for.
    private void WriteDraw(string id)
    {
        json.WriteStartObject();
        json.WriteString("id", id);
        json.WriteNumber("times", 1);
        json.WriteEndObject();
    }

    private void Drain()
    {
        stream.Write(lines.WrittenSpan);
        lines.ResetWrittenCount();
    }
}
