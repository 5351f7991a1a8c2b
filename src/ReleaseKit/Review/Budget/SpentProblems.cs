using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>What can be wrong with a declared loss, one factory a failure.</summary>
internal static class SpentProblems
{
    public static Finding TooLow(Mechanism mechanism, DeclaredNumber number, NoiseAccount account, string? mistake) => new(
        FindingLevel.Stop, "spent-too-low", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "spent"),
        string.Join('\n', new[] { Declares(mechanism, number), Costs(mechanism, number, account), mistake }.OfType<string>()),
        "the budget page would promise more protection than there is.",
        double.IsFinite(number.Upper)
            ? $"write {number.Pasted}, or {Else(number)}."
            : "leave \"spent\" out, or declare the loss in an accounting in which this law has one.");

    public static Finding BelowProof(Mechanism mechanism, DeclaredNumber number, NoiseAccount account) => new(
        FindingLevel.Caution, "spent-below-proof", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "spent"),
        $"{Declares(mechanism, number)}\nThat is smaller than can be proved here. {Costs(mechanism, number, account)}",
        "the totals use the larger value, so the page shows more than was declared.",
        double.IsFinite(number.Upper)
            ? $"write {number.Pasted}, or describe the proof of the smaller value where \"describedAt\" points to."
            : "describe the proof where \"describedAt\" points to, and give the mechanism the law \"declared\".");

    public static Finding Rounded(Mechanism mechanism, DeclaredNumber number) => new(
        FindingLevel.Caution, "spent-rounded", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "spent"),
        $"{Declares(mechanism, number)}, which is {BudgetText.Plain(number.Upper)} rounded down.",
        "a rounded loss must not be smaller than the loss; the totals use the computed value.",
        $"write {number.Pasted}.");

    public static Finding RoundedDelta(Mechanism mechanism, DeclaredNumber number, double delta) => new(
        FindingLevel.Caution, "spent-rounded", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "spent"),
        $"{Declares(mechanism, number)}; that delta is {BudgetText.Plain(delta)} rounded down.",
        "a rounded delta must not be smaller than the delta of the law; the totals use what is computed.",
        $"write \"spent\": {{ \"epsilon\": {BudgetText.Plain(number.Declared)}, \"delta\": {BudgetText.Paste(delta)} }}.");

    // Without a pair of its own such a law has no loss at all in approximate accounting.
    private static string Else(DeclaredNumber number) => number.Delta is null
        ? "leave \"spent\" out and the computed value is used"
        : "another pair of the law's curve: a smaller epsilon at a larger delta, as far as both are authorised";

    private static string Declares(Mechanism mechanism, DeclaredNumber number)
    {
        var name = number.Name.Split(' ', 2);
        return $"\"{mechanism.Id}\" declares {name[0]} {BudgetText.Plain(number.Declared)}{(name.Length > 1 ? $" {name[1]}" : "")}";
    }

    private static string Costs(Mechanism mechanism, DeclaredNumber number, NoiseAccount account)
    {
        var relation = account.Neighbouring == Neighbouring.Replace ? $" {BudgetText.Relation(account.Neighbouring, account)}," : "";
        var cost = double.IsFinite(number.Upper) ? $"costs {(number.Delta is { } delta ? $"epsilon {BudgetText.Paste(number.Upper)} at delta {BudgetText.Plain(delta)}" : BudgetText.Paste(number.Upper))}" : $"has no {number.Name} that bounds it";
        return $"{BudgetText.Law(mechanism)} with {BudgetText.Contribution(mechanism.Sensitivity, account)},{relation} {cost}.";
    }
}
