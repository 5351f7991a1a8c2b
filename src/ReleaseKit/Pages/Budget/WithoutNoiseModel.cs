using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>What is published without noise: exact figures, which no limit covers, and public ones, which come from elsewhere; each with its reason.</summary>
internal static class WithoutNoiseModel
{
    public static ScriptObject Of(BudgetWords words)
    {
        var (publics, exact) = (Rows(words, isPublic: true), Rows(words, isPublic: false));
        return new ScriptObject { ["exact"] = exact, ["public"] = publics, ["none"] = exact.Count + publics.Count == 0 };
    }

    private static ScriptArray Rows(BudgetWords words, bool isPublic) => new(
        words.Statement.WithoutNoise.Where(figures => figures.Kind == WithoutNoiseKind.Public == isPublic).Select(figures => Row(figures, words)));

    private static ScriptObject Row(FiguresWithoutNoise figures, BudgetWords words) => new()
    {
        ["table"] = words.TableName(figures.Table),
        ["href"] = Link.From(PageMap.Budget, words.Context.Pages.FirstPageOf(figures.Table)),
        ["name"] = Name(figures, words),
        ["count"] = words.Say(figures.Count == 1 ? "budget.figures.one" : "budget.figures.other", ("count", words.Language.Number(new PublishedValue(figures.Count, 0)))),
        ["kind"] = words.Say($"budget.without.{figures.Kind}"),
        ["reason"] = figures.Reason is { } reason ? words.Context.In(reason) : words.Say("budget.without.no-reason"),
    };

    private static string Name(FiguresWithoutNoise figures, BudgetWords words)
    {
        if (figures.Measure >= 0)
            return words.Context.In(words.Release.Tables[figures.Table].Measures[figures.Measure].Title);
        return figures.Column.Length > 0 ? words.Say("budget.without.column", ("column", figures.Column)) : words.Say("budget.without.hidden");
    }
}
