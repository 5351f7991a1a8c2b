using ReleaseKit.Noise;

namespace ReleaseKit.Wording;

/// <summary>A chance as "95 of 100".</summary>
public readonly record struct NaturalFrequency(long Cases, long All)
{
    private const long LargestAll = 1_000_000;

    /// <summary>A coverage as declared: of 100 if that is a whole number, else of 1,000 and so on. Never rounded up.</summary>
    public static NaturalFrequency Of(Coverage coverage)
    {
        var share = (decimal)coverage.Share;
        for (var all = 100L; ; all *= 10)
            if (share * all == decimal.Floor(share * all) || all == LargestAll)
                return new((long)decimal.Floor(share * all), all);
    }

    /// <summary>A chance that is a bound from above, of so many cases. Never rounded down.</summary>
    public static NaturalFrequency UpTo(double chance, long all) => new((long)decimal.Ceiling(decimal.Round((decimal)chance, 12) * all), all);

    /// <summary>
    /// A chance worked out, rounded down, of the smallest of 100, 1,000, … 1,000,000 at which it looks neither certain nor impossible:
    /// 0.9999 is 9,999 of 10,000, not 99 or 100 of 100.
    /// </summary>
    public static NaturalFrequency About(double chance)
    {
        for (var all = 100L; ; all *= 10)
        {
            var cases = Math.Round(chance * all, 9);
            if (all == LargestAll || (cases >= 1 && Math.Round(cases) < all))
                return new(Math.Min((long)cases, all - 1), all);
        }
    }
}
