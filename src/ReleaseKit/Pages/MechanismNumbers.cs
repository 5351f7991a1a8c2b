using ReleaseKit.Appraisal;
using ReleaseKit.Pages.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>
/// The numbers of a mechanism in print, with the unit of the figures that carry its noise where all have the same. Numbers of counts stand alone: they are numbers of
/// records.
/// </summary>
internal sealed class MechanismNumbers
{
    private readonly SiteContext context;
    private readonly Mechanism mechanism;
    private readonly List<MechanismRows> covered;
    private readonly Measure? measure;

    public MechanismNumbers(SiteContext context, Mechanism mechanism)
    {
        (this.context, this.mechanism) = (context, mechanism);
        covered = [.. MechanismRows.Of(context.Release, mechanism)];
        var alike = covered.Select(rows => rows.Measure).DistinctBy(one => (one.Unit.Key, HasUnit(one.Kind))).ToList();
        measure = alike is [var only] && HasUnit(only.Kind) ? only : null;
    }

    public string WithUnit(double number) => WithUnit(LossPrint.AsWritten(number));

    /// <summary>The smaller of two numbers, without the unit that stands after the other, and the other, in as many decimals.</summary>
    public (string From, string To) Pair(double from, double to)
    {
        var (low, high) = (LossPrint.AsWritten(from), LossPrint.AsWritten(to));
        var decimals = Math.Max(low.Decimals, high.Decimals);
        return (context.Language.NumberInProse(LossPrint.Up(from, decimals)), WithUnit(LossPrint.Up(to, decimals)));
    }

    /// <summary>The smallest and the largest number that the rows with this noise take from a column; null without any.</summary>
    public (double Smallest, double Largest)? InColumn(string column)
    {
        double[] numbers = [.. covered.SelectMany(rows => InColumn(rows, column)).Where(double.IsFinite)];
        return numbers.Length == 0 ? null : (numbers.Min(), numbers.Max());
    }

    /// <summary>The rounding to the decimals of the file that continuous noise has: "0.01 crowns"; null for noise that has none.</summary>
    public string? FileRounding
    {
        get
        {
            var steps = Appraisal.FileRounding.Steps(context.Release, mechanism);
            return steps.Count == 0 ? null : context.Language.List([.. steps.Select(WithUnit)]);
        }
    }

    /// <summary>The levels from which figures with this noise are published, in their unit; none where all are.</summary>
    public IEnumerable<double> Thresholds => covered.Select(rows => rows.Measure.PublishedFrom).OfType<double>().Distinct();

    private string WithUnit(PublishedValue number) => measure is null ? context.Language.NumberInProse(number) : context.Language.WithUnit(number, measure);

    private static IEnumerable<double> InColumn(MechanismRows rows, string column) =>
        rows.Table.SideColumns.FirstOrDefault(side => side.Column == column) is { } found ? rows.Rows.Select(row => found.Numbers[row]) : [];

    private static bool HasUnit(MeasureKind kind) => kind is MeasureKind.Amount or MeasureKind.Mean or MeasureKind.Median or MeasureKind.Index;
}
