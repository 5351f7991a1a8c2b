namespace ReleaseKit.Appraisal;

/// <summary>What a total means for one unit of privacy: a bound on the worst case.</summary>
public sealed record MeaningForOne
{
    /// <summary>ε′: the largest change of the log odds, but for at most Beta of all outcomes; infinite where no such limit can be shown.</summary>
    public required double EpsilonPrime { get; init; }

    /// <summary>The share of outcomes that may break the bound; null if none can (a guarantee without delta), and without a limit.</summary>
    public double? Beta { get; init; }

    /// <summary>e^ε′: by how many times odds can change at most.</summary>
    public required double Odds { get; init; }

    /// <summary>For priors of 0.1, 1, 10 and 50 in 100.</summary>
    public required IReadOnlyList<Belief> Beliefs { get; init; }

    /// <summary>For 1, 5 and 10 false alarms in 100.</summary>
    public required IReadOnlyList<MembershipTest> Tests { get; init; }
}

/// <summary>A guess before, and the most and least it can become, for a reader who knows all other records; chances from 0 to 1.</summary>
public sealed record Belief(double Prior, double Highest, double Lowest);

/// <summary>A test for one unit: at this chance of a false alarm, its largest chance of success; chance alone would give FalseAlarms.</summary>
public sealed record MembershipTest(double FalseAlarms, double LargestSuccess);
