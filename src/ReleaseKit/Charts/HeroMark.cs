using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts;

/// <summary>The mark of the leading figure at one width: the rule, and under it one measured line for each coverage.</summary>
internal sealed record HeroMark(MarkSize Size, double Width, double Height, double LeastInset, double FirstLine, double LineStep, bool IsWide)
{
    private const double LabelGap = 8;
    private const double LabelSize = 15;
    private const double CapHalf = 5;

    public static HeroMark Wide { get; } = new(MarkSize.Lead, 1160, 214, 180, 146, 27, true);

    public static HeroMark Narrow { get; } = new(MarkSize.LeadNarrow, 340, 178, 60, 112, 26, false);

    public string Draw(AppraisedFigure figure, ILanguage language)
    {
        var subject = MarkSubject.Of(figure);
        var scale = ScaleOf(subject, figure, language);
        var svg = Marks.Open(IsWide ? "hero-bar only-wide" : "hero-bar only-narrow", Width, subject.IsStemAlone ? Size.Middle * 2 : Height, Marks.Description(figure, language));
        // Without noise there is no scale to show.
        if (!subject.IsStemAlone)
            svg.AppendPath("hair", $"M0 {SvgMark.Number(Size.Middle)}H{SvgMark.Number(Width)}");
        AppendGuides(svg, figure, scale);
        svg.Append(SvgMark.Paint(SwelledRule.Of(subject, scale, Size).Shapes));
        if (!subject.IsStemAlone)
            AppendHeading(svg, figure, language);
        for (var index = 0; index < subject.Ranges.Count; index++)
            AppendMeasure(svg, figure, scale, language, index);
        return svg.Append("</svg>").ToString();
    }

    // The tails fill the drawing between the insets, which leave room for the longest label; a mark that goes below the possible keeps its whole length.
    private Scale ScaleOf(MarkSubject subject, AppraisedFigure figure, ILanguage language)
    {
        if (subject.IsStemAlone)
            return new(subject.Value - 1, subject.Value + 1, 0, Width);
        var longest = figure.Ranges.Max(range => Math.Max(NumberWidth(language, range.Printed.Low), NumberWidth(language, range.Printed.High)));
        var inset = Math.Max(LeastInset, longest + (2 * LabelGap) + figure.Ranges.Max(range => LabelWidth.Of(ShareOf(range, figure, language), LabelSize)));
        return new(subject.Tail.Low, subject.Tail.High, inset, Width - inset);
    }

    private static double NumberWidth(ILanguage language, PublishedValue value) => LabelWidth.Of(language.Number(value), LabelSize);

    private string ShareOf(FigureRange range, AppraisedFigure figure, ILanguage language) => IsHeaded(figure)
        ? language.Number(new(NaturalFrequency.Of(range.Coverage).Cases, 0))
        : language.Share(range.Coverage);

    // A narrow drawing has room for the number of cases alone, under words that say of how many: "95" for "95 in 100".
    private bool IsHeaded(AppraisedFigure figure) => !IsWide && figure.Ranges.Select(range => NaturalFrequency.Of(range.Coverage).All).Distinct().Count() == 1;

    private void AppendHeading(StringBuilder svg, AppraisedFigure figure, ILanguage language)
    {
        if (IsHeaded(figure))
            svg.AppendLabel("dimlab", 0, FirstLine - LineStep + 9, language.Text("marks.in-all", ("all", language.Number(new(NaturalFrequency.Of(figure.Ranges[0].Coverage).All, 0)))));
    }

    private void AppendGuides(StringBuilder svg, AppraisedFigure figure, Scale scale)
    {
        if (figure.Main is not { } main)
            return;
        foreach (var end in new[] { main.Low, main.High })
            svg.AppendPath("guide", $"M{SvgMark.Number(scale.At(end))} {SvgMark.Number(Size.Middle + 20)}V{SvgMark.Number(FirstLine + LineStep - 8)}");
    }

    private void AppendMeasure(StringBuilder svg, AppraisedFigure figure, Scale scale, ILanguage language, int index)
    {
        var range = figure.Ranges[index];
        var y = FirstLine + (index * LineStep);
        var (left, right) = (scale.At(range.Low), scale.At(range.High));
        var (line, label) = index == 1 ? ("dim dim-main", "dimnum dimnum-main") : ("dim", "dimnum");
        svg.AppendPath(line, $"M{SvgMark.Number(left)} {y}H{SvgMark.Number(right)}{Cap(left, y)}{Cap(right, y)}")
            .AppendLabel(label, left - LabelGap, y + 5, language.Number(range.Printed.Low), atEnd: true)
            .AppendLabel(label, right + LabelGap, y + 5, language.Number(range.Printed.High));
        AppendWords(svg, figure, language, index, y + 5);
    }

    private void AppendWords(StringBuilder svg, AppraisedFigure figure, ILanguage language, int index, double y)
    {
        var range = figure.Ranges[index];
        var kind = index == 1 ? "dimlab dimnum-main" : "dimlab";
        svg.AppendLabel(kind, 0, y, ShareOf(range, figure, language));
        if (IsWide)
            svg.AppendLabel(kind, Width, y, language.Text("marks.margin", ("margin", language.Margin(range.Printed))), atEnd: true);
    }

    private static string Cap(double x, double y) => $"M{SvgMark.Number(x)} {SvgMark.Number(y - CapHalf)}V{SvgMark.Number(y + CapHalf)}";
}
