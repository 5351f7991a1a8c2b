using System.Text.RegularExpressions;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>What a figure's own table says about it: its labels, titles, unit, period. A number that stands in words as it stands there is no claim about the value.</summary>
internal sealed partial class FigureTexts
{
    // Stands where a text of the table was taken out.
    private const string Taken = "\uFFFC";
    private const string Dash = "[-‐‑–—]";
    private const string End = @"(?!\w|[.,]\d)";
    private const RegexOptions AsTyped = RegexOptions.IgnoreCase | RegexOptions.CultureInvariant;

    private readonly ILanguage language;
    private readonly IReadOnlyList<string> texts;
    private readonly IReadOnlyList<string> units;
    private readonly IReadOnlyList<string> named;

    public FigureTexts(AppraisedFigure figure, Release release, ILanguage language)
    {
        this.language = language;
        units = Units(figure, language);
        texts = [.. Labels(figure), .. Titles(figure), .. About(release), .. units];
        named = [.. Named(figure), .. Dates(), .. figure.Main is { } range ? new[] { Typed(language.Cases(range.Coverage, atLeast: false)) } : []];
    }

    /// <summary>The unit as the release writes it, in its forms.</summary>
    public static IReadOnlyList<string> Units(AppraisedFigure figure, ILanguage language) =>
        figure.Measure.Unit.Forms.TryGetValue(language.Tag, out var forms) ? [forms.One, forms.Other] : [figure.Measure.Unit.Key];

    /// <summary>The words without what they share with the table: "Ward 7", "aged 16 to 24", "in 2023".</summary>
    public string Without(string words) => Regex.Replace(words, Shared(), Taken, AsTyped);

    /// <summary>Whether a number may be meant as the table has it, though other words stand around it: "over 16" beside a label "16 to 24".</summary>
    public bool MayHold(WrittenNumber number, string words) =>
        words.Trim().Length > number.Text.Trim().Length
        && !Regex.IsMatch(words[number.End..], $"^{Unit()}", AsTyped)
        && texts.SelectMany(text => Number().Matches(text)).Any(own => own.Value == number.Text);

    private string Shared() => $@"(?<![\w.,])(?:(?:{Wholes()}){End}|(?:{Pairs()})(?!\s*{Dash}\s*\d){End})|(?<=\p{{L}}\s)(?:{Years()}){End}(?!{Unit()})";

    private string Wholes() => Any(texts.Where(text => !NumberAlone().IsMatch(text) && language.NumbersIn(text).Any(number => !number.IsArticle)).Select(Typed).Concat(named));

    /// <summary>A number with the word before or behind it, or with another number: but not with the unit, which makes it a claim.</summary>
    private string Pairs() => Any(texts
        .SelectMany(text => WordBefore().Matches(text).Concat(WordBehind().Matches(text)))
        .Select(pair => pair.Groups["pair"].Value)
        .Where(pair => !Regex.IsMatch(pair, $@"^[\d.,]+{Unit()}", AsTyped))
        .Select(Typed));

    /// <summary>Years stand behind any word: "in 2031", "since 2031".</summary>
    private string Years() => Any(texts.SelectMany(text => Year().Matches(text)).Select(year => year.Value));

    private string Unit() => $@"\s*(?:{NumberWords.AnyOf(units)})(?!\w)";

    private static string Any(IEnumerable<string> patterns) =>
        string.Join('|', patterns.Distinct().OrderByDescending(pattern => pattern.Length).DefaultIfEmpty("(?!)"));

    /// <summary>A text with its spaces and dashes as anybody may type them: "16–24" is "16 to 24".</summary>
    private string Typed(string text)
    {
        var to = Regex.Escape(language.Text("prose.range", ("low", ""), ("high", "")).Trim());
        var typed = Regex.Replace(Regex.Escape(text), $@"(?<=\d)(?:(?:\\ )*{Dash}(?:\\ )*|\\ {to}\\ )(?=\d)", $@"\s*(?:{Dash}|\b{to}\b)\s*", AsTyped);
        return Regex.Replace(typed, @"(?:\\ |\u00A0)+", @"\s+");
    }

    private IEnumerable<string> Labels(AppraisedFigure figure) => figure.Table.Stub.SelectMany(column =>
    {
        var label = column.LabelOf(figure.Row);
        return new[] { label.Value, label.In(language.Tag), column.Period ? PeriodText.Of(label.Value, language) : label.Value };
    });

    /// <summary>A label behind the title of its column, or a form of it: "Ward 7", "aged 12".</summary>
    private IEnumerable<string> Named(AppraisedFigure figure) => figure.Table.Stub.Where(column => Of(column.Title).Length > 0)
        .Select(column => $@"{Typed(Of(column.Title))}\p{{L}}{{0,2}}\s+{Typed(column.LabelOf(figure.Row).In(language.Tag))}");

    /// <summary>Days and months are no claims, whatever table they stand for: "31 December", "December 2031".</summary>
    private IEnumerable<string> Dates()
    {
        const string Day = "#", Year = "##";
        for (var number = 1; number <= 12; number++)
        {
            var month = language.Text($"date.month.{Numerals.Digits(number)}");
            string[] written =
            [
                language.Text("date.day", ("day", Day), ("month", month), ("year", Year)),
                language.Text("date.day", ("day", Day), ("month", month), ("year", "")).Trim(),
                language.Text("period.month", ("month", month), ("year", Year)),
            ];
            foreach (var date in written)
                yield return $"(?-i:{Typed(date).Replace(@"\#\#", @"\d{4}", StringComparison.Ordinal).Replace(@"\#", @"\d{1,2}", StringComparison.Ordinal)})";
        }
    }

    private IEnumerable<string> Titles(AppraisedFigure figure) =>
    [
        language.Text("tables.title", ("number", Numerals.Digits(figure.Ref.Table + 1)), ("title", Of(figure.Table.Title))),
        Of(figure.Measure.Title),
        .. figure.Table.Stub.Select(column => Of(column.Title)),
        .. figure.Table.Universe is { } universe ? new[] { Of(universe) } : [],
    ];

    private IEnumerable<string> About(Release release) =>
        [Of(release.Title), .. release.ReferencePeriod is { } period ? new[] { period, PeriodText.Of(period, language) } : []];

    private string Of(ReaderText text) => text.Has(language.Tag) ? text.In(language.Tag) : "";

    [GeneratedRegex(@"(?<![\d.,])(?:1[89]|2[01])\d\d(?![\d]|[.,]\d)")]
    private static partial Regex Year();

    [GeneratedRegex(@"\d(?:[\d.,]*\d)?")]
    private static partial Regex Number();

    [GeneratedRegex(@"^\d(?:[\d.,]*\d)?$")]
    private static partial Regex NumberAlone();

    [GeneratedRegex(@"(?<pair>\p{L}+\s+\d(?:[\d.,]*\d)?)(?!\w)")]
    private static partial Regex WordBefore();

    [GeneratedRegex(@"(?<![\w.,])(?<pair>\d(?:[\d.,]*\d)?(?:\s*[-‐‑–—]\s*\d(?:[\d.,]*\d)?|\s+\p{L}+(?:\s+\d(?:[\d.,]*\d)?)?))(?!\w)")]
    private static partial Regex WordBehind();
}
