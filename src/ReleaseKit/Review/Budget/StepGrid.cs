using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Grids and bounds of the noise in decimal, as published values are compared with them.</summary>
internal static class StepGrid
{
    // Far beyond every published value, and within what decimal holds.
    private const double Farthest = 1e27;

    /// <summary>The grid of a law on a lattice; null for a continuous one and for one that is known by its spending only.</summary>
    public static decimal? OfLaw(Mechanism mechanism) =>
        mechanism.Law is LawName.DiscreteLaplace or LawName.DiscreteGaussian or LawName.DiscreteUniform or LawName.TruncatedDiscreteLaplace or LawName.Tabulated
            ? Exactly(mechanism.Grid)
            : null;

    public static decimal Exactly(double number) => (decimal)Math.Clamp(number, -Farthest, Farthest);

    /// <summary>A published value in the figure's unit.</summary>
    public static decimal InUnits(Measure measure, PublishedValue value) =>
        new decimal(value.Unscaled) / (decimal)PublishedValue.PowerOfTen(value.Decimals) * (decimal)measure.Multiplier;
}
