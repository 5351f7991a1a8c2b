using System.Globalization;
using System.Text;

namespace ReleaseKit.Pages;

/// <summary>The line that stands at the foot of every printed page, left of the page number.</summary>
internal static class RunningFoot
{
    public static string ToCss(string text) => $"@media print{{@page{{@bottom-left{{content:{Quoted(text)}}}}}}}\n";

    /// <summary>A CSS string: everything but letters, digits and spaces as an escape (CSS Syntax 3, section 4.3.7), so that no text ends it.</summary>
    internal static string Quoted(string text)
    {
        var quoted = new StringBuilder("\"");
        foreach (var rune in text.EnumerateRunes())
            if (Rune.IsLetterOrDigit(rune) || rune.Value == ' ')
                quoted.Append(rune);
            else
                quoted.Append(CultureInfo.InvariantCulture, $"\\{rune.Value:x} ");
        return quoted.Append('"').ToString();
    }
}
