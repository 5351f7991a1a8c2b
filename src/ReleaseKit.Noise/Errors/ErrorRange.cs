namespace ReleaseKit.Noise.Errors;

/// <summary>The range of values before noise that goes with one published figure at one coverage, in the figure's unit.</summary>
/// <param name="Low">Lower end, cut to the possible values.</param>
/// <param name="High">Upper end, cut to the possible values.</param>
/// <param name="UncutLow">Lower end before the cut, and before a range above what is possible is made wider.</param>
/// <param name="UncutHigh">Upper end before the cut, and before a range below what is possible is made wider.</param>
/// <param name="Attained">A lower bound on the coverage, whatever the value before noise is.</param>
public readonly record struct ErrorRange(double Low, double High, double UncutLow, double UncutHigh, double Attained);
