using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>
/// A mechanism, its cells, and what its law spends on them. <c>Loss</c> is null where it cannot be worked out: a declared law,
/// a law or a sensitivity that is not given in full.
/// </summary>
public sealed record MechanismSpending(Mechanism Mechanism, MechanismCells Cells, MechanismLoss? Loss)
{
    // Far beyond any table, and small enough to be doubled and multiplied.
    private const long Unlimited = 1L << 40;

    /// <summary>Of each mechanism of an account, in its order; without a release, of what mechanisms.json alone says.</summary>
    public static IReadOnlyList<MechanismSpending> Of(NoiseAccount account, Release? release)
    {
        var cells = release is null ? new Dictionary<string, MechanismCells>() : MechanismCells.Of(release);
        return [.. account.Mechanisms.Select(mechanism => Of(account, mechanism, cells.GetValueOrDefault(mechanism.Id, MechanismCells.None)))];
    }

    /// <summary>What one unit can contribute, as declared; null if that is not said in full.</summary>
    public static UnitContribution? ContributionOf(Sensitivity sensitivity) => sensitivity switch
    {
        { CellsPerUnit: >= 1 and var cells, PerCell: > 0 and var most, PerUnit: null or > 0 } =>
            new UnitContribution.PerCell(cells, most, sensitivity.Signed, sensitivity.PerUnit, sensitivity.Moves),
        { L1: > 0 and var sum } => new UnitContribution.AbsoluteSum(sum),
        { L2: > 0 and var distance } => new UnitContribution.Euclidean(distance),
        _ => null,
    };

    public static NeighbourRelation RelationOf(Neighbouring neighbouring) =>
        neighbouring == Neighbouring.Replace ? NeighbourRelation.Replace : NeighbourRelation.AddOrRemove;

    /// <summary>The loss with parameters, sensitivity or relation altered: to recognise for which reading a declared number was worked out.</summary>
    public MechanismLoss? LossOf(Mechanism altered, NeighbourRelation relation) =>
        LossOf(altered, altered.Parameters == Mechanism.Parameters ? Cells : Cells with { ByLaw = OneLaw(altered, Math.Max(1, Cells.Count)) }, relation);

    private static MechanismSpending Of(NoiseAccount account, Mechanism mechanism, MechanismCells cells) =>
        new(mechanism, cells, LossOf(mechanism, cells, RelationOf(account.Neighbouring)));

    // Where nothing published carries it, its law must stand in the mechanism itself, and its cells are without number.
    private static MechanismLoss? LossOf(Mechanism mechanism, MechanismCells cells, NeighbourRelation relation)
    {
        var laws = cells.ByLaw.Count > 0 ? cells.ByLaw : OneLaw(mechanism, Unlimited);
        return laws.Count > 0 && ContributionOf(mechanism.Sensitivity) is { } unit ? MechanismLoss.Of(laws, unit, relation) : null;
    }

    private static IReadOnlyList<NoisedCells> OneLaw(Mechanism mechanism, long cells) =>
        new DeclaredLaws().TryLawOf(mechanism, null, 0) is { } law ? [new NoisedCells(law, cells)] : [];
}
