using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Releases;
using ReleaseKit.Review.Budget;

namespace ReleaseKit.Review.Leaks;

/// <summary>
/// Published values that lie farther from what is possible than the declared noise reaches: never, where it has an end, or with a chance that is
/// below one in a thousand million for all figures together.
/// </summary>
internal sealed class BeyondNoiseCheck : IReviewCheck
{
    private const double Unlikely = 1e-9;

    public IEnumerable<Finding> Check(ReviewSubject subject)
    {
        if (subject is not { Release: { } release, Origins: { } origins })
            return [];
        var figures = release.Tables.Sum(table => table.Measures.Sum(CountWithNoise));
        var rules = release.Tables.Sum(table => table.Measures.Sum(measure => measure.RuleOf.Distinct().Count()));
        return release.Tables.SelectMany((table, at) => table.Measures.SelectMany((_, measure) => CheckMeasure(release, origins, at, measure, new(figures, rules))));
    }

    private static long CountWithNoise(Measure measure) => Enumerable.Range(0, measure.RuleOf.Length).LongCount(row => HasNoise(measure, row));

    private static bool HasNoise(Measure measure, int row) =>
        measure.HasNumber(row) && measure.RuleAt(row) is NoiseRule.FromMechanism or NoiseRule.SumOver;

    /// <summary>One finding for each rule: the figure that is farthest off, or all together.</summary>
    private static IEnumerable<Finding> CheckMeasure(Release release, FigureOrigins origins, int tableIndex, int measureIndex, Counts counts)
    {
        var (table, measure) = (release.Tables[tableIndex], release.Tables[tableIndex].Measures[measureIndex]);
        var possible = PossibleOf.Measure(measure);
        return Enumerable.Range(0, table.RowCount).Where(row => HasNoise(measure, row) && IsOutside(ValueOf(measure, row), possible))
            .Select(row => Reached(row, ValueOf(measure, row), possible, origins.Of(new(tableIndex, measureIndex, row))))
            .OfType<Outside>().GroupBy(one => measure.RuleOf[one.Row])
            .Select(rule => CheckRule(table, measure, possible, counts, [.. rule])).OfType<Finding>();
    }

    private static Finding? CheckRule(Table table, Measure measure, PossibleValues possible, Counts counts, List<Outside> outside)
    {
        var worst = outside.MinBy(one => one.Chance)!;
        var unreached = outside.Count(one => one.Chance * counts.Figures < Unlikely);
        if (unreached > 0)
            return Found(table, measure, worst, possible, $"{Alone(worst, counts.Figures)}{More(unreached)}");
        if (measure.RuleAt(worst.Row) is not NoiseRule.FromMechanism { Mechanism.Id: var id })
            return null;
        var alike = outside.Where(one => ValueOf(measure, one.Row) < possible.Lowest == ValueOf(measure, worst.Row) < possible.Lowest).ToList();
        var sides = double.IsFinite(possible.Lowest) && double.IsFinite(possible.Highest) ? 2 : 1;
        var together = Together(alike, measure.RuleOf.Count(rule => rule == measure.RuleOf[worst.Row])) * sides * counts.Rules;
        return together < Unlikely
            ? Found(table, measure, worst, possible, $"{alike.Count} figures of its rule lie beyond it. The chance that the noise of \"{id}\" takes so many so far is {BudgetText.Chance(together)}.")
            : null;
    }

    /// <summary>
    /// The chance that the chances of so many independent figures have so small a product: Fisher's combination, the tail of a sum of exponential
    /// variables, P(Poisson(sum) &lt; figures), bounded by its last term and a geometric series, the factorial by Stirling (textbook). A figure that
    /// is not outside counts with 1, which makes the product larger.
    /// </summary>
    private static double Together(List<Outside> outside, int figures)
    {
        var sum = outside.Sum(one => -Math.Log(one.Chance));
        var factorial = (figures - 0.5) * Math.Log(figures) - figures + 0.5 * Math.Log(2 * Math.PI);
        return sum > figures ? Math.Min(1, Math.Exp((figures - 1) * Math.Log(sum) - sum - factorial) / (1 - (figures - 1) / sum)) : 1;
    }

    private static double ValueOf(Measure measure, int row) => measure.ValueAt(row).Times(measure.Multiplier).ToDouble();

    private static bool IsOutside(double value, PossibleValues possible) => value < possible.Lowest || value > possible.Highest;

    private static Outside? Reached(int row, double value, PossibleValues possible, FigureOrigin origin) =>
        origin.Error is { Error: var error } ? new(row, error.ChanceToReach(value, possible), origin.Mechanism, error.Law) : null;

    private static Finding Found(Table table, Measure measure, Outside worst, PossibleValues possible, string chance)
    {
        var address = FigureAddress.Canonical(table, measure, worst.Row);
        var isBelow = ValueOf(measure, worst.Row) < possible.Lowest;
        var (bound, side) = isBelow ? (possible.Lowest, "smallest") : (possible.Highest, "largest");
        return new Finding(
            FindingLevel.Stop, "beyond-noise", FindingOwner.Noise, Place.OfCell(table.File, worst.Row, measure.Column),
            $"{address} is {measure.ValueAt(worst.Row)}; the {side} value before noise that is possible there is {BudgetText.Plain(bound)}. {chance}",
            "noise as declared does not make such a value: its margin, and what the mechanism is said to have spent, are those of other noise.",
            $"correct the value, or declare in mechanisms.json the noise that was added; or, if values before noise {(isBelow ? "below" : "above")} {BudgetText.Plain(bound)} are possible, {Widen(measure, isBelow, bound)}.")
        {
            Address = address,
        };
    }

    private static string Alone(Outside worst, long figures)
    {
        var noise = worst.Mechanism is { } mechanism ? $"the noise of \"{mechanism.Id}\"" : "the noise of its parts";
        if (HasEnd(worst.Law))
            return $"From there {noise} never reaches it.";
        return $"The chance that {noise} reaches it from there{(figures > 1 ? $", in any of {figures} figures," : "")} is {BudgetText.Chance(worst.Chance * figures)}.";
    }

    private static bool HasEnd(NoiseLaw law) => law switch
    {
        UniformLaw or DiscreteUniformLaw or TruncatedDiscreteLaplaceLaw => true,
        TabulatedLaw table => table.MissingMass == 0,
        IntegerSum sum => sum.Parts.All(part => HasEnd(part.Law)),
        _ => false,
    };

    private static string More(int count) => count switch
    {
        1 => "",
        2 => " One more figure of its rule is out of reach.",
        _ => $" {count - 1} more figures of its rule are out of reach.",
    };

    /// <summary>The key that sets the bound: the kind, unless a declared one is narrower.</summary>
    private static string Widen(Measure measure, bool isBelow, double bound)
    {
        var (lowest, highest) = PossibleOf.OfKind(measure);
        return bound == (isBelow ? lowest : highest)
            ? $"correct \"kind\" in release.json, which is \"{BudgetText.Written(measure.Kind)}\""
            : $"correct \"{(isBelow ? "lowest" : "highest")}\" in release.json";
    }

    /// <summary>How many figures and rules are looked at: a chance counts for all of them together.</summary>
    private readonly record struct Counts(long Figures, int Rules);

    private sealed record Outside(int Row, double Chance, Mechanism? Mechanism, NoiseLaw Law);
}
