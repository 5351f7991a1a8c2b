namespace ReleaseKit.Reading.Keys;

/// <summary>
/// The keys that an object of a folder's JSON can have. A key is added here, in the schema (the same name under $defs) and where it is read.
/// </summary>
/// <param name="Name">"file:definition" as in the schema's $defs; "file:" is the root.</param>
/// <param name="Must">Keys that must be given, each with what to paste.</param>
/// <param name="May">Keys that have a default.</param>
/// <param name="Later">Keys of the format that this version does not work out: each is a stop.</param>
public sealed record ObjectShape(string Name, IReadOnlyList<(string Key, string Paste)> Must, IReadOnlyList<string> May, IReadOnlyList<string> Later)
{
    /// <summary>What to paste where no key must be given, and the object is not one.</summary>
    public string? Example { get; init; }

    /// <summary>The object, ready to paste.</summary>
    public string Paste => Example ?? (Must.Count > 0 ? $"{{ {string.Join(", ", Must.Select(must => must.Paste))} }}" : "{ … }");

    public IEnumerable<string> Keys => Must.Select(must => must.Key).Concat(May).Concat(Later);
}
