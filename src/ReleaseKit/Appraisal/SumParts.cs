using System.Collections.Concurrent;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>One draw of noise below a sum: its mechanism, and the row it was drawn for.</summary>
internal readonly record struct BaseDraw(Mechanism Mechanism, int Row);

/// <summary>What a sum holds: its draws, the rules of its parts without noise, how many of these have no number for readers, and how many parts have none and are left out.</summary>
internal sealed class SumContent
{
    public List<BaseDraw> Draws { get; } = [];

    public List<NoiseRule> WithoutNoise { get; } = [];

    public int Hidden { get; set; }

    public int LeftOut { get; set; }
}

/// <summary>
/// The draws that a published sum of a table rests on. Over a stub column a row of "all" has as parts the values without a parent among the others;
/// a value that others name as their parent has those. Sums of sums go down to the draws.
/// </summary>
internal sealed class SumParts(Table table)
{
    private static readonly IReadOnlyList<int> None = [];
    private readonly RowKeys keys = new(table);
    private readonly ConcurrentDictionary<int, IReadOnlyDictionary<UInt128, List<int>>> byWhole = new();

    /// <summary>All that lies below a row.</summary>
    public SumContent Below(Measure measure, int row)
    {
        var content = new SumContent();
        Add(measure, row, content);
        return content;
    }

    private void Add(Measure measure, int row, SumContent content)
    {
        switch (measure.RuleAt(row))
        {
            case NoiseRule.FromMechanism from:
                content.Draws.Add(new(from.Mechanism, row));
                content.Hidden += measure.HasNumber(row) ? 0 : 1;
                break;
            case NoiseRule.SumOver sum:
                foreach (var part in PartsOf(row, sum.StubColumn))
                    if (IsIn(measure, part))
                        Add(measure, part, content);
                    else
                        content.LeftOut += CanExist(measure, part) ? 1 : 0;
                break;
            case var rule:
                content.WithoutNoise.Add(rule);
                content.Hidden += measure.HasNumber(row) ? 0 : 1;
                break;
        }
    }

    private static bool CanExist(Measure measure, int part) => measure.StatusAt(part) != 'M';

    /// <summary>A part without a number is in the sum only if it is hidden and the table says that its totals hold hidden parts.</summary>
    private bool IsIn(Measure measure, int part) =>
        measure.HasNumber(part) || (measure.StatusAt(part) == 'Q' && table.Hidden is { InTotals: true });

    private IReadOnlyList<int> PartsOf(int row, int column) =>
        byWhole.GetOrAdd(column, Group).TryGetValue(keys.Of(row), out var parts) ? parts : None;

    /// <summary>Every row but those of wholes without a parent, under the key of the row it is a part of.</summary>
    private Dictionary<UInt128, List<int>> Group(int column)
    {
        var parents = StubParents.Of(table.Stub[column]);
        var groups = new Dictionary<UInt128, List<int>>();
        for (var row = 0; row < table.RowCount; row++)
            if (parents[table.Stub[column].Codes[row]] is >= 0 and var whole)
                Add(groups, keys.With(keys.Of(row), row, column, whole), row);
        return groups;
    }

    private static void Add(Dictionary<UInt128, List<int>> groups, UInt128 whole, int row)
    {
        if (!groups.TryGetValue(whole, out var parts))
            groups[whole] = parts = [];
        parts.Add(row);
    }
}
