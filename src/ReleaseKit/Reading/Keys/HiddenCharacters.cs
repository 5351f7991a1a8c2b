namespace ReleaseKit.Reading.Keys;

/// <summary>Characters that no label or text may hold: controls, and those that turn the direction of what follows (Unicode Standard Annex 9).</summary>
internal static class HiddenCharacters
{
    public static bool IsOne(char letter) => char.IsControl(letter)
        || letter is '\u061C' or '\u200B' or '\u200E' or '\u200F' or (>= '\u202A' and <= '\u202E') or '\u2028' or '\u2029' or (>= '\u2060' and <= '\u2069') or '\uFEFF';

    /// <summary>The first of them in a text, or −1.</summary>
    public static int FirstIn(ReadOnlySpan<char> text)
    {
        for (var index = 0; index < text.Length; index++)
            if (IsOne(text[index]))
                return index;
        return -1;
    }
}
