using ReleaseKit.Appraisal;
using ReleaseKit.Reading;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Wording;

namespace ReleaseKit.Review;

/// <summary>The whole review: what reading found and what every check finds, by owner, then by place.</summary>
public static class ReleaseReview
{
    /// <param name="read">What was read.</param>
    /// <param name="appraised">Its figures; null where they cannot be appraised.</param>
    /// <param name="language">That of the pages; without it, numbers in prose are not compared with the figures.</param>
    public static IReadOnlyList<Finding> Of(ReadOutcome read, IAppraisedRelease? appraised, ILanguage? language = null)
    {
        var subject = new ReviewSubject(read, appraised) { Language = language };
        var findings = Found(read.Findings.Concat(Checks.All.SelectMany(check => check.Check(subject))).Distinct());
        var placed = read.Files is { } files ? CellPlaces.Fill(findings, files) : findings;
        return [.. Waivers.Apply(placed, read.Release).Order(ByOwnerThenPlace)];
    }

    private static IReadOnlyList<Finding> Found(IEnumerable<Finding> findings)
    {
        var log = new FindingLog();
        foreach (var finding in findings)
            log.Add(finding);
        return log.ToList();
    }

    private static Comparer<Finding> ByOwnerThenPlace { get; } = Comparer<Finding>.Create(Compare);

    private static int Compare(Finding left, Finding right)
    {
        var byOwner = left.For.CompareTo(right.For);
        return byOwner != 0 ? byOwner : ComparePlaces(left, right);
    }

    private static int ComparePlaces(Finding left, Finding right) =>
        (string.CompareOrdinal(left.At.File, right.At.File), left.At.Line - right.At.Line, left.At.Column - right.At.Column) switch
        {
            (not 0 and var byFile, _, _) => byFile,
            (_, not 0 and var byLine, _) => byLine,
            (_, _, not 0 and var byColumn) => byColumn,
            _ => string.CompareOrdinal(left.Slug, right.Slug),
        };
}
