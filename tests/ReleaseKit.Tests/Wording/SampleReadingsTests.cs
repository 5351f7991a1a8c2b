using ReleaseKit.Appraisal;
using ReleaseKit.Reading;
using ReleaseKit.Tests.Sample;
using Xunit;

namespace ReleaseKit.Tests.Wording;

/// <summary>Every figure of the sample release, read aloud and read back.</summary>
public sealed class SampleReadingsTests
{
    private static readonly IAppraisedRelease Release = AppraisedRelease.Of(ReleaseFolder.Read(SampleRelease.Folder).Release!);

    private static IEnumerable<AppraisedFigure> Figures =>
        from table in Enumerable.Range(0, Release.Release.Tables.Count)
        from measure in Enumerable.Range(0, Release.Release.Tables[table].Measures.Count)
        from row in Enumerable.Range(0, Release.Release.Tables[table].RowCount)
        select Release.Figure(new FigureRef(table, measure, row));

    [Fact]
    public void Every_reading_of_the_sample_reads_back()
    {
        foreach (var figure in Figures)
            Assert.True(ReadingBack.Faults(figure, English.Language.ReadingOf(figure)) is [], $"{figure.Address}: {English.Language.ReadingOf(figure).Text}");
    }

    [Fact]
    public void Every_reading_of_the_sample_is_at_grade_eight_or_below()
    {
        foreach (var figure in Figures)
        {
            var reading = English.Language.ReadingOf(figure);
            Assert.True(Readability.Grade([.. reading.Sentences.Select(sentence => sentence.Text)]) <= 8, $"{figure.Address}: {reading.Text}");
        }
    }

    [Fact]
    public void Every_figure_of_the_sample_with_noise_has_a_margin() =>
        Assert.Empty(Figures.Where(figure => figure.Case.First == SpecialCase.NoMargin).Select(figure => figure.Address));

    [Fact]
    public void Every_table_of_the_sample_has_its_notes()
    {
        for (var table = 0; table < Release.Release.Tables.Count; table++)
            Assert.NotEmpty(English.Language.NotesOf(Release.FactsOf(table)));
    }
}
