using ReleaseKit.Releases;

namespace ReleaseKit.Review;

/// <summary>
/// A hidden cell that a published total gives back: of the parts that a declared sum adds up, exactly one is hidden, and the total counts it.
/// What comes out carries noise, but the hiding is undone.
/// </summary>
internal sealed class HiddenPartCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        subject.Release?.Tables.Where(table => table.Hidden is { InTotals: true }).SelectMany(CheckTable) ?? [];

    private static IEnumerable<Finding> CheckTable(Table table) => table.Adds.SelectMany(addition => CheckAddition(table, addition));

    private static IEnumerable<Finding> CheckAddition(Table table, Addition addition)
    {
        var measure = table.Measures.FirstOrDefault(one => one.Column == addition.Measure);
        var column = table.Stub.ToList().FindIndex(stub => stub.Column == addition.Over);
        if (measure is null || column < 0)
            yield break;
        foreach (var group in new Reading.Tables.RowGroups(table).GroupsOver(column))
            if (GivenBack(table, measure, addition, column, group) is { } row)
                yield return Found(table, measure, row, addition);
    }

    private static int? GivenBack(Table table, Measure measure, Addition addition, int column, ArraySegment<int> group)
    {
        var total = group.Where(row => table.Stub[column].LabelOf(row).Value == addition.Total).ToList();
        var hidden = group.Where(row => measure.StatusAt(row) == 'Q' && !total.Contains(row)).ToList();
        return total.Count == 1 && measure.HasNumber(total[0]) && hidden.Count == 1 && group.Count > 2 ? hidden[0] : null;
    }

    private static Finding Found(Table table, Measure measure, int row, Addition addition)
    {
        var address = FigureAddress.Canonical(table, measure, row);
        return new Finding(
            FindingLevel.Caution, "hidden-given-back", FindingOwner.Noise, Place.OfCell(table.File, row, measure.Column),
            $"{address} is hidden, but it is the only hidden part of a published total over \"{addition.Over}\".",
            "the total less the other parts gives its noised value back.",
            "hide a second part, or publish the figure: with its noise it may not need hiding.")
        {
            Address = address,
        };
    }
}
