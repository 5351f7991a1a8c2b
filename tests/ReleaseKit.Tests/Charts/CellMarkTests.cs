using System.Globalization;
using System.Text.RegularExpressions;
using ReleaseKit.Charts;
using Xunit;

namespace ReleaseKit.Tests.Charts;

/// <summary>Marks in cells: places in per cent that give the figure back within half a pixel at the widest column of a sheet with several measures.</summary>
public sealed class CellMarkTests
{
    private const double WidestColumn = 336;
    private static readonly Scale Slot = new(-50, 450, 100 * 14d / 196, 100 - (100 * 14d / 196));

    [Theory]
    [InlineData(214)]
    [InlineData(33.3)]
    [InlineData(401)]
    public void Mark_gives_its_figure_back_within_half_a_pixel(double value)
    {
        var svg = new CellMark(CellMark.SymbolsOfPage()).Draw(Laplace(value), Slot);

        var (x, width) = UseOf(svg);
        var pixels = WidestColumn / 100;
        Assert.InRange(((x + (width / 2)) - Slot.At(value)) * pixels, -0.5, 0.5);
        Assert.InRange((width - (2 * 10 * Math.Log(100) * Slot.PerUnit)) * pixels, -0.5, 0.5);
    }

    [Fact]
    public void Figures_of_a_family_share_one_symbol()
    {
        var symbols = CellMark.SymbolsOfPage();
        var cells = new CellMark(symbols);

        foreach (var scale in new[] { 3d, 7, 12.5 })
            foreach (var value in new[] { 120d, 250, 377 })
                cells.Draw(Laplace(value, scale), Slot);

        Assert.Equal(1, symbols.Count);
    }

    [Fact]
    public void Weak_figures_have_a_symbol_of_their_own()
    {
        var symbols = CellMark.SymbolsOfPage();
        var cells = new CellMark(symbols);

        cells.Draw(Laplace(200), Slot);
        cells.Draw(Laplace(200) with { Weak = true }, Slot);

        Assert.Equal(2, symbols.Count);
    }

    [Fact]
    public void Mark_across_the_limit_of_the_possible_is_cut_there_and_dashed_beyond()
    {
        var svg = new CellMark(CellMark.SymbolsOfPage()).Draw(Laplace(7) with { Lowest = 0 }, Slot);

        var limit = SvgMark.Number(Slot.At(0), 2);
        Assert.Contains($"<use href=\"#zl\" x=\"{limit}%\"/>", svg, StringComparison.Ordinal);
        Assert.Contains($"<svg x=\"{limit}%\"", svg, StringComparison.Ordinal);
        Assert.Equal(2, Regex.Count(svg, "<svg x="));
    }

    [Fact]
    public void Mark_that_runs_off_the_scale_has_an_arrow_there()
    {
        var svg = new CellMark(CellMark.SymbolsOfPage()).Draw(Laplace(440), Slot);

        Assert.Contains("<use href=\"#ar\" x=\"92.86%\"/>", svg, StringComparison.Ordinal);
        Assert.DoesNotContain("#al", svg, StringComparison.Ordinal);
    }

    [Fact]
    public void Mark_too_narrow_to_be_seen_is_drawn_as_a_sliver_about_its_figure()
    {
        var (x, width) = UseOf(new CellMark(CellMark.SymbolsOfPage()).Draw(Laplace(200, 0.001), Slot));

        Assert.Equal(0.1, width);
        Assert.InRange(x + (width / 2) - Slot.At(200), -0.1, 0.1);
    }

    private static MarkSubject Laplace(double value, double scale = 10) => new()
    {
        Value = value,
        Ranges = [.. new[] { 2d, 20, 100 }.Select(chance => new MarkRange(value - (scale * Math.Log(chance)), value + (scale * Math.Log(chance))))],
        Density = offset => Math.Exp(-Math.Abs(offset) / scale),
    };

    private static (double X, double Width) UseOf(string svg)
    {
        var use = Regex.Match(svg, "width=\"([0-9.-]+)%\" x=\"([0-9.-]+)%\"");
        return (double.Parse(use.Groups[2].Value, CultureInfo.InvariantCulture), double.Parse(use.Groups[1].Value, CultureInfo.InvariantCulture));
    }
}
