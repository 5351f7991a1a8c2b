using System.Globalization;
using System.Text.Json;
using ReleaseKit.SampleMaker.Tables;
using Xunit;

namespace ReleaseKit.Tests.Sample;

/// <summary>The published tables are what the program draws, and nothing of what it knows besides.</summary>
public sealed class SampleTablesTests
{
    private static readonly JsonDocumentOptions AsRead = new() { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true };

    public static TheoryData<string> Tables => [.. SampleRelease.Maker.Noised().Select(table => table.File)];

    [Theory]
    [MemberData(nameof(Tables))]
    public void Table_drawn_again_has_the_bytes_of_the_published_one(string file)
    {
        var drawn = Drawn(file);
        var published = File.ReadAllText(Path.Combine(SampleRelease.Folder, "tables", file));
        Assert.Equal(drawn.Csv, published);
    }

    [Fact]
    public void Folder_holds_the_tables_that_are_drawn_and_no_other()
    {
        var files = Directory.GetFiles(Path.Combine(SampleRelease.Folder, "tables")).Select(Path.GetFileName).Order(StringComparer.Ordinal);
        Assert.Equal(SampleRelease.Maker.Noised().Select(table => table.File).Order(StringComparer.Ordinal), files);
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Table_has_the_columns_that_release_json_declares_and_no_other(string file)
    {
        var columns = File.ReadLines(Path.Combine(SampleRelease.Folder, "tables", file)).First().Split(',');
        var release = JsonDocument.Parse(File.ReadAllText(Path.Combine(SampleRelease.Folder, "release.json")), AsRead).RootElement;
        var table = release.GetProperty("tables").EnumerateArray().Single(table => table.GetProperty("file").GetString() == "tables/" + file);
        Assert.Equal(DeclaredColumns(table).Order(StringComparer.Ordinal), columns.Order(StringComparer.Ordinal));
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void No_column_holds_the_values_before_noise(string file)
    {
        var drawn = Drawn(file);
        for (var before = 0; before < drawn.Columns.Count; before++)
            for (var column = 0; column < drawn.Columns.Count; column++)
                Assert.False(IsTheSame(drawn, before, column), $"{drawn.Columns[column]} repeats {drawn.Columns[before]} before noise.");
    }

    [Fact]
    public void Draws_with_another_seed_differ_in_every_noised_column()
    {
        foreach (var (one, other) in SampleRelease.Maker.Noised(1).Zip(SampleRelease.Maker.Noised(2)))
            for (var column = 0; column < one.Columns.Count; column++)
                if (one.Rows.Any(row => row.Cells[column].Before is not null))
                    Assert.NotEqual(one.Rows.Select(row => row.Cells[column].Printed), other.Rows.Select(row => row.Cells[column].Printed));
    }

    [Fact]
    public void Sample_shows_negative_zero_and_hidden_cells()
    {
        var cells = SampleRelease.Maker.Noised().SelectMany(table => table.Rows).SelectMany(row => row.Cells).ToList();
        Assert.True(cells.Count(cell => cell.Before is not null && cell.Printed.StartsWith('-')) >= 2);
        Assert.True(cells.Count(cell => cell.Before is not null && cell.Printed == "0") >= 2);
        Assert.Contains(cells, cell => cell.Printed == "[c]");
    }

    private static SampleTable Drawn(string file) => SampleRelease.Maker.Noised().Single(table => table.File == file);

    private static IEnumerable<string> DeclaredColumns(JsonElement table)
    {
        var figures = table.GetProperty("figures").EnumerateArray().Select(figure => figure.GetProperty("column").GetString()!).ToList();
        var stub = table.GetProperty("stub").EnumerateArray().Select(column => column.GetProperty("column").GetString()!);
        var aside = table.TryGetProperty("columns", out var columns) ? columns.EnumerateObject().Select(column => column.Name) : [];
        var statuses = table.TryGetProperty("statuses", out var given) && given.TryGetProperty("column", out var pattern)
            ? figures.Select(figure => pattern.GetString()!.Replace("*", figure, StringComparison.Ordinal))
            : [];
        return [.. stub, .. figures, .. aside, .. statuses];
    }

    // Where a column's noise happens to be 0 in a few rows nothing is given away; a column that agrees in every noised row would give all.
    private static bool IsTheSame(SampleTable table, int before, int column)
    {
        var noised = table.Rows.Where(row => row.Cells[before].Before is not null).ToList();
        return noised.Count > 0 && noised.All(row =>
            double.TryParse(row.Cells[column].Printed, NumberStyles.Float, CultureInfo.InvariantCulture, out var printed) && printed == row.Cells[before].Before);
    }
}
