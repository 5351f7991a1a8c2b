using System.Text.Json;

namespace ReleaseKit.Downloads;

/// <summary>Numbers in JSON as the CSV files have them; null for what is none.</summary>
internal static class JsonNumbers
{
    /// <param name="json">Where to write.</param>
    /// <param name="name">The name of the number.</param>
    /// <param name="digits">Digits as published, which JSON takes as they are; null for none.</param>
    public static void WriteNumberOrNull(this Utf8JsonWriter json, string name, string? digits)
    {
        json.WritePropertyName(name);
        if (string.IsNullOrEmpty(digits))
            json.WriteNullValue();
        else
            json.WriteRawValue(digits);
    }

    public static void WriteNumberOrNull(this Utf8JsonWriter json, string name, double? number) =>
        json.WriteNumberOrNull(name, number is { } given ? PlainNumber.Of(given) : null);
}
