namespace ReleaseKit.Privacy.Composition;

/// <summary>Losses of several runs on the same units, added. Order changes nothing but the last digit.</summary>
public static class BasicComposition
{
    /// <summary>Σε: pure losses add. Dwork &amp; Roth 2014, Corollary 3.15. An empty list gives 0.</summary>
    public static Epsilon Sum(IEnumerable<Epsilon> losses) => losses.Aggregate(Epsilon.Zero, (sum, next) => sum + next);

    /// <summary>Σρ: concentrated losses add. Bun &amp; Steinke 2016, Lemma 1.7. An empty list gives 0.</summary>
    public static Rho Sum(IEnumerable<Rho> losses) => losses.Aggregate(Rho.Zero, (sum, next) => sum + next);

    /// <summary>(Σε, Σδ), δ at most 1. Dwork &amp; Roth 2014, Theorem 3.16. An empty list gives (0, 0).</summary>
    public static ApproximateLoss Sum(IEnumerable<ApproximateLoss> losses) =>
        losses.Aggregate(default(ApproximateLoss), (sum, next) => new ApproximateLoss(sum.Epsilon + next.Epsilon, sum.Delta + next.Delta));
}
