namespace ReleaseKit.Privacy.Losses;

/// <summary>A number of cells that are each moved by at most the same amount.</summary>
/// <param name="Shift">At most this far, ≥ 0, in the unit of the figure.</param>
/// <param name="Cells">How many cells, ≥ 0.</param>
internal readonly record struct ShiftRun(double Shift, long Cells);
