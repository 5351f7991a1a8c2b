using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>A tabulated law as the release folder gave it: noise in the figure's unit, and its chance.</summary>
internal static class LawCsv
{
    public static void Write(Stream stream, Mechanism mechanism)
    {
        using var csv = new CsvFile(stream);
        csv.Text("noise").Text("probability").EndRow();
        foreach (var (step, probability) in mechanism.Tabulated ?? [])
            csv.Number(step * mechanism.Grid).Digits(probability.ToString(CultureInfo.InvariantCulture)).EndRow();
    }
}
