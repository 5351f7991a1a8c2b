using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>Samplers against the reference: the share of draws within the reference half-width is its attained coverage (two-sided, level
/// 1e-6).</summary>
public sealed class SamplersTests
{
    private const int Trials = 100_000;

    public static TheoryData<int> Lines =>
        [.. Rows.Where(row => row.Number("attained") < 0.9999 && (row.Number("c") is 0.5 or 0.95)).Select(row => row.Line)];

    private static IReadOnlyList<ReferenceRow> Rows { get; } = ReferenceTable.Read("noise-intervals.csv").Rows;

    [Theory, MemberData(nameof(Lines))]
    public void Draws_lie_within_the_half_width_as_often_as_the_reference_says(int line)
    {
        var row = Rows[line - 2];
        var (law, random, width) = (NamedLaws.Of(row), new Random(line), row.Number("half_width"));
        var hits = Enumerable.Range(0, Trials).Count(_ => Math.Abs(Samplers.Draw(law, random)) <= width);
        BinomialLimits.AssertTwoSided(hits, Trials, row.Number("attained"));
    }

    [Fact]
    public void Draws_from_a_table_follow_its_chances()
    {
        var (law, random) = (TabulatedLaw.Of([(-1, 0.25m), (0, 0.5m), (3, 0.2m)]), new Random(7));
        var counts = Enumerable.Range(0, Trials).Select(_ => Samplers.Draw(law, random)).CountBy(draw => draw).ToDictionary();
        foreach (var (step, chance) in new[] { (-1, 0.25), (0, 0.5), (3, 0.2), (1_000_000, 0.05) })
            BinomialLimits.AssertTwoSided(counts[step], Trials, chance);
    }
}
