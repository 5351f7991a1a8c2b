using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>What the release means for one unit: exact figures first, then odds, beliefs and the test.</summary>
internal static class MeaningModel
{
    // e^27.6: beyond this a limit on odds says nothing.
    private const double MostOdds = 1e12;
    private const int DigitsOfOdds = 3;

    public static ScriptObject Of(BudgetWords words)
    {
        var meaning = words.Statement.Meaning;
        return new ScriptObject
        {
            ["has_limits"] = words.Context.HasNoise,
            ["no_limits"] = words.Context.HasNoise ? null : WithoutNoise(words),
            ["exact"] = Exact(words),
            ["exact_sums"] = ExactSums(words),
            ["sentences"] = new ScriptArray(Sentences(meaning, words)),
            ["beliefs_title"] = words.Say(words.Statement.HasExactFigures ? "budget.beliefs.title.beside-exact" : "budget.beliefs.title"),
            ["beliefs"] = new ScriptArray(meaning.Beliefs.Select((belief, index) => BeliefRow(belief, words.Statement.MeaningOfPromise?.Beliefs[index], words))),
            ["has_promise"] = words.Statement.MeaningOfPromise is not null,
            ["tests"] = new ScriptArray(meaning.Tests.Select(test => TestRow(test, words))),
            ["test_text"] = words.Say(Key("budget.meaning.test", words), ("who", words.One)),
            ["alarms_head"] = words.Say(Key("budget.test.alarms", words)),
            ["chance_head"] = words.Say(Key("budget.test.chance", words)),
            ["most_head"] = words.Say(Key("budget.test.most", words)),
        };
    }

    /// <summary>The odds in words: at most so many times, up or down, and but for which outcomes; or that there is no limit.</summary>
    internal static IEnumerable<string> Sentences(MeaningForOne meaning, BudgetWords words)
    {
        yield return words.Say(Key("budget.meaning.setting", words), ("who", words.One));
        if (double.IsInfinity(meaning.EpsilonPrime))
        {
            yield return words.Say("budget.meaning.odds-none");
            yield return words.Say("budget.meaning.general", ("others", words.Other));
            yield break;
        }

        yield return meaning.Odds < MostOdds
            ? words.Say(OddsKey(words), ("odds", words.Language.Number(LossPrint.UpTo(meaning.Odds, DigitsOfOdds))))
            : words.Say("budget.meaning.odds-huge", ("odds", words.Language.Number(new PublishedValue((long)MostOdds, 0))));
        if (meaning.Beta is { } beta)
            yield return words.Say("budget.meaning.beta", ("beta", Chances.OneIn(beta, words.Language)));
        yield return words.Say("budget.meaning.worst");
        yield return words.Say("budget.meaning.general", ("others", words.Other));
    }

    private static ScriptArray Exact(BudgetWords words) => words.Statement.HasExactFigures
        ? [words.Say("budget.exact.first"), words.Say("budget.exact.second"), .. words.Context.HasNoise ? [words.Say("budget.exact.third")] : Array.Empty<string>()]
        : [];

    /// <summary>What stands in the place of limits where no figure carries noise.</summary>
    private static string WithoutNoise(BudgetWords words) =>
        words.Say(words.Statement.HasExactFigures ? "budget.meaning.no-noise.exact" : "budget.meaning.no-noise", ("who", words.One));

    /// <summary>What an exact count or sum gives away to someone who knows all other parts of it.</summary>
    private static string? ExactSums(BudgetWords words) => words.Statement.WithoutNoise.Any(figures => IsExactSum(figures, words.Release))
        ? words.Say("budget.exact.sums", ("who", words.One), ("others", words.Other)) + (words.Context.HasNoise ? " " + words.Say("budget.exact.not-covered") : "")
        : null;

    private static bool IsExactSum(FiguresWithoutNoise figures, Release release) =>
        figures is { Kind: WithoutNoiseKind.Exact, Measure: >= 0 } && release.Tables[figures.Table] is var table && table.Measures[figures.Measure].Kind switch
        {
            MeasureKind.Count or MeasureKind.Estimate or MeasureKind.Amount => true,
            MeasureKind.Mean => table.Measures.Any(IsCountWithoutNoise),
            _ => false,
        };

    // A mean times the number of those it is taken over is their sum.
    private static bool IsCountWithoutNoise(Measure measure) =>
        measure.Kind == MeasureKind.Count && measure.Rules.Any(rule => rule is NoiseRule.Exact or NoiseRule.Public);

    private static string OddsKey(BudgetWords words) =>
        words.Statement.HasExactFigures ? "budget.meaning.odds.beside-exact" : "budget.meaning.odds";

    private static ScriptObject BeliefRow(Belief belief, Belief? promised, BudgetWords words) => new()
    {
        ["prior"] = Chances.Given(belief.Prior, words.Language),
        ["highest"] = Chances.AtMost(belief.Highest, words.Language),
        ["lowest"] = Chances.AtLeast(belief.Lowest, words.Language),
        ["promised"] = promised is null ? "" : Chances.AtMost(promised.Highest, words.Language),
    };

    private static ScriptObject TestRow(MembershipTest test, BudgetWords words) => new()
    {
        ["alarms"] = Chances.Given(test.FalseAlarms, words.Language),
        ["success"] = Chances.AtMost(test.LargestSuccess, words.Language),
    };

    private static string Key(string stem, BudgetWords words) =>
        words.Statement.Account.Neighbouring == Neighbouring.AddOrRemove ? $"{stem}.add-or-remove" : $"{stem}.replace";
}
