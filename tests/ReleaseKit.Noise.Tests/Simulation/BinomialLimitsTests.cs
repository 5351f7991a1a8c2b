namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>The test helper against tests/reference/coverage-limits.csv (exact binomial tails, mpmath; equal to scipy and R).</summary>
public sealed class BinomialLimitsTests
{
    public static TheoryData<int> Lines => [.. Rows.Select(row => row.Line)];

    private static IReadOnlyList<ReferenceRow> Rows { get; } = ReferenceTable.Read("coverage-limits.csv").Rows;

    [Theory, MemberData(nameof(Lines))]
    public void Limits_are_the_reference(int line)
    {
        var row = Rows[line - 2];
        var (trials, chance) = ((int)row.Number("n"), row.Number("coverage"));
        Assert.Equal(row.Number("accept_from"), BinomialLimits.AcceptFrom(trials, chance, BinomialLimits.Level / 2));
        Assert.Equal(row.Number("accept_to"), BinomialLimits.AcceptTo(trials, chance, BinomialLimits.Level / 2));
        Assert.Equal(row.Number("one_sided_accept_from"), BinomialLimits.AcceptFrom(trials, chance, BinomialLimits.Level));
    }
}
