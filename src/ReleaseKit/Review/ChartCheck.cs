using ReleaseKit.Releases;

namespace ReleaseKit.Review;

/// <summary>A chart that cannot be drawn, because no figure of its selection has a number, or that nobody could read for its length.</summary>
internal sealed class ChartCheck : IReviewCheck
{
    /// <summary>About two metres of page; beyond it a table says the same better.</summary>
    public const int MostFigures = 200;

    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        subject.Release is { } release ? release.Charts.Select(chart => CheckChart(chart, release)).OfType<Finding>() : [];

    private static Finding? CheckChart(ChartOrder chart, Release release)
    {
        if (NumbersOf(chart, release) is not { } numbers)
            return null;
        return numbers switch
        {
            0 => Found(chart, "chart-without-figures", "selects no figure that has a number.", "there is nothing to draw.",
                "select figures that are published, or take the chart out of \"charts\"."),
            > MostFigures => Found(chart, "chart-too-long", FormattableString.Invariant($"selects {numbers} figures; a chart holds at most {MostFigures}."),
                "nobody reads a chart of that length, and its picture would not open everywhere.",
                "name a stub column in its selection, for example one district, or take a higher level."),
            _ => null,
        };
    }

    /// <summary>How many figures of the selection have a number; null for a broken address, which reading has reported.</summary>
    private static int? NumbersOf(ChartOrder chart, Release release)
    {
        try
        {
            var found = FigureAddress.Of(release, chart.Figures).Resolve(release);
            return found.Rows.Count(release.Tables[found.Table].Measures[found.Measure].HasNumber);
        }
        catch (AddressException)
        {
            return null;
        }
    }

    private static Finding Found(ChartOrder chart, string slug, string found, string why, string remedy) =>
        new(FindingLevel.Stop, slug, FindingOwner.Writer, chart.At, $"The chart \"{chart.Id}\" {found}", why, remedy) { Address = chart.Figures };
}
