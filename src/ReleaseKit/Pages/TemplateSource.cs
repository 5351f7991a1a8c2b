using Scriban;
using Scriban.Parsing;
using Scriban.Runtime;

namespace ReleaseKit.Pages;

/// <summary>Finds included templates: files of the templates' own folder, by name.</summary>
internal sealed class TemplateSource(string folder) : ITemplateLoader
{
    public string GetPath(TemplateContext context, SourceSpan callerSpan, string templateName) =>
        Path.Combine(folder, Path.GetFileName(templateName));

    public string Load(TemplateContext context, SourceSpan callerSpan, string templatePath) => File.ReadAllText(templatePath);

    public ValueTask<string?> LoadAsync(TemplateContext context, SourceSpan callerSpan, string templatePath) =>
        ValueTask.FromResult<string?>(Load(context, callerSpan, templatePath));
}
