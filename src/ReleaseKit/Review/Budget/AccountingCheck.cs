using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A mechanism whose law has no loss in the declared accounting: the accountings in which it has one are named.</summary>
internal sealed class AccountingCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject)
    {
        if (subject.Noise is not { } account)
            return [];
        var accountant = Accountant.Of(account.Accounting);
        return subject.Spendings.Where(spending => double.IsInfinity(accountant.AmountOf(accountant.Upper(spending))) && !IsToldByReading(spending.Mechanism) && !IsToldByColumn(spending, subject.Read))
            .Select(spending => Found(spending, account, new ProposedPair(subject.Spendings, account)));
    }

    // A declared law has its loss from "spent" alone; one that is missing is told where the mechanism is read.
    private static bool IsToldByReading(Mechanism mechanism) => mechanism is { Law: LawName.Declared, Spent: null };

    // A column that gives a parameter and is not there, not declared or without numbers is told where it stands; so is a rule that could not be read.
    private static bool IsToldByColumn(MechanismSpending spending, Reading.ReadOutcome read)
    {
        var columns = spending.Mechanism.Parameters.Values.Select(value => value.Column).OfType<string>().ToList();
        return spending.Loss is null && columns.Count > 0 && (!read.RulesAreWhole || read.Findings.Any(finding =>
            finding.Level == FindingLevel.Stop && finding.Column is { } column && columns.Contains(column)));
    }

    private static Finding Found(MechanismSpending spending, NoiseAccount account, ProposedPair pairs) => spending switch
    {
        { Mechanism: { Law: LawName.Declared, Spent: not null } mechanism } => Stated(mechanism, account),
        { Loss: null } => Unknown(spending.Mechanism),
        _ when account.Accounting == Accounting.Approximate => SpentNeeded(spending, pairs),
        _ => NoLoss(spending, account, pairs),
    };

    private static Finding NoLoss(MechanismSpending spending, NoiseAccount account, ProposedPair pairs)
    {
        var finite = FiniteIn(spending.Loss!).ToList();
        return new Finding(
            FindingLevel.Stop, "no-loss-in-accounting", FindingOwner.Noise, BudgetText.PlaceOf(spending.Mechanism, "law"),
            $"\"{spending.Mechanism.Id}\" has the law \"{BudgetText.Written(spending.Mechanism.Law)}\", whose loss has no limit in {BudgetText.Written(account.Accounting)} accounting.\nIt has one in: {string.Join(", ", finite.Select(BudgetText.Written))}.",
            "the total of the release would have no limit either, and nothing could be promised.",
            finite[^1] != Accounting.Approximate ? $"write \"accounting\": \"{BudgetText.Written(finite[^1])}\", or noise its figures with another law."
                : pairs.IsBeyondAuthorised(spending) ? $"{pairs.AnotherLaw(spending)}."
                : $"write \"accounting\": \"approximate\" and {pairs.For(spending)} for it, or noise its figures with another law.");
    }

    private static Finding SpentNeeded(MechanismSpending spending, ProposedPair pairs) => new(
        FindingLevel.Stop, "spent-needed", FindingOwner.Noise, BudgetText.PlaceOf(spending.Mechanism, "spent"),
        $"\"{spending.Mechanism.Id}\" has the law \"{BudgetText.Written(spending.Mechanism.Law)}\" and {(spending.Mechanism.Spent is null ? "does not say what it spent" : "declares a \"spent\" that it never meets, whatever the epsilon, at that delta")}.",
        "this law has no epsilon without a delta; the office chooses the pair, and it is checked against the law.",
        pairs.IsBeyondAuthorised(spending)
            ? $"{pairs.AnotherLaw(spending)}."
            : $"{(spending.Mechanism.Spent is null ? "add" : "write")} {pairs.For(spending)}, or another pair of its curve.");

    private static Finding Unknown(Mechanism mechanism) => new(
        FindingLevel.Stop, "loss-unknown", FindingOwner.Noise, mechanism.At,
        $"What \"{mechanism.Id}\" spends cannot be worked out: its law or its sensitivity is not known in full for any of its figures.",
        "the total of the release would have no limit, and nothing could be promised.",
        "give the parameters of the law as numbers, or in a column of each table that uses it, and \"sensitivity\" in full.");

    private static Finding Stated(Mechanism mechanism, NoiseAccount account) => new(
        FindingLevel.Stop, "no-loss-in-accounting", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "spent"),
        $"\"{mechanism.Id}\" states a loss that {BudgetText.Written(account.Accounting)} accounting cannot add.",
        "a converted number must not be added as if it were not.",
        account.Accounting switch
        {
            Accounting.Pure => "state \"epsilon\" without \"delta\", or choose another \"accounting\".",
            Accounting.Concentrated => "state \"rho\", or \"epsilon\" without \"delta\", or choose \"accounting\": \"approximate\".",
            _ => "state \"epsilon\" and \"delta\".",
        });

    private static IEnumerable<Accounting> FiniteIn(MechanismLoss loss)
    {
        if (loss.Pure.Upper.IsFinite)
            yield return Accounting.Pure;
        yield return Accounting.Approximate;
        if (loss.Concentrated.Upper.IsFinite)
            yield return Accounting.Concentrated;
    }
}
