using ReleaseKit.Reading.Mechanisms;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading;

/// <summary>What only shows when everything has been read: names that clash, addresses that lead nowhere, totals and their parts.</summary>
internal static class FolderChecks
{
    public static void Run(
        ReleaseDraft draft, IReadOnlyList<ReadTable> tables, MechanismsDraft mechanisms, Release release, FindingLog log)
    {
        NameChecks.Run(draft, log);
        foreach (var table in tables.Where(table => table.IsWhole))
        {
            TableChecks.Run(table, log);
            TotalRowChecks.Run(table, log);
            PeriodColumnChecks.Run(table, log);
            RuleChecks.Run(table, mechanisms, log);
            SumChecks.Run(table, log);
        }
        if (draft.HasAllTables && tables.All(table => table.IsWhole))
            AddressChecks.Run(draft, release, log);
    }
}
