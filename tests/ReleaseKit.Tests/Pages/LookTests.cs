using ReleaseKit.Pages;
using ReleaseKit.Pages.Methods;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class LookTests
{
    private static readonly Colour LightPaper = Colour.Parse("#F4F6F3");
    private static readonly Colour DarkPaper = Colour.Parse("#12171A");

    // WCAG 2.2, definition of contrast ratio: black on white is 21:1; #777777 on white is 4.48:1, the commonly quoted near miss of 4.5 (from memory).
    [Theory]
    [InlineData("#000000", "#FFFFFF", 21.0)]
    [InlineData("#FFFFFF", "#FFFFFF", 1.0)]
    [InlineData("#777777", "#FFFFFF", 4.48)]
    public void Contrast_is_that_of_the_guidelines(string one, string other, double ratio) =>
        Assert.Equal(ratio, Colour.Parse(one).ContrastTo(Colour.Parse(other)), 0.005);

    [Theory]
    [InlineData("#7A1D4E")]
    [InlineData("#000000")]
    [InlineData("#FFFFFF")]
    [InlineData("#FFD400")]
    [InlineData("#004080")]
    [InlineData("#FF0000")]
    [InlineData("#00FF00")]
    public void Accent_stands_out_on_both_grounds(string accent)
    {
        var tones = AccentColours.Of(accent);
        Assert.True(tones.Light.ContrastTo(LightPaper) >= 4.5, $"light {tones.Light}");
        Assert.True(tones.Dark.ContrastTo(DarkPaper) >= 4.5, $"dark {tones.Dark}");
        Assert.True(tones.Print.ContrastTo(Colour.White) >= 4.5, $"print {tones.Print}");
        Assert.True(tones.LightMid.ContrastTo(LightPaper) >= 3, $"mark {tones.LightMid}");
        Assert.True(tones.DarkMid.ContrastTo(DarkPaper) >= 3, $"dark mark {tones.DarkMid}");
    }

    [Fact]
    public void Accent_that_stands_out_already_is_kept() => Assert.Equal(Colour.Parse("#004080"), AccentColours.Of("#004080").Light);

    [Theory]
    [InlineData("red")]
    [InlineData("#12345")]
    [InlineData("#GG0000")]
    [InlineData("#fff;}body{display:none")]
    public void Accent_that_is_no_colour_is_refused(string accent) => Assert.Throws<FormatException>(() => AccentColours.Of(accent));

    [Fact]
    public void Running_foot_cannot_leave_its_string() =>
        Assert.Equal("\"a\\22 \\7d \\5c \\a é\"", RunningFoot.Quoted("a\"}\\\né"));

    [Theory]
    [InlineData("e^(−|x| ÷ b) ÷ 2", "e<sup>−|x| ÷ b</sup> ÷ 2")]
    [InlineData("e^(−k² ÷ (2s²)) < 1", "e<sup>−k² ÷ (2s²)</sup> &lt; 1")]
    [InlineData("a^|k| · a^s", "a<sup>|k|</sup> · a<sup>s</sup>")]
    public void Formula_raises_its_exponents(string formula, string html) => Assert.Equal(html, Formula.ToHtml(formula));
}
