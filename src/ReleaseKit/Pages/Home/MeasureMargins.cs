using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Home;

/// <summary>The smallest and largest main margin of a measure, over all its rows, as printed; null where no figure has one.</summary>
internal sealed record MeasureMargins(PublishedValue? Smallest, PublishedValue? Largest, Reliability Without, Measure Measure)
{
    public static MeasureMargins Of(IAppraisedRelease appraised, int table, int measure)
    {
        PublishedValue? smallest = null, largest = null;
        var without = Reliability.NotStated;
        for (var row = 0; row < appraised.Release.Tables[table].RowCount; row++)
        {
            var figure = appraised.Figure(new FigureRef(table, measure, row));
            if (figure.Main?.Printed.Margin is not { } margin)
                without = figure.HasNumber ? figure.Reliability : without;
            else
            {
                smallest = smallest is { } least && least.ToDecimal() <= margin.ToDecimal() ? least : margin;
                largest = largest is { } most && most.ToDecimal() >= margin.ToDecimal() ? most : margin;
            }
        }
        return new MeasureMargins(smallest, largest, without, appraised.Release.Tables[table].Measures[measure]);
    }

    public string InWords(ILanguage language)
    {
        if (Smallest is not { } smallest || Largest is not { } largest)
            return language.Text(Without switch
            {
                Reliability.Exact => "figure.exact",
                Reliability.Public => "figure.public",
                _ => "figure.no-margin",
            });
        var unit = language.UnitOf(Measure, largest);
        return smallest.ToDecimal() == largest.ToDecimal()
            ? language.Text("home.margin.one", ("margin", language.Number(largest)), ("unit", unit))
            : language.Text("home.margin.from-to", ("least", language.Number(smallest)), ("most", language.Number(largest)), ("unit", unit));
    }
}
