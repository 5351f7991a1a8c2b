using System.Text.RegularExpressions;

namespace ReleaseKit.Pages.Methods;

/// <summary>A formula of a wording file as HTML: "e^(−x)" and "a^k" with their exponents raised.</summary>
internal static partial class Formula
{
    public static string ToHtml(string formula) =>
        Exponent().Replace(HtmlText.Encode(formula), exponent => $"<sup>{exponent.Groups["inner"]}{exponent.Groups["bare"]}</sup>");

    // A caret with balanced parentheses after it, or with a run of letters, digits and bars.
    [GeneratedRegex(@"\^(?:\((?<inner>(?>[^()]+|\((?<open>)|\)(?<-open>))*(?(open)(?!)))\)|(?<bare>[\p{L}\p{N}|]+))")]
    private static partial Regex Exponent();
}
