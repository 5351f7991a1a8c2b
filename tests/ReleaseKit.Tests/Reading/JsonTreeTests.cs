using System.Text;
using ReleaseKit.Reading;
using ReleaseKit.Reading.Json;
using ReleaseKit.Review;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>The tree of a JSON file knows where each value stands; columns are counted as editors count them, in UTF-16 units.</summary>
public sealed class JsonTreeTests
{
    [Theory]
    [InlineData("{\"a\":1}", "f:1:6")]
    [InlineData("{\n  \"a\":\n    1 }", "f:3:5")]
    [InlineData("{\r\n\t\"a\": 1 }", "f:2:7")]
    [InlineData("{ /* \u00E9\U0001F4A1 */ \"a\": 1 }", "f:1:18")]
    public void Value_knows_its_line_and_column(string json, string place) => Assert.Equal(place, Root(json).Member("a")!.Value.At.ToString());

    [Fact]
    public void Number_keeps_its_digits() => Assert.Equal("1.50e2", ((JsonNumber)Root("{\"a\":1.50e2}").Member("a")!.Value).Digits);

    [Fact]
    public void Doubled_keys_are_both_kept() => Assert.Equal(2, Root("{\"a\":1,\"a\":2}").Members.Count);

    [Fact]
    public void Escapes_are_resolved() => Assert.Equal("\u00E9/\n", ((JsonText)Root("{\"a\":\"\\u00e9\\/\\n\"}").Member("a")!.Value).Value);

    private static JsonObject Root(string json)
    {
        var log = new FindingLog();
        var root = JsonTreeReader.Read("f", Encoding.UTF8.GetBytes(json), FindingOwner.Writer, log);
        Assert.Empty(log.ToList());
        return Assert.IsType<JsonObject>(root);
    }
}
