using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// A law that seems to be given in the CSV's unit, where the figures count in another: continuous noise smaller than the last digit that the CSV has
/// room for, and means that nothing within "clipped" makes. The margins would be too small by the multiplier.
/// </summary>
internal sealed class LawUnitCheck : IReviewCheck
{
    // A chance below this is taken for none.
    private const double Unlikely = 1e-9;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Origins: { } origins }
        ? NoisedColumn.Of(release).Where(column => column.Measure.Multiplier != 1).SelectMany(column => CheckColumn(column, origins))
        : [];

    private static IEnumerable<Finding> CheckColumn(NoisedColumn column, FigureOrigins origins)
    {
        var decimals = FileRounding.DecimalsByRule(column.Measure);
        return column.OwnNoise.Select(own => decimals[own.Rule] is { } most ? FarOutside(column, own.Rule, own.Mechanism, origins) ?? BelowUnit(column, own.Rule, own.Mechanism, most, origins) : null)
            .OfType<Finding>();
    }

    private static Finding? BelowUnit(NoisedColumn column, int rule, Mechanism mechanism, byte decimals, FigureOrigins origins)
    {
        if (!FileRounding.IsContinuous(mechanism.Law) || FileRounding.Step(mechanism, column.Measure, decimals) is not { } step)
            return null;
        var deviation = column.Rows(rule).Max(row => origins.Of(column.At(row)).Error is { Error.Law: ContinuousLaw law } ? Math.Sqrt(law.Variance) : double.PositiveInfinity);
        return deviation < step ? BelowUnit(column, mechanism, step) : null;
    }

    /// <summary>The denominators need not be those of the records: means are given room for as much again on both sides.</summary>
    private static Finding? FarOutside(NoisedColumn column, int rule, Mechanism mechanism, FigureOrigins origins)
    {
        if (column.Measure.Kind != MeasureKind.Mean || mechanism.Clipped is not { } clipped)
            return null;
        var room = new PossibleValues(clipped.From - (clipped.To - clipped.From), clipped.To + (clipped.To - clipped.From), false);
        var chance = column.Rows(rule).Aggregate(1.0, (product, row) => product * ChanceToReach(column, row, room, origins));
        return chance < Unlikely ? FarOutside(column, column.Rows(rule).First(), mechanism, clipped) : null;
    }

    private static double ChanceToReach(NoisedColumn column, int row, PossibleValues room, FigureOrigins origins)
    {
        var value = column.ValueAt(row);
        return value >= room.Lowest && value <= room.Highest ? 1 : origins.Of(column.At(row)).Error?.Error.ChanceToReach(value, room) ?? 1;
    }

    private static Finding BelowUnit(NoisedColumn column, Mechanism mechanism, double step) => new(
        FindingLevel.Caution, "noise-below-unit", FindingOwner.Noise, mechanism.At,
        $"The noise of \"{mechanism.Id}\" is smaller than {BudgetText.Plain(step)} for the most part, but column \"{column.Measure.Column}\" of table \"{column.Table.Id}\" has \"multiplier\": {BudgetText.Plain(column.Measure.Multiplier)} and its digits move in steps of {BudgetText.Plain(step)}.",
        "if the law is given in the CSV's unit, the margins are too small by that factor.",
        $"a law is given in the figure's unit, after the multiplier: if the noise was added to the CSV's numbers, {LargerBy(column.Measure)}; if the values were rounded after the noise, write \"afterwards\": [ {{ \"roundTo\": {BudgetText.Plain(step)} }} ].");

    private static Finding FarOutside(NoisedColumn column, int row, Mechanism mechanism, ClippedTo clipped)
    {
        var (measure, address) = (column.Measure, FigureAddress.Canonical(column.Table, column.Measure, row));
        return new Finding(
            FindingLevel.Stop, "mean-outside-clipped", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "clipped"),
            $"{address} is {measure.ValueAt(row)} in the CSV, which is {BudgetText.Plain(column.ValueAt(row))} with \"multiplier\": {BudgetText.Plain(measure.Multiplier)}, but \"{mechanism.Id}\" clips what goes into the means of column \"{measure.Column}\" to {BudgetText.Plain(clipped.From)} to {BudgetText.Plain(clipped.To)}.",
            "no such mean and the noise as declared come to such values; if the law is given in the CSV's unit, the margins are too small by that factor.",
            $"a law is given in the figure's unit, after the multiplier: if the noise was added to the CSV's numbers, {LargerBy(measure)}; else correct \"clipped\" or \"multiplier\".")
        {
            Address = address,
        };
    }

    private static string LargerBy(Measure measure) => $"write the numbers of the law, of \"sensitivity\" and of \"clipped\" {BudgetText.Plain(measure.Multiplier)} times as large";
}
