using ReleaseKit.Appraisal;
using ReleaseKit.Charts;
using ReleaseKit.Noise;
using ReleaseKit.Wording;
using Scriban.Runtime;

namespace ReleaseKit.Pages.HowToRead;

/// <summary>How to read a figure, with figures of the release as examples.</summary>
internal static class ReadingPage
{
    public static void Write(SiteContext context, SiteFolder site)
    {
        var head = new PageHead(PageMap.Reading, context.Language.Text("reading.title"), SiteSection.Reading);
        var model = context.Model();
        model["home"] = Link.From(head.Path, PageMap.Home);
        model["methods"] = Link.From(head.Path, PageMap.Methods);
        model["downloads"] = Link.From(head.Path, PageMap.Downloads);
        model["release_title"] = context.In(context.Release.Title);
        model["lead"] = Lead(context);
        model["has_noise"] = context.Figures.Noised > 0;
        model["words"] = new ScriptArray(Words(context.Figures));
        AddCoverage(model, context);
        AddThresholds(model, context);
        model["example"] = Example(context);
        model["digits"] = DigitExamples.Of(context);
        model["key"] = context.Figures.Noised > 0 ? new RawHtml(Marks.Key(context.Release, context.Language)) : null;
        context.Write(site, head, "reading.html", model);
    }

    /// <summary>How many of the figures carry noise, in a word, and what noise is for.</summary>
    private static string Lead(SiteContext context) => context.Language.Text(
        context.Figures switch
        {
            { Noised: 0 } => "reading.lead.none",
            var figures when figures.Noised == figures.All => "reading.lead.all",
            var figures when 2 * figures.Noised > figures.All => "reading.lead.most",
            _ => "reading.lead.some",
        },
        context.Figures.Noised == 0 ? [] : [("unit", UnitText.One(context.Release.Noise.Who, context.Language.Tag))]);

    /// <summary>The words that stand beside figures of the release.</summary>
    private static IEnumerable<string> Words(FigureKinds figures) =>
    [
        .. figures.Noised > 0 ? ["close", "rough", "weak"] : Array.Empty<string>(),
        .. figures.Exact > 0 ? ["exact"] : Array.Empty<string>(),
        .. figures.Public > 0 ? ["public"] : Array.Empty<string>(),
    ];

    private static void AddCoverage(ScriptObject model, SiteContext context)
    {
        var main = NaturalFrequency.Of(context.Release.Coverages.Main);
        model["cases"] = Number(context, main.Cases);
        model["all"] = Number(context, main.All);
        model["miss"] = Number(context, main.All - main.Cases);
        var promises = context.Release.Tables.SelectMany(table => table.Measures).Where(measure => measure.Shown).Select(RangePromises.Of).ToHashSet();
        model["zeroed"] = promises.Contains(RangePromise.AmongNotZero);
        model["published_from"] = promises.Contains(RangePromise.AmongPublished);
    }

    private static void AddThresholds(ScriptObject model, SiteContext context)
    {
        model["close"] = context.Language.Share(Coverage.OfShare(context.Release.Reliability.Close));
        model["rough"] = context.Language.Share(Coverage.OfShare(context.Release.Reliability.Rough));
    }

    /// <summary>The first headline that has a margin, else the first figure that has one.</summary>
    private static ScriptObject? Example(SiteContext context)
    {
        var headlines = context.Release.Headlines.Select(headline => context.Appraised.FigureAt(headline.Address));
        var figure = headlines.Concat(FirstRows.Of(context.Appraised)).FirstOrDefault(candidate => candidate.Main is not null);
        return figure is null ? null : new ScriptObject
        {
            ["name"] = FigureName.Of(figure, context.Language),
            ["href"] = Link.From(PageMap.Reading, context.Pages.Of(figure.Ref)),
            ["number"] = new RawHtml(FigureHtml.Number(figure, context.Language)),
            ["margin"] = FigureHtml.Margin(figure, context.Language),
            ["reading"] = context.Language.ReadingOf(figure).Text,
        };
    }

    private static string Number(SiteContext context, long whole) => context.Language.Number(new Releases.PublishedValue(whole, 0));
}
