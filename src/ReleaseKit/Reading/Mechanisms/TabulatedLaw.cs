using System.Globalization;
using System.Text;
using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Mechanisms;

/// <summary>Reads the table of a tabulated law: noise,probability, in decimal.</summary>
internal static class TabulatedLaw
{
    private const NumberStyles Decimal = NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent;

    public static IReadOnlyList<(long Step, decimal Probability)>? Read(ObjectReader mechanism, FolderFiles files)
    {
        var context = mechanism.Context;
        if (mechanism.Text("file") is not { } path || files.Find(path, mechanism.PlaceOf("file"), context) is not { } file)
            return null;
        using var rows = CsvFile.Open(file, path, context);
        if (rows is null)
            return null;
        if (rows.Headers is not ["noise", "probability"])
        {
            context.Add(MechanismProblems.LawRow(new Place(path, 1, 1), $"The columns are {string.Join(",", rows.Headers)}.", context.Owner));
            return null;
        }
        var grid = mechanism.Find("grid") is JsonNumber number && LawReader.IsInRange("grid", number.Value) ? (decimal)number.Value : 1m;
        return ReadRows(rows, grid, path, context);
    }

    private static List<(long, decimal)>? ReadRows(CsvFile rows, decimal grid, string path, ReadContext context)
    {
        var steps = new SortedDictionary<long, decimal>();
        while (rows.Read() && steps.Count <= FolderLimits.LawRows)
        {
            if (Problem(rows, grid, steps) is not { } problem)
                continue;
            context.Add(MechanismProblems.LawRow(rows.PlaceOf(0), problem, context.Owner));
            return null;
        }
        if (!rows.IsSound || steps.Count == 0 || steps.Count > FolderLimits.LawRows)
            return null;
        if (steps.Values.Sum() <= 1m)
            return [.. steps.Select(pair => (pair.Key, pair.Value))];
        context.Add(MechanismProblems.LawRow(new Place(path, 1, 1), FormattableString.Invariant($"The probabilities add up to {steps.Values.Sum()}."), context.Owner));
        return null;
    }

    /// <summary>Takes the current row in, or says what is wrong with it.</summary>
    private static string? Problem(CsvFile rows, decimal grid, SortedDictionary<long, decimal> steps)
    {
        if (!TryDecimal(rows.Span(0), out var noise) || !TryDecimal(rows.Span(1), out var probability))
            return "A row is not two numbers.";
        if (noise % grid != 0 || Math.Abs(noise / grid) > long.MaxValue / 4)
            return FormattableString.Invariant($"The noise {noise} is no multiple of the grid {grid}.");
        if (probability is < 0 or > 1)
            return FormattableString.Invariant($"The probability {probability} is not between 0 and 1.");
        return steps.TryAdd((long)(noise / grid), probability) ? null : FormattableString.Invariant($"The noise {noise} stands there twice.");
    }

    private static bool TryDecimal(ReadOnlySpan<byte> text, out decimal value) =>
        decimal.TryParse(Encoding.UTF8.GetString(text), Decimal, CultureInfo.InvariantCulture, out value) && Math.Abs(value) < 1e15m;
}
