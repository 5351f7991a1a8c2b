using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages;

/// <summary>What a figure is of, in words: its measure, then the values of its stub that are not "all".</summary>
public static class FigureName
{
    public static string Of(AppraisedFigure figure, ILanguage language)
    {
        var measure = figure.Measure.Title.In(language.Tag);
        var places = figure.Table.Stub.Where(column => !column.IsAll(figure.Row)).Select(column => LabelText.Of(column, figure.Row, language)).ToList();
        return places.Count == 0 ? measure : language.Text("figure.name", ("measure", measure), ("place", string.Join(", ", places)));
    }
}
