using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Budget;

/// <summary>Chances as "3.6 in 100", rounded away from comfort; never printed as certain or as impossible when they are not.</summary>
internal static class Chances
{
    private const int MostDecimals = 9;

    /// <summary>A largest chance, rounded up.</summary>
    public static string AtMost(double chance, ILanguage language) =>
        InHundred(OrWhole(LossPrint.Up(Math.Min(100, 100 * chance), DecimalsFor(chance))), language);

    /// <summary>A smallest chance, rounded down.</summary>
    public static string AtLeast(double chance, ILanguage language) =>
        InHundred(OrWhole(LossPrint.Down(Math.Max(0, 100 * chance), DecimalsFor(chance))), language);

    /// <summary>A chance that was set, not worked out.</summary>
    public static string Given(double chance, ILanguage language) =>
        InHundred(PublishedValue.Shortest(decimal.Round((decimal)chance * 100, 9)), language);

    /// <summary>"1 in 100,000,000" for a tiny share, rounded up.</summary>
    public static string OneIn(double share, ILanguage language) =>
        language.Text("budget.one-in", ("all", language.Number(new PublishedValue((long)Math.Floor((1 / share) + 1e-6), 0))));

    // One decimal; below 1 in 100 two digits; just below 100 as many as it takes to tell the chance from 100.
    private static int DecimalsFor(double chance)
    {
        var (nearest, digits) = chance < 0.5 ? (100 * chance, 2) : (100 * (1 - chance), 1);
        return nearest <= 0 ? 1 : Math.Clamp(LossPrint.DecimalsFor(nearest, digits), 1, MostDecimals);
    }

    // What no decimals tell from 0 or from 100 is not drawn out to all of them.
    private static PublishedValue OrWhole(PublishedValue value) => value.ToDecimal() is 0 or 100 ? value.RoundedTo(1) : value;

    private static string InHundred(PublishedValue value, ILanguage language) => language.Text("budget.in-100", ("number", language.Number(value)));
}
