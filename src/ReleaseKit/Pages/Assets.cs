using System.Security.Cryptography;
using System.Text;
using System.Text.RegularExpressions;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>Styles and fonts of the publication, each named by its digest, so that a browser may keep them for ever.</summary>
public sealed partial record Assets(string Style)
{
    private const string Folder = "assets";
    private const int DigestDigits = 12;

    // The order matters: the accent overrides the tokens, and what base.css says for print and forced colours overrides the accent.
    private static readonly string[] Sheets = ["base.css", "table.css", "budget.css", "chart.css"];

    /// <summary>Writes the stylesheet, composed of the style files, the release's look and its line at the foot of every printed page, and the fonts it names.</summary>
    public static Assets Write(SiteFolder site, string siteTemplatesFolder, Look look, string runningFoot)
    {
        var styles = Path.Combine(siteTemplatesFolder, "styles");
        var sheet = new StringBuilder(File.ReadAllText(Path.Combine(styles, "tokens.css")));
        if (look.Accent is { } accent && Colour.Parse(accent) != AccentColours.OfTokens)
            sheet.Append(AccentColours.Of(accent).ToCss());
        foreach (var name in Sheets)
            sheet.Append(File.ReadAllText(Path.Combine(styles, name)));
        sheet.Append(RunningFoot.ToCss(runningFoot));
        var css = FontAddress().Replace(Comment().Replace(sheet.ToString(), ""), match => $"url({WriteFont(site, Path.Combine(styles, match.Groups[1].Value))})");
        return new Assets(WriteNamed(site, "style", ".css", Encoding.UTF8.GetBytes(css)));
    }

    private static string WriteFont(SiteFolder site, string file) =>
        Path.GetFileName(WriteNamed(site, Path.GetFileNameWithoutExtension(file), Path.GetExtension(file), File.ReadAllBytes(file)));

    private static string WriteNamed(SiteFolder site, string stem, string extension, byte[] bytes)
    {
        var digest = Convert.ToHexStringLower(SHA256.HashData(bytes))[..DigestDigits];
        var path = $"{Folder}/{stem}-{digest}{extension}";
        site.Write(path, bytes);
        return path;
    }

    [GeneratedRegex(@"url\((\.\./fonts/[a-z0-9-]+\.woff2)\)")]
    private static partial Regex FontAddress();

    [GeneratedRegex(@"/\*.*?\*/\n?", RegexOptions.Singleline)]
    private static partial Regex Comment();
}
