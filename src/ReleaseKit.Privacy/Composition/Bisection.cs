namespace ReleaseKit.Privacy.Composition;

/// <summary>The place on a line where a condition turns, to the last bit of a double.</summary>
internal static class Bisection
{
    /// <summary>The condition is false below a place and true from it on, true at <paramref name="high"/>: the smallest double found true.</summary>
    public static double FirstThat(Func<double, bool> condition, double low, double high)
    {
        for (var step = 0; step < 200; step++)
        {
            var middle = low + ((high - low) / 2);
            if (middle <= low || middle >= high)
                break;
            (low, high) = condition(middle) ? (low, middle) : (middle, high);
        }

        return high;
    }

    /// <summary>The condition is true up to a place and false beyond it, true at <paramref name="low"/>: the largest double found true.</summary>
    public static double LastThat(Func<double, bool> condition, double low, double high)
    {
        for (var step = 0; step < 200; step++)
        {
            var middle = low + ((high - low) / 2);
            if (middle <= low || middle >= high)
                break;
            (low, high) = condition(middle) ? (middle, high) : (low, middle);
        }

        return low;
    }
}
