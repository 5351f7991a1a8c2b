using System.Text.RegularExpressions;

namespace ReleaseKit.Pages.Prose;

/// <summary>Where links of prose may lead: http, https, mailto, or somewhere in the publication.</summary>
public static partial class ProseLink
{
    public const string Figure = "figure:";
    public const string Chart = "chart:";

    /// <summary>Whether a link may be written. Control characters and backslashes are refused because browsers skip or turn them.</summary>
    public static bool IsAllowed(string address)
    {
        if (address.Any(char.IsControl) || address.Contains('\\') || address.StartsWith("//", StringComparison.Ordinal))
            return false;
        var scheme = Scheme().Match(address);
        return !scheme.Success || scheme.Groups[1].Value.ToLowerInvariant() is "http" or "https" or "mailto";
    }

    /// <summary>The address of the figure that a destination cites, or null.</summary>
    public static string? FigureIn(string? destination) => After(Figure, destination);

    /// <summary>The id of the chart that a destination places, or null.</summary>
    public static string? ChartIn(string? destination) => After(Chart, destination);

    private static string? After(string scheme, string? destination) =>
        destination is not null && destination.StartsWith(scheme, StringComparison.Ordinal) ? destination[scheme.Length..] : null;

    [GeneratedRegex(@"^\s*([A-Za-z][A-Za-z0-9+.-]*):")]
    private static partial Regex Scheme();
}
