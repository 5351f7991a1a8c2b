namespace ReleaseKit.Privacy.Meaning;

/// <summary>
/// How far a guess about one unit can move, for a reader who knows all other records: Bayes' rule with a likelihood ratio
/// between e^−ε and e^ε. Derived.
/// </summary>
public static class BeliefBound
{
    /// <summary>The most that a prior chance can become: p·e^ε ÷ (1 − p + p·e^ε); 1 for an infinite ε.</summary>
    /// <param name="prior">A chance, 0 &lt; prior &lt; 1.</param>
    /// <param name="epsilon">ε of the whole release.</param>
    /// <exception cref="ArgumentOutOfRangeException">The prior is not strictly between 0 and 1.</exception>
    public static double Highest(double prior, Epsilon epsilon) => prior is > 0 and < 1
        ? 1 / (1 + ((1 - prior) / prior * Math.Exp(-epsilon.Value)))
        : throw new ArgumentOutOfRangeException(nameof(prior), prior, "A prior lies strictly between 0 and 1.");

    /// <summary>The least that a prior chance can become: p ÷ (p + (1 − p)·e^ε); 0 for an infinite ε.</summary>
    /// <param name="prior">A chance, 0 &lt; prior &lt; 1.</param>
    /// <param name="epsilon">ε of the whole release.</param>
    /// <exception cref="ArgumentOutOfRangeException">The prior is not strictly between 0 and 1.</exception>
    public static double Lowest(double prior, Epsilon epsilon) => prior is > 0 and < 1
        ? prior / (prior + ((1 - prior) * Math.Exp(epsilon.Value)))
        : throw new ArgumentOutOfRangeException(nameof(prior), prior, "A prior lies strictly between 0 and 1.");
}
