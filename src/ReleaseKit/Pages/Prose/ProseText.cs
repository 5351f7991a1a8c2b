namespace ReleaseKit.Pages.Prose;

/// <summary>A prose file made ready for a page.</summary>
/// <param name="Title">The words of its first heading; null if it has none.</param>
/// <param name="Html">The rest.</param>
public sealed record ProseText(string? Title, string Html);
