using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Works out the facts of a table from the few errors its figures share, not from figure after figure.</summary>
internal sealed class TableFactsMaker(Release release, FigureOrigins origins)
{
    private static readonly Coverage Of999 = Coverage.OfShare(0.999);

    public TableFacts Of(int tableIndex)
    {
        var table = release.Tables[tableIndex];
        var errors = table.Measures.Select((measure, index) => ErrorsOf(tableIndex, index, measure)).ToList();
        var measures = errors.Select((error, index) => FactsOf(error, TotalsOf(tableIndex, index))).ToList();
        var shown = errors.Where(error => error.Measure.Shown).ToList();
        return new TableFacts
        {
            Table = table,
            Figures = shown.Aggregate(FigureKinds.None, (kinds, error) => kinds + error.Figures),
            Ranges = shown.Sum(error => error.Ranges),
            ExpectedMisses = shown.Sum(error => error.ExpectedMisses),
            SharesDraws = shown.Any(error => error.HasSums),
            HasSums = shown.Any(error => error.HasSums),
            HasTotalsOfOwnNoise = measures.Any(measure => measure.Measure.Shown && measure.HasTotalsOfOwnNoise),
            Measures = measures,
        };
    }

    private MeasureErrors ErrorsOf(int table, int index, Measure measure)
    {
        var found = new MeasureErrors(measure, release.Coverages.Main);
        for (var row = 0; row < release.Tables[table].RowCount; row++)
            if (measure.HasNumber(row))
                found.Add(origins.Of(new(table, index, row)), measure.ValueAt(row).Times(measure.Multiplier), measure.RuleAt(row) is NoiseRule.SumOver);
        return found;
    }

    private TotalFacts TotalsOf(int table, int measure) => new TotalFactsMaker(release.Tables[table], release.Tables[table].Measures[measure])
        .Of(row => origins.Of(new(table, measure, row)).Error is not null);

    private MeasureFacts FactsOf(MeasureErrors found, TotalFacts totals)
    {
        var margins = found.Errors.Where(error => !error.Error.DependsOnPublished).Select(error => Margin(found.Measure, error)).ToList();
        return new MeasureFacts
        {
            Measure = found.Measure,
            Coverage = release.Coverages.Main,
            HasSums = found.HasSums,
            HasTotalsOfOwnNoise = totals.OwnNoise.Count > 0,
            Totals = totals,
            IsRounded = found.Errors.Any(error => error.Error.Steps.OfType<AfterStep.RoundTo>().Any()),
            HasThreshold = margins.Count < found.Errors.Count,
            Promise = found.Errors.Select(error => RangePromises.Of(error.Error, isZero: false)).DefaultIfEmpty().Max(),
            SmallestMargin = margins.Count == 0 ? null : margins.MinBy(margin => margin.ToDecimal()),
            LargestMargin = margins.Count == 0 ? null : margins.MaxBy(margin => margin.ToDecimal()),
            Distance999 = Distance(found),
        };
    }

    /// <summary>The margin that figures with this error print at most.</summary>
    private static PublishedValue Margin(Measure measure, DistinctError error)
    {
        var printing = Printing.Of(measure, error.IsOnWholeGrid);
        return printing.LargestMargin(error.MainHalfWidth.Width, printing.UnitFor(error.MainHalfWidth.Width));
    }

    private static PublishedValue? Distance(MeasureErrors found)
    {
        if (found.Errors.Count == 0 || found.Errors.Any(error => error.Error.DependsOnPublished || !error.Reaches(Of999)))
            return null;
        var largest = found.Errors.MaxBy(error => error.HalfWidthAt(Of999).Width)!;
        var printing = Printing.Of(found.Measure, largest.IsOnWholeGrid);
        return printing.Outward(largest.HalfWidthAt(Of999).Width, printing.UnitFor(largest.MainHalfWidth.Width));
    }
}
