using ReleaseKit.Reading.Mechanisms;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>Holds the columns that release.json and mechanisms.json name against those of the CSV.</summary>
internal sealed class HeaderCheck(TableDraft draft, MechanismsDraft mechanisms, CsvFile rows)
{
    private readonly IReadOnlyList<string> headers = rows.Headers;

    /// <summary>Columns that a name without a column probably means: the finding about that name says so, and what else follows is none of its own.</summary>
    public IReadOnlySet<string> Meant { get; } = MeantIn(draft, rows.Headers);

    /// <summary>Whether every column that is needed is there; what is not is reported, as is a column that nobody declared.</summary>
    public bool Run()
    {
        var isWhole = true;
        foreach (var (column, at) in Needed(draft).Where(needed => !headers.Contains(needed.Column)))
        {
            draft.Context.Add(TableProblems.MissingColumn(at, column, draft.File, headers, draft.Context.Owner));
            isWhole = false;
        }
        foreach (var (mechanism, key, column) in ScaleColumns().Where(scale => !headers.Contains(scale.Column)))
            draft.Context.Add(TableProblems.ScaleColumnMissing(mechanism.KeyPlaces.GetValueOrDefault(key, mechanism.At), column, mechanism.Id, draft.File, Others(), FindingOwner.Noise));
        CheckStatusColumns();
        CheckUndeclared();
        return isWhole;
    }

    private static HashSet<string> MeantIn(TableDraft draft, IReadOnlyList<string> headers) =>
        [.. Needed(draft).Where(needed => !headers.Contains(needed.Column)).Select(needed => Nearest.Of(needed.Column, headers)).OfType<string>()];

    private static IEnumerable<(string Column, Place At)> Needed(TableDraft draft) => draft.Stub.Select(stub => (stub.Column, stub.At))
        .Concat(draft.Figures.Select(figure => (figure.Column, figure.At)))
        .Concat(draft.Figures.Where(figure => figure.UnadjustedColumn is not null).Select(figure => (figure.UnadjustedColumn!, figure.At)))
        .Concat(draft.Columns.Select(column => (column.Column, column.At)));

    private IEnumerable<(Mechanism Mechanism, string Key, string Column)> ScaleColumns() => draft.Figures
        .SelectMany(figure => figure.Rules ?? []).Select(rule => rule.End).OfType<RuleEnd.Mechanism>()
        .Select(end => mechanisms.Find(end.Id)).OfType<Mechanism>().Distinct()
        .SelectMany(mechanism => mechanism.Parameters.Select(parameter => (parameter.Key, Column: parameter.Value.Column)).Append((Key: "denominator", Column: mechanism.DenominatorColumn))
            .Where(named => named.Column is not null).DistinctBy(named => named.Column).Select(named => (mechanism, named.Key, named.Column!)));

    // Row headings, figures and marks are no scales.
    private IReadOnlyList<string> Others() => [.. headers.Except(draft.Stub.Select(stub => stub.Column))
        .Except(draft.Figures.Select(figure => figure.Column)).Except(draft.Figures.Select(figure => draft.Statuses.ColumnOf(figure.Column)).OfType<string>())];

    private void CheckStatusColumns()
    {
        if (draft.Statuses.Column is { } pattern && !draft.Figures.Any(figure => headers.Contains(draft.Statuses.ColumnOf(figure.Column))))
            draft.Context.Add(TableProblems.MissingColumn(draft.Statuses.At, pattern, draft.File, headers, draft.Context.Owner));
    }

    private void CheckUndeclared()
    {
        var declared = Needed(draft).Select(needed => needed.Column)
            .Concat(draft.Figures.Select(figure => draft.Statuses.ColumnOf(figure.Column)).OfType<string>()).ToHashSet();
        for (var index = 0; index < headers.Count; index++)
            if (!declared.Contains(headers[index]) && !Meant.Contains(headers[index]))
                draft.Context.Add(TableProblems.UndeclaredColumn(rows.PlaceOfHeader(index), headers[index], FindingOwner.Noise));
    }
}
