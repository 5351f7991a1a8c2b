using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>Which page, and where on it, everything of a release stands.</summary>
public sealed class PageMap
{
    public const string Home = "index.html";
    public const string Budget = "budget.html";
    public const string Reading = "reading.html";
    public const string Methods = "methods.html";
    public const string Downloads = "downloads.html";
    public const string NotFound = "404.html";

    private readonly Release release;
    private readonly TableCut[] cuts;

    private PageMap(Release release)
    {
        this.release = release;
        cuts = [.. release.Tables.Select(TableCut.Of)];
    }

    public static PageMap Of(Release release) => new(release);

    /// <summary>The pages of a table, by its index in the release.</summary>
    public TableCut CutOf(int table) => cuts[table];

    /// <summary>First page of a table, by its index in the release.</summary>
    public string FirstPageOf(int table) => cuts[table].Pages[0].Path;

    /// <summary>Permalink of a figure in the site: "tables/arrears/aldermoor.html#in_arrears.aldermoor.harrow-lane".</summary>
    public string Of(FigureRef figure) =>
        $"{cuts[figure.Table].PageOf(figure.Row).Path}#{FigureId.Of(release.Tables[figure.Table], figure.Measure, figure.Row)}";

    /// <summary>Page of a prose file: the first of a language is woven into the home page, each other is STEM.html.</summary>
    public string OfProse(ProsePage page)
    {
        var first = release.Narrative.First(other => other.Language == page.Language);
        return ReferenceEquals(first, page) ? Home : Path.GetFileNameWithoutExtension(page.File) + ".html";
    }
}
