namespace ReleaseKit.Pages;

/// <summary>Links inside the publication: relative, and naming their file, so that it works under any path and opened from disk.</summary>
public static class Link
{
    /// <summary>
    /// The link from one page to another, both as paths in the site ("tables/arrears/index.html"); the target may carry a fragment.
    /// Link.From("tables/a/index.html", "budget.html") is "../../budget.html".
    /// </summary>
    public static string From(string page, string target)
    {
        var hash = target.IndexOf('#', StringComparison.Ordinal);
        if (hash > 0 && target.AsSpan(0, hash).SequenceEqual(page))
            return target[hash..];
        var from = page.Split('/');
        var to = (hash < 0 ? target : target[..hash]).Split('/');
        var shared = 0;
        while (shared < from.Length - 1 && shared < to.Length - 1 && from[shared] == to[shared])
            shared++;
        var up = string.Concat(Enumerable.Repeat("../", from.Length - 1 - shared));
        return up + string.Join('/', to[shared..]) + (hash < 0 ? "" : target[hash..]);
    }
}
