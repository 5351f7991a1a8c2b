using ReleaseKit.Pages;
using Scriban.Runtime;
using Scriban.Syntax;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class TemplatesTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public TemplatesTests() => Directory.CreateDirectory(folder.In("pages"));

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Value_is_escaped() => Assert.Equal("<p>&lt;b&gt; &amp; &quot;</p>", Render("<p>{{ text }}</p>", "<b> & \""));

    [Fact]
    public void Raw_value_is_written_as_it_is() => Assert.Equal("<p><b></p>", Render("<p>{{ text | raw }}</p>", "<b>"));

    [Fact]
    public void Include_is_escaped_once()
    {
        File.WriteAllText(folder.In("pages/inner.html"), "[{{ text }}|{{ $1 }}]");
        Assert.Equal("[&lt;b&gt;|a &amp; b]", Render("{{ include 'inner.html' 'a & b' }}", "<b>"));
    }

    [Fact]
    public void Include_cannot_leave_the_folder()
    {
        File.WriteAllText(folder.In("outside.html"), "outside");
        Assert.Throws<ScriptRuntimeException>(() => Render("{{ include '../outside.html' }}", ""));
    }

    [Fact]
    public void Name_that_is_unknown_is_an_error_with_its_place()
    {
        var fault = Assert.Throws<ScriptRuntimeException>(() => Render("<p>\n{{ txet }}", "x"));
        Assert.Contains("page.html(2,4)", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Member_that_is_unknown_is_an_error() => Assert.Throws<ScriptRuntimeException>(() => Render("{{ model.nope }}", "x"));

    // Scriban cuts output at 1,048,576 characters and stops loops at 1,000 unless told otherwise.
    [Fact]
    public void Output_longer_than_a_mebibyte_is_whole()
    {
        var page = Render("{{ for i in 1..3000 }}{{ text }}{{ end }}", new string('x', 500));
        Assert.Equal(1_500_000, page.Length);
    }

    [Fact]
    public void Value_of_several_lines_is_not_indented() => Assert.Equal("    <pre>a\nb</pre>", Render("    <pre>{{ text }}</pre>", "a\nb"));

    [Fact]
    public void Template_with_a_fault_is_refused_with_its_place()
    {
        File.WriteAllText(folder.In("pages/page.html"), "<p>\n{{ for }}");
        Assert.Contains("page.html(2,", Assert.Throws<InvalidDataException>(() => Templates.Load(folder.Path)).Message, StringComparison.Ordinal);
    }

    private string Render(string template, string text)
    {
        File.WriteAllText(folder.In("pages/page.html"), template);
        return Templates.Load(folder.Path).Render("page.html", new ScriptObject { ["text"] = text, ["model"] = new ScriptObject() });
    }
}
