using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Tables;

/// <summary>The class that makes a measure's column of figures as wide as its widest number, the same on all pages of the table: " w7" for seven digits.</summary>
internal static class FigureWidth
{
    /// <summary>Numbers with fewer digits fit every column; the style sheet has no class for more than the most.</summary>
    private const int FewestDigits = 4;
    private const int MostDigits = 24;

    public static string Of(IAppraisedRelease appraised, int table, int measure, ILanguage language)
    {
        var rows = appraised.Release.Tables[table];
        var widest = Enumerable.Range(0, rows.RowCount).Where(rows.Measures[measure].HasNumber)
            .Select(row => DigitsWide(language.Number(appraised.Figure(new(table, measure, row)).Printed))).DefaultIfEmpty().Max();
        return widest < FewestDigits ? "" : $" w{Math.Min(widest, MostDigits)}";
    }

    // Two separators take no more room than one digit; a minus sign takes as much.
    private static int DigitsWide(string number)
    {
        var separators = number.Count(character => character is ',' or '.' || char.IsWhiteSpace(character));
        return number.Length - separators + ((separators + 1) / 2);
    }
}
