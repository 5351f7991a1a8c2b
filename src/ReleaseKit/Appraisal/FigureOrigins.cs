using System.Collections.Concurrent;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>
/// Finds the error of each figure: one object for each distinct law and after-steps, made when first needed. Safe between threads.
/// </summary>
internal sealed class FigureOrigins(Release release)
{
    private readonly DeclaredLaws laws = new();
    private readonly ConcurrentDictionary<ErrorKey, DistinctError?> errors = new();
    private readonly ConcurrentDictionary<DrawKey, FigureOrigin> draws = new();
    private readonly ConcurrentDictionary<FigureRef, FigureOrigin> sums = new();
    private readonly ConcurrentDictionary<SumKey, LatticeLaw?> sumLaws = new();
    private readonly ConcurrentDictionary<int, SumParts> parts = new();
    private readonly Lazy<IReadOnlyList<byte?>>[][] decimals =
        [.. release.Tables.Select(table => table.Measures.Select(measure => new Lazy<IReadOnlyList<byte?>>(() => FileRounding.DecimalsByRule(measure))).ToArray())];

    public FigureOrigin Of(FigureRef at)
    {
        var table = release.Tables[at.Table];
        var measure = table.Measures[at.Measure];
        return measure.RuleAt(at.Row) switch
        {
            NoiseRule.FromMechanism from => OfDraw(from, table, measure, at),
            NoiseRule.SumOver => sums.GetOrAdd(at, OfSum),
            var rule => new FigureOrigin(rule, null, null, 0),
        };
    }

    private FigureOrigin OfDraw(NoiseRule.FromMechanism from, Table table, Measure measure, FigureRef at)
    {
        if (from.Mechanism.Adjusted || laws.TryLawOf(from.Mechanism, table, at.Row) is not { } law)
            return new FigureOrigin(from, null, from.Mechanism, 1);
        return draws.GetOrAdd(new(at.Table, at.Measure, measure.RuleOf[at.Row], law), key =>
            new FigureOrigin(from, Shared(law, Steps(from.Mechanism, measure, decimals[key.Table][key.Measure].Value[key.Rule] ?? 0, law)), from.Mechanism, 1));
    }

    /// <summary>The steps of the mechanism, the threshold of publication, and for a continuous law the rounding to the CSV's own decimals.</summary>
    private static List<AfterStep> Steps(Mechanism mechanism, Measure measure, byte decimals, NoiseLaw law)
    {
        List<AfterStep> steps = [.. mechanism.Afterwards];
        if (law is ContinuousLaw && FileRounding.Step(mechanism, measure, decimals) is { } unit)
            steps.Add(new AfterStep.RoundTo(unit));
        if (measure.PublishedFrom is { } from)
            steps.Add(new AfterStep.PublishedFrom(from));
        return steps;
    }

    private DistinctError? Shared(NoiseLaw law, IReadOnlyList<AfterStep> steps) =>
        errors.GetOrAdd(new ErrorKey(law, string.Join(';', steps)), _ => TryMake(law, steps));

    /// <summary>Null where no valid error is known: the steps do not go together, or a tabulated law lacks the mass for the coverages.</summary>
    private DistinctError? TryMake(NoiseLaw law, IReadOnlyList<AfterStep> steps)
    {
        try
        {
            return new DistinctError(FigureError.Of(law, steps), release.Coverages);
        }
        catch (ArgumentException)
        {
            return null;
        }
    }

    /// <summary>
    /// The exact law of the sum of the draws below. Parts with after-steps or continuous noise have no such law here: no valid error is known then.
    /// </summary>
    private FigureOrigin OfSum(FigureRef at)
    {
        var table = release.Tables[at.Table];
        var content = parts.GetOrAdd(at.Table, index => new SumParts(release.Tables[index])).Below(table.Measures[at.Measure], at.Row);
        var origin = OfSum(content, table, table.Measures[at.Measure].RuleAt(at.Row));
        return origin with { Parts = content.Draws.Count + content.WithoutNoise.Count + content.LeftOut, PartsHidden = content.Hidden, PartsLeftOut = content.LeftOut };
    }

    private FigureOrigin OfSum(SumContent content, Table table, NoiseRule rule)
    {
        if (content.Draws.Count == 0)
            return new FigureOrigin(SumWithoutNoise(content.WithoutNoise) ?? rule, null, null, 0);
        var mechanisms = content.Draws.Select(draw => draw.Mechanism).Distinct().ToList();
        var error = LawOfSum(table, content.Draws) is { } law ? Shared(law, []) : null;
        return new FigureOrigin(rule, error, mechanisms.Count == 1 ? mechanisms[0] : null, content.Draws.Count);
    }

    /// <summary>A sum of figures without noise is exact if one of them is.</summary>
    private static NoiseRule? SumWithoutNoise(List<NoiseRule> rules) =>
        rules.OfType<NoiseRule.Exact>().FirstOrDefault() ?? (rules.Count > 0 ? rules[0] : null);

    /// <summary>Draws of one law are counted, so that a sum of many parts is worked out from few laws; the same sum is worked out once.</summary>
    private NoiseLaw? LawOfSum(Table table, IReadOnlyList<BaseDraw> draws)
    {
        var counted = new Dictionary<LatticeLaw, int>();
        foreach (var (mechanism, row) in draws)
        {
            if (mechanism.Afterwards.Count > 0 || mechanism.Adjusted || laws.TryLawOf(mechanism, table, row) is not LatticeLaw law)
                return null;
            counted[law] = counted.GetValueOrDefault(law) + 1;
        }
        return sumLaws.GetOrAdd(new SumKey(counted), key => key.TryMakeLaw());
    }

    private readonly record struct ErrorKey(NoiseLaw Law, string Steps);

    /// <summary>Figures that share an origin: one rule of one measure, one law.</summary>
    private readonly record struct DrawKey(int Table, int Measure, byte Rule, NoiseLaw Law);
}
