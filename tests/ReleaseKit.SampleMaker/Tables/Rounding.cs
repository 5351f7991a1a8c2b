namespace ReleaseKit.SampleMaker.Tables;

public static class Rounding
{
    /// <summary>The nearest multiple of the unit, ties away from zero.</summary>
    public static long ToNearest(long value, long unit) => Math.Sign(value) * ((2 * Math.Abs(value)) + unit) / (2 * unit) * unit;

    /// <summary>part × factor ÷ whole, to the nearest whole number; all are at least 0.</summary>
    public static long Ratio(long part, long factor, long whole) => ((2 * part * factor) + whole) / (2 * whole);
}
