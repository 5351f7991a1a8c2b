using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>How long the oldest unpaid bill has stood, by district; to the nearest ten.</summary>
public static class WeeksTable
{
    public static SampleTable Of(IReadOnlyList<Household> households, Noiser noise)
    {
        var counts = households.Where(household => household.Behind).CountBy(household => (household.District, household.WeeksBand)).ToDictionary();
        var cells = (from district in Enumerable.Range(0, Norrvale.Districts.Count)
                     from band in Enumerable.Range(0, Answers.WeeksBehind.Count)
                     select (District: district, Band: band)).ToArray();
        long[] before = [.. cells.Select(cell => (long)counts.GetValueOrDefault(cell))];
        var after = noise.DiscreteLaplace("weeks-behind", 8, before);
        var rows = cells.Select((cell, i) => new SampleRow(
            [Norrvale.Districts[cell.District].Name, Answers.WeeksBehind[cell.Band]],
            [SampleCell.Count(Rounding.ToNearest(after[i], 10), before[i])]));
        return new SampleTable("weeks-behind", "weeks-behind.csv", ["district", "weeks"], ["households"], [.. rows]);
    }
}
