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
            ["exact"] = Exact(words),
            ["sentences"] = new ScriptArray(Sentences(meaning, words)),
            ["beliefs"] = new ScriptArray(meaning.Beliefs.Select((belief, index) => BeliefRow(belief, words.Statement.MeaningOfPromise?.Beliefs[index], words))),
            ["has_promise"] = words.Statement.MeaningOfPromise is not null,
            ["tests"] = new ScriptArray(meaning.Tests.Select(test => TestRow(test, words))),
            ["test_text"] = words.Say(Key("budget.meaning.test", words), ("who", words.One)),
        };
    }

    /// <summary>The odds in words: at most so many times, up or down, and but for which outcomes.</summary>
    internal static IEnumerable<string> Sentences(MeaningForOne meaning, BudgetWords words)
    {
        yield return words.Say(Key("budget.meaning.setting", words), ("who", words.One));
        yield return meaning.Odds < MostOdds
            ? words.Say("budget.meaning.odds", ("odds", words.Language.Number(LossPrint.UpTo(meaning.Odds, DigitsOfOdds))))
            : words.Say("budget.meaning.odds-huge", ("odds", words.Language.Number(new PublishedValue((long)MostOdds, 0))));
        if (meaning.Beta is { } beta)
            yield return words.Say("budget.meaning.beta", ("beta", Chances.OneIn(beta, words.Language)));
        yield return words.Say("budget.meaning.worst");
        yield return words.Say("budget.meaning.general");
    }

    private static ScriptArray Exact(BudgetWords words) => words.Statement.HasExactFigures
        ? [words.Say("budget.exact.first"), words.Say("budget.exact.second"), words.Say("budget.exact.third")]
        : [];

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
