using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;
using ReleaseKit.Review.Budget;

namespace ReleaseKit.Review.Leaks;

/// <summary>
/// Totals against the sums of their parts, where the declared noise would keep them apart: totals that are all the exact sum though noise is
/// declared that is not in it, and a total farther from its parts than their noise reaches.
/// </summary>
internal sealed class TotalGapCheck : IReviewCheck
{
    // The chance that all gaps are 0: below the smaller one it is taken for none, below the larger one somebody should look.
    private const double DoubtfulEqual = 1e-3;
    private const double UnlikelyEqual = 1e-6;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Origins: { } origins }
        ? release.Tables.SelectMany((table, at) => subject.Read.TablesInPart.Contains(table.Id) ? [] : AddedRows.Of(table).SelectMany(added => CheckTotals(added, at, origins)))
        : [];

    private static IEnumerable<Finding> CheckTotals(AddedRows added, int table, FigureOrigins origins)
    {
        var rows = added.Measures.Count > 0 ? added.Rows().ToList() : [];
        foreach (var measure in added.Measures)
        {
            var index = added.Table.Measures.ToList().IndexOf(measure);
            FigureError? ErrorOf(int row) => origins.Of(new(table, index, row)).Error?.Error;
            var gaps = rows.Where(pair => IsCompared(measure, pair)).Select(pair => Gap.Of(measure, pair, ErrorOf)).ToList();
            foreach (var rule in gaps.GroupBy(gap => measure.RuleOf[gap.Rows.Total]).Where(rule => rule.All(gap => gap.Width == 0)))
                if (rule.Aggregate(1.0, (chance, gap) => chance * ChanceOfNoGap.Of(measure, gap.Rows, ErrorOf)) is < DoubtfulEqual and var chance)
                    yield return Equal(added, measure, [.. rule.Select(gap => gap.Rows.Total)], chance);
            if (gaps.Where(gap => gap.IsTooWide).MaxBy(gap => gap.Width) is { } widest)
                yield return Far(added, measure, widest, gaps.Count(gap => gap.IsTooWide));
        }
    }

    // A published sum is held against its parts digit for digit elsewhere; a hidden part makes a gap of its own.
    private static bool IsCompared(Measure measure, TotalAndParts rows) => measure.HasNumber(rows.Total) && rows.Parts.All(measure.HasNumber)
        && measure.RuleAt(rows.Total) is not (NoiseRule.SumOver or NoiseRule.NotGiven);

    private static Finding Equal(AddedRows added, Measure measure, List<int> totals, double chance)
    {
        var (table, total) = (added.Table, totals[0]);
        var address = FigureAddress.Canonical(table, measure, total);
        var own = measure.RuleAt(total) is NoiseRule.FromMechanism { Mechanism.Id: var id } ? $"\"{id}\" is said to give {(totals.Count > 1 ? "them" : "it")} noise of its own" : "its parts are said to carry noise that it does not";
        return new Finding(
            chance < UnlikelyEqual ? FindingLevel.Stop : FindingLevel.Caution, "total-is-the-sum", FindingOwner.Noise, Place.OfCell(table.File, total, measure.Column),
            $"{address} is exactly the sum of its parts over \"{added.Stub.Column}\"{Others(totals.Count)}, but {own}. The chance of that is {BudgetText.Chance(chance)}.",
            "a sum of published parts has all their noise, and parts made to fit a total have other noise than declared: the margins would be too small.",
            $"if the total is the sum, write {{ \"where\": {{ \"{added.Stub.Column}\": \"{added.Stub.LabelOf(total).Value}\" }}, \"sumOver\": \"{added.Stub.Column}\" }} as its rule; if the parts were made to fit it afterwards, publish them as they were before.")
        {
            Address = address,
        };
    }

    private static string Others(int count) => count switch
    {
        1 => "",
        2 => ", and so is the other total",
        _ => $", and so are all {count - 1} others",
    };

    private static Finding Far(AddedRows added, Measure measure, Gap gap, int count)
    {
        var address = FigureAddress.Canonical(added.Table, measure, gap.Rows.Total);
        var isDeclared = added.Declared.Contains(measure.Column);
        return new Finding(
            isDeclared ? FindingLevel.Caution : FindingLevel.Note, "total-far-from-parts", FindingOwner.Noise, Place.OfCell(added.Table.File, gap.Rows.Total, measure.Column),
            $"{address} is {measure.ValueAt(gap.Rows.Total)}, and its parts over \"{added.Stub.Column}\" add up to {gap.Sum}. The chance that the noise of all of them makes so wide a gap is {BudgetText.Chance(gap.Chance)}.{More(count)}",
            "readers are told that only noise keeps the parts from adding up.",
            $"correct the total or its parts; {(isDeclared ? "or, if they do not add up, take \"adds\" out and" : "or, if parts overlap or some are left out,")} say so in a note under the table.")
        {
            Address = address,
        };
    }

    private static string More(int count) => count switch
    {
        1 => "",
        2 => " So it is with one more total.",
        _ => $" So it is with {count - 1} more totals.",
    };
}
