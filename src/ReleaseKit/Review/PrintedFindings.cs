namespace ReleaseKit.Review;

/// <summary>The findings that a review prints in full: the first few of each kind, the last of which says how many more there are and which call prints them.</summary>
public static class PrintedFindings
{
    public const int MostOfAKind = 12;

    /// <param name="findings">In the order in which they are to be read.</param>
    /// <param name="folder">The folder as the caller named it, for the call that prints them all.</param>
    public static IReadOnlyList<Finding> Of(IReadOnlyList<Finding> findings, string folder)
    {
        var kinds = findings.GroupBy(finding => finding.Kind).ToDictionary(kind => kind.Key, kind => kind.ToList());
        var printed = new Dictionary<FindingKind, int>();
        return [.. findings.Where(finding => (printed[finding.Kind] = printed.GetValueOrDefault(finding.Kind) + 1) <= MostOfAKind)
            .Select(finding => kinds[finding.Kind] is { Count: > MostOfAKind } all && ReferenceEquals(finding, all[MostOfAKind - 1])
                ? With(finding, $"{all.Skip(MostOfAKind).Sum(Count)} more of this kind in {finding.At.File}: releasekit review {folder} --all prints them.")
                : finding)];
    }

    /// <summary>Every finding that was kept; where more were met, the last says how many.</summary>
    public static IReadOnlyList<Finding> All(IReadOnlyList<Finding> findings) => [.. findings.Select(finding => finding.NotKept == 0
        ? finding
        : With(finding, $"{finding.NotKept} more of this kind in {finding.At.File} are counted and not listed: mend these first."))];

    /// <summary>How many findings one stands for.</summary>
    public static int Count(Finding finding) => 1 + finding.NotKept;

    private static Finding With(Finding finding, string line) => finding with { Found = $"{finding.Found}\n{line}" };
}
