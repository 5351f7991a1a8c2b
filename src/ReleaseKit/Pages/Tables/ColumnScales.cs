using ReleaseKit.Appraisal;
using ReleaseKit.Charts;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Tables;

/// <summary>
/// The scales of a table's measures, the same on all its pages: one for the parts of each measure; totals that lie beyond it get one of their own for each level of
/// totals, so that no mark ever stands where its figure is not.
/// </summary>
internal sealed class ColumnScales
{
    private const int OwnParts = 4;

    /// <summary>Free stretch between the outermost mark and the labels at the ends, as a share of what the marks take.</summary>
    private const double OwnRoom = 0.12;

    /// <summary>Totals that stretch the parts' scale by no more than this stay on it.</summary>
    private const double Stretch = 1.25;

    private readonly Table table;
    private readonly Dictionary<(int Measure, long Level), Reach> own = [];
    private readonly Reach[] parts;

    private ColumnScales(Table table, ExtentsOfTable extents)
    {
        this.table = table;
        parts = [.. Enumerable.Range(0, table.Measures.Count).Select(measure => FitParts(measure, extents))];
    }

    public static ColumnScales Of(IAppraisedRelease appraised, int table) => new(appraised.Release.Tables[table], ExtentsOfTable.Of(appraised, table));

    public Reach Of(int measure, int row) => own.TryGetValue((measure, LevelOf(table, row)), out var scale) ? scale : parts[measure];

    /// <summary>A row's level: which of its stub columns hold their value for all.</summary>
    public static long LevelOf(Table table, int row)
    {
        var level = 0L;
        for (var column = 0; column < table.Stub.Count; column++)
            if (table.Stub[column].IsAll(row))
                level |= 1L << column;
        return level;
    }

    private Reach FitParts(int measure, ExtentsOfTable extents)
    {
        var fitted = new ColumnExtent();
        fitted.Add(extents.Of(measure, extents.PartsLevel(measure)));
        foreach (var (level, extent) in extents.LevelsOf(measure))
            if (fitted.IsEmpty || extent.High <= Stretch * fitted.High || extent.High <= 0)
                fitted.Add(extent);
            else
                own[(measure, level)] = OwnScale(extent);
        var (from, to) = fitted.Fit();
        return new(from, to);
    }

    private static Reach OwnScale(ColumnExtent extent)
    {
        var (from, to) = extent.Fit();
        var room = OwnRoom * (to - from);
        var (low, high) = Ticks.Around(from == 0 ? 0 : from - room, to + room, OwnParts);
        return new(low.ToDouble(), high.ToDouble()) { FromLabel = low, ToLabel = high };
    }
}
