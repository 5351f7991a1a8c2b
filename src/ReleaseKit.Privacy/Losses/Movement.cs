namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// The ways in which two neighbouring data sets can differ in the cells of one mechanism, from <see cref="UnitContribution.PerCell"/>.
/// The loss of a law that grows faster than its shift is largest for few large shifts, that of a law of steps for many small ones;
/// the loss is linear in the number of cells where the old and the new record meet, so that the two ends of that number are enough.
/// </summary>
internal static class Movement
{
    // What binary arithmetic leaves of a bound that is a multiple of the contribution is no contribution.
    private const double Remainder = 1e-9;

    /// <summary>
    /// Arrangements of shifts of which one is the worst. Each is sorted, largest shift first. A bound on a unit's sum counts only if contributions
    /// have one sign and the loss grows with the shift.
    /// </summary>
    public static IReadOnlyList<IReadOnlyList<ShiftRun>> Worst(UnitContribution.PerCell unit, NeighbourRelation relation, long cells, bool growsWithShift) =>
        Arrangements(unit.Signed || !growsWithShift ? unit with { PerUnit = null } : unit, relation, cells);

    /// <summary>Arrangements that two records within the declared bounds attain.</summary>
    public static IReadOnlyList<IReadOnlyList<ShiftRun>> Attained(UnitContribution.PerCell unit, NeighbourRelation relation, long cells) =>
        Arrangements(unit, relation, cells);

    private static IReadOnlyList<IReadOnlyList<ShiftRun>> Arrangements(UnitContribution.PerCell unit, NeighbourRelation relation, long cells)
    {
        var touched = Math.Min(unit.CellsPerUnit, cells);
        if (relation == NeighbourRelation.AddOrRemove)
            return [OneRecord(unit, touched, 1)];
        if (unit.Signed)
            return unit.Moves && Apart(unit, touched, cells) is { Count: > 0 } apart ? [OneRecord(unit, touched, 2), apart] : [OneRecord(unit, touched, 2)];
        return [TwoRecords(unit, touched, unit.Moves ? cells : touched)];
    }

    // ⌊B/d⌋ cells at d and one at what is left of B, at most as many cells as are touched.
    private static List<ShiftRun> OneRecord(UnitContribution.PerCell unit, long touched, int times)
    {
        var sum = Math.Min(unit.PerUnit ?? double.PositiveInfinity, touched * unit.Most);
        var full = (long)Math.Min(touched, GridSteps.Down(sum, unit.Most));
        var left = sum - (full * unit.Most);
        var rest = full < touched && (full == 0 || left > Remainder * unit.Most) ? left : 0;
        return [.. Runs((times * unit.Most, full), (times * rest, 1))];
    }

    // The old record leaves its cells and the new one enters others, as far as there are cells: the largest shifts count.
    private static List<ShiftRun> TwoRecords(UnitContribution.PerCell unit, long touched, long cells)
    {
        var left = cells;
        var both = new List<ShiftRun>();
        foreach (var run in OneRecord(unit, touched, 1))
        {
            var taken = Math.Min(2 * run.Cells, left);
            left -= taken;
            both.AddRange(Runs((run.Shift, taken)));
        }

        return both;
    }

    // Signed contributions in as few common cells as the number of cells allows.
    private static List<ShiftRun> Apart(UnitContribution.PerCell unit, long touched, long cells)
    {
        var common = Math.Max(0, (2 * touched) - cells);
        var one = OneRecord(unit, touched, 1);
        var apart = one.Select(run => (run.Shift, 2 * Math.Min(run.Cells, touched - common)));
        return [.. Runs([(2 * unit.Most, unit.PerUnit is null ? common : 0), .. apart])];
    }

    private static IEnumerable<ShiftRun> Runs(params IEnumerable<(double Shift, long Cells)> runs) =>
        runs.Where(run => run is { Shift: > 0, Cells: > 0 }).Select(run => new ShiftRun(run.Shift, run.Cells));
}
