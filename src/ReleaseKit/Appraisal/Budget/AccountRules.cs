using ReleaseKit.Privacy.Losses;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>Every rule an account can stand on. The wording files have a text for each key ("budget.rule." + key).</summary>
public static class AccountRules
{
    public static AccountRule Authorised { get; } = new("authorised", "");
    public static AccountRule Declared { get; } = new("declared", "");
    public static AccountRule BothRecords { get; } = new("both-records", "");
    public static AccountRule CellsThereAre { get; } = new("cells-there-are", "");
    public static AccountRule BoundedSum { get; } = new("bounded-sum", "");
    public static AccountRule PureSum { get; } = new("pure-sum", "Dwork & Roth 2014, Corollary 3.15");
    public static AccountRule BasicSum { get; } = new("basic-sum", "Dwork & Roth 2014, Theorem 3.16");
    public static AccountRule ConcentratedSum { get; } = new("concentrated-sum", "Bun & Steinke 2016, Lemma 1.7");
    public static AccountRule TightConversion { get; } = new("conversion-tight", "Canonne, Kamath & Steinke 2020, Corollary 13");
    public static AccountRule SimpleConversion { get; } = new("conversion-simple", "Bun & Steinke 2016, Proposition 1.3");
    public static AccountRule PureAsConcentrated { get; } = new("pure-as-concentrated", "Bun & Steinke 2016, Proposition 1.4, in its smallest form ε·tanh(ε/2)");
    public static AccountRule ExactCurve { get; } = new("exact-curve", "Balle & Wang 2018 for Gaussian noise; else summed from the law itself");
    public static AccountRule CurveBound { get; } = new("curve-bound", "the smaller of the curve from ρ, Canonne, Kamath & Steinke 2020, and of the sum over cells, Dwork & Roth 2014, Theorem 3.16");
    public static AccountRule Pair { get; } = new("named-pair", "one unit that uses its declared bounds in full");
    public static AccountRule Odds { get; } = new("odds", "derived; see “Odds for one unit” on the methods page");

    /// <summary>The curve of a mechanism by its own: exact, or a bound where several cells together are not known exactly.</summary>
    public static AccountRule CurveOf(MechanismLoss loss) => loss.HasExactCurve ? ExactCurve : CurveBound;

    /// <summary>The loss of one law, from its literature.</summary>
    public static AccountRule Law(string source) => new("law", source);

    public static IReadOnlyList<AccountRule> All { get; } =
    [
        Authorised, Declared, BothRecords, CellsThereAre, BoundedSum, PureSum, BasicSum, ConcentratedSum, TightConversion, SimpleConversion, PureAsConcentrated, ExactCurve, CurveBound, Pair, Odds, Law(""),
    ];
}

/// <summary>Every kind of step in an account. The wording files have a text for each ("budget.step." + key).</summary>
public static class AccountSteps
{
    /// <summary>How many cells one unit more or less moves.</summary>
    public const string MovedByAdding = "moved-by-adding";

    /// <summary>How many cells one unit in place of another moves.</summary>
    public const string MovedByReplacing = "moved-by-replacing";

    /// <summary>The largest absolute difference over all cells, as declared.</summary>
    public const string AbsoluteSum = "absolute-sum";

    /// <summary>The largest Euclidean distance over all cells, as declared.</summary>
    public const string Distance = "distance";

    /// <summary>The loss of a mechanism from its law.</summary>
    public const string Loss = "loss";

    /// <summary>The same where the scale stands in a column: from the cells with the smallest.</summary>
    public const string LossByRow = "loss-by-row";

    /// <summary>The loss of a mechanism as the office states it.</summary>
    public const string Stated = "stated";

    /// <summary>A law without a loss in the declared accounting.</summary>
    public const string Unbounded = "unbounded";

    /// <summary>ε at the declared δ, from the curve of the law.</summary>
    public const string Curve = "curve";

    /// <summary>The sum over mechanisms.</summary>
    public const string Sum = "sum";

    /// <summary>The sum of ρ turned into ε at δ, by the tighter rule.</summary>
    public const string TightConversion = "conversion-tight";

    /// <summary>The same by the simpler rule.</summary>
    public const string SimpleConversion = "conversion-simple";

    /// <summary>What is authorised, turned into the currency of the account.</summary>
    public const string AuthorisedInCurrency = "authorised-in-currency";

    /// <summary>ε′ and the odds e^ε′.</summary>
    public const string Odds = "odds";

    public static IReadOnlyList<string> All { get; } =
    [
        MovedByAdding, MovedByReplacing, AbsoluteSum, Distance, Loss, LossByRow, Stated, Unbounded, Curve, Sum, TightConversion, SimpleConversion, AuthorisedInCurrency, Odds,
    ];
}
