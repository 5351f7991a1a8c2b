using System.Text;

namespace ReleaseKit.Releases;

/// <summary>Names for ids and files: a-z, 0-9, - and _ only, the same on every machine and in every locale.</summary>
public static class Slug
{
    /// <summary>
    /// Latin letters with marks and ligatures, and what they become. A table and not Unicode normalisation, which needs culture data,
    /// and not lower-casing by culture, under which a Turkish I would change.
    /// </summary>
    private const string Replacements =
        "àáâãäåāăą=a æ=ae çćĉċč=c ďđð=d èéêëēĕėęě=e ĝğġģ=g ĥħ=h ìíîïĩīĭįı=i ĳ=ij ĵ=j ķĸ=k ĺļľŀł=l ñńņňŉŋ=n òóôõöōŏő=o ø=o œ=oe "
        + "ŕŗř=r śŝşšșſ=s ß=ss ţťŧț=t þ=th ùúûüũūŭůűų=u ŵ=w ýÿŷ=y źżž=z "
        + "ÀÁÂÃÄÅĀĂĄ=a Æ=ae ÇĆĈĊČ=c ĎĐÐ=d ÈÉÊËĒĔĖĘĚ=e ĜĞĠĢ=g ĤĦ=h ÌÍÎÏĨĪĬĮİ=i Ĳ=ij Ĵ=j Ķ=k ĹĻĽĿŁ=l ÑŃŅŇŊ=n ÒÓÔÕÖŌŎŐ=o Ø=o Œ=oe "
        + "ŔŖŘ=r ŚŜŞŠȘ=s ẞ=ss ŢŤŦȚ=t Þ=th ÙÚÛÜŨŪŬŮŰŲ=u Ŵ=w ÝŸŶ=y ŹŻŽ=z +=-plus- &=-and-";

    private static Dictionary<char, string> Letters { get; } = Replacements.Split(' ')
        .SelectMany(group => group[..group.IndexOf('=', StringComparison.Ordinal)]
            .Select(letter => (letter, becomes: group[(group.IndexOf('=', StringComparison.Ordinal) + 1)..])))
        .ToDictionary(pair => pair.letter, pair => pair.becomes);

    /// <summary>The slug of a text; empty if nothing of it can be kept.</summary>
    public static string Of(string text)
    {
        var slug = new StringBuilder(text.Length);
        foreach (var letter in text)
            Append(slug, letter);
        return slug.ToString().Trim('-');
    }

    /// <summary>Whether a text can be used as an id as it stands: a-z, 0-9, - _ . only, beginning with a letter or digit.</summary>
    public static bool IsOne(string text) =>
        text.Length is > 0 and <= 100 && char.IsAsciiLetterOrDigit(text[0]) && text.All(letter => char.IsAsciiLetterLower(letter) || char.IsAsciiDigit(letter) || letter is '-' or '_' or '.');

    private static void Append(StringBuilder slug, char letter)
    {
        if (char.IsAsciiLetterOrDigit(letter) || letter == '_')
            slug.Append(char.ToLowerInvariant(letter));
        else if (Letters.TryGetValue(letter, out var becomes))
            AppendPieces(slug, becomes);
        else if (letter < 0x80 || char.IsWhiteSpace(letter) || char.IsPunctuation(letter))
            AppendDash(slug);
    }

    private static void AppendPieces(StringBuilder slug, string becomes)
    {
        foreach (var piece in becomes)
            if (piece == '-')
                AppendDash(slug);
            else
                slug.Append(piece);
    }

    private static void AppendDash(StringBuilder slug)
    {
        if (slug.Length > 0 && slug[^1] != '-')
            slug.Append('-');
    }
}
