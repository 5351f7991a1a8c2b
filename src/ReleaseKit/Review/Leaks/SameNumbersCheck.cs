using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Review.Budget;

namespace ReleaseKit.Review.Leaks;

/// <summary>Two columns that are said to carry noise of their own and have the same numbers in every row they share: two columns of a table, or one column of two tables.</summary>
internal sealed class SameNumbersCheck : IReviewCheck
{
    /// <summary>Fewer rows can be alike for other reasons.</summary>
    private const int LeastRows = 8;

    private const double Unlikely = 1e-6;

    // A third column that is like two others is told of once.
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Origins: { } origins }
        ? InOneTable(release, origins).Concat(InTwoTables(release, origins)).OfType<Finding>().DistinctBy(finding => finding.Address)
        : [];

    private static IEnumerable<Finding?> InOneTable(Release release, FigureOrigins origins) =>
        from table in Enumerable.Range(0, release.Tables.Count)
        from one in Enumerable.Range(0, release.Tables[table].Measures.Count)
        from other in Enumerable.Range(one + 1, release.Tables[table].Measures.Count - one - 1)
        select Compare(release, origins, new(table, one), new(table, other), Enumerable.Range(0, release.Tables[table].RowCount).Select(row => new Pair(row, row)));

    private static IEnumerable<Finding?> InTwoTables(Release release, FigureOrigins origins)
    {
        var cells = release.Tables.Select(table => new Lazy<CellNames>(() => new CellNames(table))).ToList();
        for (var one = 0; one < release.Tables.Count; one++)
            for (var other = one + 1; other < release.Tables.Count; other++)
                foreach (var (left, right) in Namesakes(release.Tables[one], release.Tables[other]))
                    yield return Compare(release, origins, new(one, left), new(other, right), Pairs(cells[one].Value, release.Tables[other]));
    }

    private static IEnumerable<(int, int)> Namesakes(Table one, Table other) =>
        from left in Enumerable.Range(0, one.Measures.Count)
        from right in Enumerable.Range(0, other.Measures.Count)
        where one.Measures[left].Column == other.Measures[right].Column
        select (left, right);

    private static IEnumerable<Pair> Pairs(CellNames cells, Table other) => Enumerable.Range(0, other.RowCount)
        .Select(row => new Pair(cells.RowLike(other, row), row)).Where(pair => pair.Left >= 0);

    /// <summary>Stops reading at the first row that differs, which between honest columns is among the first.</summary>
    private static Finding? Compare(Release release, FigureOrigins origins, Column left, Column right, IEnumerable<Pair> rows)
    {
        var (one, other) = (left.Of(release), right.Of(release));
        var (same, chance, first) = (0, 1.0, -1);
        foreach (var (row, row2) in rows.Where(pair => HasOwnNoise(one, pair.Left) && HasOwnNoise(other, pair.Right)))
        {
            if (one.ValueAt(row).ToDecimal() * (decimal)one.Multiplier != other.ValueAt(row2).ToDecimal() * (decimal)other.Multiplier)
                return null;
            (same, first) = (same + 1, first < 0 ? row2 : first);
            chance *= ChanceOfJust(origins, new(right.Table, right.Measure, row2), other.ValueAt(row2).Times(other.Multiplier).ToDouble());
        }
        return same >= LeastRows && chance < Unlikely ? Found(release, left, right, first, same, chance) : null;
    }

    private static bool HasOwnNoise(Measure measure, int row) => measure.HasNumber(row) && measure.RuleAt(row) is NoiseRule.FromMechanism;

    private static double ChanceOfJust(FigureOrigins origins, FigureRef at, double value) => origins.Of(at).Error?.Error.ChanceOfJust(value) ?? 1;

    private static Finding Found(Release release, Column left, Column right, int row, int count, double chance)
    {
        var (table, measure) = (release.Tables[right.Table], right.Of(release));
        var named = $"{release.Tables[left.Table].Id}/{left.Of(release).Column}";
        return new Finding(
            FindingLevel.Caution, "same-numbers", FindingOwner.Noise, Place.OfCell(table.File, row, measure.Column),
            $"{table.Id}/{measure.Column} has the numbers of {named} in all {count} rows with noise that both have, and each is said to have noise of its own. The chance of that is {BudgetText.Chance(chance)}.",
            "if both show one draw, sums and differences of the two have other margins than stated, and the budget counts the draw twice; if they are two runs of one seed, they protect less than stated.",
            $"publish one draw once: take the column out of {(left.Table == right.Table ? "the table" : $"table \"{table.Id}\"")}, and cite {named} where it is needed (\"sameDrawAs\", which says that two columns share a draw, is not read by this version); or else publish the numbers of the second run.")
        {
            Address = FigureAddress.Canonical(table, measure, row),
        };
    }

    private readonly record struct Pair(int Left, int Right);

    private readonly record struct Column(int Table, int Measure)
    {
        public Measure Of(Release release) => release.Tables[Table].Measures[Measure];
    }
}
