using System.Text.Encodings.Web;
using System.Text.Json;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>The account of the privacy loss for programs: the next release reads it as its predecessor's.</summary>
internal static class BudgetJson
{
    private static readonly JsonWriterOptions Options = new() { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    public static void Write(Stream stream, Release release, BudgetStatement budget)
    {
        using var json = new Utf8JsonWriter(stream, Options);
        json.WriteStartObject();
        WriteUnit(json, release);
        json.WriteString("neighbouring", JsonNamingPolicy.KebabCaseLower.ConvertName(release.Noise.Neighbouring.ToString()));
        WriteTotal(json, "authorised", budget.Promise);
        WriteTotal(json, "declared", budget.Declared);
        WriteTotal(json, "recomputed", budget.Recomputed);
        WriteTotal(json, "smallestBound", budget.SmallestBound);
        json.WriteStartArray("mechanisms");
        foreach (var account in budget.Mechanisms)
            WriteMechanism(json, release, account);
        json.WriteEndArray();
        json.WriteStartArray("earlier");
        json.WriteEndArray();
        json.WriteStartArray("exactFigures");
        foreach (var figures in budget.WithoutNoise.Where(figures => figures.Kind != WithoutNoiseKind.Public))
            WriteExact(json, release, figures);
        json.WriteEndArray();
        json.WriteEndObject();
        json.Flush();
        stream.Write("\n"u8);
    }

    private static void WriteUnit(Utf8JsonWriter json, Release release)
    {
        json.WriteStartObject("unitOfPrivacy");
        json.WriteString("who", release.Noise.Who.Key);
        if (release.Noise.Over is { } over)
            json.WriteString("over", over.In(release.MainLanguage));
        json.WriteEndObject();
    }

    private static void WriteTotal(Utf8JsonWriter json, string name, LossTotal? total)
    {
        if (total is null)
        {
            json.WriteNull(name);
            return;
        }
        json.WriteStartObject(name);
        WriteIfGiven(json, "epsilon", total.Epsilon);
        WriteIfGiven(json, "delta", total.Delta);
        WriteIfGiven(json, "rho", total.Rho);
        json.WriteString("rule", total.Rule.Key);
        json.WriteEndObject();
    }

    private static void WriteIfGiven(Utf8JsonWriter json, string name, double? number)
    {
        if (number is { } given)
            json.WriteNumberOrNull(name, given);
    }

    /// <summary>Figures that no total of this file covers: where they stand, how many, and why they carry no noise.</summary>
    private static void WriteExact(Utf8JsonWriter json, Release release, FiguresWithoutNoise figures)
    {
        json.WriteStartObject();
        json.WriteString("table", release.Tables[figures.Table].Id);
        if (figures.Column.Length > 0)
            json.WriteString(figures.Measure >= 0 ? "measure" : "column", figures.Column);
        json.WriteString("kind", JsonNamingPolicy.KebabCaseLower.ConvertName(figures.Kind.ToString()));
        json.WriteNumber("count", figures.Count);
        json.WriteString("reason", figures.Reason?.In(release.MainLanguage));
        json.WriteEndObject();
    }

    private static void WriteMechanism(Utf8JsonWriter json, Release release, MechanismAccount account)
    {
        json.WriteStartObject();
        json.WriteString("id", account.Mechanism.Id);
        json.WriteString("law", LawJson.NameOf(account.Mechanism.Law));
        WriteTotal(json, "declared", account.Declared);
        WriteTotal(json, "recomputed", account.Recomputed);
        json.WriteNumberOrNull("shareOfBudget", account.ShareOfSpent);
        json.WriteStartArray("tables");
        foreach (var table in account.Tables)
            json.WriteStringValue(release.Tables[table].Id);
        json.WriteEndArray();
        json.WriteEndObject();
    }
}
