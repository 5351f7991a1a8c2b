using ReleaseKit.Reading.Keys;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>What every row heading is checked for, once per distinct value.</summary>
internal static class LabelChecks
{
    public static void Check(string label, string column, Place at, ReadContext context)
    {
        var hidden = HiddenCharacters.FirstIn(label);
        if (label.Length == 0)
            context.Add(CellProblems.EmptyLabel(at, column, context.Owner));
        else if (label.Length > FolderLimits.LabelLength)
            context.Add(CellProblems.LabelTooLong(at, column, label.Length, context.Owner));
        else if (hidden >= 0)
            context.Add(KeyProblems.HiddenCharacter(at, $"A row heading in column \"{column}\"", label[hidden], context.Owner));
        else if (IsFormula(label))
            context.Add(CellProblems.Formula(at, column, label, context.Owner));
    }

    /// <summary>Whether a spreadsheet would run a text cell (CWE-1236).</summary>
    private static bool IsFormula(string label) => label[0] is '=' or '+' or '-' or '@' or '\t' or '\r' or '\uFF1D' or '\uFF0B' or '\uFF0D' or '\uFF20';
}
