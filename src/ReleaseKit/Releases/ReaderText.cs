namespace ReleaseKit.Releases;

/// <summary>Text for readers, by language tag. A plain string in the folder stands for the main language.</summary>
public sealed class ReaderText
{
    private readonly IReadOnlyDictionary<string, string> byLanguage;

    public ReaderText(IReadOnlyDictionary<string, string> byLanguage) => this.byLanguage = byLanguage;

    public static ReaderText Plain(string language, string text) => new(new Dictionary<string, string> { [language] = text });

    public string In(string language) => byLanguage[language];

    public bool Has(string language) => byLanguage.ContainsKey(language);
}
