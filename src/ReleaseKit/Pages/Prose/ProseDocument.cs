using Markdig;
using Markdig.Syntax;
using Markdig.Syntax.Inlines;

namespace ReleaseKit.Pages.Prose;

/// <summary>Prose as CommonMark with tables, raw HTML left out; places are kept for messages.</summary>
public static class ProseDocument
{
    private static readonly MarkdownPipeline Pipeline = new MarkdownPipelineBuilder().UsePipeTables().DisableHtml().UsePreciseSourceLocation().Build();

    public static MarkdownDocument Parse(string markdown) => Markdown.Parse(markdown, Pipeline);

    /// <summary>The words of an inline, without its markup.</summary>
    public static string PlainText(ContainerInline? container) => container is null
        ? ""
        : string.Concat(container.Descendants().Select(inline => inline switch
        {
            LiteralInline literal => literal.Content.ToString(),
            CodeInline code => code.Content,
            HtmlEntityInline entity => entity.Transcoded.ToString(),
            LineBreakInline => " ",
            _ => "",
        }));
}
