using System.Globalization;
using System.Text.RegularExpressions;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Keys;

/// <summary>Single values: each method reports what is wrong and then answers null.</summary>
internal static partial class Values
{
    /// <summary>Text in one language or none: names, ids, paths. Not empty, no hidden characters.</summary>
    public static string? Text(JsonValue value, string key, ReadContext context)
    {
        if (value is not JsonText { Value: var text })
        {
            context.Add(KeyProblems.WrongType(value, key, "text", $"\"{key}\": \"…\"", context.Owner));
            return null;
        }
        return IsSound(text, value, key, context) ? text : null;
    }

    /// <summary>Text for readers: a string for the main language, or an object by language.</summary>
    public static ReaderText? ReaderText(JsonValue value, string key, ReadContext context)
    {
        if (value is not JsonObject byLanguage)
            return Text(value, key, context) is { } text ? Releases.ReaderText.Plain(context.Language, text) : null;
        var texts = ByLanguage(byLanguage, key, context);
        if (!texts.ContainsKey(context.Language))
            context.Add(KeyProblems.TextMissing(value.At, key, context.Language, context.Owner));
        return texts.ContainsKey(context.Language) ? new ReaderText(texts) : null;
    }

    public static double? Number(JsonValue value, string key, NumberRange range, ReadContext context)
    {
        if (value is not JsonNumber number)
        {
            context.Add(KeyProblems.WrongType(value, key, "a number", NumberToPaste(value, key, range), context.Owner));
            return null;
        }
        if (range.Holds(number.Value))
            return number.Value;
        context.Add(KeyProblems.OutOfRange(number, key, range.Words, context.Owner));
        return null;
    }

    public static IReadOnlyList<JsonMember> Members(JsonValue value, string key, ReadContext context)
    {
        if (value is not JsonObject json)
        {
            context.Add(KeyProblems.WrongType(value, key, "an object { … }", $"\"{key}\": {{ … }}", context.Owner));
            return [];
        }
        var first = new Dictionary<string, JsonMember>();
        foreach (var member in json.Members.Where(member => !first.TryAdd(member.Name, member)))
            context.Add(KeyProblems.Doubled(member, first[member.Name], context.Owner));
        return [.. first.Values];
    }

    public static DateOnly? Date(JsonValue value, string key, ReadContext context)
    {
        if (Text(value, key, context) is not { } text)
            return null;
        if (DateOnly.TryParseExact(text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var date))
            return date;
        context.Add(KeyProblems.BadDate((JsonText)value, key, "date", "\"2031-09-04\"", context.Owner));
        return null;
    }

    /// <summary>An absolute http or https address.</summary>
    public static string? Link(JsonValue value, string key, ReadContext context)
    {
        if (Text(value, key, context) is not { } text)
            return null;
        if (Uri.TryCreate(text, UriKind.Absolute, out var link) && link.Scheme is "http" or "https" && link.Host.Length > 0 && !text.Contains(' ', StringComparison.Ordinal))
            return text;
        context.Add(KeyProblems.BadLink((JsonText)value, key, context.Owner));
        return null;
    }

    private static string NumberToPaste(JsonValue value, string key, NumberRange range) =>
        Meant(value, range) is { } meant ? $"\"{key}\": {meant}" : $"a number without quotation marks, such as \"{key}\": {range.Example}";

    /// <summary>The number that stands between quotation marks, if it is one that the key can have.</summary>
    private static string? Meant(JsonValue value, NumberRange range) => value is JsonText { Value: var written }
        && (MeantNumber.OfDecimalComma(written) ?? written) is var text
        && double.TryParse(text, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture, out var number)
        && double.IsFinite(number) && range.Holds(number)
            ? Bare(text, number)
            : null;

    private static string Bare(string text, double number) =>
        JsonForm.IsMatch(text) ? text : number.ToString("R", CultureInfo.InvariantCulture);

    private static Dictionary<string, string> ByLanguage(JsonObject json, string key, ReadContext context)
    {
        var texts = new Dictionary<string, string>();
        foreach (var member in Members(json, key, context))
            if (!LanguageTag.IsMatch(member.Name))
                context.Add(KeyProblems.Unknown(member, new ObjectShape("", [], [context.Language], []), context.Owner));
            else if (Text(member.Value, key, context) is { } text)
                texts[member.Name] = text;
        return texts;
    }

    private static bool IsSound(string text, JsonValue value, string key, ReadContext context)
    {
        var hidden = HiddenCharacters.FirstIn(text);
        if (hidden >= 0)
            context.Add(KeyProblems.HiddenCharacter(value.At, $"\"{key}\"", text[hidden], context.Owner));
        else if (text.Length > FolderLimits.TextLength)
            context.Add(KeyProblems.TooLong(value.At, $"\"{key}\"", text.Length, FolderLimits.TextLength, context.Owner));
        else if (string.IsNullOrWhiteSpace(text))
            context.Add(KeyProblems.Empty(value.At, key, context.Owner));
        else
            return true;
        return false;
    }

    [GeneratedRegex("^-?(0|[1-9][0-9]*)([.][0-9]+)?([eE][+-]?[0-9]+)?$")]
    private static partial Regex JsonForm { get; }

    [GeneratedRegex("^[a-z]{2,3}(-[A-Za-z0-9]{2,8})*$")]
    private static partial Regex LanguageTag { get; }
}
