using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Tests.Composition;

/// <summary>Every row of tests/reference/composition.csv (50-digit arithmetic, cross-checked; sources in its README), to 1e-9 relative.</summary>
public sealed class CompositionReferenceTests
{
    public static TheoryData<string> Rules => [.. ReferenceRow.Of("composition.csv").Select(row => row["rule"]).Distinct()];

    [Theory]
    [MemberData(nameof(Rules))]
    public void Reference_rows_of_a_rule_hold(string rule)
    {
        var rows = ReferenceRow.Of("composition.csv").Where(row => row["rule"] == rule).ToList();
        Assert.NotEmpty(rows);
        Assert.All(rows, Check);
    }

    private static void Check(ReferenceRow row)
    {
        switch (row["rule"])
        {
            case "pure-sum":
                Same(row, "out_eps", BasicComposition.Sum(row.Runs().Select(run => Epsilon.Of(run["eps"]))).Value);
                break;
            case "approx-basic-sum":
                var sum = BasicComposition.Sum(row.Runs().Select(run => new ApproximateLoss(Epsilon.Of(run["eps"]), Delta.Of(run["delta"]))));
                Same(row, "out_eps", sum.Epsilon.Value);
                Same(row, "out_delta", sum.Delta.Value);
                break;
            case "zcdp-sum":
                Same(row, "out_rho", BasicComposition.Sum(row.Runs().Select(run => Rho.Of(run["rho"]))).Value);
                break;
            case "zcdp-of-gaussian":
                var gaussian = row.Runs().Single();
                Same(row, "out_rho", new GaussianCurve(gaussian["sensitivity"] / gaussian["sigma"]).Rho.Value);
                break;
            case "zcdp-of-pure":
                Same(row, "out_rho", PureConversion.QuadraticRho(Epsilon.Of(row.Runs().Single()["eps"])).Value);
                break;
            default:
                CheckConversion(row);
                break;
        }
    }

    private static void CheckConversion(ReferenceRow row)
    {
        switch (row["rule"])
        {
            case "zcdp-to-approx-simple":
                Same(row, "out_eps", ConcentratedConversion.SimpleEpsilonAt(RhoOf(row), GivenDelta(row)).Value);
                break;
            case "zcdp-to-approx-tight":
                Same(row, "out_eps", ConcentratedConversion.EpsilonAt(RhoOf(row), GivenDelta(row)).Value);
                break;
            case "zcdp-to-approx-tight-delta":
                Same(row, "out_delta", ConcentratedConversion.DeltaAt(RhoOf(row), GivenEpsilon(row)).Value);
                break;
            case "gaussian-exact-delta":
                Same(row, "out_delta", CurveOf(row).DeltaAt(GivenEpsilon(row)).Value);
                break;
            case "gaussian-exact-eps":
                Same(row, "out_eps", CurveOf(row).EpsilonAt(GivenDelta(row)).Value);
                break;
            case "gaussian-exact-sigma":
                Same(row, "out_sigma", row.Runs().Single()["sensitivity"] / GaussianCurve.LargestMu(GivenEpsilon(row), GivenDelta(row)));
                break;
            default:
                Assert.Fail($"No check for the rule {row["rule"]}.");
                break;
        }
    }

    private static GaussianCurve CurveOf(ReferenceRow row)
    {
        var run = row.Runs().Single();
        return new GaussianCurve(run["sensitivity"] / run["sigma"]);
    }

    private static Rho RhoOf(ReferenceRow row) => BasicComposition.Sum(row.Runs().Select(run => Rho.Of(run["rho"])));

    private static Delta GivenDelta(ReferenceRow row) => Delta.Of(row.Number("given_delta"));

    private static Epsilon GivenEpsilon(ReferenceRow row) => Epsilon.Of(row.Number("given_eps"));

    private static void Same(ReferenceRow row, string column, double actual) =>
        ReferenceRow.Near(row.Number(column), actual, $"{row["rule"]} {row["mechanisms"]} {row["given_eps"]} {row["given_delta"]}");
}
