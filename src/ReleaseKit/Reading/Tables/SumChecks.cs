using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>
/// A "sumOver" total is, digit for digit, the sum of its parts' published values, and its parts are draws whose sum has a law that is worked out:
/// lattice laws of one grid without after-steps. The parts of "all" are the values without a parent, those of another value are the ones that name it.
/// </summary>
internal static class SumChecks
{
    private const char CannotExist = 'M';

    public static void Run(ReadTable read, FindingLog log)
    {
        for (var measure = 0; measure < read.Table.Measures.Count; measure++)
            foreach (var column in read.Table.Measures[measure].Rules.OfType<NoiseRule.SumOver>().Select(rule => rule.StubColumn).Distinct())
                CheckOver(read, measure, column, log);
    }

    private static void CheckOver(ReadTable read, int measure, int column, FindingLog log)
    {
        var figure = read.Table.Measures[measure];
        var parents = StubParents.Of(read.Table.Stub[column]);
        foreach (var group in new RowGroups(read.Table).GroupsOver(column))
            foreach (var total in group)
                if (figure.RuleAt(total) is NoiseRule.SumOver { StubColumn: var over } && over == column)
                    CheckTotal(read, measure, column, total, parents, group, log);
    }

    private static void CheckTotal(ReadTable read, int measure, int column, int total, int[] parents, ArraySegment<int> group, FindingLog log)
    {
        var stub = read.Table.Stub[column];
        // A row that stands there twice has been reported; it is one part.
        var parts = group.Where(row => parents[stub.Codes[row]] == stub.Codes[total]).DistinctBy(row => stub.Codes[row]).ToList();
        if (!stub.IsAll(total) && !parents.Contains(stub.Codes[total]))
            log.Add(TotalProblems.NotATotal(read.PlaceOf(total, measure), read.Address(measure, total), stub.Column, FindingOwner.Noise));
        else if (parts.Count == 0)
            log.Add(TotalProblems.NoParts(read.PlaceOf(total, measure), read.Address(measure, total), stub.Column, FindingOwner.Noise));
        else
        {
            Compare(read, measure, column, total, parts, log);
            CheckLaws(read, measure, total, parts, log);
        }
    }

    private static void Compare(ReadTable read, int measure, int column, int total, List<int> parts, FindingLog log)
    {
        var (figure, inTotals) = (read.Table.Measures[measure], read.Table.Hidden?.InTotals == true);
        var hasHidden = parts.Any(part => !figure.HasNumber(part));
        if (!figure.HasNumber(total) || (hasHidden && inTotals))
            return;
        var sum = ExactSum.Of(parts.Where(figure.HasNumber).Select(figure.ValueAt));
        var published = ExactSum.Of([figure.ValueAt(total)]);
        if (published.Equals(sum))
        {
            if (!parts.Exists(figure.HasNumber) && parts.Exists(part => figure.StatusAt(part) != CannotExist))
                log.Add(TotalProblems.SumOfNothing(read.PlaceOf(total, measure), read.Address(measure, total), read.Table.Stub[column].Column, parts.Count, FindingOwner.Writer));
            return;
        }

        log.Add(TotalProblems.SumDiffers(
            read.PlaceOf(total, measure), read.Address(measure, total), read.Table.Stub[column].Column,
            published.ToString(), sum.ToString(), published.Less(sum).ToString(), hasHidden ? TotalProblems.SayInTotals : null, FindingOwner.Noise));
    }

    private static void CheckLaws(ReadTable read, int measure, int total, List<int> parts, FindingLog log)
    {
        var mechanisms = parts.Select(part => read.Table.Measures[measure].RuleAt(part)).OfType<NoiseRule.FromMechanism>()
            .Select(rule => rule.Mechanism).Distinct().ToList();
        if (mechanisms.Select(NotSummable).FirstOrDefault(why => why is not null) is { } problem)
            log.Add(TotalProblems.PartsNotYet(read.PlaceOf(total, measure), read.Address(measure, total), problem, FindingOwner.Noise));
        else if (mechanisms.Select(mechanism => mechanism.Grid).Distinct().Count() > 1)
            log.Add(TotalProblems.PartsNotYet(read.PlaceOf(total, measure), read.Address(measure, total), "on different grids", FindingOwner.Noise));
    }

    /// <summary>Why a sum of this mechanism's draws has no law that is worked out yet; null if it has.</summary>
    private static string? NotSummable(Mechanism mechanism)
    {
        if (mechanism.Law is LawName.Laplace or LawName.Gaussian or LawName.Uniform or LawName.Staircase)
            return $"with continuous noise (\"{mechanism.Id}\")";
        return mechanism.Afterwards.Count > 0 ? $"with \"afterwards\" (\"{mechanism.Id}\")" : null;
    }
}
