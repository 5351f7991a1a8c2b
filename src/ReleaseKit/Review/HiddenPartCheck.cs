using ReleaseKit.Appraisal;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Review;

/// <summary>
/// A hidden cell that a published total gives back: of the parts that a total adds up, exactly one is hidden, and the total counts it. A sum of the
/// same draws undoes the hiding, a total without noise even more; one with a draw of its own only allows an estimate.
/// </summary>
internal sealed class HiddenPartCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Origins: { } origins }
        ? release.Tables.Index().Where(at => at.Item.Hidden is { InTotals: true } && !subject.Read.TablesInPart.Contains(at.Item.Id))
            .SelectMany(at => AddedRows.Of(at.Item).SelectMany(added => CheckTotals(added, at.Index, origins)))
            .GroupBy(finding => finding.Address).Select(findings => findings.MinBy(finding => finding.Level)!)
        : [];

    private static IEnumerable<Finding> CheckTotals(AddedRows added, int table, FigureOrigins origins) =>
        from rows in added.Rows()
        from measure in added.Measures
        where measure.HasNumber(rows.Total) && measure.RuleAt(rows.Total) is not NoiseRule.NotGiven && rows.Parts.Count > 1
        let hidden = rows.Parts.Where(row => measure.StatusAt(row) == 'Q').ToList()
        where hidden.Count == 1
        let index = added.Table.Measures.ToList().IndexOf(measure)
        select Found(added, measure, rows, hidden[0], row => origins.Of(new(table, index, row)));

    private static Finding Found(AddedRows added, Measure measure, TotalAndParts rows, int hidden, Func<int, FigureOrigin> originOf)
    {
        var address = FigureAddress.Canonical(added.Table, measure, hidden);
        var (level, why, instead) = Judged(added, rows, hidden, originOf);
        return new Finding(
            level, "hidden-given-back", FindingOwner.Noise, Place.OfCell(added.Table.File, hidden, measure.Column),
            $"{address} is hidden, but it is the only hidden part of a published total over \"{added.Stub.Column}\".", why, instead)
        {
            Address = address,
        };
    }

    private static (FindingLevel Level, string Why, string Do) Judged(AddedRows added, TotalAndParts rows, int hidden, Func<int, FigureOrigin> originOf)
    {
        var (total, othersHaveNoise) = (originOf(rows.Total), rows.Parts.Any(row => row != hidden && originOf(row).Draws > 0));
        if (total.Rule is NoiseRule.Exact or NoiseRule.Public)
            return (FindingLevel.Caution, othersHaveNoise
                ? "the total has no noise: less the other parts it gives the hidden value with their noise alone."
                : "neither the total nor the other parts have noise: the total less them is the value itself.", "hide a second part, or the total.");
        if (total.Rule is NoiseRule.SumOver sum && (sum.StubColumn == added.Column || total.Draws == rows.Parts.Sum(row => originOf(row).Draws)))
            return (FindingLevel.Caution, "the total less the other parts gives its noised value back.", "hide a second part, or publish the figure: with its noise it may not need hiding.");
        return (FindingLevel.Note, $"the total has noise of its own: less the other parts it gives an estimate of the hidden value, with the noise of {(othersHaveNoise ? "all of them" : "the total")}.",
            "leave it so if such an estimate may be made; else hide a second part.");
    }
}
