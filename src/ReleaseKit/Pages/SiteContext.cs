using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;
using Scriban.Runtime;

namespace ReleaseKit.Pages;

/// <summary>All that the pages of one language are made from.</summary>
public sealed record SiteContext(IAppraisedRelease Appraised, ILanguage Language, BudgetStatement Budget, Templates Templates, Assets Assets, PageMap Pages)
{
    public Release Release => Appraised.Release;

    /// <summary>The published numbers of the release by where they come from.</summary>
    public FigureKinds Figures { get; } = Enumerable.Range(0, Appraised.Release.Tables.Count).Aggregate(FigureKinds.None, (kinds, table) => kinds + Appraised.FactsOf(table).Figures);

    /// <summary>Whether there is noise to speak of: in figures, or in runs that none is published of.</summary>
    public bool HasNoise => Figures.Noised > 0 || Budget.Mechanisms.Count > 0;

    /// <summary>Text for readers in the language of these pages.</summary>
    public string In(ReaderText text) => text.In(Language.Tag);

    /// <summary>A template model that knows <c>say</c>; give it what else the template uses.</summary>
    public ScriptObject Model() => new() { ["say"] = new SayFunction(Language) };

    /// <summary>Begins a page: its head is written, the body is the caller's, its foot is written when the writer is disposed.</summary>
    public HtmlWriter Open(SiteFolder site, PageHead head)
    {
        var (top, foot) = PageFrame.Of(this, head);
        return new HtmlWriter(site.Create(head.Path), foot).Raw(top);
    }

    /// <summary>A whole page whose body is one template.</summary>
    public void Write(SiteFolder site, PageHead head, string template, ScriptObject model)
    {
        using var page = Open(site, head);
        page.Raw(Templates.Render(template, model));
    }
}
