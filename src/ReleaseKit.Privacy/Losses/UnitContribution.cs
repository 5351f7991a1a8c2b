namespace ReleaseKit.Privacy.Losses;

/// <summary>How much one unit of privacy can move the answers of one mechanism. Amounts are in the figure's unit.</summary>
public abstract record UnitContribution
{
    private UnitContribution()
    {
    }

    /// <summary>
    /// A unit counts in at most <paramref name="CellsPerUnit"/> cells, in each with a contribution from 0 to <paramref name="Most"/>
    /// (from −Most to Most if <paramref name="Signed"/>).
    /// </summary>
    /// <param name="CellsPerUnit">m ≥ 1.</param>
    /// <param name="Most">d &gt; 0.</param>
    /// <param name="Signed">Whether contributions have either sign.</param>
    /// <param name="PerUnit">
    /// B: a bound on the sum of a unit's contributions, or null. Of contributions with either sign it bounds no distance, because they
    /// can cancel in the sum; upper bounds then leave it aside.
    /// </param>
    /// <param name="Moves">False if a unit cannot change cells.</param>
    public sealed record PerCell(int CellsPerUnit, double Most, bool Signed = false, double? PerUnit = null, bool Moves = true) : UnitContribution;

    /// <summary>The absolute differences over all cells add up to at most Δ₁, under the relation that is declared.</summary>
    /// <param name="Most">Δ₁ &gt; 0.</param>
    public sealed record AbsoluteSum(double Most) : UnitContribution;

    /// <summary>The Euclidean distance over all cells is at most Δ₂, under the relation that is declared.</summary>
    /// <param name="Most">Δ₂ &gt; 0.</param>
    public sealed record Euclidean(double Most) : UnitContribution;
}
