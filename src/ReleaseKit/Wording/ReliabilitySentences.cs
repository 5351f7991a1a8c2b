using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>Part 4 of a reading: one fixed word tied to margin ÷ figure, and what to do instead when it is weak.</summary>
internal sealed class ReliabilitySentences(Voice voice)
{
    public IEnumerable<string> Of(AppraisedFigure figure) => figure.Reliability switch
    {
        Reliability.Close => [Graded(figure, "reading.close")],
        Reliability.Rough => [Graded(figure, "reading.rough")],
        Reliability.Weak => [Weak(figure), .. Advice(figure)],
        _ => [],
    };

    private string Weak(AppraisedFigure figure) => figure.MarginToFigure switch
    {
        _ when IsSaidAlready(figure) => voice.Say("reading.weak.not-alone"),
        null => voice.Say("reading.weak.not-above-zero"),
        > 1 => voice.Say("reading.weak.larger"),
        1 => voice.Say("reading.weak.as-large"),
        _ => Graded(figure, "reading.weak"),
    };

    private string Graded(AppraisedFigure figure, string key)
    {
        var inHundred = InHundred(figure.MarginToFigure!.Value, out var isExact);
        if (inHundred == 0)
            return voice.Say($"{key}.tiny");
        return voice.Say(isExact ? key : $"{key}.about", ("cases", voice.Numerals.Whole(inHundred)));
    }

    /// <summary>Margin in each 100 of the figure, rounded up; 0 stands for less than 1.</summary>
    private static long InHundred(double share, out bool isExact)
    {
        var inHundred = PrintUnit.Rounded(share) * 100;
        isExact = decimal.Floor(inHundred) == inHundred;
        return inHundred < 1 ? 0 : (long)decimal.Ceiling(inHundred);
    }

    /// <summary>A published figure of a larger whole, else not to use it alone (said once).</summary>
    private IEnumerable<string> Advice(AppraisedFigure figure)
    {
        if (figure.UseInstead is { } total)
            yield return Instead(figure, total.Row);
        else if (!IsSaidAlready(figure))
            yield return voice.Say("reading.not-alone");
    }

    /// <summary>That the margin is as large as the figure.</summary>
    private static bool IsSaidAlready(AppraisedFigure figure) => figure.Case.First is SpecialCase.MarginAsLargeAsFigure;

    private string Instead(AppraisedFigure figure, int row)
    {
        var key = figure.Measure.Kind is MeasureKind.Count or MeasureKind.Estimate or MeasureKind.Amount ? "reading.use-total" : "reading.use-figure";
        return voice.Say(key, ("place", string.Join(voice.Say("list.names"), NameOf(figure.Table, row))));
    }

    /// <summary>The headings a row stands under, down to the last one that is not "all": "All tenures, 60 to 74"; all of them for the total of everything.</summary>
    private IEnumerable<string> NameOf(Table table, int row)
    {
        var last = Enumerable.Range(0, table.Stub.Count).LastOrDefault(at => !table.Stub[at].IsAll(row), table.Stub.Count - 1);
        return table.Stub.Take(last + 1).Select(column => voice.Label(column, row));
    }
}
