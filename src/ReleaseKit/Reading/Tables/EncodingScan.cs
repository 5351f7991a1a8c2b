using ReleaseKit.Reading.Files;

namespace ReleaseKit.Reading.Tables;

internal enum ScannedEncoding { Utf8, Utf16, SingleByte, Nul }

/// <summary>What the bytes of a file are, and the line of the first byte that is no UTF-8. One pass in blocks, nothing kept.</summary>
internal readonly record struct EncodingScan(ScannedEncoding Encoding, int Line)
{
    private const int BlockSize = 128 * 1024;
    private const int LongestCharacter = 4;

    public static EncodingScan Of(FileInfo file)
    {
        using var stream = file.OpenRead();
        var buffer = new byte[BlockSize];
        var (kept, line, isFirst) = (0, 1, true);
        while (stream.Read(buffer, kept, buffer.Length - kept) is > 0 and var count)
        {
            var block = buffer.AsSpan(0, kept + count);
            if (isFirst && LooksLikeUtf16(block))
                return new EncodingScan(ScannedEncoding.Utf16, 1);
            if (Problem(block, isLast: false, line) is { } problem)
                return problem;
            var whole = WholeCharacters(block);
            line += block[..whole].Count((byte)'\n');
            block[whole..].CopyTo(buffer);
            (kept, isFirst) = (block.Length - whole, false);
        }
        return Problem(buffer.AsSpan(0, kept), isLast: true, line) ?? new EncodingScan(ScannedEncoding.Utf8, 0);
    }

    /// <summary>A byte order mark, or zero bytes in every other place as Latin text has them in UTF-16.</summary>
    private static bool LooksLikeUtf16(ReadOnlySpan<byte> start) =>
        start is [0xFF, 0xFE, ..] or [0xFE, 0xFF, ..] || (start.Length >= 8 && start[..Math.Min(64, start.Length)].Count((byte)0) * 3 > Math.Min(64, start.Length));

    private static EncodingScan? Problem(ReadOnlySpan<byte> block, bool isLast, int line)
    {
        var nul = block.IndexOf((byte)0);
        if (nul >= 0)
            return new EncodingScan(ScannedEncoding.Nul, line + block[..nul].Count((byte)'\n'));
        var invalid = Utf8Text.FirstInvalid(block);
        var mayBeCut = !isLast && invalid >= WholeCharacters(block);
        return invalid >= 0 && !mayBeCut ? new EncodingScan(ScannedEncoding.SingleByte, line + block[..invalid].Count((byte)'\n')) : null;
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
