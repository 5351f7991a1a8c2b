using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Review;

/// <summary>A column of figures and where it stands in the release.</summary>
internal sealed record NoisedColumn(Table Table, int TableIndex, Measure Measure, int Index)
{
    public static IEnumerable<NoisedColumn> Of(Release release) =>
        release.Tables.SelectMany((table, at) => table.Measures.Select((measure, index) => new NoisedColumn(table, at, measure, index)));

    /// <summary>The rules that give a figure noise of its own which nothing adjusted, by their index.</summary>
    public IEnumerable<(int Rule, Mechanism Mechanism)> OwnNoise => Measure.Rules.Index()
        .Where(rule => rule.Item is NoiseRule.FromMechanism { Mechanism.Adjusted: false }).Select(rule => (rule.Index, ((NoiseRule.FromMechanism)rule.Item).Mechanism));

    /// <summary>The rows of a rule that have a number.</summary>
    public IEnumerable<int> Rows(int rule) => Enumerable.Range(0, Measure.RuleOf.Length).Where(row => Measure.RuleOf[row] == rule && Measure.HasNumber(row));

    public FigureRef At(int row) => new(TableIndex, Index, row);

    /// <summary>In the figure's unit.</summary>
    public double ValueAt(int row) => Measure.ValueAt(row).Times(Measure.Multiplier).ToDouble();
}
