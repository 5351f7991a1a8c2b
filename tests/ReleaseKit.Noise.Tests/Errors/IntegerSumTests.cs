using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Errors;

/// <summary>The rows of tests/reference/sums.csv (mpmath, characteristic function; see its README): integer laws, weights 1 and
/// −1.</summary>
public sealed class IntegerSumTests
{
    public static TheoryData<int> Lines => [.. Rows.Select(row => row.Line)];

    private static IReadOnlyList<ReferenceRow> Rows { get; } = ReferenceTable.Read("sums.csv").Rows;

    private static Dictionary<string, LatticeLaw> Built { get; } = [];

    [Theory, MemberData(nameof(Lines))]
    public void HalfWidth_of_a_sum_is_the_reference(int line)
    {
        var row = Rows[line - 2];
        var sum = SumOf(row.Text("terms"));
        var half = sum.HalfWidthAt(Coverage.OfShare(row.Number("c")));
        Assert.Equal(row.Number("half_width"), half.Width);
        Assert.Equal(row.Number("attained"), half.Attained, 1e-11);
        Assert.Equal(row.Number("attained_one_below"), sum.WithinSteps((long)half.Width - 1), 1e-11);
        Assert.InRange(sum.Variance / row.Number("variance"), 1 - 1e-12, 1 + 1e-12);
    }

    // Symmetric laws: a weight of −1 is a weight of 1.
    private static LatticeLaw SumOf(string terms)
    {
        lock (Built)
            return Built.TryGetValue(terms, out var sum) ? sum : Built[terms] = IntegerSum.Of(terms.Split(';').Select(PartOf));
    }

    private static (LatticeLaw Law, int Count) PartOf(string term)
    {
        var parts = term.Split(':', 3);
        return ((LatticeLaw)NamedLaws.Of(parts[2]), int.Parse(parts[0], System.Globalization.CultureInfo.InvariantCulture));
    }
}
