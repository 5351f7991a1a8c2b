using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>The account as a table that sums in every direction: tables and their measures down, levels across.</summary>
internal static class LedgerModel
{
    public static ScriptObject Of(BudgetWords words)
    {
        var levels = PieceGroup.ByLevel(words);
        string[] keys = [.. levels.Select(level => level.Pieces[0].LevelKey)];
        var tables = PieceGroup.ByTables(words);
        return new ScriptObject
        {
            ["levels"] = new ScriptArray(levels.Select(level => level.Key)),
            ["tables"] = new ScriptArray(tables.Select(table => TableRows(table, keys, words))),
            ["spent"] = new ScriptArray(levels.Select(level => words.Amount(level.Amount))),
            ["total"] = words.Amount(words.Statement.Spent),
            ["authorised"] = words.Statement.Authorised is { } authorised ? words.Allowance(authorised) : null,
            ["left"] = words.Left is { } left ? words.Language.Number(left) : null,
            ["rounding"] = AddsInPrint(tables, levels, words) ? null : words.Say("budget.ledger.rounding"),
        };
    }

    private static ScriptObject TableRows(PieceGroup table, string[] levels, BudgetWords words)
    {
        var row = Row(table, levels, words);
        row["key"] = table.Key;
        // A table with one row of measures says it in its own row.
        var measures = table.ByMeasures(words);
        row["only"] = measures.Count == 1 ? measures[0].Name : null;
        row["measures"] = measures.Count == 1 ? [] : new ScriptArray(measures.Select(measure => Row(measure, levels, words)));
        return row;
    }

    private static ScriptObject Row(PieceGroup group, string[] levels, BudgetWords words) => new()
    {
        ["name"] = group.Name,
        ["amounts"] = new ScriptArray(levels.Select(level => group.AmountAt(level) is { } amount ? words.Amount(amount) : null)),
        ["total"] = words.Amount(group.Amount),
    };

    /// <summary>Whether the printed parts add up to the printed totals, digit for digit, across and down; else the page says why they do not.</summary>
    internal static bool AddsInPrint(IReadOnlyList<PieceGroup> tables, IReadOnlyList<PieceGroup> levels, BudgetWords words) =>
        !double.IsFinite(words.Statement.Spent) || Sums(tables, levels, words).All(sum => Printed(sum.Whole, words) == sum.Parts.Sum(part => Printed(part, words)));

    private static IEnumerable<(double Whole, IEnumerable<double> Parts)> Sums(IReadOnlyList<PieceGroup> tables, IReadOnlyList<PieceGroup> levels, BudgetWords words)
    {
        string[] keys = [.. levels.Select(level => level.Pieces[0].LevelKey)];
        double[] Cells(PieceGroup group) => [.. keys.Select(key => group.AmountAt(key) ?? 0)];
        yield return (words.Statement.Spent, tables.Select(table => table.Amount));
        yield return (words.Statement.Spent, levels.Select(level => level.Amount));
        foreach (var (level, index) in levels.Select((level, index) => (level, index)))
            yield return (level.Amount, tables.Select(table => Cells(table)[index]));
        foreach (var table in tables)
        {
            var measures = table.ByMeasures(words);
            yield return (table.Amount, Cells(table));
            yield return (table.Amount, measures.Select(measure => measure.Amount));
            foreach (var measure in measures)
                yield return (measure.Amount, Cells(measure));
            for (var index = 0; index < keys.Length; index++)
                yield return (Cells(table)[index], measures.Select(measure => Cells(measure)[index]));
        }
    }

    private static long Printed(double amount, BudgetWords words) => LossPrint.Up(amount, words.Decimals).Unscaled;
}
