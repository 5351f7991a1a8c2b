using System.Text.Json;
using ReleaseKit.Noise.Errors;

namespace ReleaseKit.Downloads;

/// <summary>A step after the noise, in the keys of mechanisms.json.</summary>
internal static class AfterStepJson
{
    public static void Write(Utf8JsonWriter json, AfterStep step)
    {
        json.WriteStartObject();
        switch (step)
        {
            case AfterStep.RoundTo rounding:
                WriteRounding(json, rounding);
                break;
            case AfterStep.NotBelow bound:
                json.WriteNumberOrNull("notBelow", bound.Bound);
                break;
            case AfterStep.NotAbove bound:
                json.WriteNumberOrNull("notAbove", bound.Bound);
                break;
            case AfterStep.ZeroBelow threshold:
                json.WriteNumberOrNull("zeroBelow", threshold.Threshold);
                break;
            case AfterStep.PublishedFrom threshold:
                json.WriteNumberOrNull("publishedFrom", threshold.Threshold);
                break;
        }
        json.WriteEndObject();
    }

    private static void WriteRounding(Utf8JsonWriter json, AfterStep.RoundTo rounding)
    {
        json.WriteNumberOrNull("roundTo", rounding.Unit);
        json.WriteString("how", JsonNamingPolicy.KebabCaseLower.ConvertName(rounding.How.ToString()));
        if (rounding.How == RoundingHow.Nearest)
            json.WriteString("ties", JsonNamingPolicy.KebabCaseLower.ConvertName(rounding.Ties.ToString()));
    }
}
