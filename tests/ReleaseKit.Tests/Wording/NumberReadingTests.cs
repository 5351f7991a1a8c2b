using ReleaseKit.Wording;
using Xunit;

namespace ReleaseKit.Tests.Wording;

/// <summary>Numbers of a text, as English writes them and as the wording of another language says that it does.</summary>
public sealed class NumberReadingTests : IDisposable
{
    private readonly string root = Directory.CreateTempSubdirectory("wording").FullName;

    public void Dispose() => Directory.Delete(root, recursive: true);

    [Theory]
    [InlineData("twenty-five thousand and six", "25006")]
    [InlineData("one million two hundred thousand", "1200000")]
    [InlineData("a hundred and ten, or eleven", "110 11")]
    [InlineData("two and three", "2 3")]
    [InlineData("two dozen", "24")]
    [InlineData("minus twenty", "-20")]
    [InlineData("several hundred thousands", "")]
    [InlineData("two and a half million", "")]
    [InlineData("three quarters of a million", "")]
    [InlineData("the twenty-first of ten-year plans", "")]
    [InlineData("wonder, tend, often", "")]
    [InlineData("2 hundred thousand", "200000")]
    [InlineData("the 16th", "")]
    [InlineData("no lamps, none, nobody, not one", "0 0 0 0")]
    [InlineData("no more than ten, no-go, notable", "10")]
    public void Number_in_letters_is_read_by_its_words(string text, string expected) => Assert.Equal(expected, Values(English.Language, text));

    [Theory]
    [InlineData("1.214,5", "1214.5")]
    [InlineData("1,214.5", "?")]
    [InlineData("1 214,5", "1214.5")]
    [InlineData("zo miljo", "2000000")]
    [InlineData("1,2 miljo", "1200000")]
    [InlineData("two million", "")]
    [InlineData("5 sub nul", "-5")]
    public void Another_language_has_its_own_marks_and_words(string text, string expected) => Assert.Equal(expected, Values(Other(), text));

    [Fact]
    public void Word_without_its_number_is_named() => Assert.Contains(
        "\"number.words\" holds \"zo\"", Assert.Throws<WordingException>(() => Other("zo=2|zo")).Message, StringComparison.Ordinal);

    /// <summary>With patterns that try a mark in two ways, the first of these would take longer than anyone waits.</summary>
    [Theory]
    [InlineData("1", ",")]
    [InlineData("1", "k ")]
    [InlineData("1", " 000")]
    [InlineData("", "one hundred and ")]
    [InlineData("1", " -")]
    [InlineData("", "plus or minus ")]
    [InlineData("", "no more than ")]
    [InlineData("1", " or")]
    [InlineData("", "no ")]
    [InlineData("", "> ")]
    [InlineData("", "over about ")]
    public void Long_row_of_marks_is_read_through(string start, string again) =>
        Assert.InRange(English.Language.NumbersIn(start + string.Concat(Enumerable.Repeat(again, 3000)) + "x").Count, 0, 6000);

    private static string Values(ILanguage language, string text) => string.Join(' ', language.NumbersIn(text)
        .Where(number => !number.IsArticle)
        .Select(number => number.Value is { } value ? FormattableString.Invariant($"{value:0.###}") : "?"));

    private ILanguage Other(string words = "zo=2")
    {
        var folder = Directory.CreateDirectory(Path.Combine(root, "wording", "xx")).FullName;
        var texts = English.Texts.Keys.ToDictionary(key => key, key => key switch
        {
            "number.group" => ".",
            "number.point" => ",",
            "number.words" => words,
            "number.scales" => "miljo=1000000",
            "number.below-zero" => "sub nul",
            "number.fractions" or "number.words.and" or "number.plus-or-minus" or "number.ordinal-ends" or "number.none" => "",
            _ => English.Texts.Template(key),
        });
        File.WriteAllText(Path.Combine(folder, "all.json"), System.Text.Json.JsonSerializer.Serialize(texts));
        return Language.Load(root, "xx");
    }
}
