namespace ReleaseKit.Appraisal;

/// <summary>One cell: the index of its table in the release, of its measure in the table, of its row in the table.</summary>
public readonly record struct FigureRef(int Table, int Measure, int Row);
