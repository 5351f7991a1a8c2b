using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Review;

/// <summary>
/// A hidden cell that a published total gives back: of the parts that a total adds up, exactly one is hidden, and the total counts it.
/// What comes out carries noise, but the hiding is undone.
/// </summary>
internal sealed class HiddenPartCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release?.Tables.Where(table => table.Hidden is { InTotals: true })
        .SelectMany(AddedRows.Of).SelectMany(CheckTotals).DistinctBy(finding => finding.Address) ?? [];

    private static IEnumerable<Finding> CheckTotals(AddedRows added) =>
        from rows in added.Rows()
        from measure in added.Measures
        where measure.HasNumber(rows.Total) && rows.Parts.Count > 1
        let hidden = rows.Parts.Where(row => measure.StatusAt(row) == 'Q').ToList()
        where hidden.Count == 1
        select Found(added.Table, measure, hidden[0], added.Stub.Column);

    private static Finding Found(Table table, Measure measure, int row, string over)
    {
        var address = FigureAddress.Canonical(table, measure, row);
        return new Finding(
            FindingLevel.Caution, "hidden-given-back", FindingOwner.Noise, Place.OfCell(table.File, row, measure.Column),
            $"{address} is hidden, but it is the only hidden part of a published total over \"{over}\".",
            "the total less the other parts gives its noised value back.",
            "hide a second part, or publish the figure: with its noise it may not need hiding.")
        {
            Address = address,
        };
    }
}
