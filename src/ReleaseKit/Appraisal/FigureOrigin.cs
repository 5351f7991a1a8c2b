using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Where the error of one figure comes from.</summary>
/// <param name="Rule">What says so: an exact or public rule, or one that leads to a mechanism.</param>
/// <param name="Error">The error; null for exact and public figures, and where no valid error is known.</param>
/// <param name="Mechanism">The mechanism of its draws, if they share one.</param>
/// <param name="Draws">How many draws it holds.</param>
internal sealed record FigureOrigin(NoiseRule Rule, DistinctError? Error, Mechanism? Mechanism, int Draws)
{
    /// <summary>For a sum: how many parts it has, down to those that are no sums.</summary>
    public int Parts { get; init; }

    /// <summary>How many of its parts are hidden but in the sum.</summary>
    public int PartsHidden { get; init; }

    /// <summary>How many of its parts have no number and are not in the sum.</summary>
    public int PartsLeftOut { get; init; }
}
