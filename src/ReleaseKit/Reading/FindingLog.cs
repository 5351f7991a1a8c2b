using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>Collects findings while a folder is read. Of one kind in one file only the first few are kept, and the rest counted, so that a broken file does not drown the others.</summary>
public sealed class FindingLog
{
    /// <summary>How many findings of one slug in one file are listed.</summary>
    public const int MostOfAKind = 12;

    private readonly List<Finding> findings = [];
    private readonly Dictionary<(string Slug, string File), int> counts = [];

    public void Add(Finding finding)
    {
        var kind = (finding.Slug, finding.At.File);
        var count = counts.GetValueOrDefault(kind);
        counts[kind] = count + 1;
        if (count < MostOfAKind)
            findings.Add(finding);
    }

    public bool HasStops => findings.Any(finding => finding.Level == FindingLevel.Stop);

    /// <summary>The findings in the order in which they were met; the last listed of a kind says how many more there are.</summary>
    public IReadOnlyList<Finding> ToList()
    {
        var listed = findings.ToList();
        foreach (var ((slug, file), count) in counts.Where(pair => pair.Value > MostOfAKind))
        {
            var last = listed.FindLastIndex(finding => finding.Slug == slug && finding.At.File == file);
            listed[last] = listed[last] with { Found = $"{listed[last].Found}\n{count - MostOfAKind} more of this kind in {file} are not listed." };
        }
        return listed;
    }
}
