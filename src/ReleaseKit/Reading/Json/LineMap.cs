using System.Text;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Json;

/// <summary>From a byte of a UTF-8 file to its line and column; both count from 1, columns in UTF-16 units as editors count them.</summary>
public sealed class LineMap
{
    private readonly string file;
    private readonly byte[] bytes;
    private readonly List<int> starts = [0];

    public LineMap(string file, byte[] bytes)
    {
        (this.file, this.bytes) = (file, bytes);
        for (var index = 0; index < bytes.Length; index++)
            if (bytes[index] == (byte)'\n')
                starts.Add(index + 1);
    }

    public Place At(long offset)
    {
        var at = (int)Math.Clamp(offset, 0, bytes.Length);
        var line = starts.BinarySearch(at);
        line = line < 0 ? ~line - 1 : line;
        var column = Encoding.UTF8.GetCharCount(bytes, starts[line], at - starts[line]) + 1;
        return new Place(file, line + 1, column);
    }

    /// <summary>The place of a byte given by its line and its offset in that line, both from 0.</summary>
    public Place At(long line, long byteInLine) => At(OffsetOf(line, byteInLine));

    /// <summary>The byte given by its line and its offset in that line, both from 0; the end of the file if that is beyond it.</summary>
    public int OffsetOf(long line, long byteInLine) => line < starts.Count ? (int)Math.Min(starts[(int)line] + byteInLine, bytes.Length) : bytes.Length;
}
