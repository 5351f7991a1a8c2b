using ReleaseKit.Reading.Mechanisms;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>Gives the measures without "noise" rules their mechanisms from what mechanisms say they cover.</summary>
internal static class CoverAssigner
{
    public static IReadOnlyList<ReadTable> Assign(IReadOnlyList<ReadTable> tables, MechanismsDraft mechanisms, bool hasAllTables, FindingLog log)
    {
        var resolved = mechanisms.Covers.Select(cover => (Cover: cover, Rows: Resolve(cover, tables, hasAllTables, log)))
            .Where(pair => pair.Rows is not null).ToLookup(pair => (pair.Rows!.Table, pair.Rows.Measure));
        return [.. tables.Select((table, index) => table with
        {
            Table = table.Table with
            {
                Measures = [.. table.Table.Measures.Select((measure, at) =>
                    Cover(table, at, [.. resolved[(index, at)].Select(pair => (pair.Cover, pair.Rows!.Rows))], mechanisms, log))],
            },
        })];
    }

    private static FigureSelection? Resolve(Covering cover, IReadOnlyList<ReadTable> tables, bool hasAllTables, FindingLog log)
    {
        try
        {
            return FigureSelector.Select(FigureAddress.Parse(cover.Address), [.. tables.Select(table => table.Table)]);
        }
        catch (AddressException problem)
        {
            if (hasAllTables && tables.All(table => table.IsWhole))
                log.Add(ReleaseProblems.Address(cover.At, problem, FindingOwner.Noise));
            return null;
        }
    }

    private static Measure Cover(
        ReadTable table, int measure, IReadOnlyList<(Covering Cover, IReadOnlyList<int> Rows)> covers, MechanismsDraft mechanisms, FindingLog log)
    {
        var (before, draft) = (table.Table.Measures[measure], table.Draft.Figures[measure]);
        if (covers.Count == 0)
            return before;
        if (draft.Rules is not null)
        {
            log.Add(TableProblems.RulesAndCovers(covers[0].Cover.At, $"{table.Table.Id}/{draft.Column}", covers[0].Cover.MechanismId, FindingOwner.Noise));
            return before;
        }
        var readable = covers.Where(cover => mechanisms.Find(cover.Cover.MechanismId) is not null).Take(RulesReader.MostRules).ToList();
        var ruleOf = new byte[table.Table.RowCount];
        Array.Fill(ruleOf, (byte)readable.Count);
        for (var index = 0; index < readable.Count; index++)
            Mark(ruleOf, readable, index, table, measure, log);
        NoiseRule[] rules = [.. readable.Select(cover => new NoiseRule.FromMechanism(mechanisms.Find(cover.Cover.MechanismId)!)), NoiseRule.NotGiven.Instance];
        return before with { Rules = rules, RuleOf = ruleOf };
    }

    private static void Mark(
        byte[] ruleOf, List<(Covering Cover, IReadOnlyList<int> Rows)> covers, int index, ReadTable table, int measure, FindingLog log)
    {
        foreach (var twice in covers[index].Rows.Where(row => ruleOf[row] < covers.Count).GroupBy(row => ruleOf[row]))
            log.Add(TableProblems.CoveredTwice(
                covers[index].Cover.At, table.Address(measure, twice.First()), twice.Count(), covers[twice.Key].Cover.MechanismId, covers[index].Cover.MechanismId, FindingOwner.Noise));
        foreach (var row in covers[index].Rows)
            ruleOf[row] = (byte)index;
    }
}
