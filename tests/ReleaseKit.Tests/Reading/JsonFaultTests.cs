using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>What a JSON file that breaks is told about in words of our own.</summary>
public sealed class JsonFaultTests
{
    [Theory]
    [InlineData("{\n  \"title\": \"A\"", "mechanisms.json:2:15", "The file ends here, and the { of line 1, column 1, is still open.")]
    [InlineData("{ \"a\": [ 1,\n  { \"b\": 2 },", "mechanisms.json:2:14", "The file ends here, and the [ of line 1, column 8, is still open.")]
    [InlineData("", "mechanisms.json:1:1", "The file is empty")]
    [InlineData("// only this", "mechanisms.json:1:13", "The file is empty")]
    [InlineData("{ \"a\": 1 } x", "mechanisms.json:1:12", "There is \"x\" after the end of it all.")]
    [InlineData("{ \"a\": 1 \"b\": 2 }", "mechanisms.json:1:10", "There is \"\"\" where a comma or a closing bracket should stand.")]
    [InlineData("{ \"a\": [ 1 } ]", "mechanisms.json:1:12", "There is \"}\" where a comma or a closing bracket should stand.")]
    [InlineData("{ \"a\" 1 }", "mechanisms.json:1:7", "There is \"1\" where a colon should stand.")]
    [InlineData("{ a: 1 }", "mechanisms.json:1:3", "There is \"a\" where a key in double quotes should begin.")]
    [InlineData("{ \"a\": b }", "mechanisms.json:1:8", "There is \"b\" where a value should begin.")]
    [InlineData("{ \"a\": \u201Cb\u201D }", "mechanisms.json:1:8", "There is \"\u201C\" where a value should begin.")]
    [InlineData("{ \"a\": ,", "mechanisms.json:1:8", "There is \",\" where a value should begin.")]
    [InlineData("{ \"a\": truth }", "mechanisms.json:1:11", "only true, false and null")]
    [InlineData("{ \"a\": \"b\n\" }", "mechanisms.json:1:10", "must end on its line")]
    [InlineData("{ \"a\": \"C:\\dir\" }", "mechanisms.json:1:12", "There is \"d\" after a backslash")]
    [InlineData("{ \"a\": 01 }", "mechanisms.json:1:9", "not how a number is written")]
    [InlineData("{ \"a\": 1. }", "mechanisms.json:1:10", "not how a number is written")]
    [InlineData("{ \"a\": 1,5 }", "mechanisms.json:1:10", "There is \"5\" where a key in double quotes should begin.")]
    [InlineData("{ / \"a\": 1 }", "mechanisms.json:1:3", "A comment is written")]
    public void Broken_text_is_told_in_plain_words(string text, string place, string words)
    {
        using var folder = new TestFolder().With("mechanisms.json", text);
        var stop = folder.OnlyStop("json-broken");
        Assert.Equal(place, stop.At.ToString());
        Assert.Contains(words, stop.Found, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("{ \"a\": \u201Cb\u201D }", true)]
    [InlineData("{ \u201Ca\u201D: 1 }", true)]
    [InlineData("{ 'a': 1 }", true)]
    [InlineData("{ \"a\": ,", false)]
    public void Quotes_of_another_kind_are_named(string text, bool isQuote)
    {
        using var folder = new TestFolder().With("mechanisms.json", text);
        Assert.Equal(isQuote, folder.OnlyStop("json-broken").Do.StartsWith("use plain quotes", StringComparison.Ordinal));
    }

    [Fact]
    public void Nesting_that_is_too_deep_is_told_in_plain_words()
    {
        using var folder = new TestFolder().With("mechanisms.json", new string('[', 40) + new string(']', 40));
        Assert.Contains("more than 32 deep", folder.OnlyStop("json-broken").Found, StringComparison.Ordinal);
    }

    /// <summary>Every text that comes of cutting a file short, or of taking out or doubling one of its characters.</summary>
    [Fact]
    public void Words_of_the_reader_never_show()
    {
        string[] words = ["isFinalBlock", "depth", "JSON payload", "token", "property", "literal", "JsonException", "LineNumber", "BytePosition", "Expected", "invalid"];
        var text = TestFolder.Mechanisms;
        using var folder = new TestFolder();
        for (var at = 0; at < text.Length; at += 3)
            foreach (var broken in new[] { text[..at], text.Remove(at, 1), text.Insert(at, text[at].ToString()), text.Insert(at, "\\"), text.Insert(at, "/") })
            {
                var found = folder.With("mechanisms.json", broken).Read().Findings.Where(finding => finding.Slug == "json-broken").ToList();
                Assert.All(found, finding => Assert.DoesNotContain(words, word => finding.Found.Contains(word, StringComparison.Ordinal)));
            }
    }
}
