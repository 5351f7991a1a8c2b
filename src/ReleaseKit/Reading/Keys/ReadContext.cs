using ReleaseKit.Review;

namespace ReleaseKit.Reading.Keys;

/// <summary>What every part of a file is read with: where findings go, whose they are, the main language of plain strings.</summary>
public sealed record ReadContext(FindingLog Log, FindingOwner Owner, string Language)
{
    /// <summary>The same, for the parts of a file that another owner answers for.</summary>
    public ReadContext For(FindingOwner owner) => this with { Owner = owner };

    public void Add(Finding finding) => Log.Add(finding);
}
