using ReleaseKit.Appraisal;
using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Pages;
using ReleaseKit.Privacy;
using ReleaseKit.Releases;
using ReleaseKit.Review;
using ReleaseKit.Tests.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Tests.Pages;

/// <summary>
/// A budget statement put together by hand, so that the page can be read back against numbers known here: four tables, three levels, one
/// mechanism over two tables, one that touches none, one only declared; exact and public figures.
/// </summary>
internal sealed class BudgetSample
{
    private static readonly string[] Titles =
    [
        "Households in arrears and households without heating, by district and ward", "What was owed and what was paid, by district",
        "Who is behind, by tenure and age band", "Weeks behind, by district",
    ];

    public LossCurrency Currency { get; init; } = LossCurrency.Rho;
    public Neighbouring Neighbouring { get; init; } = Neighbouring.AddOrRemove;
    public bool WithExactFigures { get; init; } = true;
    public double? Authorised { get; init; } = 0.35;

    /// <summary>Amounts by (tables, level); the mechanisms are named after their place.</summary>
    public IReadOnlyList<(int[] Tables, string Level, double Amount)> Amounts { get; init; } =
    [
        ([0], "ward", 0.0310912), ([0], "ward", 0.0102041), ([0], "district", 0.0138889), ([0], "Norrvale", 0.03125), ([0], "district", 0.0078125),
        ([1], "district", 0.0492113), ([1], "Norrvale", 0.0015681), ([2], "Norrvale", 0.0138889), ([2], "Norrvale", 0.0138697), ([3], "district", 0.0077921),
        ([0, 3], "district", 0.03125), ([], "", 0.0123457),
    ];

    /// <summary>Whether a limit on odds can be shown.</summary>
    public bool WithLimit { get; init; } = true;

    public static string Templates => Path.Combine(AppContext.BaseDirectory, "site-templates");

    public Release Release => field ??= BuildRelease();

    public BudgetStatement Statement => field ??= BuildStatement();

    /// <summary>Writes the page into a folder and gives its HTML.</summary>
    public string Page()
    {
        using var folder = new TemporaryFolder();
        WriteTo(folder.In("site"));
        return File.ReadAllText(Path.Combine(folder.In("site"), PageMap.Budget));
    }

    public void WriteTo(string target)
    {
        using var site = SiteFolder.Open(target);
        BudgetPage.Write(ContextFor(site), site);
        site.Finish();
    }

    public SiteContext ContextFor(SiteFolder site) => new(
        AppraisedRelease.Of(Release), Language.Load(Templates, "en"), Statement, ReleaseKit.Pages.Templates.Load(Templates),
        Assets.Write(site, Templates, Release.Look, "Foot"), PageMap.Of(Release));

    private Release BuildRelease()
    {
        var small = new SmallRelease()
            .Stub("ward", null, "North", "South", "East")
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "120", "14", "300").Build();
        var table = small.Tables[0] with { Universe = SmallRelease.Words("All households"), Source = SmallRelease.Words("The register") };
        return small with
        {
            Title = SmallRelease.Words("Energy Hardship Register 2031"),
            ReferencePeriod = "2031",
            Licence = new Licence("CC BY 4.0", null),
            Tables = [.. Titles.Select((title, index) => table with { Id = $"t{index}", Title = SmallRelease.Words(title) })],
            Noise = AccountOf(small.Noise),
        };
    }

    private NoiseAccount AccountOf(NoiseAccount account) => account with
    {
        Over = SmallRelease.Words("the year 2031"),
        Neighbouring = Neighbouring,
        Accounting = Currency == LossCurrency.Rho ? Accounting.Concentrated : Accounting.Pure,
        Authorised = new Authorised
        {
            Epsilon = 6,
            Delta = 1e-9,
            By = "The Registrar",
            On = new DateOnly(2031, 9, 4),
            Paper = "NOPF/2031/7",
            Unspent = "lapses",
            At = new Place("mechanisms.json"),
        },
        Practice = new Practice("The Registrar's office", "exact integer sampler", null, "same noise kept", null, null, null),
        Mechanisms = [.. Amounts.Select((amount, index) => MechanismOf(index, amount.Level))],
    };

    private static Mechanism MechanismOf(int index, string level) => SmallRelease.Mechanism($"m{index}", index == 2 ? LawName.Declared : LawName.DiscreteGaussian, ("sigma", 9.5)) with
    {
        Answers = SmallRelease.Words($"Households counted in question {index + 1}"),
        Level = level.Length == 0 ? null : SmallRelease.Words(level),
        Use = level.Length == 0 ? MechanismUse.NotPublished : MechanismUse.Figures,
    };

    private BudgetStatement BuildStatement()
    {
        var spent = Amounts.Sum(amount => amount.Amount);
        return new BudgetStatement
        {
            Account = Release.Noise,
            Currency = Currency,
            Spent = spent,
            Authorised = Authorised,
            IsWithinAuthorised = true,
            Promise = new LossTotal(6, 1e-9, null, AccountRules.Authorised),
            Declared = new LossTotal(null, null, 0.2301, AccountRules.Declared),
            Recomputed = new LossTotal(4.2345678, 1e-9, spent, AccountRules.ConcentratedSum),
            SmallestBound = new LossTotal(4.1987654, 1e-9, null, AccountRules.TightConversion),
            Lower = new LossTotal(null, null, 0.2109876, AccountRules.Pair),
            Delta = 1e-9,
            Conversions = [new LossTotal(4.2345678, 1e-9, null, AccountRules.TightConversion), new LossTotal(4.8765432, 1e-9, null, AccountRules.SimpleConversion)],
            Meaning = WithLimit ? MeaningAt(4.5, 1e-8) : Meanings.Of([], Delta.Of(0.5)),
            MeaningOfPromise = MeaningAt(6.2, 1e-8),
            Mechanisms = [.. Amounts.Select(AccountFor)],
            Pieces = [.. Amounts.Select(PieceFor)],
            WithoutNoise = Without(),
            Steps = Steps(spent),
        };
    }

    private static MeaningForOne MeaningAt(double epsilon, double beta) => new()
    {
        EpsilonPrime = epsilon,
        Beta = beta,
        Odds = Math.Exp(epsilon),
        Beliefs = [.. new[] { 0.001, 0.01, 0.1, 0.5 }.Select(prior => new Belief(
            prior, prior * Math.Exp(epsilon) / (1 - prior + (prior * Math.Exp(epsilon))), prior / (prior + ((1 - prior) * Math.Exp(epsilon)))))],
        Tests = [.. new[] { 0.01, 0.05, 0.1 }.Select(alarms => new MembershipTest(alarms, Math.Min(1, 1 - (Math.Exp(-epsilon) * (1 - alarms)))))],
    };

    private MechanismAccount AccountFor((int[] Tables, string Level, double Amount) part, int index) => new()
    {
        Mechanism = Release.Noise.Mechanisms[index],
        Declared = index == 2 ? new LossTotal(null, null, part.Amount, AccountRules.Declared) : null,
        Recomputed = new LossTotal(null, null, part.Amount, AccountRules.Law("Canonne, Kamath & Steinke 2020")),
        Lower = new LossTotal(null, null, part.Amount, AccountRules.Pair),
        Amount = part.Amount,
        ShareOfSpent = part.Amount / Amounts.Sum(amount => amount.Amount),
        Measures = [.. part.Tables.Select(table => new MeasureRef(table, 0))],
        Tables = part.Tables,
        Cells = 3 + index,
        Published = 2 + index,
        Hidden = index == 0 ? 1 : 0,
        OnlyDeclared = index == 2,
    };

    private BudgetPiece PieceFor((int[] Tables, string Level, double Amount) part, int index) => new(
        $"m{index}", part.Tables, [.. part.Tables.Select(table => new MeasureRef(table, 0))], part.Level,
        part.Level.Length == 0 ? null : SmallRelease.Words(part.Level), part.Amount);

    private FiguresWithoutNoise[] Without() =>
    [
        .. WithExactFigures ? [new FiguresWithoutNoise(1, 0, "figure", WithoutNoiseKind.Exact, SmallRelease.Words("The Relief Act orders the exact sum to be published"), 7)] : Array.Empty<FiguresWithoutNoise>(),
        new FiguresWithoutNoise(0, 0, "figure", WithoutNoiseKind.Public, SmallRelease.Words("Public list of accounts, 31 December 2030"), 66),
    ];

    private AccountStep[] Steps(double spent) =>
    [
        .. Amounts.Select((part, index) => new AccountStep(AccountSteps.Loss, $"ρ = 1 × 1² ÷ (2 × 9.5²) = {part.Amount}", part.Amount, AccountRules.Law("Canonne, Kamath & Steinke 2020")) { Mechanism = $"m{index}" }),
        new AccountStep(AccountSteps.Sum, $"{string.Join(" + ", Amounts.Select(part => part.Amount))} = {spent}", spent, AccountRules.ConcentratedSum),
        new AccountStep(AccountSteps.TightConversion, "ε(ρ, δ) = 4.2345678", 4.2345678, AccountRules.TightConversion),
    ];
}
