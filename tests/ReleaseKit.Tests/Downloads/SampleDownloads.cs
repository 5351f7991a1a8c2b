using CsvHelper;
using ReleaseKit.Appraisal;
using ReleaseKit.Downloads;
using ReleaseKit.Pages;
using ReleaseKit.Reading;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Sample;
using ReleaseKit.Wording;

namespace ReleaseKit.Tests.Downloads;

/// <summary>The downloads of the sample release, written once and read back by the tests.</summary>
public sealed class SampleDownloads : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public SampleDownloads()
    {
        var templates = Path.Combine(AppContext.BaseDirectory, "site-templates");
        var outcome = ReleaseFolder.Read(SampleRelease.Folder);
        Release = outcome.Release ?? throw new InvalidOperationException(string.Join('\n', outcome.Findings));
        Appraised = AppraisedRelease.Of(Release);
        Language = ReleaseKit.Wording.Language.Load(templates, "en");
        Budget = BudgetStatement.Of(Release);
        using var site = SiteFolder.Open(folder.In("site"));
        var assets = Assets.Write(site, templates, Release.Look, "");
        DownloadFiles.WriteAll(new SiteContext(Appraised, Language, Budget, Templates.Load(templates), assets, PageMap.Of(Release)), site);
        site.Finish();
    }

    public Release Release { get; }
    public IAppraisedRelease Appraised { get; }
    public ILanguage Language { get; }
    public BudgetStatement Budget { get; }

    /// <summary>Every figure of a table, row by row, in the order of the files.</summary>
    public IEnumerable<AppraisedFigure> Figures(int table) =>
        from row in Enumerable.Range(0, Release.Tables[table].RowCount)
        from measure in Enumerable.Range(0, Release.Tables[table].Measures.Count)
        select Appraised.Figure(new FigureRef(table, measure, row));

    public string PathOf(string download) => folder.In("site/" + download);

    public IReadOnlyList<IReadOnlyDictionary<string, string>> Rows(string download)
    {
        using var csv = CsvReader.FromFile(PathOf(download));
        var rows = new List<IReadOnlyDictionary<string, string>>();
        while (csv.Read())
            rows.Add(csv.Headers.ToDictionary(name => name, csv.GetString));
        return rows;
    }

    public void Dispose() => folder.Dispose();
}
