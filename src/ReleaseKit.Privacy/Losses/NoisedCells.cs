using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>Cells of one mechanism that carry the same law.</summary>
/// <param name="Law">The law of the noise of each.</param>
/// <param name="Count">How many cells, ≥ 1.</param>
public readonly record struct NoisedCells(NoiseLaw Law, long Count);
