using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>Collects findings. Of one kind more are kept than anybody reads at once; past that they are counted, so that a broken file of millions of rows does not fill memory.</summary>
public sealed class FindingLog
{
    /// <summary>How many findings of one kind are kept one by one.</summary>
    public const int MostKept = 10_000;

    private readonly List<Finding> findings = [];
    private readonly Dictionary<FindingKind, (int Count, int Last)> kinds = [];

    public void Add(Finding finding)
    {
        var (count, last) = kinds.GetValueOrDefault(finding.Kind);
        if (count >= MostKept)
        {
            findings[last] = findings[last] with { NotKept = findings[last].NotKept + 1 + finding.NotKept };
            return;
        }
        kinds[finding.Kind] = (count + 1, findings.Count);
        findings.Add(finding);
    }

    public bool HasStops => findings.Any(finding => finding.Level == FindingLevel.Stop);

    /// <summary>The findings in the order in which they were met.</summary>
    public IReadOnlyList<Finding> ToList() => [.. findings];
}
