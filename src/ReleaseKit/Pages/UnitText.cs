using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages;

/// <summary>A unit's forms without a number.</summary>
internal static class UnitText
{
    public static string One(Unit unit, string language) => PluralCategory.Form(unit, language, new PublishedValue(1, 0));

    public static string Many(Unit unit, string language) => PluralCategory.Form(unit, language, new PublishedValue(2, 0));
}
