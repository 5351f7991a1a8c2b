namespace ReleaseKit.SampleMaker.Population;

/// <summary>The answers that a household can give, in the order of the tables, and the limits each record is held to.</summary>
public static class Answers
{
    public const int MostOwed = 400;
    public const int MostCredit = 240;
    public const int MostUse = 3000;
    public const int MostKindsOfHelp = 3;
    public const int RetirementHome = 4;
    public const int FirstRetirementAge = 3;

    public static IReadOnlyList<string> Tenures { get; } =
        ["Owned outright", "Bought with a loan", "Rented from a landlord", "Rented from the district", "Retirement home"];

    public static IReadOnlyList<string> AgeBands { get; } = ["Under 30", "30 to 44", "45 to 59", "60 to 74", "75 and over"];

    public static IReadOnlyList<string> WeeksBehind { get; } = ["Under 4 weeks", "4 to 12 weeks", "13 to 25 weeks", "26 weeks or more"];

    public static IReadOnlyList<string> Quarters { get; } = ["2031-Q1", "2031-Q2", "2031-Q3", "2031-Q4"];

    public static IReadOnlyList<string> KindsOfHelp { get; } =
        ["Advice visit", "Prepayment top-up", "Debt written down", "Insulation grant", "Boiler repaired", "Heater lent"];
}
