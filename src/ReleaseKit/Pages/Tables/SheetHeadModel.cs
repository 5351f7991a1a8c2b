using ReleaseKit.Charts;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Tables;

/// <summary>What stands above the sheet: title, universe, edition, downloads, the table's other pages, the key of marks, and on narrow screens the choice of a measure.</summary>
internal static class SheetHeadModel
{
    public static ScriptObject Of(Sheet sheet, TablePage page)
    {
        var site = sheet.Site;
        var model = site.Model();
        model["release_title"] = site.In(site.Release.Title);
        model["home"] = Link.From(page.Path, PageMap.Home);
        model["reading"] = Link.From(page.Path, PageMap.Reading);
        model["title"] = TableTitle(sheet);
        model["part"] = PartOf(sheet, page);
        model["universe"] = sheet.Table.Universe is { } universe ? site.In(universe) : null;
        model["edition"] = EditionLine.Of(site);
        model["published"] = site.Language.Date(DateOnly.FromDateTime(site.Release.Published.DateTime));
        model["downloads"] = Downloads(sheet, page);
        model["parts"] = Parts(sheet, page);
        model["key"] = sheet.Facts.Figures.Noised > 0 ? new RawHtml(Marks.Key(site.Release, site.Language)) : null;
        model["measures"] = new ScriptArray(sheet.Shown.Select(measure => sheet.Table.Measures[measure].Title.In(site.Language.Tag)));
        return model;
    }

    /// <summary>"Table 3. Households behind, by tenure and age: Owned outright".</summary>
    public static string TitleOf(Sheet sheet, TablePage page)
    {
        var title = TableTitle(sheet);
        return PartOf(sheet, page) is { } part ? sheet.Text("tables.title.part", ("title", title), ("part", part)) : title;
    }

    private static string TableTitle(Sheet sheet) => sheet.Text("tables.title", ("number", sheet.Whole(sheet.Number)), ("title", sheet.Site.In(sheet.Table.Title)));

    /// <summary>The part of the table that a page holds: a value of the cutting column, a run of rows named by its first and last, or null for the only or first page.</summary>
    private static string? PartOf(Sheet sheet, TablePage page)
    {
        var cut = sheet.Table.CutBy;
        var part = page.Part is { } label && cut is { } column ? LabelText.Of(sheet.Table.Stub[column], label, sheet.Language) : null;
        if (page.Number == 1)
            return part;
        var run = RunOf(sheet, page);
        return part is null ? run : sheet.Text("tables.part.of", ("part", part), ("run", run));
    }

    private static ScriptArray Downloads(Sheet sheet, TablePage page)
    {
        (string File, string Key)[] files = [($"{sheet.Table.Id}.csv", "csv"), ($"{sheet.Table.Id}-long.csv", "long"), ($"{sheet.Table.Id}.jsonl", "lines")];
        return new(files.Select(file => new ScriptObject
        {
            ["href"] = Link.From(page.Path, "downloads/" + file.File),
            ["text"] = sheet.Text("tables.download." + file.Key),
        }));
    }

    private static ScriptArray Parts(Sheet sheet, TablePage page)
    {
        var pages = sheet.Site.Pages.CutOf(sheet.Index).Pages;
        return pages.Count == 1 ? [] : new(pages.Where(other => other.Rows.Count > 0).Select(other => new ScriptObject
        {
            ["href"] = Link.From(page.Path, other.Path),
            ["text"] = PartOf(sheet, other) ?? FirstPart(sheet, other),
            ["current"] = other.Path == page.Path,
        }));
    }

    /// <summary>What the first page of a cut table holds: the totals of the cutting column under their name, or its first rows.</summary>
    private static string FirstPart(Sheet sheet, TablePage page) => sheet.Table.CutBy is { } cut
        ? LabelText.Of(sheet.Table.Stub[cut], page.Rows[0], sheet.Language)
        : RunOf(sheet, page);

    private static string RunOf(Sheet sheet, TablePage page) =>
        sheet.Text("tables.part.run", ("first", sheet.Stub.NameOf(page.Rows[0])), ("last", sheet.Stub.NameOf(page.Rows[^1])));
}
