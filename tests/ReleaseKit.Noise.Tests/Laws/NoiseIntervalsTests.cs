using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Laws;

/// <summary>Every row of tests/reference/noise-intervals.csv (mpmath, 50 digits; sources in its README).</summary>
public sealed class NoiseIntervalsTests
{
    private const double Relative = 1e-12;

    public static TheoryData<int> Lines => [.. Rows.Select(row => row.Line)];

    private static IReadOnlyList<ReferenceRow> Rows { get; } = ReferenceTable.Read("noise-intervals.csv").Rows;

    [Theory, MemberData(nameof(Lines))]
    public void HalfWidth_at_a_coverage_is_the_reference(int line)
    {
        var (row, law) = At(line);
        var half = law.HalfWidthAt(Coverage.OfShare(row.Number("c")));
        if (law is LatticeLaw)
            Assert.Equal(row.Number("half_width"), half.Width);
        else
            Near(row.Number("half_width"), half.Width, 0);
        Near(row.Number("attained"), half.Attained, 1e-11);
    }

    [Theory, MemberData(nameof(Lines))]
    public void Within_the_half_width_is_the_attained_coverage(int line)
    {
        var (row, law) = At(line);
        Near(row.Number("attained"), law.Within(row.Number("half_width")), 1e-11);
        if (law is LatticeLaw)
            Assert.Equal(row.Number("attained_one_below"), law.Within(row.Number("half_width") - 1), 1e-11);
    }

    [Theory, MemberData(nameof(Lines))]
    public void Moments_are_the_reference(int line)
    {
        var (row, law) = At(line);
        Near(row.Number("variance"), law.Variance, 0);
        Near(row.Number("mean_abs_dev"), law.MeanAbsoluteDeviation, 0);
    }

    private static (ReferenceRow Row, NoiseLaw Law) At(int line)
    {
        var row = Rows[line - 2];
        return (row, NamedLaws.Of(row));
    }

    private static void Near(double expected, double actual, double absolute) =>
        Assert.InRange(actual, expected - Math.Max(absolute, Relative * expected), expected + Math.Max(absolute, Relative * expected));
}
