using Markdig.Extensions.Tables;
using Markdig.Renderers;
using Markdig.Renderers.Html;
using Markdig.Syntax;

namespace ReleaseKit.Pages.Prose;

/// <summary>Tables in prose: in a region of their own that scrolls, columns to the right by a class (a style would break the page's policy).</summary>
internal sealed class ProseTableRenderer(string label) : HtmlObjectRenderer<Table>
{
    protected override void Write(HtmlRenderer renderer, Table table)
    {
        renderer.EnsureLine();
        renderer.Write("<div class=\"scroll\" role=\"region\" tabindex=\"0\" aria-label=\"").WriteEscape(label).Write("\"><table class=\"plain\">");
        foreach (var part in table.OfType<TableRow>().GroupBy(row => row.IsHeader))
        {
            var tag = part.Key ? "thead" : "tbody";
            renderer.Write($"<{tag}>");
            foreach (var row in part)
                WriteRow(renderer, table, row);
            renderer.Write($"</{tag}>");
        }
        renderer.WriteLine("</table></div>");
    }

    private static void WriteRow(HtmlRenderer renderer, Table table, TableRow row)
    {
        renderer.Write("<tr>");
        for (var column = 0; column < row.Count; column++)
        {
            var tag = row.IsHeader || column == 0 ? "th" : "td";
            var scope = row.IsHeader ? " scope=\"col\"" : column == 0 ? " scope=\"row\"" : "";
            var isRight = column < table.ColumnDefinitions.Count && table.ColumnDefinitions[column].Alignment == TableColumnAlign.Right;
            renderer.Write($"<{tag}{scope}{(isRight ? " class=\"r\"" : "")}>");
            WriteCell(renderer, (TableCell)row[column]);
            renderer.Write($"</{tag}>");
        }
        renderer.Write("</tr>");
    }

    private static void WriteCell(HtmlRenderer renderer, TableCell cell)
    {
        var before = renderer.ImplicitParagraph;
        renderer.ImplicitParagraph = cell is [ParagraphBlock];
        renderer.Write(cell);
        renderer.ImplicitParagraph = before;
    }
}
