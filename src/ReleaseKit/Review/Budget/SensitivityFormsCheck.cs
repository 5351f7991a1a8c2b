using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A sensitivity that is given in two ways which do not say the same: as cells and as a norm, or as two norms that no change of the answers can have.</summary>
internal sealed class SensitivityFormsCheck : IReviewCheck
{
    // A norm may stand there rounded to five digits.
    private const double Slack = 1e-4;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Noise is { } account
        ? subject.Spendings.Zip(MechanismSpending.Of(account, null), (published, declared) => Found(published, declared, account)).OfType<Finding>()
        : [];

    private static Finding? Found(MechanismSpending published, MechanismSpending declared, NoiseAccount account)
    {
        var (mechanism, sensitivity) = (published.Mechanism, published.Mechanism.Sensitivity);
        if (sensitivity is { CellsPerUnit: not null, PerCell: not null })
            return Against(mechanism, account, [.. new[] { declared.Loss, published.Loss }.OfType<MechanismLoss>()]);
        return sensitivity is { L1: { } sum, L2: { } distance } && distance > sum * (1 + Slack)
            ? Contradiction(mechanism, $"an l1 of {BudgetText.Plain(sum)} and an l2 of {BudgetText.Plain(distance)}; an l2 is never larger than its l1", "\"l1\" or \"l2\"")
            : null;
    }

    /// <summary>A norm must be that of the cells as declared, or of as many of them as the release has.</summary>
    private static Finding? Against(Mechanism mechanism, NoiseAccount account, IReadOnlyList<MechanismLoss> losses)
    {
        var norms = new (string Key, double? Given, Func<MechanismLoss, double> Implied)[] { ("l1", mechanism.Sensitivity.L1, L1), ("l2", mechanism.Sensitivity.L2, L2) };
        foreach (var (key, given, implied) in norms)
            if (given is { } norm && losses.Count > 0 && !losses.Any(loss => IsSame(norm, implied(loss))))
                return Contradiction(
                    mechanism,
                    $"{BudgetText.Contribution(mechanism.Sensitivity, account)}, which makes an {key} of {BudgetText.Plain(implied(losses[0]))}, and an {key} of {BudgetText.Plain(norm)}",
                    $"\"cellsPerUnit\" and \"perCell\", or \"{key}\"");
        return null;
    }

    private static double L1(MechanismLoss loss) => loss.ConcentratedTerms.Sum(term => term.Shift * term.Cells);

    private static double L2(MechanismLoss loss) => Math.Sqrt(loss.ConcentratedTerms.Sum(term => term.Shift * term.Shift * term.Cells));

    private static bool IsSame(double one, double other) => Math.Abs(one - other) <= Slack * other;

    private static Finding Contradiction(Mechanism mechanism, string says, string keep) => new(
        FindingLevel.Stop, "sensitivity-unclear", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" gives its sensitivity in two ways: {says}.",
        "the loss follows from one of them; if it is not the right one, the budget page promises more protection than there is.",
        $"keep the one that holds and take the other out: {keep}.");
}
