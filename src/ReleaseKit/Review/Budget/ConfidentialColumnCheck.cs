using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Columns worked out on the confidential records without a mechanism, and cells hidden by their value before noise: both count as exact figures.</summary>
internal sealed class ConfidentialColumnCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release?.Tables.SelectMany(CheckTable) ?? [];

    private static IEnumerable<Finding> CheckTable(Table table)
    {
        foreach (var side in table.SideColumns.Where(side => side is { From: SideColumnOrigin.Confidential, Mechanism: null }))
            yield return Confidential(table, side);
        if (table.Hidden is { By: HiddenBy.ValueBeforeNoise } hidden && table.Measures.Any(measure => measure.Status.Contains((byte)'Q')))
            yield return HiddenByValue(table, hidden);
    }

    private static Finding Confidential(Table table, SideColumn side) => new(
        FindingLevel.Caution, "confidential-column", FindingOwner.Noise, side.At,
        $"Column \"{side.Column}\" of table \"{table.Id}\" comes from the confidential records, and no mechanism noised it.",
        "it is published exactly: for it there is no limit on what can be learned, and the budget page says so.",
        "name its \"mechanism\", work it out from published values (\"from\": \"published\"), or leave the column out.");

    private static Finding HiddenByValue(Table table, Hiding hidden) => new(
        FindingLevel.Caution, "hidden-by-value", FindingOwner.Noise, hidden.At,
        $"Table \"{table.Id}\" hides cells because of their value before noise.",
        "that a cell is hidden then tells something exact about it: the hidden cells count as exact figures, and the budget page says so.",
        "hide by the noised value (\"by\": \"noised-value\") or by a rule that was public beforehand (\"by\": \"public-rule\").");
}
