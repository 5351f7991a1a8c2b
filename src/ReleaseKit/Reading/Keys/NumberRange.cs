using System.Globalization;

namespace ReleaseKit.Reading.Keys;

/// <summary>Which numbers a key may have, with the words that say so in a message.</summary>
public sealed record NumberRange(string Words, Func<double, bool> Holds, string Example)
{
    /// <summary>Beyond this no number of a release lies; within it sums and products stay exact enough and finite.</summary>
    public const double Largest = 1e15;

    /// <summary>The smallest rounding unit.</summary>
    private const double Finest = 1e-9;

    public static NumberRange Any { get; } = new("a number within 1e15 of zero", value => Math.Abs(value) <= Largest, "1");

    public static NumberRange Positive { get; } = new("above 0 and at most 1e15", value => value is > 0 and <= Largest, "1");

    public static NumberRange NotNegative { get; } = new("from 0 to 1e15", value => value is >= 0 and <= Largest, "0");

    public static NumberRange RoundingUnit { get; } = new("from 1e-9 to 1e15", value => value is >= Finest and <= Largest, "5");

    /// <summary>Strictly between 0 and 1.</summary>
    public static NumberRange Share { get; } = new("between 0 and 1, neither of them", value => value is > 0 and < 1, "0.5");

    /// <summary>0 and more, below 1: a delta.</summary>
    public static NumberRange Delta { get; } = new("from 0 to below 1", value => value is >= 0 and < 1, "1e-9");

    public static NumberRange Whole(int from, int to) => new(
        $"a whole number from {from.ToString(CultureInfo.InvariantCulture)} to {to.ToString(CultureInfo.InvariantCulture)}",
        value => value >= from && value <= to && value == Math.Floor(value),
        from.ToString(CultureInfo.InvariantCulture));
}
