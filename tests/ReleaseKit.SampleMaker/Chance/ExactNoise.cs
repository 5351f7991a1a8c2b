namespace ReleaseKit.SampleMaker.Chance;

/// <summary>
/// Noise drawn exactly, by whole-number arithmetic alone (Canonne, Kamath and Steinke 2020, "The discrete Gaussian for differential privacy",
/// algorithms 1 to 3; numbering from memory). No logarithm, no floating point: nothing that a machine could round differently.
/// </summary>
public static class ExactNoise
{
    /// <summary>True with chance e^(−part ÷ whole).</summary>
    public static bool HappensExp(UniformStream stream, UInt128 part, UInt128 whole)
    {
        for (; part > whole; part -= whole)
            if (!HappensExpUpToOne(stream, 1, 1))
                return false;
        return HappensExpUpToOne(stream, part, whole);
    }

    /// <summary>Two-sided geometric noise: chance of k proportional to e^(−|k| ÷ scale), the scale a whole number of steps.</summary>
    public static long DiscreteLaplace(UniformStream stream, int scale)
    {
        while (true)
        {
            var within = stream.Below(scale);
            if (!HappensExp(stream, (UInt128)within, (UInt128)scale))
                continue;
            var size = within + (scale * GeometricAtOne(stream));
            var negative = stream.Happens(1, 2);
            if (size != 0 || !negative)
                return negative ? -size : size;
        }
    }

    /// <summary>Discrete Gaussian noise: chance of k proportional to e^(−k² ÷ 2σ²), sigma a whole number of steps.</summary>
    public static long DiscreteGaussian(UniformStream stream, int sigma)
    {
        var scale = sigma + 1;
        var variance = (Int128)sigma * sigma;
        while (true)
        {
            var tried = DiscreteLaplace(stream, scale);
            var off = ((Int128)long.Abs(tried) * scale) - variance;
            if (HappensExp(stream, (UInt128)(off * off), (UInt128)(2 * variance * scale * scale)))
                return tried;
        }
    }

    /// <summary>
    /// Staircase noise (Geng and Viswanath 2014) with epsilon = part ÷ whole, in steps: stairs of <paramref name="sensitivity"/> steps, their upper
    /// tread <paramref name="upper"/> steps wide, each stair e^−epsilon as high as the one before. Uniform within a tread.
    /// </summary>
    public static long Staircase(UniformStream stream, int part, int whole, int sensitivity, int upper)
    {
        var stair = 0L;
        while (HappensExp(stream, (UInt128)part, (UInt128)whole))
            stair++;
        var place = PlaceOnStair(stream, part, whole, sensitivity, upper);
        var size = (stair * sensitivity) + place;
        return stream.Happens(1, 2) ? size : -size - 1;
    }

    // Upper tread with weight 1 a step, lower tread with weight e^−epsilon a step.
    private static int PlaceOnStair(UniformStream stream, int part, int whole, int sensitivity, int upper)
    {
        while (true)
        {
            var place = stream.Below(sensitivity);
            if (place < upper || HappensExp(stream, (UInt128)part, (UInt128)whole))
                return place;
        }
    }

    private static bool HappensExpUpToOne(UniformStream stream, UInt128 part, UInt128 whole)
    {
        UInt128 tries = 1;
        while (stream.Happens(part, whole * tries))
            tries++;
        return UInt128.IsOddInteger(tries);
    }

    private static long GeometricAtOne(UniformStream stream)
    {
        var count = 0L;
        while (HappensExpUpToOne(stream, 1, 1))
            count++;
        return count;
    }
}
