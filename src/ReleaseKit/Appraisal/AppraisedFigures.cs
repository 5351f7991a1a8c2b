using System.Collections.Concurrent;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Makes appraised figures, one at a time, from the errors they share. Safe between threads.</summary>
internal sealed class AppraisedFigures(Release release)
{
    private readonly FigureOrigins origins = new(release);
    private readonly ConcurrentDictionary<int, WholeFinder> wholes = new();
    private readonly ConcurrentDictionary<FigureRef, double?> ofWholes = new();

    public FigureOrigins Origins => origins;

    public AppraisedFigure Of(FigureRef at)
    {
        var figure = WithoutCase(at, out var origin);
        return figure with { Case = FigureCases.Of(figure, origin), UseInstead = UseInstead(figure) };
    }

    private AppraisedFigure WithoutCase(FigureRef at, out FigureOrigin origin)
    {
        var table = release.Tables[at.Table];
        var measure = table.Measures[at.Measure];
        origin = origins.Of(at);
        var hasNumber = measure.HasNumber(at.Row);
        var value = measure.ValueAt(at.Row).Times(measure.Multiplier);
        var error = hasNumber ? origin.Error : null;
        var ranges = error?.RangesOf(value, Printing.Of(measure, error.IsOnWholeGrid && value.IsWhole)) ?? [];
        return new AppraisedFigure
        {
            Ref = at,
            Table = table,
            Measure = measure,
            Address = FigureAddress.Canonical(table, measure, at.Row),
            Id = IdOf(table, measure, at.Row),
            Value = value,
            Printed = ranges.Count > 0 ? ranges[^1].Printed.Value : PrintedWithoutMargin(measure, value),
            Status = measure.StatusAt(at.Row),
            HasNumber = hasNumber,
            Error = error?.Error,
            Mechanism = origin.Mechanism,
            Draws = Math.Max(1, origin.Draws),
            Parts = origin.Parts,
            PartsHidden = origin.PartsHidden,
            PartsLeftOut = origin.PartsLeftOut,
            Ranges = ranges,
            Reliability = ReliabilityOf(measure, value, hasNumber, origin, ranges),
            MarginToFigure = ranges.Count > 1 ? ReliabilityRule.Share(value.ToDecimal(), ranges[1].Margin, CanBeNegative(measure)) : null,
            Possible = PossibleOf.Measure(measure),
            LeftAsItWas = error?.LeftAsItWas,
            Case = new(SpecialCase.None, false, false, false, false),
        };
    }

    private Reliability ReliabilityOf(Measure measure, PublishedValue value, bool hasNumber, FigureOrigin origin, IReadOnlyList<FigureRange> ranges)
    {
        if (ranges.Count > 1)
            return ReliabilityRule.Of(value.ToDecimal(), ranges[1].Margin, CanBeNegative(measure), release.Reliability);
        return (hasNumber, origin.Rule) switch
        {
            (true, NoiseRule.Exact) => Reliability.Exact,
            (true, NoiseRule.Public) => Reliability.Public,
            _ => Reliability.NotStated,
        };
    }

    /// <summary>Of the nearest wholes that are not weak the one with the smallest margin for its size; a figure without noise has none.</summary>
    private FigureRef? UseInstead(AppraisedFigure figure)
    {
        if (figure.Reliability != Reliability.Weak)
            return null;
        var at = figure.Ref;
        foreach (var rows in wholes.GetOrAdd(at.Table, table => new WholeFinder(release.Tables[table])).Of(at.Row))
        {
            var usable = rows.Select(row => at with { Row = row }).Where(whole => MarginOfWhole(whole) is not null).ToList();
            if (usable.Count > 0)
                return usable.MinBy(whole => MarginOfWhole(whole));
        }

        return null;
    }

    /// <summary>Margin ÷ figure of a whole, null where it cannot be used alone.</summary>
    private double? MarginOfWhole(FigureRef whole) => ofWholes.GetOrAdd(whole, at => WithoutCase(at, out _) is { Reliability: not (Reliability.Weak or Reliability.NotStated) } figure
        ? figure.MarginToFigure ?? 0
        : null);

    private static bool CanBeNegative(Measure measure) => !(PossibleOf.Measure(measure).Lowest >= 0);

    private static string IdOf(Table table, Measure measure, int row) =>
        string.Join('.', table.Stub.Select(column => column.LabelOf(row).Slug).Prepend(measure.Slug));

    /// <summary>Exact and public figures have the measure's decimals, or those they are written with.</summary>
    private static PublishedValue PrintedWithoutMargin(Measure measure, PublishedValue value)
    {
        var printed = value.Times(measure.PrintFactor);
        return measure.Decimals is { } decimals ? printed.RoundedTo(decimals) : printed;
    }
}
