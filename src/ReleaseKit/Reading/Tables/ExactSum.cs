using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>A sum of published values, exact: Unscaled × 10^−Decimals in 128 bits.</summary>
internal readonly record struct ExactSum(Int128 Unscaled, int Decimals)
{
    public static ExactSum Of(IEnumerable<PublishedValue> values) =>
        values.Aggregate(new ExactSum(0, 0), (sum, value) => sum.Plus(new ExactSum(value.Unscaled, value.Decimals)));

    public ExactSum Less(ExactSum other) => Plus(new ExactSum(-other.Unscaled, other.Decimals));

    public bool Equals(ExactSum other) => Less(other).Unscaled == 0;

    public override int GetHashCode() => 0;

    public override string ToString()
    {
        var digits = Int128.Abs(Unscaled).ToString(CultureInfo.InvariantCulture).PadLeft(Decimals + 1, '0');
        return $"{(Unscaled < 0 ? "-" : "")}{digits[..^Decimals]}{(Decimals > 0 ? "." : "")}{digits[^Decimals..]}";
    }

    private ExactSum Plus(ExactSum other)
    {
        var decimals = Math.Max(Decimals, other.Decimals);
        return new ExactSum(Raised(decimals) + other.Raised(decimals), decimals);
    }

    private Int128 Raised(int decimals)
    {
        var raised = Unscaled;
        for (var index = Decimals; index < decimals; index++)
            raised *= 10;
        return raised;
    }
}
