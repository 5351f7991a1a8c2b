using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>How long the oldest unpaid bill has stood, by district; to the nearest ten.</summary>
public sealed class WeeksTable(IReadOnlyList<Household> households) : ISampleQuery
{
    private static readonly (int District, int Band)[] Cells =
        [.. from district in Enumerable.Range(0, Norrvale.Districts.Count) from band in Enumerable.Range(0, Answers.WeeksBehind.Count) select (district, band)];

    private readonly long[] before =
        [.. Cells.Select(cell => (long)households.Count(household => household.Behind && (household.District, household.WeeksBand) == cell))];

    public SampleTable Noised(Noiser noise)
    {
        var noised = noise.DiscreteLaplace("weeks-behind", 8, before);
        var rows = Cells.Select((cell, i) => new SampleRow(
            [Norrvale.Districts[cell.District].Name, Answers.WeeksBehind[cell.Band]],
            [SampleCell.Count(Rounding.ToNearest(noised[i], 10), before[i])]));
        return new SampleTable("weeks-behind", "weeks-behind.csv", ["district", "weeks"], ["households"], [.. rows]);
    }
}
