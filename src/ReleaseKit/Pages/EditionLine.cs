using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>Edition and status in words: "Edition 2, corrected".</summary>
internal static class EditionLine
{
    public static string Of(SiteContext context)
    {
        var edition = context.Release.Edition;
        var number = edition.Number.ToString(CultureInfo.InvariantCulture);
        var line = context.Language.Text(KeyOf(edition.Status), ("number", number));
        return edition.Printing == 1
            ? line
            : context.Language.Text("frame.printing", ("edition", line), ("printing", edition.Printing.ToString(CultureInfo.InvariantCulture)));
    }

    private static string KeyOf(EditionStatus status) => status switch
    {
        EditionStatus.Provisional => "frame.edition.provisional",
        EditionStatus.Revised => "frame.edition.revised",
        EditionStatus.Corrected => "frame.edition.corrected",
        EditionStatus.Withdrawn => "frame.edition.withdrawn",
        _ => "frame.edition.first",
    };
}
