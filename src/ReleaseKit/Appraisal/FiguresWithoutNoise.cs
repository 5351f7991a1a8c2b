using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Why figures stand in the release without noise.</summary>
public enum WithoutNoiseKind
{
    /// <summary>Declared as exact: from the confidential records, outside the guarantee.</summary>
    Exact,

    /// <summary>A side column worked out on the confidential records without a mechanism: counts as exact.</summary>
    ConfidentialColumn,

    /// <summary>Cells hidden because of their value before noise: what is hidden counts as exact.</summary>
    HiddenByValueBeforeNoise,

    /// <summary>Known from elsewhere, not from the records: no cost, and no breach of the guarantee.</summary>
    Public,
}

/// <summary>Figures of one column that carry no noise, for one reason.</summary>
/// <param name="Table">Index of the table.</param>
/// <param name="Measure">Index of the measure, or −1 for a side column or hidden cells.</param>
/// <param name="Column">The column in the CSV; empty for hidden cells.</param>
/// <param name="Kind">Why there is no noise.</param>
/// <param name="Reason">Reason or source as the folder gives it, or null.</param>
/// <param name="Count">How many figures.</param>
public sealed record FiguresWithoutNoise(int Table, int Measure, string Column, WithoutNoiseKind Kind, ReaderText? Reason, int Count)
{
    /// <summary>The row of the first of them.</summary>
    public int FirstRow { get; init; }
}
