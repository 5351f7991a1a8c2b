using ReleaseKit.Appraisal;

namespace ReleaseKit.Pages.HowToRead;

/// <summary>The shown figures of the first rows of each table: enough to find examples, whatever the size of a release.</summary>
internal static class FirstRows
{
    private const int RowsOfEachTable = 500;

    public static IEnumerable<AppraisedFigure> Of(IAppraisedRelease appraised) =>
        from table in Enumerable.Range(0, appraised.Release.Tables.Count)
        from row in Enumerable.Range(0, Math.Min(RowsOfEachTable, appraised.Release.Tables[table].RowCount))
        from measure in Enumerable.Range(0, appraised.Release.Tables[table].Measures.Count)
        where appraised.Release.Tables[table].Measures[measure].Shown
        select appraised.Figure(new FigureRef(table, measure, row));
}
