using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts;

/// <summary>A unit without its number, for axes and for the side of a large figure.</summary>
internal static class UnitWords
{
    public static string Many(Unit unit, ILanguage language) => PluralCategory.Form(unit, language.Tag, new PublishedValue(2, 0));

    /// <summary>In the form that goes with the figure as printed.</summary>
    public static string Of(AppraisedFigure figure, ILanguage language) =>
        PluralCategory.Form(figure.Measure.Unit, language.Tag, figure.Main?.Printed.Value ?? figure.Value);
}
