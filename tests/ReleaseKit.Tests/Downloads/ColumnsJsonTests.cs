using System.Text.Json;
using ReleaseKit.Downloads;
using Xunit;

namespace ReleaseKit.Tests.Downloads;

/// <summary>CSVW metadata against the files they describe.</summary>
public sealed class ColumnsJsonTests(SampleDownloads downloads) : IClassFixture<SampleDownloads>
{
    public static TheoryData<int> Tables => [0, 1, 2, 3, 4, 5];

    [Theory]
    [MemberData(nameof(Tables))]
    public void Every_column_of_every_file_is_described_in_its_order(int table)
    {
        foreach (var described in Group(table).GetProperty("tables").EnumerateArray())
        {
            var titles = Columns(described).Select(column => column.GetProperty("titles").GetString());
            var headers = File.ReadLines(downloads.PathOf("downloads/" + described.GetProperty("url").GetString())).First().Split(',');
            Assert.Equal(headers, titles);
            Assert.All(Columns(described), column => Assert.NotEqual("", column.GetProperty("dc:description").GetString()));
        }
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Columns_called_decimal_hold_numbers_or_nothing(int table)
    {
        foreach (var described in Group(table).GetProperty("tables").EnumerateArray())
        {
            var numbers = Columns(described).Where(column => column.GetProperty("datatype").GetString() == "decimal").Select(column => column.GetProperty("titles").GetString()!);
            var rows = downloads.Rows("downloads/" + described.GetProperty("url").GetString());
            Assert.All(numbers, number => Assert.All(rows, row => Assert.Matches("^(-?[0-9]+([.][0-9]+)?)?$", row[number])));
        }
    }

    [Fact]
    public void Primary_key_tells_the_rows_of_each_file_apart()
    {
        for (var table = 0; table < downloads.Release.Tables.Count; table++)
            foreach (var described in Group(table).GetProperty("tables").EnumerateArray())
            {
                var key = described.GetProperty("tableSchema").GetProperty("primaryKey").EnumerateArray().Select(name => Uri.UnescapeDataString(name.GetString()!)).ToList();
                var rows = downloads.Rows("downloads/" + described.GetProperty("url").GetString());
                Assert.Equal(rows.Count, rows.Select(row => string.Join('\n', key.Select(name => row[name]))).Distinct().Count());
            }
    }

    private JsonElement Group(int table) =>
        JsonDocument.Parse(File.ReadAllText(downloads.PathOf(DownloadNames.Columns(downloads.Release.Tables[table])))).RootElement;

    private static IEnumerable<JsonElement> Columns(JsonElement described) =>
        described.GetProperty("tableSchema").GetProperty("columns").EnumerateArray();
}
