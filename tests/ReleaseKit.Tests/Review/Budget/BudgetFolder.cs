using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Budget;

/// <summary>What the whole review says about a folder, and one finding of it.</summary>
internal static class BudgetFolder
{
    public const string Lit = """{ "id": "lamps-lit", "law": "discrete-gaussian", "sigma": 4.0, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 } }""";

    public static IReadOnlyList<Finding> Review(this TestFolder folder) => ReleaseReview.Of(folder.Read(), null);

    /// <summary>The small folder with another mechanism in place of "lamps-lit".</summary>
    public static TestFolder WithLit(this TestFolder folder, string mechanism) => folder.Edit("mechanisms.json", Lit, mechanism);

    /// <summary>The one finding of a slug.</summary>
    public static Finding One(this TestFolder folder, string slug)
    {
        var findings = folder.Review().Where(finding => finding.Slug == slug).ToList();
        Assert.True(findings.Count == 1, $"Expected one {slug}, found: {string.Join("; ", folder.Review().Select(finding => $"{finding.Slug} {finding.Found}"))}");
        return findings[0];
    }

    /// <summary>What it says, line by line, not yet broken to a width.</summary>
    public static string Text(this TestFolder folder, string slug)
    {
        var finding = folder.One(slug);
        return $"{finding.Level} {finding.At}\n{finding.Found}\nWhy: {finding.Why}\nDo: {finding.Do}";
    }

    public static void HasNo(this TestFolder folder, string slug) =>
        Assert.DoesNotContain(folder.Review(), finding => finding.Slug == slug);
}
