namespace ReleaseKit.Privacy.Losses;

/// <summary>A part of the loss of a mechanism: a number of cells of one law that are each moved by at most one shift.</summary>
/// <param name="Loss">The loss of their law.</param>
/// <param name="Shift">In the unit of the figure.</param>
/// <param name="Cells">How many cells.</param>
public sealed record LossTerm(LawLoss Loss, double Shift, long Cells);
