using System.Buffers;

namespace ReleaseKit.Pages;

/// <summary>Addresses out of a folder that may become links.</summary>
internal static class WebAddress
{
    private static readonly SearchValues<char> NotInMail = SearchValues.Create(" :?&<>\"");

    /// <summary>The address, if it is an http or https one; null otherwise.</summary>
    public static string? Of(string? address) =>
        Uri.TryCreate(address, UriKind.Absolute, out var uri) && uri.Scheme is "http" or "https" ? address : null;

    /// <summary>The path of an address without its host, between slashes; null if it is no http or https one.</summary>
    public static string? PathOf(string? address) =>
        Of(address) is { } web ? $"/{new Uri(web).AbsolutePath.Trim('/')}/".Replace("//", "/", StringComparison.Ordinal) : null;

    /// <summary>Where to write to: a web address, or mailto: for a mail address; null if it is neither.</summary>
    public static string? OfContact(string contact) =>
        Of(contact) ?? (contact.Contains('@') && !contact.AsSpan().ContainsAny(NotInMail) ? "mailto:" + contact : null);

    /// <summary>The address above an edition's: less its last segment; null if there is none above.</summary>
    public static string? Above(string? address)
    {
        if (Of(address) is null)
            return null;
        var trimmed = address!.TrimEnd('/');
        var cut = trimmed.LastIndexOf('/');
        return cut > trimmed.IndexOf("://", StringComparison.Ordinal) + 2 ? trimmed[..(cut + 1)] : null;
    }
}
