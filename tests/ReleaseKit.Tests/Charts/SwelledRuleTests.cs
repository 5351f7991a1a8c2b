using ReleaseKit.Charts;
using Xunit;

namespace ReleaseKit.Tests.Charts;

/// <summary>The geometry of the error bar, drawn from closed densities: Laplace of scale b (e^−|x|/b, quantiles b·ln 2, b·ln 20, b·ln 100).</summary>
public sealed class SwelledRuleTests
{
    private static readonly MarkSize Size = MarkSize.Cell;

    [Theory]
    [InlineData(214, 10, 0, 400)]
    [InlineData(7, 3, -40, 100)]
    [InlineData(98_765, 120, 0, 100_000)]
    public void Mark_gives_figure_and_ends_back_within_half_a_pixel(double value, double scaleOfLaw, double from, double to)
    {
        var subject = Laplace(value, scaleOfLaw);
        var scale = new Scale(from, to, 14, 182);

        var rule = SwelledRule.Of(subject, scale, Size);

        var painted = SvgMark.Paint(rule.Shapes);
        var halfPixel = 0.5 / scale.PerUnit;
        Assert.Equal(value, scale.ValueAt(PlaceOf(painted, "stem")), halfPixel);
        Assert.Equal(Math.Max(from, value - (scaleOfLaw * Math.Log(20))), scale.ValueAt(rule.Stops!.Value.Left), halfPixel);
        Assert.Equal(Math.Min(to, value + (scaleOfLaw * Math.Log(20))), scale.ValueAt(rule.Stops!.Value.Right), halfPixel);
    }

    [Fact]
    public void Body_thickness_is_density_over_peak()
    {
        var subject = Laplace(100, 10);
        var scale = new Scale(0, 200, 0, 1000);

        var rule = SwelledRule.Of(subject, scale, MarkSize.Lead);

        var body = rule.Shapes.Single(shape => shape.Ink == MarkInk.Body);
        foreach (var (top, bottom) in body.Points.Take(body.Points.Count / 2).Zip(body.Points.Reverse()))
            Assert.Equal(104 * Math.Exp(-Math.Abs(scale.ValueAt(top.X) - 100) / 10), bottom.Y - top.Y, 1e-9);
    }

    [Fact]
    public void Body_is_never_thinner_than_a_hair()
    {
        var rule = SwelledRule.Of(Laplace(100, 10), new Scale(0, 200, 0, 196), Size);

        var tail = rule.Shapes.Single(shape => shape.Ink == MarkInk.Tail);

        Assert.Equal(1, tail.Points.Take(tail.Points.Count / 2).Zip(tail.Points.Reverse()).Min(pair => pair.Second.Y - pair.First.Y), 1e-9);
    }

    [Fact]
    public void Shapes_lie_core_over_body_over_tail_and_the_stem_on_top()
    {
        var rule = SwelledRule.Of(Laplace(100, 10), new Scale(0, 200, 0, 196), Size);

        Assert.Equal([MarkInk.Tail, MarkInk.Body, MarkInk.Core, MarkInk.Stop, MarkInk.Stop, MarkInk.Halo, MarkInk.Stem], rule.Shapes.Select(shape => shape.Ink));
    }

    [Fact]
    public void Weak_mark_is_hollow_with_hair_tails()
    {
        var rule = SwelledRule.Of(Laplace(100, 10) with { Weak = true }, new Scale(0, 200, 0, 196), Size);

        Assert.Equal([MarkInk.TailLine, MarkInk.TailLine, MarkInk.Hollow, MarkInk.Stop, MarkInk.Stop, MarkInk.Halo, MarkInk.Stem], rule.Shapes.Select(shape => shape.Ink));
    }

    [Fact]
    public void Part_left_of_the_possible_is_dashed_and_the_rest_begins_there()
    {
        var scale = new Scale(-60, 140, 0, 200);

        var rule = SwelledRule.Of(Laplace(-7, 10) with { Lowest = 0 }, scale, Size);

        Assert.All(rule.Shapes.Where(shape => shape.Ink == MarkInk.Ghost), shape => Assert.All(shape.Points, point => Assert.True(scale.ValueAt(point.X) <= 1e-9)));
        var body = rule.Shapes.Single(shape => shape.Ink == MarkInk.Body);
        Assert.Equal(0, scale.ValueAt(body.Points.Min(point => point.X)), 1e-9);
        Assert.Equal(0, scale.ValueAt(rule.Shapes.Single(shape => shape.Ink == MarkInk.ZeroLine).Points[0].X), 1e-9);
        Assert.Contains(rule.Shapes, shape => shape.Ink == MarkInk.GhostStop);
    }

    [Fact]
    public void Clipped_mark_gets_an_arrow_seven_pixels_outside()
    {
        var rule = SwelledRule.Of(Laplace(95, 10), new Scale(0, 100, 14, 182), Size);

        var arrow = rule.Shapes.Single(shape => shape.Ink == MarkInk.Arrow);
        Assert.Equal(189, arrow.Points.Max(point => point.X), 1e-9);
        Assert.Equal(182, rule.Stops!.Value.Right, 1e-9);
        Assert.Single(rule.Shapes, shape => shape.Ink == MarkInk.Stop);
    }

    [Fact]
    public void Mark_ends_flat_at_a_limit_of_the_possible()
    {
        var rule = SwelledRule.Of(Laplace(95, 10) with { Lowest = 0, Highest = 100 }, new Scale(0, 100, 14, 182), Size);

        Assert.DoesNotContain(rule.Shapes, shape => shape.Ink is MarkInk.Arrow or MarkInk.Ghost);
    }

    [Fact]
    public void Figure_without_margin_is_a_stem_alone()
    {
        var rule = SwelledRule.Of(new MarkSubject { Value = 12, Ranges = [] }, new Scale(0, 100, 0, 200), Size);

        Assert.Equal([MarkInk.Halo, MarkInk.Stem], rule.Shapes.Select(shape => shape.Ink));
        Assert.Null(rule.Stops);
    }

    [Fact]
    public void Figure_without_density_is_a_line_with_stops()
    {
        var rule = SwelledRule.Of(Laplace(50, 5) with { Density = null }, new Scale(0, 100, 0, 200), Size);

        Assert.Equal([MarkInk.TailLine, MarkInk.Stop, MarkInk.Stop, MarkInk.Halo, MarkInk.Stem], rule.Shapes.Select(shape => shape.Ink));
    }

    [Fact]
    public void Figure_beyond_the_scale_has_no_stem()
    {
        var rule = SwelledRule.Of(Laplace(500, 5), new Scale(0, 100, 0, 200), Size);

        Assert.Null(rule.Stem);
        Assert.DoesNotContain(rule.Shapes, shape => shape.Ink == MarkInk.Stem);
    }

    [Fact]
    public void Outline_of_a_law_on_steps_goes_straight_from_step_to_step()
    {
        var subject = new MarkSubject { Value = 10, Ranges = [new(9, 11), new(8, 12), new(7, 13)], Density = offset => offset == Math.Round(offset) ? Math.Pow(2, -Math.Abs(offset)) : 0, Grid = 1 };

        Assert.Equal(1, subject.ThicknessAt(10));
        Assert.Equal(0.75, subject.ThicknessAt(10.5));
        Assert.Equal(0.375, subject.ThicknessAt(8.5));
    }

    private static MarkSubject Laplace(double value, double scale) => new()
    {
        Value = value,
        Ranges = [Range(value, scale * Math.Log(2)), Range(value, scale * Math.Log(20)), Range(value, scale * Math.Log(100))],
        Density = offset => Math.Exp(-Math.Abs(offset) / scale),
    };

    private static MarkRange Range(double value, double width) => new(value - width, value + width);

    private static double PlaceOf(string svg, string kind)
    {
        var path = svg[svg.IndexOf($"class=\"{kind}\"", StringComparison.Ordinal)..];
        var from = path.IndexOf(" d=\"M", StringComparison.Ordinal) + 5;
        return double.Parse(path[from..path.IndexOf(' ', from)], System.Globalization.CultureInfo.InvariantCulture);
    }
}
