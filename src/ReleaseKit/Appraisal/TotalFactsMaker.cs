using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Works out what the totals of one measure are made of.</summary>
internal sealed class TotalFactsMaker(Table table, Measure measure)
{
    /// <param name="hasNoise">Whether the figure of a row carries noise.</param>
    public TotalFacts Of(Func<int, bool> hasNoise) => measure.Kind is MeasureKind.Count or MeasureKind.Estimate or MeasureKind.Amount
        ? new TotalFacts
        {
            OwnNoise = Levels(rule => rule is NoiseRule.FromMechanism),
            Sums = Levels(rule => rule is NoiseRule.SumOver),
            HasTotalsWithoutNoise = table.Adds.Where(addition => addition.Measure == measure.Column).Any(addition => IsWithoutNoise(addition, hasNoise)),
            Steps = [.. Steps()],
        }
        : TotalFacts.None;

    private List<TotalLevel> Levels(Func<NoiseRule, bool> isMeant)
    {
        var levels = new HashSet<TotalLevel>();
        for (var row = 0; row < table.RowCount; row++)
            if (isMeant(measure.RuleAt(row)) && table.Stub.Any(column => column.IsAll(row)))
                levels.Add(new([.. table.Stub.Where(column => !column.IsAll(row))]));
        return [.. levels];
    }

    private bool IsWithoutNoise(Addition addition, Func<int, bool> hasNoise)
    {
        var over = Enumerable.Range(0, table.Stub.Count).First(column => table.Stub[column].Column == addition.Over);
        var stub = table.Stub[over];
        var total = Enumerable.Range(0, stub.Labels.Count).FirstOrDefault(code => stub.Labels[code].Value == addition.Total, -1);
        var keys = new RowKeys(table);
        var wholes = Rows().Where(row => stub.Codes[row] == total && measure.HasNumber(row) && measure.RuleAt(row) is NoiseRule.Exact or NoiseRule.Public)
            .Select(keys.Of).ToHashSet();
        return wholes.Count > 0 && Rows().Any(row => stub.Codes[row] != total && hasNoise(row) && wholes.Contains(keys.With(keys.Of(row), row, over, total)));
    }

    private IEnumerable<int> Rows() => Enumerable.Range(0, table.RowCount);

    private IEnumerable<StepOfFigures> Steps()
    {
        var used = measure.Rules.Where((_, rule) => measure.RuleOf.AsSpan().Contains((byte)rule)).OfType<NoiseRule.FromMechanism>()
            .Select(rule => rule.Mechanism).Distinct().ToList();
        return used.SelectMany(mechanism => mechanism.Afterwards).Distinct()
            .Where(step => step is AfterStep.NotBelow or AfterStep.NotAbove or AfterStep.ZeroBelow or AfterStep.RoundTo { How: RoundingHow.Up or RoundingHow.Down })
            .Select(step => new StepOfFigures(step, used.All(mechanism => mechanism.Afterwards.Contains(step))));
    }
}
