using System.Buffers;

namespace ReleaseKit.Pages;

/// <summary>Which paths a site may have: nothing that could leave the folder or that some file system reads otherwise.</summary>
internal static class SitePath
{
    private const int LongestSegment = 200;

    private static readonly SearchValues<char> Allowed =
        SearchValues.Create("abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789-_.");

    /// <exception cref="ArgumentException">The path is none that a site may have.</exception>
    public static void Demand(string path)
    {
        if (!path.Split('/').All(IsAllowed))
            throw new ArgumentException($"'{path}' is no path for a site.", nameof(path));
    }

    private static bool IsAllowed(string segment) =>
        segment.Length is > 0 and <= LongestSegment && segment[0] != '.' && segment[^1] != '.' && !segment.AsSpan().ContainsAnyExcept(Allowed);
}
