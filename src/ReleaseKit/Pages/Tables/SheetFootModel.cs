using Scriban.Runtime;

namespace ReleaseKit.Pages.Tables;

/// <summary>What stands below the sheet: source and notes, what holds for the table as a whole, and for each measure its noise, its cost and how to cite it.</summary>
internal static class SheetFootModel
{
    public static ScriptObject Of(Sheet sheet, TablePage page, PrintNotes paper)
    {
        var model = sheet.Site.Model();
        model["budget"] = Link.From(page.Path, PageMap.Budget);
        model["source"] = sheet.Table.Source is { } source ? sheet.Site.In(source) : null;
        model["notes"] = Notes(sheet, page);
        model["sentences"] = new ScriptArray(TableSentences.Of(sheet));
        model["readings"] = paper.Model();
        model["measures"] = new ScriptArray(sheet.Shown.Select(measure => MeasureFootModel.Of(sheet, page, measure)));
        return model;
    }

    // Notes for rows that stand on other pages stand there.
    private static ScriptArray Notes(Sheet sheet, TablePage page) => new(sheet.Notes.Notes.Where(note => note.Mark.Length == 0 || sheet.Notes.AreOn(page.Rows, note.Mark)).Select(note => new ScriptObject
    {
        ["mark"] = note.Mark,
        ["text"] = sheet.Site.In(note.Text),
    }));
}
