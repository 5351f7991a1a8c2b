namespace ReleaseKit.Pages;

/// <summary>Whether two files hold the same bytes.</summary>
internal static class FileBytes
{
    private const int Block = 1 << 16;

    public static bool AreSame(string one, string other)
    {
        using var first = File.OpenRead(one);
        using var second = File.OpenRead(other);
        if (first.Length != second.Length)
            return false;
        var (left, right) = (new byte[Block], new byte[Block]);
        while (first.ReadAtLeast(left, Block, throwOnEndOfStream: false) is var read and > 0)
        {
            second.ReadAtLeast(right, Block, throwOnEndOfStream: false);
            if (!left.AsSpan(0, read).SequenceEqual(right.AsSpan(0, read)))
                return false;
        }
        return true;
    }
}
