namespace ReleaseKit.Review;

/// <summary>What makes findings alike: a review prints only the first few of a kind in full.</summary>
public readonly record struct FindingKind(FindingLevel Level, string Slug, FindingOwner For, string File);
