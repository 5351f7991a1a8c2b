using System.Text;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>The stable id of a figure on its page: MEASURE.VALUE.VALUE of slugs, so that a permalink survives the next edition.</summary>
public static class FigureId
{
    public static string Of(Table table, int measure, int row)
    {
        var id = new StringBuilder(table.Measures[measure].Slug);
        foreach (var column in table.Stub)
            id.Append('.').Append(column.LabelOf(row).Slug);
        return id.ToString();
    }
}
