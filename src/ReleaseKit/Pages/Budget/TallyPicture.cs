using ReleaseKit.Charts;
using ReleaseKit.Charts.Tally;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Budget;

/// <summary>The account as a split tally: lying for wide pages and for paper, upright for narrow ones.</summary>
internal static class TallyPicture
{
    /// <summary>The drawings; none where nothing was spent in the currency, so that there is nothing to cut.</summary>
    public static (string Html, bool HasUnlabelled) Of(BudgetWords words, TypeCase type)
    {
        if (words.SpentNothing)
            return ("", false);
        var account = AccountOf(words);
        var (wide, upright, paper) = (WideTally.Of(account, type), UprightTally.Of(account, type), WideTally.Of(account, type, WideTally.PaperWidth));
        var title = words.Say("budget.tally.title");
        var description = Description(account, words);
        return (
            SvgPainter.ForPage(wide.Drawing, "tally-wide", "tally only-wide", title, description)
            + SvgPainter.ForPage(upright.Drawing, "tally-upright", "tally only-narrow", title, description)
            + SvgPainter.ForPage(paper.Drawing, "tally-paper", "tally only-paper", title, description),
            wide.Unlabelled.Count + upright.Unlabelled.Count + paper.Unlabelled.Count > 0);
    }

    internal static TallyAccount AccountOf(BudgetWords words)
    {
        var statement = words.Statement;
        var whole = Math.Max(statement.Authorised ?? 0, statement.Spent);
        return new TallyAccount
        {
            ByTable = [.. PieceGroup.ByTables(words).Select(group => PieceOf(group, words))],
            ByLevel = [.. PieceGroup.ByLevel(words).Select(group => PieceOf(group, words))],
            Rest = words.Left is { Unscaled: > 0 } left
                ? new TallyPiece(words.Say("budget.left"), "", words.Language.Number(left), whole - statement.Spent)
                : null,
            Whole = whole,
            WholeLabel = statement.Authorised is { } authorised
                ? words.Say("budget.tally.authorised", ("amount", words.Allowance(authorised)))
                : words.Say("budget.tally.spent", ("amount", words.Amount(statement.Spent))),
            Print = (number, decimals) => words.Language.Number(new PublishedValue((long)Math.Round(number * Math.Pow(10, decimals)), (byte)decimals)),
        };
    }

    private static TallyPiece PieceOf(PieceGroup group, BudgetWords words) => new(group.Key, group.Name, words.Amount(group.Amount), group.Amount);

    private static string Description(TallyAccount account, BudgetWords words) => words.Say(
        "budget.tally.description",
        ("spent", words.Amount(words.Statement.Spent)),
        ("tables", words.Language.List([.. account.ByTable.Select(piece => $"{piece.Key} {piece.Amount}")])),
        ("levels", words.Language.List([.. account.ByLevel.Select(piece => $"{piece.Key} {piece.Amount}")])));
}
