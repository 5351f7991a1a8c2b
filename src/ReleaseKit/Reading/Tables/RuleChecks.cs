using ReleaseKit.Reading.Mechanisms;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>Every figure has a rule and no more digits than its margin can be worked out for, and every number that a mechanism takes from a column is there, row by row.</summary>
internal static class RuleChecks
{
    // 10^15: decimals of up to 15 digits go through a double unharmed (IEEE 754, DBL_DIG of C).
    private const decimal BeyondDouble = 1_000_000_000_000_000;

    public static void Run(ReadTable read, MechanismsDraft mechanisms, FindingLog log)
    {
        CheckColumns(read, mechanisms, log);
        for (var measure = 0; measure < read.Table.Measures.Count; measure++)
        {
            CheckRules(read, measure, mechanisms, log);
            CheckScales(read, measure, log);
            CheckDeclared(read, measure, log);
            CheckDigits(read, measure, log);
        }
    }

    /// <summary>Whether each measure of a table has rules, and all of them could be read.</summary>
    public static bool AreWhole(ReadTable read, MechanismsDraft mechanisms) => read.Table.Measures.Zip(read.Draft.Figures)
        .All(pair => !HasBrokenRule(pair.First, pair.Second, mechanisms) && pair.First.Rules.Count > 1);

    /// <summary>A column that is said to carry the noise of a mechanism names one that is declared.</summary>
    private static void CheckColumns(ReadTable read, MechanismsDraft mechanisms, FindingLog log)
    {
        if (mechanisms.Account is null)
            return;
        foreach (var column in read.Draft.Columns)
            if (column.Mechanism is { } id && !mechanisms.DeclaredIds.Contains(id))
                log.Add(MechanismProblems.UnknownMechanism(column.At, id, mechanisms.DeclaredIds, FindingOwner.Noise));
    }

    private static void CheckRules(ReadTable read, int measure, MechanismsDraft mechanisms, FindingLog log)
    {
        var (figure, draft) = (read.Table.Measures[measure], read.Draft.Figures[measure]);
        if (HasBrokenRule(figure, draft, mechanisms))
            return;
        if (figure.Rules.Count == 1)
            log.Add(TableProblems.NoNoise(draft.At, figure.Column, FindingOwner.Noise));
        else if (RowsWithout(figure, read.Table).ToList() is [var row, ..] rows)
            log.Add(TableProblems.NoRule(read.PlaceOf(row, measure), read.Address(measure, row), rows.Count, figure.Column, FindingOwner.Noise));
        foreach (var (rule, given) in (draft.Rules ?? []).Index())
            if (read.Table.RowCount > 0 && !figure.RuleOf.AsSpan().Contains((byte)rule))
                log.Add(TableProblems.RuleUnused(given.At, figure.Column, given.Where.Count > 0, FindingOwner.Noise));
    }

    /// <summary>Whether a rule could not be read, so that rows without one are no further fault.</summary>
    private static bool HasBrokenRule(Measure figure, FigureDraft draft, MechanismsDraft mechanisms) =>
        mechanisms.Account is null || draft.HasLaterRules || figure.Rules.Count - 1 < (draft.Rules?.Count ?? 0);

    private static IEnumerable<int> RowsWithout(Measure figure, Table table) => Enumerable.Range(0, table.RowCount)
        .Where(row => figure.RuleAt(row) is NoiseRule.NotGiven && (figure.HasNumber(row) || (figure.StatusAt(row) == 'Q' && table.Hidden?.InTotals == true)));

    /// <summary>Columns that give a law's parameter hold a positive number in range in every row of the mechanism that has one.</summary>
    private static void CheckScales(ReadTable read, int measure, FindingLog log)
    {
        var figure = read.Table.Measures[measure];
        foreach (var mechanism in figure.Rules.OfType<NoiseRule.FromMechanism>().Select(rule => rule.Mechanism).Distinct())
            foreach (var (key, value) in mechanism.Parameters.Where(parameter => parameter.Value.Column is not null))
                if (read.Table.SideColumns.FirstOrDefault(side => side.Column == value.Column) is { } side)
                    CheckScale(read, figure, mechanism, key, side, log);
    }

    private static void CheckScale(ReadTable read, Measure figure, Mechanism mechanism, string key, SideColumn side, FindingLog log)
    {
        for (var row = 0; row < read.Table.RowCount; row++)
        {
            if (figure.RuleAt(row) is not NoiseRule.FromMechanism { Mechanism: var used } || used != mechanism || !figure.HasNumber(row))
                continue;
            var number = side.Numbers[row];
            if (!(number > 0))
                log.Add(TableProblems.ScaleNotPositive(read.PlaceOf(row, side.Column), side.Column, key, FindingOwner.Noise));
            else if (!LawReader.IsInRange(key, number))
                log.Add(MechanismProblems.ParameterOutOfRange(
                    read.PlaceOf(row, side.Column), key, $"{number.ToString("R", System.Globalization.CultureInfo.InvariantCulture)} (column \"{side.Column}\")", FindingOwner.Noise) with
                {
                    Column = side.Column,
                });
        }
    }

    /// <summary>Figures with noise have so few digits, before and after a multiplier, that a double holds them and the ends of their ranges.</summary>
    private static void CheckDigits(ReadTable read, int measure, FindingLog log)
    {
        var figure = read.Table.Measures[measure];
        for (var row = 0; row < read.Table.RowCount; row++)
            if (figure.HasNumber(row) && figure.RuleAt(row) is NoiseRule.FromMechanism or NoiseRule.SumOver && HasTooManyDigits(figure, row))
                log.Add(TableProblems.TooManyDigits(read.PlaceOf(row, measure), read.Address(measure, row), FindingOwner.Noise));
    }

    private static bool HasTooManyDigits(Measure figure, int row)
    {
        var digits = Math.Abs((decimal)figure.Unscaled[row]);
        var magnitude = Math.Abs(figure.ValueAt(row).ToDouble()) * figure.Multiplier;
        return digits >= BeyondDouble || magnitude >= (double)BeyondDouble;
    }

    /// <summary>A figure of a mechanism that is only declared would have to be stated, which is of a later version.</summary>
    private static void CheckDeclared(ReadTable read, int measure, FindingLog log)
    {
        foreach (var rule in read.Table.Measures[measure].Rules.OfType<NoiseRule.FromMechanism>().Where(rule => rule.Mechanism.Law == LawName.Declared))
            log.Add(Keys.KeyProblems.NotYet(
                read.Draft.Figures[measure].At, "stated", FindingOwner.Noise,
                $"leave \"{read.Draft.Figures[measure].Column}\" out: the margin of a figure of \"{rule.Mechanism.Id}\", whose law is only declared, would have to be stated."));
    }
}
