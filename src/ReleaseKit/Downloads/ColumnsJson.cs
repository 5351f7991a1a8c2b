using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;
using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Pages;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Downloads;

/// <summary>
/// Describes every column of the CSV files of one table, as a group of tables in the vocabulary of CSV on the Web
/// (W3C Recommendations of 17 December 2015, Metadata Vocabulary for Tabular Data).
/// </summary>
internal sealed class ColumnsJson(Stream stream, SiteContext context) : IDisposable
{
    private static readonly JsonWriterOptions Options = new() { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };
    private readonly Utf8JsonWriter json = new(stream, Options);

    public void Write(Table table)
    {
        json.WriteStartObject();
        WriteContext();
        WriteAbout(table);
        json.WriteStartArray("tables");
        WriteWide(table, DownloadNames.Wide(table), context.Release.Coverages.Main, withReadings: true);
        WriteWide(table, DownloadNames.WideAt(table, context.Release.Coverages.Lower), context.Release.Coverages.Lower, withReadings: false);
        WriteWide(table, DownloadNames.WideAt(table, context.Release.Coverages.Upper), context.Release.Coverages.Upper, withReadings: false);
        WriteLong(table);
        json.WriteEndArray();
        json.WriteEndObject();
        json.Flush();
        stream.Write("\n"u8);
    }

    public void Dispose() => json.Dispose();

    private void WriteContext()
    {
        json.WriteStartArray("@context");
        json.WriteStringValue("http://www.w3.org/ns/csvw");
        json.WriteStartObject();
        json.WriteString("@language", context.Language.Tag);
        json.WriteEndObject();
        json.WriteEndArray();
    }

    private void WriteAbout(Table table)
    {
        var release = context.Release;
        json.WriteString("dc:title", context.In(table.Title));
        json.WriteString("dc:isPartOf", context.In(release.Title));
        json.WriteString("dc:publisher", release.Publisher.Name);
        json.WriteString("dc:issued", release.Published.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture));
        if (release.Licence is { } licence)
            json.WriteString("dc:license", licence.Url ?? licence.Name);
        if (table.Source is { } source)
            json.WriteString("dc:source", context.In(source));
    }

    private void WriteWide(Table table, string path, Coverage coverage, bool withReadings)
    {
        var share = context.Language.Share(coverage);
        WriteStartTable(path);
        foreach (var column in WideColumns.Of(table, withReadings))
            WriteColumn(column.Name, DatatypeOf(column), Describe(column, share));
        WriteEndTable(table.Stub.Select(column => column.Column));
    }

    private void WriteLong(Table table)
    {
        WriteStartTable(DownloadNames.Long(table));
        foreach (var column in LongColumn.Of(table))
            WriteColumn(column.Name, column.IsNumber ? "decimal" : "string", Describe(column));
        WriteEndTable(["address"]);
    }

    private void WriteStartTable(string path)
    {
        json.WriteStartObject();
        json.WriteString("url", path[DownloadNames.Folder.Length..]);
        json.WriteStartObject("tableSchema");
        json.WriteStartArray("columns");
    }

    private void WriteEndTable(IEnumerable<string> key)
    {
        json.WriteEndArray();
        json.WriteStartArray("primaryKey");
        foreach (var column in key)
            json.WriteStringValue(NameOf(column));
        json.WriteEndArray();
        json.WriteEndObject();
        json.WriteEndObject();
    }

    private void WriteColumn(string name, string datatype, string description)
    {
        json.WriteStartObject();
        json.WriteString("name", NameOf(name));
        json.WriteString("titles", SafeCell.Of(name));
        json.WriteString("datatype", datatype);
        json.WriteString("dc:description", description);
        json.WriteEndObject();
    }

    private string Describe(WideColumn column, string share)
    {
        var title = ("title", context.In(column.Title));
        var key = column.Kind.ToString().ToLowerInvariant();
        return column.Kind switch
        {
            ColumnKind.Value when column.Measure is { InOnes: true } => Say("value-in-ones", title),
            ColumnKind.Value => Say(key, title, ("unit", UnitOf(column.Measure))),
            ColumnKind.Margin or ColumnKind.Low or ColumnKind.High => Say(key, title, ("share", share)) + Given(column.Measure),
            _ => Say(key, title),
        };
    }

    /// <summary>Among which figures the coverage holds.</summary>
    private string Given(Measure? measure) => measure is not null && RangePromises.Of(measure) is var promise and not RangePromise.Every
        ? " " + Say("given" + PromiseKey.Of(promise))
        : "";

    private string Describe(LongColumn column) => column.Title is { } title ? Say("stub", ("title", context.In(title))) : Say("long." + column.Key);

    private string Say(string key, params (string Name, string Value)[] fill) => context.Language.Text("downloads.column." + key, fill);

    private string UnitOf(Measure? measure) => measure is null ? "" : context.Language.UnitOf(measure, new PublishedValue(2, 0));

    private static string DatatypeOf(WideColumn column) =>
        column.Kind is ColumnKind.Value or ColumnKind.Margin or ColumnKind.Low or ColumnKind.High ? "decimal" : "string";

    // Names are URI template variables there: letters, digits, underscores, points and percent-encoded bytes, no underscore first.
    private static string NameOf(string column)
    {
        var name = Uri.EscapeDataString(column).Replace("-", "%2D", StringComparison.Ordinal).Replace("~", "%7E", StringComparison.Ordinal);
        return name.StartsWith('_') ? "%5F" + name[1..] : name;
    }
}
