using System.Buffers;
using System.Text;

namespace ReleaseKit.Pages;

/// <summary>Text made ready for HTML: the one place where escaping happens.</summary>
public static class HtmlText
{
    private static readonly SearchValues<char> Special = SearchValues.Create(SpecialCharacters());

    /// <summary>
    /// Escapes the five characters that mean something in HTML text and quoted attributes. Control characters, which HTML forbids, and
    /// the bidirectional embeddings and overrides, which could make digits read in another order, become U+FFFD.
    /// </summary>
    public static string Encode(string text) => text.AsSpan().ContainsAny(Special) ? EncodeSpecial(text) : text;

    /// <summary>Index of the first character that cannot be written as it is, or −1.</summary>
    internal static int IndexOfSpecial(ReadOnlySpan<char> text) => text.IndexOfAny(Special);

    internal static string Replacement(char special) => special switch
    {
        '&' => "&amp;",
        '<' => "&lt;",
        '>' => "&gt;",
        '"' => "&quot;",
        '\'' => "&#39;",
        _ => "\uFFFD",
    };

    private static string EncodeSpecial(ReadOnlySpan<char> text)
    {
        var encoded = new StringBuilder(text.Length + 32);
        for (var at = text.IndexOfAny(Special); at >= 0; at = text.IndexOfAny(Special))
        {
            encoded.Append(text[..at]).Append(Replacement(text[at]));
            text = text[(at + 1)..];
        }
        return encoded.Append(text).ToString();
    }

    private static string SpecialCharacters()
    {
        var controls = Enumerable.Range(0, 0x20).Where(code => code is not ('\t' or '\n' or '\r')).Concat(Enumerable.Range(0x7F, 0x21));
        var overrides = Enumerable.Range(0x202A, 5);
        return "&<>\"'" + string.Concat(controls.Concat(overrides).Select(code => (char)code));
    }
}
