using System.Collections.Frozen;
using Scriban;
using Scriban.Runtime;

namespace ReleaseKit.Pages;

/// <summary>The page templates of a site-templates folder, parsed once. Thread-safe: each rendering has a context of its own.</summary>
public sealed class Templates
{
    private readonly FrozenDictionary<string, Template> byName;
    private readonly TemplateSource source;

    private Templates(string folder, FrozenDictionary<string, Template> byName)
    {
        this.byName = byName;
        source = new TemplateSource(folder);
        FontsFolder = Path.Combine(Path.GetDirectoryName(folder)!, "fonts");
    }

    /// <summary>Parses every template in the folder "pages" of a site-templates folder.</summary>
    /// <exception cref="InvalidDataException">A template has a fault; the message says file, line and column.</exception>
    public static Templates Load(string siteTemplatesFolder)
    {
        var folder = Path.Combine(siteTemplatesFolder, "pages");
        var templates = Directory.EnumerateFiles(folder, "*.html").ToFrozenDictionary(file => Path.GetFileName(file), Parse);
        return new Templates(folder, templates);
    }

    /// <summary>The fonts that stand beside the templates; pictures are set in them.</summary>
    public string FontsFolder { get; }

    public IEnumerable<string> Names => byName.Keys.Order(StringComparer.Ordinal);

    /// <summary>Renders a template. Values are escaped; <c>raw</c> in a template spells out the exception.</summary>
    /// <param name="name">File name, "home.html".</param>
    /// <param name="model">What the template may use; ScriptObject and ScriptArray all the way down.</param>
    public string Render(string name, ScriptObject model)
    {
        var context = new HtmlTemplateContext(source);
        context.PushGlobal(model);
        return byName[name].Render(context);
    }

    private static Template Parse(string file)
    {
        var template = Template.Parse(File.ReadAllText(file), Path.GetFileName(file));
        return template.HasErrors ? throw new InvalidDataException(string.Join('\n', template.Messages)) : template;
    }
}
