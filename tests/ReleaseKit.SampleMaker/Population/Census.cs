using ReleaseKit.SampleMaker.Chance;

namespace ReleaseKit.SampleMaker.Population;

/// <summary>Invents every household of Norrvale from a seed, by whole-number chances alone.</summary>
public static class Census
{
    private static readonly int[] BehindByTenureIn10 = [5, 9, 14, 15, 4];
    private static readonly int[] PlaceInWeeksIn10 = [3, 4, 2, 1];
    private static readonly int[] CutOffIn1000 = [70, 50, 30, 60];
    private static readonly int[] MeanUse = [1400, 720, 360, 1250];
    private static readonly int[] HelpIn1000 = [250, 150, 60, 40, 30, 4];

    public static IReadOnlyList<Household> Invent(ulong seed)
    {
        var stream = UniformStream.Named(seed, "households");
        return
        [
            .. from district in Enumerable.Range(0, Norrvale.Districts.Count)
               from ward in Enumerable.Range(0, Norrvale.Districts[district].Wards.Count)
               from household in InWard(stream, district, ward)
               select household,
        ];
    }

    private static IEnumerable<Household> InWard(UniformStream stream, int district, int ward)
    {
        var place = Norrvale.Districts[district].Wards[ward];
        var households = place.ListedIn2030 + stream.Below((place.ListedIn2030 / 12) + 1) - (place.ListedIn2030 / 30);
        for (var i = 0; i < households; i++)
            yield return One(stream, district, ward, place);
    }

    private static Household One(UniformStream stream, int district, int ward, Ward place)
    {
        var age = stream.Below(Answers.AgeBands.Count);
        var tenure = stream.Below(age >= Answers.FirstRetirementAge ? Answers.Tenures.Count : Answers.RetirementHome);
        var behind = stream.Below(100_000) < place.BehindIn10000 * BehindByTenureIn10[tenure];
        var cold = stream.Below(100_000) < place.ColdIn10000 * (behind ? 40 : 7);
        return new Household(district, ward, tenure, age)
        {
            Behind = behind,
            Owed = behind ? Owed(stream) : 0,
            WeeksBand = OneOf(stream, PlaceInWeeksIn10, 10),
            OnPlan = behind && stream.Below(5) == 0,
            WentCold = cold,
            Credit = stream.Below(4) == 0 ? 40 + (20 * stream.Below(11)) : 0,
            CutOff = [.. CutOffIn1000.Select(chance => behind && stream.Below(1000) < chance)],
            Use = [.. MeanUse.Select(mean => Use(stream, mean, district))],
            Help = behind ? Help(stream) : [],
        };
    }

    private static int Owed(UniformStream stream)
    {
        var owed = 20 + stream.Below(300) + (stream.Below(3) == 0 ? stream.Below(500) : 0);
        return Math.Min(owed, Answers.MostOwed);
    }

    private static int Use(UniformStream stream, int mean, int district) =>
        Math.Min((mean / 2) + stream.Below(mean) + (12 * district), Answers.MostUse);

    private static IReadOnlyList<int> Help(UniformStream stream) =>
        [.. Enumerable.Range(0, HelpIn1000.Length).Where(kind => stream.Below(1000) < HelpIn1000[kind]).Take(Answers.MostKindsOfHelp)];

    private static int OneOf(UniformStream stream, IReadOnlyList<int> weights, int all)
    {
        var drawn = stream.Below(all);
        var index = 0;
        for (; drawn >= weights[index]; index++)
            drawn -= weights[index];
        return index;
    }
}
