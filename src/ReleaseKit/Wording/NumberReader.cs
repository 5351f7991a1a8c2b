using System.Globalization;
using System.Text.RegularExpressions;

namespace ReleaseKit.Wording;

/// <summary>Finds the numbers of a text and reads them as one language writes them: <see cref="Numerals"/> the other way round.</summary>
internal sealed class NumberReader
{
    // Blank, no-break, thin and narrow no-break space: between groups of three digits they are understood in every language (ISO 80000-1).
    private const string Spaces = @"[ \u00A0\u2009\u202F]";
    private const decimal MostSaid = 1e15m;

    private readonly Regex number;
    private readonly Regex form;
    private readonly Regex groupMarks;
    private readonly string point;
    private readonly NumberWords words;

    public NumberReader(WordingTexts texts)
    {
        words = new(texts);
        point = texts.Template("number.point");
        var (group, dot) = (Regex.Escape(texts.Template("number.group")), Regex.Escape(point));
        // One class: a mark that two branches know would be tried both ways, over and over in a long row of them.
        var marks = string.Concat((texts.Template("number.group") + point).Select(mark => $@"\u{(int)mark:X4}"));
        var margin = NumberWords.AnyOf(["±", .. texts.Template("number.plus-or-minus").Split('|')]);
        var sign = $@"(?<!\w)(?:{Regex.Escape(texts.Template("number.minus-in-tables"))}|[-–])(?=\d)|\b{Regex.Escape(texts.Template("number.minus-in-prose"))}\s+";
        var digits = $@"(?<digits>\d{{1,3}}(?:{Spaces}\d{{3}})+(?:{dot}\d+)?(?![.,'’]?\d)|\d(?:[\d.,'’{marks}]*\d)?)(?:{words.Scale})*(?<ordinal>(?:{NumberWords.AnyOf(texts.Template("number.ordinal-ends").Split('|'))})(?!\w))?";
        var below = $@"(?<below>(?:\s+\p{{L}}+)?\s+(?:{NumberWords.AnyOf(texts.Template("number.below-zero").Split('|'))})(?!\w|[.,]\d))";
        var bound = new BoundWords(texts);
        number = new($@"(?<before>{bound.Before})?(?<number>(?:(?<margin>{margin})\s*|(?<minus>{sign}))?(?:{digits}|(?<run>{words.Run})){below}?)(?<behind>{bound.Behind})?", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant);
        form = new($@"^(?:[0-9]{{1,3}}(?:(?:{group}|{Spaces})[0-9]{{3}})+|[0-9]+)(?:{dot}[0-9]+)?$", RegexOptions.CultureInvariant);
        groupMarks = new($"{group}|{Spaces}", RegexOptions.CultureInvariant);
    }

    /// <summary>In the order of the text, no ordinals. Marks of other languages belong to the number, which then has no value.</summary>
    public IReadOnlyList<WrittenNumber> In(string text) => [.. number.Matches(text).Where(match => !match.Groups["ordinal"].Success).SelectMany(Read)];

    private IEnumerable<WrittenNumber> Read(Match match)
    {
        var number = match.Groups["number"];
        var written = new WrittenNumber(number.Value, null, match.Groups["margin"].Success)
        {
            Start = number.Index,
            End = match.Index + match.Length,
            Bound = BoundWords.In(match),
            Before = match.Groups["before"].Value,
            Behind = match.Groups["behind"].Value,
        };
        return match.Groups["run"] is { Success: true } run
            ? words.In(run.Value).Select(value => written with { Value = Signed(value, match), Step = StepOf(value), IsInLetters = true })
            : [InDigits(written, match)];
    }

    private WrittenNumber InDigits(WrittenNumber written, Match match)
    {
        var scales = match.Groups["scale"].Captures.Select(word => word.Value).ToList();
        var scale = scales.Aggregate(1m, (product, word) => Math.Clamp(product * words.ScaleOf(word), 1, MostSaid));
        return ValueOf(match.Groups["digits"].Value) is { } value && value <= MostSaid / scale
            ? written with { Value = Signed(value * scale, match), Step = StepOf(value) * scale, Scale = scale, ScaleWord = scales.LastOrDefault() ?? "" }
            : written;
    }

    private decimal? ValueOf(string digits)
    {
        if (!form.IsMatch(digits))
            return null;
        var plain = groupMarks.Replace(digits, "").Replace(point, ".", StringComparison.Ordinal);
        return decimal.TryParse(plain, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var value) ? value : null;
    }

    private static decimal Signed(decimal value, Match match) => match.Groups["minus"].Success != match.Groups["below"].Success ? -value : value;

    /// <summary>To what a number as written is rounded: its last decimal, or the zeros at its end.</summary>
    private static decimal StepOf(decimal value)
    {
        var step = 1m;
        for (var decimals = value.Scale; decimals > 0; decimals--)
            step /= 10;
        while (step >= 1 && value != 0 && value % (step * 10) == 0)
            step *= 10;
        return step;
    }
}
