namespace ReleaseKit.SampleMaker.Population;

/// <summary>One invented household of 2031: the confidential record. Indices count from 0; amounts in crowns, use in kWh, both as clipped for publication.</summary>
public sealed record Household(int District, int Ward, int Tenure, int AgeBand)
{
    public bool Behind { get; init; }
    public int Owed { get; init; }
    public int WeeksBand { get; init; }
    public bool OnPlan { get; init; }
    public bool WentCold { get; init; }
    public int Credit { get; init; }

    /// <summary>Whether it was cut off, for each quarter.</summary>
    public required IReadOnlyList<bool> CutOff { get; init; }

    /// <summary>Energy used for heating, for each quarter.</summary>
    public required IReadOnlyList<int> Use { get; init; }

    /// <summary>Kinds of help it had; at most three are counted.</summary>
    public required IReadOnlyList<int> Help { get; init; }
}
