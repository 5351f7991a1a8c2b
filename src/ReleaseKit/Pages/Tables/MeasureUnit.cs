using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Tables;

/// <summary>The unit of a measure as it stands under its title in the boxhead: "households", "crowns a household", "in each 100".</summary>
internal static class MeasureUnit
{
    public static string Of(Measure measure, ILanguage language)
    {
        var unit = PluralCategory.Form(measure.Unit, language.Tag, new(2, 0));
        return measure.Kind switch
        {
            MeasureKind.Share when unit.Length == 0 => language.Text("tables.unit.share"),
            // The unit's own words may say it already.
            MeasureKind.Share when unit.EndsWith(language.Text("tables.unit.share"), StringComparison.Ordinal) => unit,
            MeasureKind.Share => language.Text("tables.unit.share-of", ("unit", unit)),
            MeasureKind.Rate when measure.Per is { } per => language.Text("tables.unit.rate", ("unit", unit), ("per", language.Number(PublishedValue.Shortest((decimal)per)))),
            _ => unit,
        };
    }
}
