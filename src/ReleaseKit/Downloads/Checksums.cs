using System.Security.Cryptography;
using System.Text;
using ReleaseKit.Pages;

namespace ReleaseKit.Downloads;

/// <summary>SHA-256 of every download, a line each with two spaces, names relative to the file: what <c>sha256sum -c</c> reads.</summary>
internal static class Checksums
{
    public static void Write(SiteFolder site)
    {
        var downloads = site.Written.Where(path => path.StartsWith(DownloadNames.Folder, StringComparison.Ordinal)).ToList();
        var lines = downloads.Select(path => $"{HashOf(site, path)}  {path[DownloadNames.Folder.Length..]}\n");
        site.Write(DownloadNames.Checksums, Encoding.UTF8.GetBytes(string.Concat(lines)));
    }

    private static string HashOf(SiteFolder site, string path)
    {
        using var stream = site.Read(path);
        return Convert.ToHexStringLower(SHA256.HashData(stream));
    }
}
