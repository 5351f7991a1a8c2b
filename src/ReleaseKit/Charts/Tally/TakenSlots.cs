namespace ReleaseKit.Charts.Tally;

/// <summary>Lines of text beside the stick, counted outward from it, and what stands on each already.</summary>
internal sealed class TakenSlots(int count)
{
    private const double Space = 9;

    private readonly List<(double From, double To)>[] taken = [.. Enumerable.Range(0, count).Select(_ => new List<(double, double)>())];

    public int Count => taken.Length;

    public void Take(int slot, double from, double to) => taken[slot].Add((from, to));

    public bool IsFree(int slot, double from, double to) => taken[slot].TrueForAll(other => to + Space <= other.From || other.To + Space <= from);

    /// <summary>A leader line to a slot stands in every slot before it.</summary>
    public bool IsFreeUpTo(int slot, double at) => Enumerable.Range(0, slot).All(before => IsFree(before, at - 1, at + 1));

    public void TakeUpTo(int slot, double at)
    {
        for (var before = 0; before < slot; before++)
            Take(before, at - 1, at + 1);
    }
}
