using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Tables;

/// <summary>A table as its pages see it, read whole before the first of them is written.</summary>
internal sealed record Sheet
{
    public required SiteContext Site { get; init; }
    public required int Index { get; init; }
    public required Table Table { get; init; }
    public required SheetStub Stub { get; init; }
    public required ColumnScales Scales { get; init; }
    public required TableFacts Facts { get; init; }
    public required NoteMarks Notes { get; init; }

    /// <summary>Indices of the measures that are shown, in order.</summary>
    public required IReadOnlyList<int> Shown { get; init; }

    /// <summary>For each of them how wide its columns of numbers are.</summary>
    public required IReadOnlyList<ColumnWidth> Widths { get; init; }
    public ILanguage Language => Site.Language;

    /// <summary>Whether the table stands on several pages.</summary>
    public bool IsCut => Site.Pages.CutOf(Index).Pages.Count > 1;

    /// <summary>The table's number in the release, from 1.</summary>
    public int Number => Index + 1;

    public static Sheet Of(SiteContext site, int index)
    {
        var table = site.Release.Tables[index];
        int[] shown = [.. Enumerable.Range(0, table.Measures.Count).Where(measure => table.Measures[measure].Shown)];
        return new()
        {
            Site = site,
            Index = index,
            Table = table,
            Stub = SheetStub.Of(table, site.Language),
            Scales = ColumnScales.Of(site.Appraised, index),
            Facts = site.Appraised.FactsOf(index),
            Notes = NoteMarks.Of(table),
            Shown = shown,
            Widths = [.. shown.Select(measure => ColumnWidth.Of(site.Appraised, index, measure, site.Language))],
        };
    }

    public AppraisedFigure Figure(int measure, int row) => Site.Appraised.Figure(new(Index, measure, row));

    public string Text(string key, params (string Name, string Value)[] fill) => Language.Text(key, fill);

    /// <summary>A number in the names of classes.</summary>
    public static string Digits(int number) => number.ToString(CultureInfo.InvariantCulture);

    public string Whole(long number) => Language.Number(new(number, 0));

    /// <summary>Id of the section at the foot that tells a measure's noise, cost and citation; the capital keeps it apart from every figure's id.</summary>
    public static string AboutId(Measure measure) => "M." + measure.Slug;
}
