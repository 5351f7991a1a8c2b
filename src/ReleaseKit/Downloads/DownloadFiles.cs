using ReleaseKit.Appraisal;
using ReleaseKit.Pages;
using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>All files of SITE/downloads. Figures pass once a table; what they are worth in each form is written as they pass.</summary>
public static class DownloadFiles
{
    public static void WriteAll(SiteContext context, SiteFolder site)
    {
        for (var table = 0; table < context.Release.Tables.Count; table++)
            WriteTable(context, site, table);
        foreach (var table in context.Release.Tables)
            using (var stream = site.Create(DownloadNames.Columns(table)))
                new ColumnsJson(stream, context).Write(table);
        foreach (var mechanism in context.Release.Noise.Mechanisms.Where(mechanism => mechanism.Law == LawName.Tabulated))
            LawCsv.Write(site.Create(DownloadNames.Law(mechanism)), mechanism);
        using (var stream = site.Create(DownloadNames.Budget))
            BudgetJson.Write(stream, context.Release, context.Budget);
        Checksums.Write(site);
    }

    private static void WriteTable(SiteContext context, SiteFolder site, int index)
    {
        var table = context.Release.Tables[index];
        var files = new List<IRowFile>();
        try
        {
            files.AddRange(FilesOf(context, site, table));
            for (var row = 0; row < table.RowCount; row++)
                AddRow(context.Appraised, files, new FigureRef(index, 0, row), table.Measures.Count);
        }
        finally
        {
            files.ForEach(file => file.Dispose());
        }
    }

    private static void AddRow(IAppraisedRelease appraised, List<IRowFile> files, FigureRef first, int measures)
    {
        var figures = new AppraisedFigure[measures];
        for (var measure = 0; measure < measures; measure++)
            figures[measure] = appraised.Figure(first with { Measure = measure });
        foreach (var file in files)
            file.Add(first.Row, figures);
    }

    private static IEnumerable<IRowFile> FilesOf(SiteContext context, SiteFolder site, Table table)
    {
        var coverages = context.Release.Coverages;
        yield return new WideCsv(site.Create(DownloadNames.Wide(table)), table, coverages.Main, context.Language);
        yield return new WideCsv(site.Create(DownloadNames.WideAt(table, coverages.Lower)), table, coverages.Lower, null);
        yield return new WideCsv(site.Create(DownloadNames.WideAt(table, coverages.Upper)), table, coverages.Upper, null);
        yield return new LongCsv(site.Create(DownloadNames.Long(table)), table);
        yield return new JsonLines(site.Create(DownloadNames.JsonLines(table)), table);
    }
}
