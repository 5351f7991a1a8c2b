namespace ReleaseKit.Wording;

/// <summary>Something is wrong with the wording files of a language: where, what is there, and what to do.</summary>
public sealed class WordingException : Exception
{
    private WordingException(string message)
        : base(message)
    {
    }

    public static WordingException NoLanguage(string folder, string tag) =>
        new($"{folder}  holds no wording for the language \"{tag}\". Do: put its wording files there, or leave \"{tag}\" out of \"languages\".");

    public static WordingException MissingKey(string tag, string key) =>
        new($"wording/{tag}  has no text for the key \"{key}\". No other language is put in its place. Do: add \"{key}\" to a wording file of \"{tag}\".");

    public static WordingException TwiceTheKey(string file, string key) =>
        new($"{file}  gives the key \"{key}\" a second time. Do: keep one of the two, also if the other stands in another file.");

    public static WordingException NotFlat(string file, string fault) =>
        new($"{file}  is no flat list of texts: {fault}. Do: write one JSON object whose values are strings.");

    public static WordingException EmptyHole(string tag, string key, string hole) =>
        new($"wording/{tag}  \"{key}\" has the hole {{{hole}}}, which nothing fills. Do: use only the holes that the English text of this key has.");

    public static WordingException UnusedFill(string tag, string key, string hole) =>
        new($"wording/{tag}  \"{key}\" leaves out {{{hole}}}, so the sentence would lose it. Do: put {{{hole}}} into the text.");

    public static WordingException NoNumberWord(string tag, string key, string entry) =>
        new($"wording/{tag}  \"{key}\" holds \"{entry}\", which gives no word a whole number. Do: write word=number, with | between them: ten=10|hundred=100.");
}
