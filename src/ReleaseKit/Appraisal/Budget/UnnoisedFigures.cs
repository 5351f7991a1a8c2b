using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>The figures of a release that carry no noise, exact ones first.</summary>
internal static class UnnoisedFigures
{
    private const byte HiddenStatus = (byte)'Q';

    public static IReadOnlyList<FiguresWithoutNoise> Of(Release release) =>
        [.. Enumerable.Range(0, release.Tables.Count).SelectMany(table => InTable(table, release.Tables[table])).OrderBy(figures => figures.Kind == WithoutNoiseKind.Public)];

    private static IEnumerable<FiguresWithoutNoise> InTable(int index, Table table)
    {
        var ofMeasures = Enumerable.Range(0, table.Measures.Count).SelectMany(measure => OfMeasure(index, measure, table.Measures[measure]));
        var ofColumns = table.SideColumns
            .Where(side => side is { From: SideColumnOrigin.Confidential, Mechanism: null } && table.RowCount > 0)
            .Select(side => new FiguresWithoutNoise(index, -1, side.Column, WithoutNoiseKind.ConfidentialColumn, null, table.RowCount));
        return [.. ofMeasures, .. ofColumns, .. Hidden(index, table)];
    }

    private static IEnumerable<FiguresWithoutNoise> OfMeasure(int table, int index, Measure measure)
    {
        for (var rule = 0; rule < measure.Rules.Count; rule++)
        {
            var (kind, reason) = measure.Rules[rule] switch
            {
                NoiseRule.Exact exact => (WithoutNoiseKind.Exact, exact.Reason),
                NoiseRule.Public known => (WithoutNoiseKind.Public, known.Source),
                _ => (WithoutNoiseKind.Exact, (ReaderText?)null),
            };
            var rows = Rows(measure, rule);
            if (reason is not null && rows.Count > 0)
                yield return new FiguresWithoutNoise(table, index, measure.Column, kind, reason, rows.Count) { FirstRow = rows[0] };
        }
    }

    private static List<int> Rows(Measure measure, int rule) =>
        [.. Enumerable.Range(0, measure.RuleOf.Length).Where(row => measure.RuleOf[row] == rule && measure.HasNumber(row))];

    private static IEnumerable<FiguresWithoutNoise> Hidden(int index, Table table)
    {
        if (table.Hidden is not { By: HiddenBy.ValueBeforeNoise })
            return [];
        var hidden = table.Measures.Sum(measure => measure.Status.Count(status => status == HiddenStatus));
        return hidden == 0 ? [] : [new FiguresWithoutNoise(index, -1, "", WithoutNoiseKind.HiddenByValueBeforeNoise, null, hidden)];
    }
}
