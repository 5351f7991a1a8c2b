using ReleaseKit.Reading.Json;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Keys;

/// <summary>What can be wrong with keys and their values, one factory a failure.</summary>
internal static class KeyProblems
{
    public static Finding Unknown(JsonMember member, ObjectShape shape, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-key", owner, member.At,
        $"\"{Cut(member.Name)}\" is no key here.",
        "a key that is not known has no effect, and what it was meant to do is not done.",
        Nearest.Of(member.Name, shape.Keys) is { } near
            ? $"write \"{near}\", or take it out."
            : $"take it out. Known here: {string.Join(", ", shape.Keys.Where(key => key != "$schema"))}.");

    public static Finding Doubled(JsonMember member, JsonMember first, FindingOwner owner) => new(
        FindingLevel.Stop, "doubled-key", owner, member.At,
        $"\"{Cut(member.Name)}\" is given twice; first at line {first.At.Line}.",
        "programs differ in which of the two they use.",
        "keep one of them.");

    public static Finding Missing(JsonObject inside, string key, string paste, FindingOwner owner) => new(
        FindingLevel.Stop, "missing-key", owner, inside.At,
        $"\"{key}\" is missing here.",
        "it must be given and has no default.",
        $"add {paste}");

    public static Finding EmptyList(Place at, string key, string paste, FindingOwner owner) => new(
        FindingLevel.Stop, "empty-list", owner, at,
        $"\"{key}\" is an empty list.",
        "nothing of the table could be published, and what was spent on it would go unseen.",
        $"name at least one: {paste}");

    public static Finding NotYet(Place at, string key, FindingOwner owner, string instead) => new(
        FindingLevel.Stop, "not-yet", owner, at,
        $"\"{key}\" is not worked out by this version of the program.",
        "leaving it aside without a word would make figures or margins wrong.",
        instead);

    public static Finding WrongType(JsonValue value, string key, string wanted, string paste, FindingOwner owner) => new(
        FindingLevel.Stop, "wrong-type", owner, value.At,
        $"\"{key}\" is {value.Kind}, but {wanted} is needed.",
        "it cannot be used as it stands.",
        $"write {paste}");

    public static Finding UnknownValue(JsonText value, string key, IReadOnlyCollection<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-value", owner, value.At,
        $"\"{key}\" is \"{Cut(value.Value)}\", which is not one of its values.",
        $"it decides how the release is read. Possible: {string.Join(", ", known)}.",
        $"write \"{key}\": \"{Nearest.Of(value.Value, known) ?? known.First()}\" or another of them.");

    public static Finding OutOfRange(JsonNumber value, string key, string allowed, FindingOwner owner) => new(
        FindingLevel.Stop, "out-of-range", owner, value.At,
        $"\"{key}\" is {Cut(value.Digits)}, but must be {allowed}.",
        "no sense can be made of it.",
        $"write a number that is {allowed}.");

    public static Finding BadDate(JsonText value, string key, string form, string paste, FindingOwner owner) => new(
        FindingLevel.Stop, "bad-date", owner, value.At,
        $"\"{key}\" is \"{Cut(value.Value)}\", which is no {form}.",
        "dates are printed and compared; a guess could be a wrong one.",
        $"write \"{key}\": {paste}");

    public static Finding BadLink(JsonText value, string key, FindingOwner owner) => new(
        FindingLevel.Stop, "bad-link", owner, value.At,
        $"\"{key}\" is \"{Cut(value.Value)}\", which is no http or https address.",
        "readers are sent there.",
        "write the whole address, beginning with https://.");

    public static Finding HiddenCharacter(Place at, string what, int codePoint, FindingOwner owner) => new(
        FindingLevel.Stop, "hidden-character", owner, at,
        $"{what} holds U+{codePoint:X4}, a control or direction character.",
        "it cannot be seen, and can make a text read other than it is.",
        "take the character out.");

    public static Finding TooLong(Place at, string what, int length, int most, FindingOwner owner) => new(
        FindingLevel.Stop, "text-too-long", owner, at,
        $"{what} has {length} characters; at most {most} fit.",
        "it would push everything else off the page.",
        "shorten it; longer text belongs into the prose.");

    public static Finding TextMissing(Place at, string key, string language, FindingOwner owner) => new(
        FindingLevel.Stop, "text-missing", owner, at,
        $"\"{key}\" has no text in \"{language}\".",
        "the pages of that language would have a hole here.",
        $"add \"{language}\": \"…\" to it.");

    public static Finding Empty(Place at, string key, FindingOwner owner) => new(
        FindingLevel.Stop, "text-missing", owner, at,
        $"\"{key}\" is empty.",
        "readers would find a hole here.",
        $"write a text, or take \"{key}\" out if it may be left out.");

    /// <summary>At most 60 characters of something from the folder, with control characters shown as U+FFFD.</summary>
    public static string Cut(string text)
    {
        var clean = new string([.. text.Take(60).Select(letter => HiddenCharacters.IsOne(letter) ? '\uFFFD' : letter)]);
        return text.Length > 60 ? clean + "…" : clean;
    }
}
