using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Laws;

/// <summary>
/// Worked examples and handbook tables (tests/reference/published.csv; citation and status in each row), each judged by its own tolerance.
/// </summary>
public sealed class PublishedExamplesTests
{
    private static IReadOnlyList<ReferenceRow> Rows { get; } = ReferenceTable.Read("published.csv").Rows;

    /// <summary>Dwork &amp; Roth 2014, section 3.3: with chance 0.95 none of 10,000 names is off by more than 12.2.</summary>
    [Fact]
    public void Largest_of_ten_thousand_Laplace_errors() =>
        Matches(1, LaplaceLaw.Of(1).HalfWidthAt(Coverage.OfShare(1 - 0.05 / 10_000)).Width);

    /// <summary>Dwork &amp; Roth 2014, Fact 3.7.</summary>
    [Fact]
    public void Laplace_tail_beyond_three_scales() => Matches(2, 1 - LaplaceLaw.Of(1).Within(3));

    /// <summary>NIST/SEMATECH e-Handbook; Abramowitz &amp; Stegun 1964, table 26.5.</summary>
    [Theory]
    [InlineData(8, 0.9)]
    [InlineData(9, 0.95)]
    [InlineData(10, 0.98)]
    [InlineData(11, 0.99)]
    public void Two_sided_normal_half_width(int id, double share) => Matches(id, GaussianLaw.Of(1).HalfWidthAt(Coverage.OfShare(share)).Width);

    /// <summary>Abramowitz &amp; Stegun 1964, table 26.1, 15 decimals.</summary>
    [Theory]
    [InlineData(12, 1)]
    [InlineData(13, 2)]
    [InlineData(14, 3)]
    public void Normal_distribution_function(int id, double z) => Matches(id, GaussianLaw.Of(1).AtMost(z));

    /// <summary>JCGM 100:2008 (GUM), table G.1.</summary>
    [Theory]
    [InlineData(15, 1)]
    [InlineData(16, 2)]
    [InlineData(17, 3)]
    public void Normal_coverage_of_k_sigma(int id, double k) => Matches(id, GaussianLaw.Of(1).Within(k));

    /// <summary>JCGM 100:2008 (GUM), G.1.3 (section number uncertain).</summary>
    [Theory]
    [InlineData(18, 0.95)]
    [InlineData(19, 0.99)]
    public void Rectangular_coverage_factor(int id, double share)
    {
        var law = UniformLaw.Of(1);
        Matches(id, law.HalfWidthAt(Coverage.OfShare(share)).Width / Math.Sqrt(law.Variance));
    }

    /// <summary>JCGM 100:2008 (GUM), 4.3.7.</summary>
    [Fact]
    public void Rectangular_standard_deviation() => Matches(20, Math.Sqrt(UniformLaw.Of(1).Variance));

    /// <summary>Geng &amp; Viswanath 2014: at the best gamma the expected absolute error is Δe^(ε/2)/(e^ε − 1).</summary>
    [Fact]
    public void Staircase_least_expected_absolute_error()
    {
        var gamma = 1 / (1 + Math.Exp(0.5));
        Matches(50, gamma);
        Matches(51, StaircaseLaw.Of(1, 1, gamma).MeanAbsoluteDeviation);
    }

    // One unit in the last place of a double near 1 is 1.1e-16: the tables' 5e-16 leaves room for it.
    private static void Matches(int id, double actual)
    {
        var row = Rows.Single(row => row.Text("id") == id.ToString(System.Globalization.CultureInfo.InvariantCulture));
        Assert.Equal(row.Number("recomputed"), actual, Math.Max(row.Number("tolerance"), 2e-16));
    }
}
