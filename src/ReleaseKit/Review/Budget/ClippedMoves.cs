using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// How far one unit can move the sums, means, shares or rates of one measure at least: what it can put into a sum (its contribution is clipped; of a
/// share or rate of units it is 1 of the numerator), divided by the public denominator. Only what is certain counts: one cell; a cell with the totals above it; the smallest moves on every level and in
/// every period; and the same for a unit that is replaced by one of another cell, so that both cells move.
/// </summary>
internal sealed class ClippedMoves
{
    private readonly IReadOnlyDictionary<int, double> denominators;
    private readonly Dictionary<int, int[]> countedIn;
    private readonly List<List<int>> levels;

    private ClippedMoves(Table table, IReadOnlyDictionary<int, double> denominators, ClippedTo clipped, Neighbouring neighbouring, bool changesCells)
    {
        var wholes = new Wholes(table, denominators.Keys);
        (this.denominators, countedIn) = (denominators, denominators.Keys.ToDictionary(row => row, row => wholes.Of(row).ToArray()));
        levels = [.. denominators.Keys.GroupBy(Levels.LevelOf(table)).Select(level => level.ToList())];
        SmallestDenominator = denominators.Values.Min();
        var place = neighbouring == Neighbouring.Replace ? new Exchange(clipped.To, clipped.From) : new Exchange(clipped.Outermost, 0);
        Take(InPlace(place.InBoth));
        // Contributions of either sign lie up to twice "perCell" apart.
        SignedPerCell = neighbouring == Neighbouring.Replace ? One / 2 : One;
        if (neighbouring == Neighbouring.Replace && changesCells)
            TakeApart(clipped);
    }

    public double SmallestDenominator { get; }

    /// <summary>In one cell.</summary>
    public double One { get; private set; }

    /// <summary>What "perCell" must be at least for contributions of either sign.</summary>
    public double SignedPerCell { get; private set; }

    /// <summary>Over all its cells, as an absolute sum.</summary>
    public double Sum { get; private set; }

    /// <summary>Over all its cells, as a length.</summary>
    public double Length { get; private set; }

    /// <summary>Whether two cells in which a unit is not counted together move by more than one does.</summary>
    public bool IsApart { get; private set; }

    /// <summary>Null where the folder does not say enough, or no figure of the measure carries the mechanism.</summary>
    public static ClippedMoves? Of(Table table, Measure measure, Mechanism mechanism, NoiseAccount account)
    {
        if (ContributionOf(measure, mechanism, account) is not { } contribution || NumbersOf(table, measure, mechanism) is not { } numbers)
            return null;
        var rows = Enumerable.Range(0, table.RowCount).Where(row => measure.HasNumber(row) && numbers(row) > 0
            && measure.RuleAt(row) is NoiseRule.FromMechanism from && from.Mechanism.Id == mechanism.Id).ToList();
        return rows.Count == 0 ? null : new(table, rows.ToDictionary(row => row, numbers), contribution, account.Neighbouring, mechanism.Sensitivity.Moves);
    }

    // A share or rate of what may stand several times in the numerator for one unit is bounded by nothing that was said.
    private static ClippedTo? ContributionOf(Measure measure, Mechanism mechanism, NoiseAccount account) => measure switch
    {
        { Kind: not (MeasureKind.Share or MeasureKind.Rate) } => mechanism.Clipped,
        { Whole: > 0 and var whole } when BudgetText.IsUnitOfPrivacy(measure.Unit, account) => new ClippedTo(0, whole),
        _ => null,
    };

    /// <summary>By what the sum of a row is divided: 1 for an amount, or for what else is clipped without a denominator; for a mean, share or rate the denominators, which stand in a column that is declared as public or is a measure itself.</summary>
    private static Func<int, double>? NumbersOf(Table table, Measure measure, Mechanism mechanism) => (measure.Kind, mechanism.DenominatorColumn) switch
    {
        (MeasureKind.Amount, _) or (MeasureKind.Count or MeasureKind.Estimate, null) => _ => 1,
        (MeasureKind.Mean or MeasureKind.Share or MeasureKind.Rate, { } column) => NumbersOf(table, column),
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

    private void Take(IEnumerable<double[]> together)
    {
        foreach (var moves in together)
        {
            One = Math.Max(One, moves.Max());
            Sum = Math.Max(Sum, moves.Sum());
            Length = Math.Max(Length, Math.Sqrt(moves.Sum(move => move * move)));
        }
    }

    /// <summary>For each cell its move and those of the totals that hold it: whoever is counted in the cell is counted in them. Then the smallest on each level.</summary>
    private IEnumerable<double[]> InPlace(double by) => countedIn.Values.Select(cells => cells.Select(cell => by / denominators[cell]).ToArray())
        .Append([.. levels.Select(level => by / level.Max(row => denominators[row]))]);

    private void TakeApart(ClippedTo clipped)
    {
        var (inPlace, several) = (Sum, levels.Where(level => level.Count > 1).ToList());
        foreach (var exchange in Exchange.OfOthers(clipped))
            Take([.. several.SelectMany(level => FromOneToEachOther(level, exchange)), [.. levels.SelectMany(level => SmallestApart(level, exchange))]]);
        if (several.Count > 0)
            SignedPerCell = Math.Max(SignedPerCell, clipped.Outermost / several.Min(level => level.Min(row => denominators[row])));
        IsApart = Sum > inPlace;
    }

    // The cell that moves most with its totals, and every other: not all pairs, of which a long table has too many.
    private IEnumerable<double[]> FromOneToEachOther(List<int> level, Exchange exchange)
    {
        var left = level.MaxBy(row => countedIn[row].Sum(cell => 1 / denominators[cell]));
        var leaving = countedIn[left];
        return level.Where(row => row != left).Select(row => countedIn[row])
            .Select(entered => leaving.Concat(entered.Where(cell => !leaving.Contains(cell)))
                .Select(cell => exchange.In(leaving.Contains(cell), entered.Contains(cell)) / denominators[cell]).ToArray());
    }

    private IEnumerable<double> SmallestApart(List<int> level, Exchange exchange)
    {
        if (level.Count == 1)
            return [exchange.InBoth / denominators[level[0]]];
        var largest = level.Select(row => denominators[row]).OrderDescending().Take(2).ToList();
        return [exchange.Smaller / largest[1], exchange.Larger / largest[0]];
    }
}
