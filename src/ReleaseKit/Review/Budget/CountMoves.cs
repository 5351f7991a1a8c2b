using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// How many cells of a count of units one unit moves by 1, at least: the cell that counts it and the totals above; replaced by a unit that another
/// cell of the same level counts, the cells that hold one of the two.
/// </summary>
/// <param name="Counted">In how many cells a unit is counted.</param>
/// <param name="Moved">How many cells of them differ between neighbouring data.</param>
internal sealed record CountMoves(int Counted, int Moved)
{
    /// <summary>Null where no figure of the measure carries the mechanism.</summary>
    public static CountMoves? Of(Table table, Measure measure, Mechanism mechanism, Neighbouring neighbouring)
    {
        var rows = Enumerable.Range(0, table.RowCount)
            .Where(row => measure.HasNumber(row) && measure.RuleAt(row) is NoiseRule.FromMechanism from && from.Mechanism.Id == mechanism.Id).ToList();
        if (rows.Count == 0)
            return null;
        var wholes = new Wholes(table, rows);
        var deepest = rows.MaxBy(row => wholes.Of(row).Count());
        var counting = wholes.Of(deepest).ToHashSet();
        return new(counting.Count, neighbouring == Neighbouring.Replace && mechanism.Sensitivity.Moves ? Replaced(table, rows, deepest, counting, wholes) : counting.Count);
    }

    private static int Replaced(Table table, List<int> rows, int from, HashSet<int> counting, Wholes wholes)
    {
        var levelOf = Levels.LevelOf(table);
        var level = levelOf(from);
        return rows.Where(row => row != from && levelOf(row) == level)
            .Select(row => wholes.Of(row).ToList()).Select(other => other.Count + counting.Count - (2 * other.Count(counting.Contains)))
            .Append(1).Max();
    }
}
