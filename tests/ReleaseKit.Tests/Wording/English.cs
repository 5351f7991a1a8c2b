using System.Text.Json;
using ReleaseKit.Wording;

namespace ReleaseKit.Tests.Wording;

/// <summary>The English that ships, loaded once.</summary>
internal static class English
{
    public static string TemplatesFolder { get; } = Path.Combine(AppContext.BaseDirectory, "site-templates");

    public static ILanguage Language { get; } = ReleaseKit.Wording.Language.Load(TemplatesFolder, "en");

    public static WordingTexts Texts { get; } = WordingTexts.Load(TemplatesFolder, "en");

    /// <summary>The keys of the file of readings, which are the sentences that are made from figures.</summary>
    public static IReadOnlyList<string> KeysOfReadings { get; } = ReadKeys();

    private static IReadOnlyList<string> ReadKeys()
    {
        using var file = JsonDocument.Parse(File.ReadAllBytes(Path.Combine(TemplatesFolder, "wording", "en", "readings.json")));
        return [.. file.RootElement.EnumerateObject().Select(member => member.Name)];
    }
}
