namespace ReleaseKit.Privacy.Losses;

/// <summary>Which two data sets count as neighbours.</summary>
public enum NeighbourRelation
{
    /// <summary>One unit more or less.</summary>
    AddOrRemove,

    /// <summary>One unit's record replaced by another's.</summary>
    Replace,
}
