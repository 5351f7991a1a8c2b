using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Pages;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts;

/// <summary>The key of marks. Its example is a figure of 1,842 with a margin of 95; its rules are drawn from a Laplace law of scale 1.</summary>
internal sealed class MarkKey(Release release, ILanguage language)
{
    private const double Half = 0.5;
    private static readonly PrintedRange Example = new(new(1842, 0), new(95, 0), new(95, 0), new(1747, 0), new(1937, 0), false, false);
    private readonly StringBuilder html = new("<dl class=\"legend\">");

    public string Draw()
    {
        var digits = FigureHtml.Digits(LightDigits.Of(language.Number(Example.Value), Example));
        Append("digits", $"<span class=\"num key-num\">{digits}</span>", language.Text("marks.key.digits.means"));
        Append("rule", Bar(Subject(weak: false, lowest: double.NegativeInfinity)), RuleMeans());
        Append("hollow", Bar(Subject(weak: true, lowest: double.NegativeInfinity)), HollowMeans(), " <span class=\"lz\"></span>");
        Append("dashed", Bar(Subject(weak: true, lowest: 0.7)), language.Text("marks.key.dashed.means"));
        return html.Append("</dl>").ToString();
    }

    private void Append(string key, string mark, string means, string afterName = "") => html
        .Append("<div><dt>").Append(mark).Append("</dt><dd><b>")
        .Append(HtmlText.Encode(language.Text($"marks.key.{key}"))).Append(afterName).Append("</b> ")
        .Append(HtmlText.Encode(means)).Append("</dd></div>");

    private string RuleMeans() => language.Text(
        "marks.key.rule.means",
        ("lower", language.Share(release.Coverages.Lower)),
        ("main", language.Share(release.Coverages.Main)),
        ("upper", language.Share(release.Coverages.Upper)));

    private string HollowMeans() => release.Reliability.Rough == Half
        ? language.Text("marks.key.hollow.means-half")
        : language.Text("marks.key.hollow.means", ("share", language.Share(Coverage.OfShare(release.Reliability.Rough))));

    // Quantiles of |N| for the Laplace law of scale 1: P(|N| ≤ w) = 1 − e^−w.
    private MarkSubject Subject(bool weak, double lowest) => new()
    {
        Value = 0,
        Ranges = [.. release.Coverages.All.Select(coverage => -Math.Log(coverage.Rest)).Select(width => new MarkRange(-width, width))],
        Density = offset => Math.Exp(-Math.Abs(offset)),
        Weak = weak,
        Lowest = lowest,
    };

    private static string Bar(MarkSubject subject)
    {
        var reach = subject.Tail.High * 1.24;
        var scale = new Scale(-reach, reach, 0, 200);
        return $"<svg class=\"key-bar\" viewBox=\"0 0 200 44\" aria-hidden=\"true\">{SvgMark.Paint(SwelledRule.Of(subject, scale, MarkSize.Key).Shapes)}</svg>";
    }
}
