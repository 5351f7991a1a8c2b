using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Kinds of help. A household is counted for at most three of them.</summary>
public sealed class HelpTable(IReadOnlyList<Household> households) : ISampleQuery
{
    // The most that one household may have of each kind, in crowns: a public rule; visits, repairs and loans are not paid in money.
    private static readonly string[] Limits = ["[n]", "80", "600", "1500", "[n]", "[n]"];

    private readonly long[] before =
        [.. Answers.KindsOfHelp.Select((_, kind) => (long)households.Count(household => household.Help.Contains(kind)))];

    public SampleTable Noised(Noiser noise)
    {
        var noised = noise.DiscreteLaplace("help", 12, before);
        var rows = Answers.KindsOfHelp.Select((name, kind) =>
            new SampleRow([name], [SampleCell.Count(noised[kind], before[kind]), SampleCell.Mark(Limits[kind])]));
        return new SampleTable("help", "help-given.csv", ["kind"], ["helped", "limit"], [.. rows]);
    }
}
