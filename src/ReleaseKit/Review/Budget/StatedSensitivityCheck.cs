using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A sensitivity that nothing in the folder can be held against: of medians, indices and estimates, and of shares and rates of something else than units of privacy.</summary>
internal sealed class StatedSensitivityCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Noise: { } account }
        ? subject.Spendings.Where(spending => spending.Mechanism is { DescribedAt: null, Law: not LawName.Declared }).Select(spending => CheckMechanism(spending, release, account)).OfType<Finding>()
        : [];

    private static Finding? CheckMechanism(MechanismSpending spending, Release release, NoiseAccount account) => spending.Cells.Measures
        .Select(at => (Table: release.Tables[at.Table], Measure: release.Tables[at.Table].Measures[at.Measure]))
        .Where(pair => IsStated(spending.Mechanism, pair.Table, pair.Measure, account))
        .Select(pair => Stated(spending.Mechanism, pair.Table, pair.Measure, account)).FirstOrDefault();

    private static bool IsStated(Mechanism mechanism, Table table, Measure measure, NoiseAccount account) => measure.Kind switch
    {
        MeasureKind.Median or MeasureKind.Index => true,
        MeasureKind.Estimate => mechanism.Clipped is null && !CountSensitivityCheck.IsBelowOne(mechanism, table, measure, account),
        MeasureKind.Share or MeasureKind.Rate => mechanism.DenominatorColumn is not null && !BudgetText.IsUnitOfPrivacy(measure.Unit, account),
        _ => false,
    };

    private static Finding Stated(Mechanism mechanism, Table table, Measure measure, NoiseAccount account) => new(
        FindingLevel.Note, "sensitivity-as-stated", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"Nothing in the folder says how far one {BudgetText.One(account)} can move the {BudgetText.Several(measure.Kind)} of column \"{measure.Column}\" in table \"{table.Id}\": what \"{mechanism.Id}\" declares is taken as it stands.",
        "the loss on the budget page is no better than that number.",
        "have it worked out again by a second person, and give the page that shows how in \"describedAt\".");
}
