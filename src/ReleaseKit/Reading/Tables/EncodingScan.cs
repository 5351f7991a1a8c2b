using ReleaseKit.Reading.Files;

namespace ReleaseKit.Reading.Tables;

internal enum ScannedEncoding { Utf8, Utf16, SingleByte, Nul }

/// <summary>What the bytes of a file are, and line and column of the first byte that is no UTF-8. One pass in blocks, nothing kept.</summary>
internal readonly record struct EncodingScan(ScannedEncoding Encoding, int Line, int Column)
{
    private const int BlockSize = 128 * 1024;
    private const int LongestCharacter = 4;

    public static EncodingScan Of(FileInfo file)
    {
        using var stream = file.OpenRead();
        var buffer = new byte[BlockSize];
        var (kept, line, column, isFirst) = (0, 1, 1, true);
        while (stream.Read(buffer, kept, buffer.Length - kept) is > 0 and var count)
        {
            var block = buffer.AsSpan(0, kept + count);
            if (isFirst && LooksLikeUtf16(block))
                return new EncodingScan(ScannedEncoding.Utf16, 1, 1);
            if (Problem(block, isLast: false, line, column) is { } problem)
                return problem;
            var whole = WholeCharacters(block);
            (line, column) = After(block[..whole], line, column);
            block[whole..].CopyTo(buffer);
            (kept, isFirst) = (block.Length - whole, false);
        }
        return Problem(buffer.AsSpan(0, kept), isLast: true, line, column) ?? new EncodingScan(ScannedEncoding.Utf8, 0, 0);
    }

    /// <summary>A byte order mark, or zero bytes in every other place as Latin text has them in UTF-16.</summary>
    private static bool LooksLikeUtf16(ReadOnlySpan<byte> start) =>
        start is [0xFF, 0xFE, ..] or [0xFE, 0xFF, ..] || (start.Length >= 8 && start[..Math.Min(64, start.Length)].Count((byte)0) * 3 > Math.Min(64, start.Length));

    private static EncodingScan? Problem(ReadOnlySpan<byte> block, bool isLast, int line, int column)
    {
        var nul = block.IndexOf((byte)0);
        if (nul >= 0)
            return At(ScannedEncoding.Nul, After(block[..nul], line, column));
        var invalid = Utf8Text.FirstInvalid(block);
        var mayBeCut = !isLast && invalid >= WholeCharacters(block);
        return invalid >= 0 && !mayBeCut ? At(ScannedEncoding.SingleByte, After(block[..invalid], line, column)) : null;
    }

    private static EncodingScan At(ScannedEncoding encoding, (int Line, int Column) place) => new(encoding, place.Line, place.Column);

    /// <summary>Line and column after some text, in UTF-16 units as editors count them.</summary>
    private static (int Line, int Column) After(ReadOnlySpan<byte> text, int line, int column)
    {
        var lineStart = text.LastIndexOf((byte)'\n') + 1;
        var characters = System.Text.Encoding.UTF8.GetCharCount(text[lineStart..]);
        return (line + text.Count((byte)'\n'), lineStart == 0 ? column + characters : characters + 1);
    }

    /// <summary>How many bytes hold whole characters: a character that the end may have cut is left for the next block.</summary>
    private static int WholeCharacters(ReadOnlySpan<byte> block)
    {
        for (var back = 1; back < LongestCharacter && back <= block.Length; back++)
            if (block[^back] >= 0xC0)
                return block.Length - back;
            else if (block[^back] < 0x80)
                break;
        return block.Length;
    }
}
