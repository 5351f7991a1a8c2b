using ReleaseKit.Appraisal;

namespace ReleaseKit.Downloads;

/// <summary>A file that is written row by row while a table passes once.</summary>
internal interface IRowFile : IDisposable
{
    /// <param name="row">Index of the row in the table.</param>
    /// <param name="figures">Its figures, one a measure, in the order of the table.</param>
    void Add(int row, IReadOnlyList<AppraisedFigure> figures);
}
