using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Budget;

/// <summary>
/// How a total is printed: its ε or ρ, and its δ, rounded the same way, so that in print it stays the bound that it is. A smaller δ needs a larger ε:
/// of a lower bound both may be rounded down.
/// </summary>
internal sealed record LossDigits(Func<double, PublishedValue> Loss, Func<double, PublishedValue> Delta)
{
    private const int OfLoss = 4;
    private const int OfDelta = 2;
    private const int OfSum = 12;

    /// <summary>An upper bound.</summary>
    public static LossDigits Up { get; } = new(loss => LossPrint.UpTo(loss, OfLoss), LossPrint.Delta);

    /// <summary>A lower bound.</summary>
    public static LossDigits Down { get; } = new(loss => LossPrint.DownTo(loss, OfLoss), delta => LossPrint.Shortest(LossPrint.DownTo(delta, OfDelta)));

    /// <summary>What the office wrote.</summary>
    public static LossDigits AsWritten { get; } = new(LossPrint.AsWritten, LossPrint.AsWritten);

    /// <summary>The sum of what the office wrote, without what binary arithmetic adds to it.</summary>
    public static LossDigits SumAsWritten { get; } = new(Sum, Sum);

    private static PublishedValue Sum(double number) => LossPrint.Shortest(LossPrint.UpTo(number, OfSum));
}
