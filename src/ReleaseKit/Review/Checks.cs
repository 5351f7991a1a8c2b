using ReleaseKit.Review.Budget;
using ReleaseKit.Review.Leaks;
using ReleaseKit.Review.Prose;

namespace ReleaseKit.Review;

/// <summary>Every check that a review runs after reading. What reading itself finds (structure) is not repeated here.</summary>
public static class Checks
{
    public static IReadOnlyList<IReviewCheck> All { get; } =
    [
        new ProseLinkCheck(),
        new ProseNumberCheck(),
        new ProseHeadingCheck(),
        new ProseLiteralCheck(),
        new ProseNameCheck(),
        new HiddenPartCheck(),
        new ChartCheck(),
        new SpentCheck(),
        new AuthorisedCheck(),
        new DeclaredTotalCheck(),
        new AccountingCheck(),
        new UnusedMechanismCheck(),
        new LevelsCheck(),
        new SensitivityFormsCheck(),
        new ClippedSensitivityCheck(),
        new MissingDenominatorCheck(),
        new UnclippedCheck(),
        new StatedSensitivityCheck(),
        new CountSensitivityCheck(),
        new ExactCountCheck(),
        new UniformNoiseCheck(),
        new OffGridCheck(),
        new BoundCheck(),
        new PastStepCheck(),
        new MultiplierCheck(),
        new LawUnitCheck(),
        new ConfidentialColumnCheck(),
        new DenominatorCheck(),
        new ConfidentialCountCheck(),
        new DeltaCheck(),
        new BeyondNoiseCheck(),
        new TotalGapCheck(),
        new SameNumbersCheck(),
        new UndeclaredGridCheck(),
        new UnnoisedNameCheck(),
        new SeedInProseCheck(),
    ];
}
