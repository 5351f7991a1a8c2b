namespace ReleaseKit.Noise.Errors;

/// <summary>Rounding of whole steps to multiples of a whole number of steps.</summary>
internal readonly record struct Rounding(long Unit, RoundingHow How, RoundingTies Ties)
{
    /// <summary>
    /// The smallest step that is rounded to the given multiple (its number, not its value) or to a higher one; random rounding adds a
    /// uniform 0..Unit − 1 to the step and then rounds down, so that a step goes up with the chance that its remainder is of the unit.
    /// </summary>
    public long First(long number) => How switch
    {
        RoundingHow.Down or RoundingHow.AtRandom => number * Unit,
        RoundingHow.Up => (number - 1) * Unit + 1,
        _ => number * Unit - Unit / 2 + (Unit % 2 == 0 && !TieGoesUpTo(number) ? 1 : 0),
    };

    private bool TieGoesUpTo(long number) => Ties switch
    {
        RoundingTies.Away => number > 0,
        RoundingTies.Up => true,
        _ => number % 2 == 0,
    };
}
