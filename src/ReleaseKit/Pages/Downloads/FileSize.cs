using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Downloads;

/// <summary>The size of a file in words: "840 bytes", "12.4 kB" (1 kB = 1,000 bytes), rounded up.</summary>
internal static class FileSize
{
    public static string Of(long bytes, ILanguage language) => bytes switch
    {
        < 1_000 => Text("downloads-page.bytes", new PublishedValue(bytes, 0), language),
        < 1_000_000 => Text("downloads-page.kilobytes", new PublishedValue((bytes + 99) / 100, 1), language),
        _ => Text("downloads-page.megabytes", new PublishedValue((bytes + 99_999) / 100_000, 1), language),
    };

    private static string Text(string key, PublishedValue number, ILanguage language) => language.Text(key, ("number", language.Number(number)));
}
