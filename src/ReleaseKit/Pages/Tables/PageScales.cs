using ReleaseKit.Charts;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Tables;

/// <summary>The scale of one figure's mark, in per cent of its slot; labelled at both ends if it is not the one whose ticks stand in the boxhead.</summary>
internal sealed record CellScale(Scale Scale, PublishedValue? FromLabel, PublishedValue? ToLabel)
{
    public bool IsOwn => FromLabel is not null;
}

/// <summary>The scale whose ticks stand in the boxhead; its two ends as numbers where they are round, for ticks that stand at the ends.</summary>
internal sealed record HeadScale(Scale Scale, IReadOnlyList<PublishedValue>? Ends);

/// <summary>The scales of one page: for each measure the one that most of its rows have, whose ticks stand in the boxhead, and for other rows one of their own.</summary>
internal sealed class PageScales
{
    // The canvas of a cell is 196 wide with 14 free on each side; a scale of its own needs less.
    private const double Start = 100 * 14d / 196;
    private const double OwnStart = 4;

    private readonly ColumnScales scales;
    private readonly Dictionary<int, Reach> heads;

    private PageScales(ColumnScales scales, Dictionary<int, Reach> heads) => (this.scales, this.heads) = (scales, heads);

    public static PageScales Of(Sheet sheet, IReadOnlyList<SheetRow> rows) => new(sheet.Scales, sheet.Shown.ToDictionary(
        measure => measure,
        measure => rows.Where(row => sheet.Table.Measures[measure].HasNumber(row.Row)).Select(row => sheet.Scales.Of(measure, row.Row))
            .GroupBy(scale => scale).MaxBy(group => group.Count())?.Key ?? new(0, 1)));

    public HeadScale HeadOf(int measure) => heads[measure] is { FromLabel: { } from, ToLabel: { } to }
        ? new(Between(heads[measure], OwnStart), [from, to])
        : new(Between(heads[measure], Start), null);

    public CellScale Of(int measure, int row)
    {
        var reach = scales.Of(measure, row);
        return reach == heads[measure]
            ? new(HeadOf(measure).Scale, null, null)
            : new(Between(reach, OwnStart), LabelOf(reach.FromLabel, reach.From), LabelOf(reach.ToLabel, reach.To));
    }

    private static Scale Between(Reach reach, double start) => new(reach.From, reach.To, start, 100 - start);

    private static PublishedValue LabelOf(PublishedValue? label, double end) => label ?? new((long)Math.Round(end), 0);
}
