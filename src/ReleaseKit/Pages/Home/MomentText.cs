using System.Globalization;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Home;

/// <summary>A moment in words, with its distance from UTC: "16 March 2032, 09:30, UTC+1".</summary>
internal static class MomentText
{
    private const string Minus = "\u2212";

    public static string Of(DateTimeOffset moment, ILanguage language) => language.Text(
        "date.moment",
        ("date", language.Date(DateOnly.FromDateTime(moment.DateTime))),
        ("time", moment.ToString("HH:mm", CultureInfo.InvariantCulture)),
        ("zone", "UTC" + Distance(moment.Offset)));

    private static string Distance(TimeSpan offset)
    {
        if (offset == TimeSpan.Zero)
            return "";
        var hours = Math.Abs(offset.Hours).ToString(CultureInfo.InvariantCulture);
        var minutes = offset.Minutes == 0 ? "" : offset.ToString(@"\:mm", CultureInfo.InvariantCulture);
        return (offset < TimeSpan.Zero ? Minus : "+") + hours + minutes;
    }
}
