using System.Text.RegularExpressions;
using ReleaseKit.Wording;
using Xunit;

namespace ReleaseKit.Tests.Wording;

public sealed class WordingTextsTests : IDisposable
{
    private readonly string root = Directory.CreateTempSubdirectory("wording").FullName;

    public void Dispose() => Directory.Delete(root, recursive: true);

    private WordingTexts Load(params string[] files)
    {
        var folder = Directory.CreateDirectory(Path.Combine(root, "wording", "en")).FullName;
        for (var index = 0; index < files.Length; index++)
            File.WriteAllText(Path.Combine(folder, $"{index}.json"), files[index]);
        return WordingTexts.Load(root, "en");
    }

    private static string MessageOf(Action fault) => Assert.Throws<WordingException>(fault).Message;

    [Fact]
    public void Files_of_a_language_are_merged()
    {
        var texts = Load("""{ "a": "one" }""", """{ "b": "two {n}" }""");
        Assert.Equal(("one", "two 3"), (texts.Fill("a"), texts.Fill("b", ("n", "3"))));
    }

    [Fact]
    public void Language_without_files_is_refused()
    {
        var message = MessageOf(() => WordingTexts.Load(root, "xx"));
        Assert.Contains("no wording for the language \"xx\"", message, StringComparison.Ordinal);
    }

    [Fact]
    public void Missing_key_is_named()
    {
        var texts = Load("{}");
        Assert.Contains("\"page.title\"", MessageOf(() => texts.Fill("page.title")), StringComparison.Ordinal);
    }

    [Fact]
    public void Key_given_twice_is_named_with_its_file()
    {
        var message = MessageOf(() => Load("""{ "a": "one" }""", """{ "a": "two" }"""));
        Assert.StartsWith("wording/en/1.json  gives the key \"a\" a second time.", message, StringComparison.Ordinal);
    }

    [Fact]
    public void Hole_that_nothing_fills_is_named()
    {
        var texts = Load("""{ "a": "one {n}" }""");
        Assert.Contains("\"a\" has the hole {n}", MessageOf(() => texts.Fill("a")), StringComparison.Ordinal);
    }

    [Fact]
    public void Number_that_a_text_would_lose_is_named()
    {
        var texts = Load("""{ "a": "one" }""");
        Assert.Contains("leaves out {n}", MessageOf(() => texts.Fill("a", ("n", "3"))), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("""{ "a": 1 }""", "\"a\" is no string")]
    [InlineData("[]", "it does not begin with {")]
    [InlineData("{\n \"a\"", "line 2")]
    public void File_that_is_no_list_of_texts_is_refused(string file, string why) =>
        Assert.Contains(why, MessageOf(() => Load(file)), StringComparison.Ordinal);

    [Fact]
    public void Fill_is_taken_as_it_is() => Assert.Equal("x {b} y", Load("""{ "a": "x {v} y" }""").Fill("a", ("v", "{b}")));

    [Fact]
    public void Templates_of_sentences_are_short_and_easy()
    {
        foreach (var key in English.KeysOfReadings.Where(key => key.StartsWith("reading.", StringComparison.Ordinal) || key.StartsWith("facts.", StringComparison.Ordinal)))
        {
            var sentence = Example(key);
            Assert.True(Readability.Words(sentence).Count <= 25, sentence);
            Assert.True(Readability.Grade([sentence]) <= 8, $"{key} {Readability.Grade([sentence]):0.0}: {sentence}");
        }
    }

    [Fact]
    public void Every_word_of_a_reading_has_its_syllables_in_the_list()
    {
        var ours = English.KeysOfReadings
            .Where(key => key.Split('.')[0] is "reading" or "facts" or "kind" or "coverage" or "status")
            .SelectMany(key => Readability.Words(Regex.Replace(English.Texts.Template(key), @"\{[a-z]+\}", "7")))
            .Where(word => !char.IsAsciiDigit(word[0]) && !Readability.IsOurs(word));
        Assert.Empty(ours.Distinct());
    }

    /// <summary>A template with the longest it is ever filled with: coverages in full, units and labels as one word, else a number.</summary>
    private static string Example(string key) => Regex.Replace(English.Texts.Template(key), @"\{([a-z]+)\}", hole => hole.Groups[1].Value switch
    {
        "cases" when !English.Texts.Template(key).Contains("in 100", StringComparison.Ordinal) =>
            key.StartsWith("reading.range", StringComparison.Ordinal) && key != "reading.range.zero-for-small" ? "at least 95 of 100 such cases" : "at least 95 of 100 cases",
        "value" or "margin" when key is "facts.column" || key.StartsWith("reading.value", StringComparison.Ordinal) => "1,240 households",
        "largest" or "distance" => "19 households",
        "highest" when key == "reading.capped" => "400 crowns",
        "lowest" when key == "reading.capped.below" => "5 crowns",
        "kind" => "estimate",
        "place" => "Aldermoor",
        "where" => "in this table, on all its pages",
        "measures" => "Households",
        "status" => "provisional",
        _ => "19",
    });
}
