using ReleaseKit.Appraisal;
using ReleaseKit.Charts;

namespace ReleaseKit.Pages.Tables;

/// <summary>What the marks of a table reach, by measure and by level of totals (see <see cref="ColumnScales.LevelOf"/>).</summary>
internal sealed class ExtentsOfTable
{
    private readonly SortedDictionary<(int Measure, long Level), ColumnExtent> extents = [];

    /// <summary>Reads every shown figure of a table once.</summary>
    public static ExtentsOfTable Of(IAppraisedRelease appraised, int tableIndex)
    {
        var table = appraised.Release.Tables[tableIndex];
        var result = new ExtentsOfTable();
        for (var measure = 0; measure < table.Measures.Count; measure++)
            for (var row = 0; row < table.RowCount; row++)
                if (table.Measures[measure].Shown && table.Measures[measure].HasNumber(row))
                    result.Add(measure, ColumnScales.LevelOf(table, row), MarkSubject.Of(appraised.Figure(new(tableIndex, measure, row))));
        return result;
    }

    private void Add(int measure, long level, MarkSubject subject)
    {
        if (!extents.TryGetValue((measure, level), out var extent))
            extents[(measure, level)] = extent = new();
        extent.Add(subject);
    }

    public ColumnExtent Of(int measure, long level) => extents.GetValueOrDefault((measure, level)) ?? new();

    /// <summary>The level with the fewest totals that the measure has figures of; 0 where there are parts.</summary>
    public long PartsLevel(int measure) => LevelsOf(measure).Select(pair => pair.Level).FirstOrDefault();

    /// <summary>The levels of a measure, the parts first, then by how many columns they sum over.</summary>
    public IEnumerable<(long Level, ColumnExtent Extent)> LevelsOf(int measure) => extents
        .Where(pair => pair.Key.Measure == measure)
        .OrderBy(pair => long.PopCount(pair.Key.Level)).ThenBy(pair => pair.Key.Level)
        .Select(pair => (pair.Key.Level, pair.Value));
}
