using System.Buffers;
using System.Text;
using System.Text.Unicode;

namespace ReleaseKit.Reading.Files;

/// <summary>Finds what is no UTF-8 in bytes.</summary>
internal static class Utf8Text
{
    /// <summary>The index of the first byte that is no valid UTF-8, or −1.</summary>
    public static int FirstInvalid(ReadOnlySpan<byte> bytes)
    {
        if (Utf8.IsValid(bytes))
            return -1;
        var index = 0;
        while (Rune.DecodeFromUtf8(bytes[index..], out _, out var consumed) == OperationStatus.Done)
            index += consumed;
        return index;
    }
}
