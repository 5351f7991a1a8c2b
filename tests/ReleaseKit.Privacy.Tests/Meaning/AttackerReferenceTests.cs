using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Meaning;

namespace ReleaseKit.Privacy.Tests.Meaning;

/// <summary>Every row of tests/reference/attacker.csv, to 1e-9 relative.</summary>
public sealed class AttackerReferenceTests
{
    [Fact]
    public void Highest_belief_equals_the_reference() =>
        Assert.All(Rows("posterior"), row => Same(row, BeliefBound.Highest(row.Number("prior_or_fpr"), EpsilonOf(row))));

    [Fact]
    public void Largest_success_of_a_test_equals_the_reference() =>
        Assert.All(Rows("max-true-positive-rate"), row => Same(row, TestBound.LargestSuccess(CurveOf(row), row.Number("prior_or_fpr"))));

    [Fact]
    public void Largest_success_against_Gaussian_noise_equals_the_reference() =>
        Assert.All(Rows("max-true-positive-rate-gdp"), row => Same(row, TestBound.LargestSuccess(new GaussianCurve(row.Number("mu")), row.Number("prior_or_fpr"))));

    private static List<ReferenceRow> Rows(string measure)
    {
        var rows = ReferenceRow.Of("attacker.csv").Where(row => row["measure"] == measure).ToList();
        Assert.NotEmpty(rows);
        return rows;
    }

    private static Epsilon EpsilonOf(ReferenceRow row) => Epsilon.Of(row.Number("eps"));

    private static ApproximateCurve CurveOf(ReferenceRow row) => new(new ApproximateLoss(EpsilonOf(row), Delta.Of(row.Number("delta"))));

    private static void Same(ReferenceRow row, double actual) =>
        ReferenceRow.Near(row.Number("value"), actual, $"{row["measure"]} {row["eps"]} {row["delta"]} {row["mu"]} {row["prior_or_fpr"]}");
}
