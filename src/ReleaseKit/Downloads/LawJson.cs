using System.Text.Json;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>The noise law of one draw: its name and parameters as mechanisms.json has them, each with the number of its row.</summary>
internal static class LawJson
{
    /// <summary>Writes "law": the law that all draws share; null without draws, or where they differ (then each draw's own figure has its law).</summary>
    public static void Write(Utf8JsonWriter json, Table table, IReadOnlyList<BaseDraw> draws)
    {
        json.WritePropertyName("law");
        if (draws.Count == 0 || draws.Skip(1).Any(draw => !IsAlike(table, draws[0], draw)))
            json.WriteNullValue();
        else
            WriteLaw(json, table, draws[0]);
    }

    /// <summary>The name of a law in files: "discrete-gaussian".</summary>
    public static string NameOf(LawName law) => JsonNamingPolicy.KebabCaseLower.ConvertName(law.ToString());

    private static void WriteLaw(Utf8JsonWriter json, Table table, BaseDraw draw)
    {
        json.WriteStartObject();
        json.WriteString("name", NameOf(draw.Mechanism.Law));
        foreach (var (key, given) in Parameters(draw.Mechanism))
            json.WriteNumberOrNull(key, NumberOf(given, table, draw.Row));
        if (draw.Mechanism.Law == LawName.Tabulated)
            json.WriteString("file", DownloadNames.Law(draw.Mechanism)[DownloadNames.Folder.Length..]);
        if (IsOnLattice(draw.Mechanism.Law))
            json.WriteNumberOrNull("grid", draw.Mechanism.Grid);
        json.WriteEndObject();
    }

    private static bool IsAlike(Table table, BaseDraw one, BaseDraw other) => one.Mechanism.Id == other.Mechanism.Id
        && Parameters(one.Mechanism).All(pair => NumberOf(pair.Value, table, one.Row) == NumberOf(pair.Value, table, other.Row));

    // In the order of the alphabet, so that the same release gives the same bytes; the grid has its own place.
    private static IEnumerable<KeyValuePair<string, NumberOrColumn>> Parameters(Mechanism mechanism) =>
        mechanism.Parameters.Where(pair => pair.Key != "grid").OrderBy(pair => pair.Key, StringComparer.Ordinal);

    private static double NumberOf(NumberOrColumn given, Table table, int row) =>
        given.Number ?? table.SideColumns.First(side => side.Column == given.Column).Numbers[row];

    private static bool IsOnLattice(LawName law) =>
        law is LawName.DiscreteLaplace or LawName.DiscreteGaussian or LawName.DiscreteUniform or LawName.TruncatedDiscreteLaplace or LawName.Tabulated;
}
