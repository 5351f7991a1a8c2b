using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Tables;

/// <summary>The unit of a measure as it stands under its title in the boxhead: "households", "crowns a household", "in each 100".</summary>
internal static class MeasureUnit
{
    public static string Of(Measure measure, ILanguage language)
    {
        var unit = language.UnitOf(measure, new(2, 0));
        return measure is { Kind: MeasureKind.Rate, Per: { } per }
            ? language.Text("tables.unit.rate", ("unit", unit), ("per", language.Number(PublishedValue.Shortest((decimal)per))))
            : unit;
    }
}
