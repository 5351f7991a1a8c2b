using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>How many cells one unit moves, as a calculation from what is declared ("min(2 × 2, 3) = 3"), and the rule it follows.</summary>
internal static class MovedCells
{
    // What binary arithmetic leaves of a sum that is a multiple of the contribution fills no cell.
    private const double Remainder = 1e-9;

    /// <summary>All cells of the mechanism are <paramref name="cells"/>, 0 where nothing published carries it; the loss is taken over those <paramref name="moved"/>.</summary>
    public static (string Arithmetic, AccountRule Rule) Of(Sensitivity declared, NeighbourRelation relation, long cells, long moved)
    {
        var all = cells == 0 ? long.MaxValue : cells;
        var found = Ways(declared, relation).FirstOrDefault(way => Math.Min(way.Times * way.Cells, all) == moved);
        return found is null ? (Signs.Of(moved), AccountRules.CellsThereAre) : (found.Written(all, moved), found.RuleFor(all));
    }

    /// <summary>A sum for one unit may fill fewer cells than the unit can count in; a record in place of another moves the cells of both where it can change cells.</summary>
    private static IEnumerable<Way> Ways(Sensitivity declared, NeighbourRelation relation)
    {
        var (count, most) = (declared.CellsPerUnit ?? 0, declared.PerCell ?? 0);
        int[] times = relation == NeighbourRelation.AddOrRemove || !declared.Moves ? [1] : declared.Signed ? [1, 2] : [2];
        foreach (var factor in times)
        {
            if (declared.PerUnit is { } sum && Math.Ceiling((sum / most) - Remainder) is var filled && filled < count)
                yield return new Way(factor, (long)filled, $"⌈{Signs.Of(sum)} ÷ {Signs.Of(most)}⌉", AccountRules.BoundedSum);
            yield return new Way(factor, count, Signs.Of(count), AccountRules.Declared);
        }
    }

    private sealed record Way(int Times, long Cells, string Sign, AccountRule Rule)
    {
        public string Written(long all, long moved)
        {
            var product = Times == 1 ? Sign : $"{Times} × {Sign}";
            var limited = Times * Cells > all ? $"min({product}, {all})" : product;
            return limited == Signs.Of(moved) ? limited : $"{limited} = {moved}";
        }

        public AccountRule RuleFor(long all) => Times > 1 ? AccountRules.BothRecords
            : Rule == AccountRules.Declared && Cells > all ? AccountRules.CellsThereAre
            : Rule;
    }
}
