using System.Globalization;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading;

/// <summary>Reads what release.json says once for the whole release. What is missing or wrong is reported and replaced, so that the rest can still be reviewed.</summary>
internal static class HeadReader
{
    private static readonly string[] Moments = ["yyyy-MM-dd'T'HH:mm:sszzz", "yyyy-MM-dd'T'HH:mmzzz", "yyyy-MM-dd'T'HH:mm:ss'Z'", "yyyy-MM-dd'T'HH:mm'Z'"];

    private static readonly Dictionary<string, EditionStatus> Statuses =
        Enum.GetValues<EditionStatus>().ToDictionary(status => status.ToString().ToLowerInvariant());

    public static ReleaseHead Read(ObjectReader keys) => new()
    {
        Title = keys.ReaderText("title") ?? ReaderText.Plain(keys.Context.Language, ""),
        Identifier = ReadIdentifier(keys),
        Lead = keys.ReaderText("lead"),
        Publisher = ReadPublisher(keys),
        Published = ReadPublished(keys),
        ReferencePeriod = ReadPeriod(keys, "referencePeriod", "\"2031-01-01/2031-12-31\""),
        Next = ReadPeriod(keys, "next", "\"2033-03\""),
        Address = ReadAddress(keys),
        Licence = ReadLicence(keys),
        Languages = ReadLanguages(keys),
        Coverages = ReadCoverages(keys),
        Reliability = ReadReliability(keys),
        Edition = ReadEdition(keys),
        Look = ReadLook(keys),
    };

    private static string ReadIdentifier(ObjectReader keys)
    {
        if (keys.Text("identifier") is not { } identifier)
            return "";
        if (!Slug.IsOne(identifier))
            keys.Context.Add(Mechanisms.MechanismProblems.BadId(keys.PlaceOf("identifier"), identifier, keys.Context.Owner));
        return identifier;
    }

    private static Publisher ReadPublisher(ObjectReader keys)
    {
        var publisher = keys.Object("publisher", ReleaseShapes.Publisher);
        return new Publisher(publisher?.Text("name") ?? "", publisher?.Text("contact") ?? "", publisher is null ? null : Link(publisher, "homepage"));
    }

    private static Licence? ReadLicence(ObjectReader keys)
    {
        if (!keys.Has("licence"))
            keys.Context.Add(ReleaseProblems.NoLicence(keys.At, keys.Context.Owner));
        return keys.Object("licence", ReleaseShapes.Licence) is { } licence && licence.Text("name") is { } name ? new Licence(name, Link(licence, "url")) : null;
    }

    private static string? Link(ObjectReader keys, string key) => keys.Find(key) is { } value ? Values.Link(value, key, keys.Context) : null;

    private static DateTimeOffset ReadPublished(ObjectReader keys)
    {
        if (keys.Text("published") is not { } text)
            return default;
        if (DateTimeOffset.TryParseExact(text, Moments, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal, out var moment))
            return moment;
        keys.Context.Add(KeyProblems.BadDate(
            (JsonText)keys.Find("published")!, "published", "moment with its distance from UTC", "\"2032-03-16T09:30:00+01:00\"", keys.Context.Owner));
        return default;
    }

    private static string? ReadPeriod(ObjectReader keys, string key, string paste)
    {
        if (keys.Text(key) is not { } text)
            return null;
        if (Periods.IsPeriod(text))
            return text;
        keys.Context.Add(KeyProblems.BadDate((JsonText)keys.Find(key)!, key, "ISO 8601 date or period", paste, keys.Context.Owner));
        return null;
    }

    private static string? ReadAddress(ObjectReader keys)
    {
        if (!keys.Has("address"))
            keys.Context.Add(ReleaseProblems.NoAddress(keys.At, keys.Context.Owner));
        return Link(keys, "address") is { } address ? (address.EndsWith('/') ? address : address + "/") : null;
    }

    private static IReadOnlyList<string> ReadLanguages(ObjectReader keys)
    {
        foreach (var value in keys.List("languages"))
            if (Values.Text(value, "languages", keys.Context) is { } tag && tag != keys.Context.Language)
                keys.Context.Add(ReleaseProblems.LanguageNotYet(value.At, tag, keys.Context.Owner));
        return [keys.Context.Language];
    }

    private static Coverages ReadCoverages(ObjectReader keys)
    {
        var said = keys.Object("coverage", ReleaseShapes.Coverage);
        var main = said?.Number("main", NumberRange.Share) ?? 0.95;
        var also = said?.List("also").Select(value => Values.Number(value, "also", NumberRange.Share, keys.Context)).OfType<double>().Order().ToList() ?? [];
        if (also is [var lower, var upper] && lower < main && main < upper)
            return Of(lower, main, upper);
        if (said?.Has("also") == true || main is <= 0.5 or >= 0.99)
            keys.Context.Add(ReleaseProblems.CoverageAlso(said?.PlaceOf("also") ?? keys.At, keys.Context.Owner));
        return Of(0.5, main is <= 0.5 or >= 0.99 ? 0.95 : main, 0.99);
    }

    private static Coverages Of(double lower, double main, double upper) =>
        new(Noise.Coverage.OfShare(main), Noise.Coverage.OfShare(lower), Noise.Coverage.OfShare(upper));

    private static ReliabilityThresholds ReadReliability(ObjectReader keys)
    {
        var said = keys.Object("reliability", ReleaseShapes.Reliability);
        var close = said?.Number("close", NumberRange.Share) ?? 0.1;
        var rough = said?.Number("rough", NumberRange.Share) ?? 0.5;
        if (close < rough)
            return new ReliabilityThresholds(close, rough);
        keys.Context.Add(ReleaseProblems.Thresholds(said!.At, keys.Context.Owner));
        return new ReliabilityThresholds(0.1, 0.5);
    }

    private static Edition ReadEdition(ObjectReader keys)
    {
        var said = keys.Object("edition", ReleaseShapes.Edition);
        var status = said?.Choice("status", Statuses) ?? EditionStatus.First;
        return new Edition(said?.Whole("number", 1, 9999) ?? 1, said?.Whole("printing", 1, 9999) ?? 1, status);
    }

    private static Look ReadLook(ObjectReader keys)
    {
        var said = keys.Object("look", ReleaseShapes.Look);
        var accent = said?.Text("accent");
        if (accent is not null && AccentCheck.Problem(accent, said!.PlaceOf("accent"), keys.Context.Owner) is { } problem)
        {
            keys.Context.Add(problem);
            accent = null;
        }
        return new Look(accent, said?.Text("foot"));
    }
}
