namespace ReleaseKit.Review;

/// <summary>Which findings an office may waive in signoff.json: none about the budget, a missing margin or a leak.</summary>
public static class Waivers
{
    private static readonly HashSet<string> Never =
    [
        // A margin that is missing.
        "no-rule", "rule-unclear", "rules-and-covers", "covered-twice", "unknown-mechanism", "parts-missing", "sum-differs", "sum-not-a-total", "not-yet",
        "parameter-missing", "parameter-out-of-range", "parameter-off-grid", "parameter-of-other-law", "scale-not-positive", "law-table",
        // A leak.
        "undeclared-column", "hidden-has-value", "path-leaves-folder", "off-grid", "seed",
        // The budget.
        "authorised-incomplete", "sensitivity-missing", "spent-missing",
    ];

    private static readonly string[] NeverBeginning = ["spent-", "budget-", "leak-", "authorised-", "sensitivity-"];

    public static bool CanWaive(string slug) => !Never.Contains(slug) && !NeverBeginning.Any(start => slug.StartsWith(start, StringComparison.Ordinal));
}
