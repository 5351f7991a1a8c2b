namespace ReleaseKit.Noise;

/// <summary>e^x − 1 and ln(1 + x) without loss of digits near 0, which the runtime's own do not give.</summary>
internal static class Elementary
{
    /// <summary>e^x − 1 (Higham 2002, Accuracy and Stability of Numerical Algorithms, section 1.14.1, after W. Kahan; from
    /// memory).</summary>
    public static double ExpM1(double x)
    {
        var u = Math.Exp(x);
        // Away from 0 nothing cancels, and the logarithm of a u too small for a full double has lost digits.
        if (Math.Abs(x) > 1)
            return u - 1;
        return u == 1 ? x : (u - 1) * (x / Math.Log(u));
    }

    /// <summary>ln(1 + x), x &gt; −1 (Higham 2002, problem 1.5, after W. Kahan; from memory).</summary>
    public static double Log1P(double x)
    {
        var u = 1 + x;
        return u == 1 ? x : Math.Log(u) * (x / (u - 1));
    }
}
