using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts;

/// <summary>A unit without its number, for boxheads and axes and for the side of a large figure.</summary>
internal static class UnitWords
{
    public static string Many(Measure measure, ILanguage language) => language.UnitOf(measure, new PublishedValue(2, 0));

    /// <summary>In the form that goes with the figure as printed.</summary>
    public static string Of(AppraisedFigure figure, ILanguage language) => language.UnitOf(figure.Measure, figure.Printed);
}
