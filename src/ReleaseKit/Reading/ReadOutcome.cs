using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>
/// What came out of reading a folder. The release is null if it cannot be formed at all (one of its two files missing or broken);
/// the noise account is there as soon as mechanisms.json can be read, so that each half is reviewed alone.
/// Beside a stop a table can have no rows: check RowCount before taking a first or a smallest row.
/// </summary>
public sealed record ReadOutcome(Release? Release, IReadOnlyList<Finding> Findings)
{
    public NoiseAccount? Noise { get; init; }

    /// <summary>Whether every table could be read whole; if not, addresses that lead nowhere are no further fault.</summary>
    public bool TablesAreWhole { get; init; } = true;

    /// <summary>Ids of the tables of which rows could not be read: what does not add up there is no further fault.</summary>
    public IReadOnlyCollection<string> TablesInPart { get; init; } = [];

    /// <summary>Whether every noise rule could be read; if not, a mechanism that nothing uses is no further fault.</summary>
    public bool RulesAreWhole { get; init; } = true;

    /// <summary>The files that were read, to look up where a cell stands; null where a release was made without any.</summary>
    internal Files.FolderFiles? Files { get; init; }

    public bool HasStops => Findings.Any(finding => finding.Level == FindingLevel.Stop);
}
