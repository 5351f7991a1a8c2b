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
        var (stub, wholeOf) = (table.Stub[column], WholesOf(table.Stub[column], addition.Total));
        foreach (var group in new Reading.Tables.RowGroups(table).GroupsOver(column))
            foreach (var row in GivenBack(measure, stub, wholeOf, group))
                yield return Found(table, measure, row, addition);
    }

    /// <summary>For each row the heading that it is a part of: by the parents of labels.csv; under a total of another heading, that one for all others.</summary>
    private static Func<int, int> WholesOf(StubColumn stub, string total)
    {
        var parents = StubParents.Of(stub);
        var code = stub.Labels.ToList().FindIndex(label => label.Value == total);
        return code < 0 || parents.Contains(code) ? row => parents[stub.Codes[row]] : row => stub.Codes[row] == code ? -1 : code;
    }

    /// <summary>Rows that are hidden alone among the parts of a published one.</summary>
    private static IEnumerable<int> GivenBack(Measure measure, StubColumn stub, Func<int, int> wholeOf, ArraySegment<int> group)
    {
        var published = group.Where(measure.HasNumber).Select(row => stub.Codes[row]).ToHashSet();
        return group.GroupBy(wholeOf).Where(parts => published.Contains(parts.Key) && parts.Count() > 1)
            .Select(parts => parts.Where(row => measure.StatusAt(row) == 'Q').ToList()).Where(hidden => hidden.Count == 1).Select(hidden => hidden[0]);
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
