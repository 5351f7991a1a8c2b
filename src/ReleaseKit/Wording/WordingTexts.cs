using System.Collections.Frozen;
using System.Text;
using System.Text.Json;

namespace ReleaseKit.Wording;

/// <summary>The texts of one language by key, merged from its wording files. Immutable; safe between threads.</summary>
public sealed class WordingTexts
{
    private readonly FrozenDictionary<string, string> texts;

    private WordingTexts(string tag, IReadOnlyDictionary<string, string> texts) => (Tag, this.texts) = (tag, texts.ToFrozenDictionary());

    public string Tag { get; }

    public IReadOnlyCollection<string> Keys => texts.Keys;

    /// <summary>Reads all files of <c>wording/TAG/</c>; which file a key stands in means nothing.</summary>
    /// <exception cref="WordingException">No such language, a file that is no flat list of texts, or a key given twice.</exception>
    public static WordingTexts Load(string siteTemplatesFolder, string tag)
    {
        var folder = Path.Combine(siteTemplatesFolder, "wording", tag);
        var files = Directory.Exists(folder) ? Directory.GetFiles(folder, "*.json") : [];
        if (files.Length == 0)
            throw WordingException.NoLanguage(Path.Combine("wording", tag), tag);
        var texts = new Dictionary<string, string>();
        foreach (var file in files.Order(StringComparer.Ordinal))
            AddFile(file, tag, texts);
        return new WordingTexts(tag, texts);
    }

    /// <summary>The text of a key as the file gives it, holes unfilled.</summary>
    public string Template(string key) => texts.TryGetValue(key, out var text) ? text : throw WordingException.MissingKey(Tag, key);

    public bool Has(string key) => texts.ContainsKey(key);

    /// <summary>The text of a key with every hole filled. A hole without a fill, or a fill without a hole, is an error: a sentence never loses a number silently.</summary>
    public string Fill(string key, params ReadOnlySpan<(string Name, string Value)> fill)
    {
        var template = Template(key);
        var filled = new StringBuilder(template.Length + 32);
        var used = 0L;
        for (var at = 0; at < template.Length;)
        {
            var open = template.IndexOf('{', at);
            var close = open < 0 ? -1 : template.IndexOf('}', open);
            if (close < 0)
                open = close = template.Length;
            filled.Append(template, at, open - at);
            if (open < template.Length)
                used |= AppendHole(filled, key, template.AsSpan(open + 1, close - open - 1), fill);
            at = close + 1;
        }
        for (var index = 0; index < fill.Length; index++)
            if ((used & (1L << index)) == 0)
                throw WordingException.UnusedFill(Tag, key, fill[index].Name);
        return filled.ToString();
    }

    private long AppendHole(StringBuilder filled, string key, ReadOnlySpan<char> hole, ReadOnlySpan<(string Name, string Value)> fill)
    {
        for (var index = 0; index < fill.Length; index++)
            if (hole.SequenceEqual(fill[index].Name))
            {
                filled.Append(fill[index].Value);
                return 1L << index;
            }
        throw WordingException.EmptyHole(Tag, key, hole.ToString());
    }

    private static void AddFile(string path, string tag, Dictionary<string, string> texts)
    {
        var name = $"wording/{tag}/{Path.GetFileName(path)}";
        foreach (var (key, text) in ReadFlat(path, name))
            if (!texts.TryAdd(key, text))
                throw WordingException.TwiceTheKey(name, key);
    }

    private static IEnumerable<(string Key, string Text)> ReadFlat(string path, string name)
    {
        using var document = Parse(path, name);
        if (document.RootElement.ValueKind != JsonValueKind.Object)
            throw WordingException.NotFlat(name, "it does not begin with {");
        foreach (var member in document.RootElement.EnumerateObject())
        {
            if (member.Value.ValueKind != JsonValueKind.String)
                throw WordingException.NotFlat(name, $"\"{member.Name}\" is no string");
            yield return (member.Name, member.Value.GetString()!);
        }
    }

    private static JsonDocument Parse(string path, string name)
    {
        try
        {
            return JsonDocument.Parse(File.ReadAllBytes(path), new JsonDocumentOptions { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true });
        }
        catch (JsonException fault)
        {
            throw WordingException.NotFlat(name, $"line {fault.LineNumber + 1}, {fault.Message}");
        }
    }
}
