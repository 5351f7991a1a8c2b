using ReleaseKit.Appraisal;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Tables;

/// <summary>The readings that paper needs: those of weak and special figures, numbered; the rest have their column's sentence.</summary>
internal sealed class PrintNotes(Sheet sheet)
{
    private readonly List<(string Name, AppraisedFigure Figure)> noted = [];

    /// <summary>The number of the figure's note, or null if its column's sentence says all.</summary>
    public int? NumberFor(AppraisedFigure figure, SheetRow row)
    {
        if (!NeedsNote(figure))
            return null;
        noted.Add((row.Name, figure));
        return noted.Count;
    }

    public ScriptArray Model() => new(noted.Select(note => new ScriptObject
    {
        ["name"] = note.Name,
        ["measure"] = note.Figure.Measure.Title.In(sheet.Language.Tag),
        ["reading"] = sheet.Language.ReadingOf(note.Figure).Text,
    }));

    // What is special about a whole column (exact, public, amounts capped, noise that mostly leaves a value as it was) its foot says.
    private static bool NeedsNote(AppraisedFigure figure) => figure.Reliability == Reliability.Weak || figure.Case.First is
        SpecialCase.NoNumber or SpecialCase.NoMargin or SpecialCase.BelowZero or SpecialCase.AboveHighest or SpecialCase.Zero or SpecialCase.FromThreshold
        or SpecialCase.NotPublishedBelow or SpecialCase.FlooredSum or SpecialCase.MarginAsLargeAsFigure;
}
