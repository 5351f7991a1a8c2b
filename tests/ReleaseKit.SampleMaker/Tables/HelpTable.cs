using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Kinds of help. A household is counted for at most three of them.</summary>
public static class HelpTable
{
    // The most that one household may have of each kind, in crowns: a public rule; visits, repairs and loans are not paid in money.
    private static readonly string[] Limits = ["[n]", "80", "600", "1500", "[n]", "[n]"];

    public static SampleTable Of(IReadOnlyList<Household> households, Noiser noise)
    {
        long[] before = [.. Answers.KindsOfHelp.Select((_, kind) => (long)households.Count(household => household.Help.Contains(kind)))];
        var after = noise.DiscreteLaplace("help", 12, before);
        var rows = Answers.KindsOfHelp.Select((name, kind) => new SampleRow(
            [name], [SampleCell.Count(after[kind], before[kind]), SampleCell.Mark(Limits[kind])]));
        return new SampleTable("help", "help-given.csv", ["kind"], ["helped", "limit"], [.. rows]);
    }
}
