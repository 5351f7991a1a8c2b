using System.Globalization;

namespace ReleaseKit.Reading.Keys;

/// <summary>Which numbers a key may have, with the words that say so in a message.</summary>
public sealed record NumberRange(string Words, Func<double, bool> Holds, string Example)
{
    public static NumberRange Any { get; } = new("a finite number", double.IsFinite, "0");

    public static NumberRange Positive { get; } = new("above 0 and finite", value => value > 0 && double.IsFinite(value), "1");

    public static NumberRange NotNegative { get; } = new("0 or more and finite", value => value >= 0 && double.IsFinite(value), "0");

    /// <summary>Strictly between 0 and 1.</summary>
    public static NumberRange Share { get; } = new("between 0 and 1, neither of them", value => value is > 0 and < 1, "0.5");

    /// <summary>0 and more, below 1: a delta.</summary>
    public static NumberRange Delta { get; } = new("from 0 to below 1", value => value is >= 0 and < 1, "1e-9");

    public static NumberRange Whole(int from, int to) => new(
        $"a whole number from {from.ToString(CultureInfo.InvariantCulture)} to {to.ToString(CultureInfo.InvariantCulture)}",
        value => value >= from && value <= to && value == Math.Floor(value),
        from.ToString(CultureInfo.InvariantCulture));
}
