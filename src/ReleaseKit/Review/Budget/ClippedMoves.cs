using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// How far one unit can move the sums or means of one measure at least: what it can put into a sum (its contribution is clipped), divided by the
/// public denominator of a mean. Only what is certain counts: one cell; a cell with the totals above it; the smallest move on every level and in every period.
/// </summary>
internal sealed class ClippedMoves
{
    private readonly List<double[]> together;

    private ClippedMoves(IReadOnlyDictionary<int, double> moves, double smallest, Table table)
    {
        SmallestDenominator = smallest;
        One = moves.Values.Max();
        together = [.. WithTotals(moves, table), SmallestOnEachLevel(moves, table)];
    }

    public double SmallestDenominator { get; }

    /// <summary>In one cell.</summary>
    public double One { get; }

    /// <summary>Over all its cells, as an absolute sum.</summary>
    public double Sum => together.Max(moves => moves.Sum());

    /// <summary>Over all its cells, as a length.</summary>
    public double Length => together.Max(moves => Math.Sqrt(moves.Sum(move => move * move)));

    /// <summary>Null where the mechanism does not say enough, or no mean of the measure carries it.</summary>
    public static ClippedMoves? Of(Table table, Measure measure, Mechanism mechanism, Neighbouring neighbouring)
    {
        if (mechanism.Clipped is not { } clipped || NumbersOf(table, measure, mechanism) is not { } numbers)
            return null;
        var most = neighbouring == Neighbouring.Replace ? clipped.To - clipped.From : Math.Max(Math.Abs(clipped.From), Math.Abs(clipped.To));
        var rows = Enumerable.Range(0, table.RowCount).Where(row => measure.HasNumber(row) && numbers(row) > 0
            && measure.RuleAt(row) is NoiseRule.FromMechanism from && from.Mechanism.Id == mechanism.Id).ToList();
        return rows.Count == 0 ? null : new(rows.ToDictionary(row => row, row => most / numbers(row)), rows.Min(numbers), table);
    }

    /// <summary>By what the sum of a row is divided: 1 for an amount, or for what else is clipped without a denominator; for a mean the denominators, which stand in a column that is declared as public or is a measure itself.</summary>
    private static Func<int, double>? NumbersOf(Table table, Measure measure, Mechanism mechanism) => (measure.Kind, mechanism.DenominatorColumn) switch
    {
        (MeasureKind.Amount, _) or (MeasureKind.Count or MeasureKind.Estimate, null) => _ => 1,
        (MeasureKind.Mean, { } column) => NumbersOf(table, column),
        _ => null,
    };

    private static Func<int, double>? NumbersOf(Table table, string column)
    {
        if (table.SideColumns.FirstOrDefault(side => side.Column == column) is { } found)
            return row => found.Numbers[row];
        return table.Measures.FirstOrDefault(measure => measure.Column == column) is { } figure
            ? row => figure.HasNumber(row) ? figure.ValueAt(row).ToDouble() * figure.Multiplier : double.NaN
            : null;
    }

    /// <summary>For each cell its move and those of the totals that hold it: whoever is counted in the cell is counted in them.</summary>
    private static IEnumerable<double[]> WithTotals(IReadOnlyDictionary<int, double> moves, Table table)
    {
        var wholes = new Wholes(table, moves.Keys);
        return moves.Keys.Select(row => wholes.Of(row).Select(whole => moves[whole]).ToArray());
    }

    private static double[] SmallestOnEachLevel(IReadOnlyDictionary<int, double> moves, Table table)
    {
        var levelOf = Levels.LevelOf(table);
        return [.. moves.GroupBy(pair => levelOf(pair.Key)).Select(level => level.Min(pair => pair.Value))];
    }
}
