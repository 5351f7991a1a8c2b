using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Tables;

/// <summary>What a measure's two columns of numbers must hold, in digits, the same on all pages of the table: its widest figure and its widest margin.</summary>
internal sealed record ColumnWidth(int Figure, int Margin)
{
    /// <summary>Numbers with fewer digits fit every column; the style sheet has no class for more than the most.</summary>
    private const int FewestDigits = 4;
    private const int FewestOfMargin = 6;
    private const int MostDigits = 24;

    /// <summary>The class that makes the column of figures wide enough: " w7" for seven digits.</summary>
    public string FigureClass => ClassOf(Figure, FewestDigits);
    public string MarginClass => ClassOf(Margin, FewestOfMargin);

    public static ColumnWidth Of(IAppraisedRelease appraised, int table, int measure, ILanguage language)
    {
        var rows = appraised.Release.Tables[table];
        var (figures, margins) = (0, 0);
        foreach (var row in Enumerable.Range(0, rows.RowCount).Where(rows.Measures[measure].HasNumber))
        {
            var figure = appraised.Figure(new(table, measure, row));
            figures = Math.Max(figures, DigitsWide(language.Number(figure.Printed)));
            if (figure.Main is { } main)
                margins = Math.Max(margins, DigitsWide(language.Margin(main.Printed)));
        }
        return new(figures, margins);
    }

    public static string ClassOf(int digits, int fewest) => digits < fewest ? "" : $" w{Math.Min(digits, MostDigits)}";

    // Two separators take no more room than one digit; a sign takes as much.
    private static int DigitsWide(string number)
    {
        var separators = number.Count(character => character is ',' or '.' || char.IsWhiteSpace(character));
        return number.Length - separators + ((separators + 1) / 2);
    }
}
