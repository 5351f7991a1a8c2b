using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Pages;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Tests.Pages;

/// <summary>A release with two tables, prose and headlines, invented, for tests of pages; with a text of the test's choice wherever the folder gives text.</summary>
internal static class PagesRelease
{
    public static string TemplatesFolder { get; } = Path.Combine(AppContext.BaseDirectory, "site-templates");

    public static ILanguage English { get; } = Language.Load(TemplatesFolder, "en");

    /// <param name="text">Turns each text of the release into the one that stands in it.</param>
    public static Release Make(Func<string, string>? text = null)
    {
        var as_ = text ?? (plain => plain);
        var gauss = SmallRelease.Mechanism("late-gauss", LawName.DiscreteGaussian, ("sigma", 9.5)) with { Answers = Words(as_("Late in each ward")) };
        var laplace = SmallRelease.Mechanism("paid-laplace", LawName.DiscreteLaplace, ("scale", 40)) with { Afterwards = [new AfterStep.RoundTo(10), new AfterStep.NotBelow(0)] };
        var basis = new SmallRelease()
            .Stub("district", "All", "All", "North", "North", "South", "South")
            .Stub("ward", "All", "All", "All", "Quay", "All", "Mill")
            .Figures(Named("late", as_), [new NoiseRule.FromMechanism(gauss)], new byte[5], "1240", "702", "698", "541", "-4")
            .Figures(Named("listed", as_), [new NoiseRule.Public(Words(as_("Public list")))], new byte[5], "9000", "5000", "5000", "4000", "4000")
            .Build();
        var other = new SmallRelease().Stub("kind", null, "Cash", "Card", "Other")
            .Figures(Named("paid", as_), [new NoiseRule.FromMechanism(laplace), new NoiseRule.Exact(Words(as_("The law asks for it")))], [0, 1, 0], "12340", "777", "Q")
            .Build();
        var tables = new[]
        {
            basis.Tables[0] with { Id = "late", Title = Words(as_("Late payers")), CutBy = 0, Universe = Words(as_("Households")), Source = Words(as_("Register")), Notes = [new TableNote(null, Words(as_("A note")))] },
            other.Tables[0] with { Id = "paid", Title = Words(as_("Paid by kind")) },
        };
        return basis with
        {
            Title = Words(as_("A small release")),
            Lead = Words(as_("What was paid late.")),
            Publisher = new Publisher(as_("The Office"), "office@office.example", "https://office.example/"),
            ReferencePeriod = "2031-01-01/2031-12-31",
            Next = "2033-03",
            Address = "https://office.example/small/1/",
            Licence = new Licence(as_("CC BY 4.0"), "https://creativecommons.org/licenses/by/4.0/"),
            Look = new Look(null, as_("The Office, at the foot")),
            Tables = tables,
            Short = new Dictionary<string, string> { ["all-late"] = "late/late?district=All&ward=All" },
            Headlines =
            [
                new Headline("all-late", Words(as_("Late in all")), Words(as_("Paid after the day."))),
                new Headline("late/late?district=South&ward=Mill", null, null),
                new Headline("paid/paid?kind=Card", Words(as_("By card")), null),
            ],
            Narrative =
            [
                new ProsePage("narrative/summary.md", "en", $"# {as_("In short")}\n\nIn all [value and margin](figure:all-late) were late.\n"),
                new ProsePage("narrative/more.md", "en", $"# {as_("More of it")}\n\n## {as_("A part")}\n\nBy card [value](<figure:paid/paid?kind=Card>), see [the first](summary.md).\n"),
            ],
            Noise = basis.Noise with { Mechanisms = [gauss, laplace], Over = Words(as_("the year 2031")) },
        };
    }

    public static BudgetStatement BudgetOf(Release release)
    {
        var rule = new AccountRule("concentrated-sum", "A source");
        var total = new LossTotal(1.25, 1e-9, 0.0152, rule);
        return new BudgetStatement
        {
            Account = release.Noise,
            Currency = LossCurrency.Rho,
            Spent = 0.0152,
            Authorised = 1,
            IsWithinAuthorised = true,
            Promise = new LossTotal(null, null, 1, rule),
            Recomputed = total,
            SmallestBound = total,
            Lower = total,
            Delta = 1e-9,
            Conversions = [],
            Meaning = new MeaningForOne { EpsilonPrime = 1.3, Odds = 3.7, Beliefs = [], Tests = [] },
            Mechanisms = [],
            Pieces =
            [
                new BudgetPiece("late-gauss", [0], [new MeasureRef(0, 0)], "", null, 0.0056),
                new BudgetPiece("paid-laplace", [1], [new MeasureRef(1, 0)], "", null, 0.0096),
            ],
            WithoutNoise = [new FiguresWithoutNoise(1, 0, "paid", WithoutNoiseKind.Exact, Words("The law asks for it"), 1)],
            Steps = [],
        };
    }

    public static SiteContext ContextOf(Release release) => new(
        AppraisedRelease.Of(release), English, BudgetOf(release), Templates.Load(TemplatesFolder), new Assets("assets/style.css"), PageMap.Of(release));

    /// <summary>Composes the release into a folder.</summary>
    public static void Compose(Release release, string target)
    {
        using var site = SiteFolder.Open(target);
        Site.Compose(AppraisedRelease.Of(release), English, BudgetOf(release), TemplatesFolder, site, null);
        site.Finish();
    }

    private static ReaderText Words(string text) => SmallRelease.Words(text);

    private static Measure Named(string column, Func<string, string> text) =>
        SmallRelease.Measure(MeasureKind.Count, column) with { Title = Words(text($"Measure {column}")) };
}
