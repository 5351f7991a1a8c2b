using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Prose;

/// <summary>What a citation is replaced by.</summary>
public enum CitationForm
{
    /// <summary>The writer's own words stay.</summary>
    OwnWords,
    Value,
    Margin,
    ValueAndMargin,
    Range,
    Reading,
}

/// <summary>The words that ask for a generated text.</summary>
public static class CitationForms
{
    private static readonly (CitationForm Form, string English, string Key)[] Words =
    [
        (CitationForm.Value, "value", "prose.word.value"),
        (CitationForm.Margin, "margin", "prose.word.margin"),
        (CitationForm.ValueAndMargin, "value and margin", "prose.word.value-and-margin"),
        (CitationForm.Range, "range", "prose.word.range"),
        (CitationForm.Reading, "reading", "prose.word.reading"),
    ];

    /// <summary>The form that a link's words ask for, in the page's language or in English.</summary>
    public static CitationForm Of(string words, ILanguage language)
    {
        var asked = words.Trim();
        foreach (var (form, english, key) in Words)
            if (asked.Equals(english, StringComparison.OrdinalIgnoreCase) || asked.Equals(language.Text(key), StringComparison.OrdinalIgnoreCase))
                return form;
        return CitationForm.OwnWords;
    }
}
