using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts;

/// <summary>The mark beside a headline figure: a scale that need not begin at zero, both its ends labelled, and the ends of the main range under the stops.</summary>
internal static class LineMark
{
    private const double Width = 380;
    private const double Left = 8;
    private const double Right = 372;
    private const double LabelLine = 58;
    private const double SecondLine = 78;
    private const double LabelSize = 14;
    private const double Gap = 4;

    public static string Draw(AppraisedFigure figure, ILanguage language)
    {
        var subject = MarkSubject.Of(figure);
        return subject.IsStemAlone ? DrawStem(figure, subject, language) : DrawRule(figure, subject, language);
    }

    // Without noise there is no scale to show.
    private static string DrawStem(AppraisedFigure figure, MarkSubject subject, ILanguage language) => Marks.Open("line-bar", Width, 48, Marks.Description(figure, language))
        .Append(SvgMark.Paint(SwelledRule.Of(subject, new(subject.Value - 1, subject.Value + 1, Left, Right), MarkSize.Line).Shapes))
        .Append("</svg>").ToString();

    private static string DrawRule(AppraisedFigure figure, MarkSubject subject, ILanguage language)
    {
        var (from, to) = Ends(subject);
        var rule = SwelledRule.Of(subject, new(from.ToDouble(), to.ToDouble(), Left, Right), MarkSize.Line);
        var labels = LabelsOf(figure, language, from, to, rule.Stops!.Value);
        var svg = Marks.Open("line-bar", Width, SecondLine + Gap, Marks.Description(figure, language))
            .AppendPath("hair", "M8 24H372").AppendPath("hair", "M8 18V30M372 18V30")
            .Append(SvgMark.Paint(rule.Shapes));
        return labels.Append(svg).Append("</svg>").ToString();
    }

    /// <summary>Round ends about one range's length away on both sides, so that the mark takes a third of the scale; never below the possible but for a figure that is.</summary>
    private static (PublishedValue From, PublishedValue To) Ends(MarkSubject subject)
    {
        var body = subject.Body;
        var span = body.High - body.Low;
        var low = Math.Min(subject.Tail.Low, body.Low - (0.8 * span));
        var high = Math.Max(subject.Tail.High, body.High + (0.8 * span));
        if (body.Low >= subject.Lowest)
            low = Math.Max(low, subject.Lowest);
        if (body.High <= subject.Highest)
            high = Math.Min(high, subject.Highest);
        return Ticks.Around(low, high, 4);
    }

    private static Labels LabelsOf(AppraisedFigure figure, ILanguage language, PublishedValue from, PublishedValue to, (double Left, double Right) stops)
    {
        var printed = figure.Main!.Printed;
        return new(language.Number(from), language.WithUnit(to, figure.Measure), language.Number(printed.Low), language.Number(printed.High), stops);
    }

    /// <summary>The four labels: the ends of the range under its stops, the ends of the scale on a line of their own, so that they never touch.</summary>
    private sealed record Labels(string From, string To, string Low, string High, (double Left, double Right) Stops)
    {
        private double LowEnd => Math.Max(Stops.Left - 2, LabelWidth.Of(Low, LabelSize));
        private double HighStart => Math.Min(Stops.Right + 2, Width - LabelWidth.Of(High, LabelSize));

        public StringBuilder Append(StringBuilder svg) => svg
            .AppendLabel("axlab", Gap, SecondLine, From)
            .AppendLabel("axlab", Width - Gap, SecondLine, To, atEnd: true)
            .AppendLabel("endlab", LowEnd, LabelLine, Low, atEnd: true)
            .AppendLabel("endlab", HighStart, LabelLine, High);
    }
}
