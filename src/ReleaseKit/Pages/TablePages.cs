using ReleaseKit.Pages.Tables;

namespace ReleaseKit.Pages;

/// <summary>The pages of all tables: one for each part that the page map cuts.</summary>
public static class TablePages
{
    /// <param name="context">What the pages are made from.</param>
    /// <param name="site">Where they are written.</param>
    /// <param name="progress">Told the number of figures written so far; may be null.</param>
    public static void WriteAll(SiteContext context, SiteFolder site, IProgress<long>? progress = null)
    {
        var written = 0L;
        for (var index = 0; index < context.Release.Tables.Count; index++)
        {
            var sheet = Sheet.Of(context, index);
            var number = 1;
            foreach (var page in context.Pages.CutOf(index).Pages)
            {
                SheetPage.Write(sheet, page, number, site);
                number += page.Rows.Count;
                progress?.Report(written += (long)page.Rows.Count * sheet.Shown.Count);
            }
        }
    }
}
