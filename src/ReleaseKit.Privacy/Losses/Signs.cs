using System.Globalization;

namespace ReleaseKit.Privacy.Losses;

/// <summary>Numbers as they stand in a calculation: at most twelve significant digits.</summary>
internal static class Signs
{
    public static string Of(double value) => value.ToString("G12", CultureInfo.InvariantCulture);

    public static string Say(FormattableString text) => FormattableString.Invariant(text);
}
