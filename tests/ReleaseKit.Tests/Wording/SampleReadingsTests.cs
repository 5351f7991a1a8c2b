using ReleaseKit.Appraisal;
using ReleaseKit.Reading;
using Xunit;

namespace ReleaseKit.Tests.Wording;

/// <summary>Every figure of the sample release and of the example in the format's description, read aloud and read back.</summary>
public sealed class SampleReadingsTests
{
    private static readonly IReadOnlyList<IAppraisedRelease> Releases = [Appraise(Repository.Sample), Appraise(Repository.Example)];

    private static IEnumerable<AppraisedFigure> Figures =>
        from release in Releases
        from table in Enumerable.Range(0, release.Release.Tables.Count)
        from measure in Enumerable.Range(0, release.Release.Tables[table].Measures.Count)
        from row in Enumerable.Range(0, release.Release.Tables[table].RowCount)
        select release.Figure(new FigureRef(table, measure, row));

    private static IAppraisedRelease Appraise(string folder) => AppraisedRelease.Of(ReleaseFolder.Read(folder).Release!);

    [Fact]
    public void Every_reading_reads_back()
    {
        foreach (var figure in Figures)
            Assert.True(ReadingBack.Faults(figure, English.Language.ReadingOf(figure)) is [], $"{figure.Address}: {English.Language.ReadingOf(figure).Text}");
    }

    [Fact]
    public void Every_reading_is_at_grade_eight_or_below()
    {
        foreach (var figure in Figures)
        {
            var reading = English.Language.ReadingOf(figure);
            Assert.True(Readability.Grade([.. reading.Sentences.Select(sentence => sentence.Text)]) <= 8, $"{figure.Address}: {reading.Text}");
        }
    }

    [Fact]
    public void Every_figure_with_noise_has_a_margin() =>
        Assert.Empty(Figures.Where(figure => figure.Case.First == SpecialCase.NoMargin).Select(figure => figure.Address));

    /// <summary>Its counts of households cut off are added up; its means have noise of their own and are no totals.</summary>
    [Fact]
    public void Table_of_quarters_speaks_of_sums_for_the_count_only()
    {
        var quarters = Releases[0].Release.Tables.ToList().FindIndex(table => table.Id == "quarters");
        var notes = English.Language.NotesOf(Releases[0].FactsOf(quarters));
        Assert.Equal(["The totals of “Households cut off” are sums of the published parts."], notes.Where(note => note.Contains("total", StringComparison.Ordinal)));
    }

    [Fact]
    public void Every_table_has_its_notes()
    {
        foreach (var release in Releases)
            for (var table = 0; table < release.Release.Tables.Count; table++)
                Assert.NotEmpty(English.Language.NotesOf(release.FactsOf(table)));
    }
}
