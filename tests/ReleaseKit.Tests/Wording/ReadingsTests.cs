using System.Text;
using System.Text.RegularExpressions;
using ReleaseKit.Appraisal;
using ReleaseKit.Wording;
using Xunit;

namespace ReleaseKit.Tests.Wording;

public sealed class ReadingsTests
{
    private const double HighestGrade = 8;
    private const int LongestSentence = 25;

    public static TheoryData<string> CaseNames { get; } = [.. ReadingCases.All.Select(one => one.Name)];

    private static IEnumerable<(string Name, AppraisedFigure Figure)> Everything =>
        [.. ReadingCases.All, .. GeneratedFigures.All.Select((figure, index) => ($"generated {index}", figure))];

    [Fact]
    public void Readings_are_as_approved()
    {
        // Non-breaking spaces are written as ~. If this fails and the new text is right, copy the received file over the approved one.
        var approved = Path.Combine(SourceFolder(), "Readings.approved.txt");
        var received = Written();
        var expected = File.Exists(approved) ? File.ReadAllText(approved) : "";
        if (expected != received)
            File.WriteAllText(Path.Combine(SourceFolder(), "Readings.received.txt"), received);
        Assert.Equal(expected, received);
    }

    [Theory]
    [MemberData(nameof(CaseNames))]
    public void Case_reads_back(string name)
    {
        var figure = ReadingCases.All.Single(one => one.Name == name).Figure;
        Assert.Empty(ReadingBack.Faults(figure, English.Language.ReadingOf(figure)));
    }

    [Fact]
    public void Generated_readings_read_back()
    {
        foreach (var figure in GeneratedFigures.All)
            Assert.Empty(ReadingBack.Faults(figure, English.Language.ReadingOf(figure)));
    }

    [Fact]
    public void Generated_figures_meet_every_special_case_of_a_single_noised_figure()
    {
        var met = GeneratedFigures.All.Select(figure => figure.Case.First).Distinct();
        SpecialCase[] expected =
        [
            SpecialCase.None, SpecialCase.BelowZero, SpecialCase.AboveHighest, SpecialCase.Zero, SpecialCase.FromThreshold, SpecialCase.MostlyUnchanged, SpecialCase.Capped,
            SpecialCase.MarginAsLargeAsFigure,
        ];
        Assert.Empty(expected.Except(met));
    }

    [Fact]
    public void Every_template_of_a_reading_is_said_by_some_case()
    {
        var said = ReadingCases.All.SelectMany(one => English.Language.ReadingOf(one.Figure).Sentences).Select(sentence => sentence.Text).ToList();
        var silent = English.KeysOfReadings
            .Where(key => key.StartsWith("reading.", StringComparison.Ordinal))
            .Where(key => !said.Exists(AsPattern(English.Texts.Template(key)).IsMatch));
        Assert.Empty(silent);
    }

    [Fact]
    public void Parts_stand_in_their_order()
    {
        foreach (var (name, figure) in Everything)
        {
            var parts = English.Language.ReadingOf(figure).Sentences.Select(sentence => (int)sentence.Part).ToList();
            Assert.True(parts.SequenceEqual(parts.Order()), name);
        }
    }

    [Fact]
    public void No_sentence_is_said_twice()
    {
        foreach (var (name, figure) in Everything)
        {
            var sentences = English.Language.ReadingOf(figure).Sentences;
            Assert.True(sentences.Distinct().Count() == sentences.Count, name);
        }
    }

    [Fact]
    public void Readings_are_read_at_grade_eight_or_below()
    {
        foreach (var (name, figure) in Everything)
        {
            var grade = Readability.Grade([.. English.Language.ReadingOf(figure).Sentences.Select(sentence => sentence.Text)]);
            Assert.True(grade <= HighestGrade, $"{name}: {grade:0.0}");
        }
    }

    [Fact]
    public void No_sentence_has_more_than_twenty_five_words()
    {
        foreach (var (name, figure) in Everything)
            foreach (var sentence in English.Language.ReadingOf(figure).Sentences)
                Assert.True(Readability.Words(sentence.Text).Count <= LongestSentence, $"{name}: {sentence.Text}");
    }

    [Fact]
    public void Sentences_hold_no_dash_sign_or_word_of_the_trade()
    {
        var banned = new Regex(@"[-–—−±%~]|\b(true|confiden\w*|significan\w*|epsilon|sensitivity|mechanism|distribution|variance|anonym\w*|safe|probab\w*|likely|roughly|no difference)\b", RegexOptions.IgnoreCase);
        foreach (var (name, figure) in Everything)
            Assert.False(banned.IsMatch(English.Language.ReadingOf(figure).Text), $"{name}: {English.Language.ReadingOf(figure).Text}");
    }

    [Fact]
    public void About_is_never_said_of_a_number_that_is_exact()
    {
        // A margin of 10 beside 100: exactly 10 in 100.
        var text = English.Language.ReadingOf(ReadingCases.All.Single(one => one.Name == "A count whose margin is a tenth of it").Figure).Text;
        Assert.Contains("its margin is 10 in 100 of it", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Range_of_zero_to_zero_is_never_said()
    {
        foreach (var (name, figure) in Everything)
            Assert.False(Regex.IsMatch(English.Language.ReadingOf(figure).Text, @"from 0(\.0+)? to 0(\.0+)?\b(?!\.)"), name);
    }

    private static string Written()
    {
        var text = new StringBuilder();
        foreach (var (name, figure) in ReadingCases.All)
        {
            text.Append("# ").Append(name).Append('\n');
            foreach (var sentence in English.Language.ReadingOf(figure).Sentences)
                text.Append(sentence.Text.Replace(Numerals.NoBreak, '~')).Append('\n');
            text.Append('\n');
        }
        return text.ToString();
    }

    private static Regex AsPattern(string template) =>
        new($"^{Regex.Replace(Regex.Escape(template).Replace("}", "\\}", StringComparison.Ordinal), @"\\\{[a-z]+\\\}", ".+")}$", RegexOptions.CultureInvariant);

    private static string SourceFolder() => Path.Combine(Repository.Root, "tests", "ReleaseKit.Tests", "Wording");
}
