using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>What a table's rows are checked for as a whole: rows that stand there twice, notes for rows that are not there, page names, declared sums.</summary>
internal static class TableChecks
{
    private static readonly string[] TakenPages = ["index", "print"];

    public static void Run(ReadTable read, FindingLog log)
    {
        CheckDoubledRows(read, log);
        CheckNotes(read, log);
        CheckPages(read, read.Table.CutBy, log);
        CheckPages(read, read.Table.Places, log);
        foreach (var addition in read.Draft.Adds)
            CheckAddition(read, addition, log);
    }

    private static void CheckDoubledRows(ReadTable read, FindingLog log)
    {
        var groups = new RowGroups(read.Table);
        foreach (var (first, again) in groups.Doubled())
            log.Add(CellProblems.DoubledRow(
                read.PlaceOf(again, read.Table.Stub[0].Column), string.Join(", ", read.Table.Stub.Select(column => $"\"{Keys.KeyProblems.Cut(column.LabelOf(again).Value)}\"")),
                read.Lines[first], FindingOwner.Noise));
    }

    private static void CheckNotes(ReadTable read, FindingLog log)
    {
        foreach (var (note, at) in read.Draft.Notes)
            if (note.At is not null)
                CheckNote(read, note.At, at, log);
    }

    /// <summary>A note's place is a query ("?ward=Skerry%20End"), or a figure and a query.</summary>
    private static void CheckNote(ReadTable read, string where, Place at, FindingLog log)
    {
        try
        {
            if (NoteQuery.Rows(read.Table, where).Count == 0)
                log.Add(ReleaseProblems.NoteMatchesNothing(at, read.Table.Id, FindingOwner.Writer));
        }
        catch (AddressException problem)
        {
            log.Add(ReleaseProblems.Address(at, problem, FindingOwner.Writer));
        }
    }

    private static void CheckPages(ReadTable read, int? column, FindingLog log)
    {
        if (column is not { } index)
            return;
        foreach (var label in read.Table.Stub[index].Labels)
            if (TakenPages.Contains(label.Slug) || Files.PathRules.IsDevice(label.Slug))
                log.Add(TableProblems.SlugTaken(read.Draft.FileAt, read.Table.Stub[index].Column, label.Value, label.Slug, FindingOwner.Writer));
    }

    private static void CheckAddition(ReadTable read, AdditionDraft addition, FindingLog log)
    {
        var figures = read.Table.Measures.Select(measure => measure.Column).ToList();
        if (!figures.Contains(addition.Figure))
            log.Add(TableProblems.NotAFigure(addition.At, addition.Figure, figures, FindingOwner.Writer));
        var stub = read.Table.Stub.FirstOrDefault(column => column.Column == addition.Over);
        if (stub is null)
            log.Add(TableProblems.NotAStub(addition.At, "over", addition.Over, read.Table.Stub.Select(column => column.Column), FindingOwner.Writer));
        else if ((addition.Total ?? stub.All) is not { } total)
            log.Add(TotalProblems.NoTotalName(addition.At, addition.Over, FindingOwner.Writer));
        else if (!stub.Labels.Any(label => label.Value == total))
            log.Add(TotalProblems.NoTotals(addition.At, addition.Figure, addition.Over, total, FindingOwner.Writer));
    }
}
