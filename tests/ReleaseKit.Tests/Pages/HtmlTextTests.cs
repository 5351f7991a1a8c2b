using System.Text;
using ReleaseKit.Pages;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class HtmlTextTests
{
    // HTML Living Standard, section 13.1.2.3 (attributes) and 13.1.4 (character references): the five characters that can end text or a quoted value.
    [Theory]
    [InlineData("a & b", "a &amp; b")]
    [InlineData("<script>", "&lt;script&gt;")]
    [InlineData("\" onload='x'", "&quot; onload=&#39;x&#39;")]
    [InlineData("é £ − \u00A0 日本 😀", "é £ − \u00A0 日本 😀")]
    [InlineData("a\u0000b\u001Bc\u0085d", "a\uFFFDb\uFFFDc\uFFFDd")]
    [InlineData("12\u202E34", "12\uFFFD34")]
    [InlineData("a\tb\nc", "a\tb\nc")]
    public void Encode_escapes_what_could_end_text_or_mislead(string text, string expected) => Assert.Equal(expected, HtmlText.Encode(text));

    [Fact]
    public void Text_written_to_a_stream_is_the_encoded_text()
    {
        var text = string.Concat(Enumerable.Repeat("a&b<c>'é😀", 20_000));
        Assert.Equal(HtmlText.Encode(text), Written(html => html.Text(text)));
    }

    [Fact]
    public void Raw_longer_than_the_buffer_is_written_whole()
    {
        var markup = new byte[200_000];
        Array.Fill(markup, (byte)'x');
        Assert.Equal(200_001, Written(html => html.Raw("<"u8).Raw(markup)).Length);
    }

    [Fact]
    public void Attribute_cannot_be_left() =>
        Assert.Equal(" title=\"&quot;&gt;&lt;b&gt;\"", Written(html => html.Attribute("title"u8, "\"><b>")));

    [Fact]
    public void Closing_is_written_once_when_disposed()
    {
        var stream = new MemoryStream();
        var html = new HtmlWriter(stream, "</html>");
        html.Raw("a"u8);
        html.Dispose();
        html.Dispose();
        Assert.Equal("a</html>", Encoding.UTF8.GetString(stream.ToArray()));
    }

    private static string Written(Action<HtmlWriter> write)
    {
        var stream = new MemoryStream();
        using (var html = new HtmlWriter(stream))
            write(html);
        return Encoding.UTF8.GetString(stream.ToArray());
    }
}
