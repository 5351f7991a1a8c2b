using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>
/// Plural categories of Unicode CLDR (plural rules, cardinal), of the number as it is written: 1 is "one" in English, 1.0 is "other".
/// </summary>
public static class PluralCategory
{
    public const string One = "one";
    public const string Other = "other";

    /// <summary>English: "one" for i = 1 and v = 0 (i: whole part of the absolute value, v: digits after the point as written).</summary>
    public static string InEnglish(PublishedValue value) => value is { Decimals: 0, Unscaled: 1 or -1 } ? One : Other;

    /// <summary>The form of a unit that goes with a number.</summary>
    public static string Form(Unit unit, string tag, PublishedValue value)
    {
        if (!unit.Forms.TryGetValue(tag, out var forms))
            return unit.Key;
        return InEnglish(value) == One ? forms.One : forms.Other;
    }
}
