using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Uniform noise: what it does not protect is said in plain words.</summary>
internal sealed class UniformNoiseCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Noise is { } account
        ? subject.Spendings.Where(spending => spending is { Mechanism.Law: LawName.Uniform or LawName.DiscreteUniform, Loss: not null })
            .Select(spending => Uniform(spending, account))
        : [];

    private static Finding Uniform(MechanismSpending spending, NoiseAccount account) => new(
        FindingLevel.Caution, "uniform-noise", FindingOwner.Noise, BudgetText.PlaceOf(spending.Mechanism, "law"),
        $"\"{spending.Mechanism.Id}\" adds uniform noise. With chance {BudgetText.Paste(spending.Loss!.DeltaAt(Epsilon.Zero).Upper.Value)} its figures show with certainty whether one {BudgetText.One(account)} was counted.",
        "no epsilon, however large, bounds that: delta is as large as this chance at every epsilon.",
        "choose a law whose noise has no end, such as discrete-laplace or discrete-gaussian, unless this chance is acceptable and authorised.");
}
