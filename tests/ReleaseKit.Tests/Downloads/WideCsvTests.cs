using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Downloads;
using ReleaseKit.Noise;
using Xunit;

namespace ReleaseKit.Tests.Downloads;

public sealed class WideCsvTests(SampleDownloads downloads) : IClassFixture<SampleDownloads>
{
    public static TheoryData<int> Tables => [0, 1, 2, 3, 4, 5];

    [Theory]
    [MemberData(nameof(Tables))]
    public void Figure_stands_digit_for_digit_with_its_margin_and_range(int table)
    {
        foreach (var (figure, cells) in Cells(table, DownloadNames.Wide(downloads.Release.Tables[table])))
            AssertNumbers(figure, figure.Main, cells);
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Reading_is_the_one_of_the_language(int table)
    {
        foreach (var (figure, cells) in Cells(table, DownloadNames.Wide(downloads.Release.Tables[table])))
            Assert.Equal(downloads.Language.ReadingOf(figure).Text, cells("_reading"));
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Range_holds_the_figure_wherever_the_figure_is_possible(int table)
    {
        foreach (var (figure, cells) in Cells(table, DownloadNames.Wide(downloads.Release.Tables[table])))
        {
            if (figure.Main is null || figure.Value.ToDouble() < 0)
                continue;
            Assert.InRange(figure.Value.ToDouble(), Number(cells("_low")), Number(cells("_high")));
            Assert.True(Number(cells("_margin")) > 0);
        }
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Other_coverages_have_files_of_their_own_without_readings(int table)
    {
        var of = downloads.Release.Tables[table];
        foreach (var coverage in new[] { downloads.Release.Coverages.Lower, downloads.Release.Coverages.Upper })
        {
            var file = DownloadNames.WideAt(of, coverage);
            Assert.DoesNotContain(downloads.Rows(file)[0].Keys, name => name.EndsWith("_reading", StringComparison.Ordinal));
            foreach (var (figure, cells) in Cells(table, file))
                AssertNumbers(figure, figure.Ranges.FirstOrDefault(range => range.Coverage == coverage), cells);
        }
    }

    [Fact]
    public void Files_of_other_coverages_are_named_by_them()
    {
        var table = downloads.Release.Tables[0];
        Assert.Equal("downloads/arrears-50.csv", DownloadNames.WideAt(table, downloads.Release.Coverages.Lower));
        Assert.Equal("downloads/arrears-99.csv", DownloadNames.WideAt(table, downloads.Release.Coverages.Upper));
        Assert.Equal("downloads/arrears-99.9.csv", DownloadNames.WideAt(table, Coverage.OfShare(0.999)));
    }

    // RFC 4180, section 2: records end with CRLF. The sample has no cell with a line end of its own.
    [Fact]
    public void Records_end_with_carriage_return_and_line_feed_and_there_is_no_byte_order_mark()
    {
        var bytes = File.ReadAllBytes(downloads.PathOf("downloads/arrears.csv"));
        Assert.Equal((byte)'d', bytes[0]);
        Assert.Equal(bytes.Count(each => each == '\n'), Enumerable.Range(1, bytes.Length - 1).Count(at => bytes[at] == '\n' && bytes[at - 1] == '\r'));
    }

    private IEnumerable<(AppraisedFigure Figure, Func<string, string> Cell)> Cells(int table, string file)
    {
        var rows = downloads.Rows(file);
        Assert.Equal(downloads.Release.Tables[table].RowCount, rows.Count);
        foreach (var figure in downloads.Figures(table))
        {
            foreach (var column in figure.Table.Stub)
                Assert.Equal(column.LabelOf(figure.Row).Value, rows[figure.Row][column.Column]);
            yield return (figure, ending => rows[figure.Row][figure.Measure.Column + ending]);
        }
    }

    private static void AssertNumbers(AppraisedFigure figure, FigureRange? range, Func<string, string> cell)
    {
        Assert.Equal(figure.HasNumber ? figure.Value.ToString() : "", cell(""));
        Assert.Equal(range?.Margin, NumberOrNull(cell("_margin")));
        Assert.Equal(range?.Low, NumberOrNull(cell("_low")));
        Assert.Equal(range?.High, NumberOrNull(cell("_high")));
        Assert.Equal(ReliabilityWord.Of(figure.Reliability), cell("_reliability"));
        Assert.Equal(figure.Status.ToString(), cell("_status"));
    }

    private static double Number(string cell) => double.Parse(cell, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture);

    private static double? NumberOrNull(string cell) => cell.Length == 0 ? null : Number(cell);
}
