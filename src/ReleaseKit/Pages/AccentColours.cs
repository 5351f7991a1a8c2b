namespace ReleaseKit.Pages;

/// <summary>The tones that a release's accent takes on the light ground, on the dark ground and on paper.</summary>
public sealed record AccentColours(Colour Light, Colour LightMid, Colour Dark, Colour DarkMid, Colour Print, Colour PrintMid)
{
    /// <summary>Least contrast of text (WCAG 2.2, success criterion 1.4.3).</summary>
    public const double TextContrast = 4.5;

    /// <summary>Least contrast of a mark (WCAG 2.2, success criterion 1.4.11), with some to spare on the band of total rows.</summary>
    private const double MarkContrast = 3.5;

    /// <summary>The accent that tokens.css has; its tones were chosen by hand.</summary>
    public static Colour OfTokens { get; } = Colour.Parse("#7A1D4E");

    // The grounds of tokens.css: of rows with a band, where contrast is least.
    private static readonly Colour LightBand = Colour.Parse("#E8ECE7");
    private static readonly Colour DarkBand = Colour.Parse("#1C2327");

    public static AccentColours Of(string accent)
    {
        var colour = Colour.Parse(accent);
        var light = Towards(Colour.Black, colour, LightBand, TextContrast);
        var dark = Towards(Colour.White, colour, DarkBand, TextContrast);
        var print = light.Mix(Colour.Black, 25);
        return new AccentColours(light, FurthestFrom(light, LightBand), dark, FurthestFrom(dark, DarkBand), print, FurthestFrom(print, Colour.White));
    }

    /// <summary>The accent's tokens, in the words of tokens.css.</summary>
    public string ToCss() =>
        $":root{{{Tokens(Light, LightMid)}--print-damson:{Print};--print-damson-mid:{PrintMid}}}\n" +
        $"@media (prefers-color-scheme:dark){{:root{{{Tokens(Dark, DarkMid)}}}}}\n";

    private static string Tokens(Colour full, Colour mid) =>
        $"--damson:{full};--link:{full};--stick:{full};--damson-mid:{mid};--damson-tail:{mid};";

    /// <summary>The colour moved towards another by no more than it takes to stand out from the ground.</summary>
    private static Colour Towards(Colour end, Colour colour, Colour ground, double contrast) =>
        Enumerable.Range(0, 101).Select(step => colour.Mix(end, step)).First(tone => tone.ContrastTo(ground) >= contrast);

    /// <summary>The palest tone between the colour and its ground that can still be seen as a mark.</summary>
    private static Colour FurthestFrom(Colour colour, Colour ground) =>
        Enumerable.Range(0, 101).Select(step => colour.Mix(ground, step)).Last(tone => tone.ContrastTo(ground) >= MarkContrast);
}
