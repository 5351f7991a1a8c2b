using System.Globalization;
using ReleaseKit.Downloads;
using Xunit;

namespace ReleaseKit.Tests.Downloads;

public sealed class LongCsvTests(SampleDownloads downloads) : IClassFixture<SampleDownloads>
{
    [Fact]
    public void Addresses_are_as_many_as_figures_and_each_means_its_own()
    {
        var rows = downloads.Release.Tables.SelectMany(table => downloads.Rows(DownloadNames.Long(table))).ToList();
        Assert.Equal(downloads.Release.Tables.Sum(table => table.RowCount * table.Measures.Count), rows.Select(row => row["address"]).Distinct().Count());
        foreach (var row in rows)
        {
            var figure = downloads.Appraised.FigureAt(row["address"]);
            Assert.Equal(figure.HasNumber ? figure.Value.ToString() : "", row["value"]);
            Assert.Equal(figure.Measure.Column, row["figure"]);
        }
    }

    [Fact]
    public void Columns_stand_in_the_declared_order()
    {
        string[] expected =
        [
            "address", "district", "ward", "figure", "value", "margin", "noise_margin", "low", "high", "uncut_low", "uncut_high",
            "coverage", "reliability", "status", "changed",
        ];
        Assert.Equal(expected, File.ReadLines(downloads.PathOf("downloads/arrears-long.csv")).First().Split(','));
    }

    [Fact]
    public void Coverage_is_the_attained_one_and_never_above_it()
    {
        for (var table = 0; table < downloads.Release.Tables.Count; table++)
        {
            var rows = downloads.Rows(DownloadNames.Long(downloads.Release.Tables[table]));
            foreach (var (figure, row) in downloads.Figures(table).Zip(rows))
            {
                if (figure.Main is not { } range)
                    Assert.Equal("", row["coverage"]);
                else
                    Assert.InRange(double.Parse(row["coverage"], CultureInfo.InvariantCulture), range.Attained - 1.01e-4, range.Attained + 1e-12);
            }
        }
    }
}
