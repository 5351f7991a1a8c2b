using System.Globalization;
using System.Text;
using System.Text.Json;
using ReleaseKit.Appraisal;
using ReleaseKit.Downloads;
using ReleaseKit.Noise;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Downloads;

/// <summary>What stands in one cell: numbers bare, text harmless.</summary>
public sealed class CellTests
{
    // CWE-1236: these beginnings run as a formula in spreadsheets; the wide forms are common practice, no source.
    [Theory]
    [InlineData("=1+1")]
    [InlineData("+49")]
    [InlineData("-2 to 3")]
    [InlineData("@sum")]
    [InlineData("\tx")]
    [InlineData("＝1")]
    public void Text_like_a_formula_is_written_behind_an_apostrophe(string text) => Assert.Equal("'" + text, SafeCell.Of(text));

    [Theory]
    [InlineData("Harrow Lane")]
    [InlineData("")]
    [InlineData("2 = 2")]
    [InlineData("'quoted")]
    public void Other_text_stays_as_it_is(string text) => Assert.Equal(text, SafeCell.Of(text));

    [Theory]
    [InlineData(0.1, "0.1")]
    [InlineData(-0.0, "0")]
    [InlineData(1e-7, "0.0000001")]
    [InlineData(-1.25e-9, "-0.00000000125")]
    [InlineData(1e21, "1000000000000000000000")]
    [InlineData(1.7976931348623157e308, null)]
    [InlineData(123456789.125, "123456789.125")]
    [InlineData(double.NaN, "")]
    [InlineData(double.PositiveInfinity, "")]
    public void Number_has_all_its_digits_and_no_exponent(double number, string? expected)
    {
        var written = PlainNumber.Of(number);
        if (expected is not null)
            Assert.Equal(expected, written);
        if (double.IsFinite(number))
            Assert.Equal(number, double.Parse(written, CultureInfo.InvariantCulture));
        Assert.DoesNotContain('E', written);
    }

    [Theory]
    [InlineData(0.95, "0.95")]
    [InlineData(0.9499999999999999, "0.95")]
    [InlineData(0.96459, "0.9645")]
    [InlineData(0.9999999, "0.9999")]
    [InlineData(1, "1")]
    public void Coverage_is_rounded_down(double share, string expected) => Assert.Equal(expected, PlainNumber.RoundedDown(share));

    [Fact]
    public void Wide_row_keeps_a_negative_number_bare_and_disarms_a_label_beside_it()
    {
        var lines = Written(stream => new WideCsv(stream, Hostile.Release.Tables[0], Hostile.Release.Coverages.Main, null)).Split("\r\n");
        Assert.StartsWith("'=cmd(),-7,", lines[1], StringComparison.Ordinal);
    }

    // A CSV that counts in thousands: value, margin and range stand in the figure's own unit, so that they go together.
    [Fact]
    public void Value_with_a_multiplier_is_written_in_the_unit_of_its_margin()
    {
        var thousands = SmallRelease.Measure(MeasureKind.Count) with { Multiplier = 1000 };
        var noise = new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(4000) with { Grid = 1000 });
        var release = new SmallRelease().Figures(thousands, [noise], new byte[1], "12").Appraise();
        var stream = new MemoryStream();
        using (var file = new WideCsv(stream, release.Release.Tables[0], release.Release.Coverages.Main, null))
            file.Add(0, [release.Figure(new FigureRef(0, 0, 0))]);
        Assert.Contains("r1,12000,8000,4000,20000,weak,A", Encoding.UTF8.GetString(stream.ToArray()), StringComparison.Ordinal);
    }

    [Fact]
    public void Label_with_comma_quote_and_line_end_is_one_cell()
    {
        var text = Written(stream => new LongCsv(stream, Hostile.Release.Tables[0]));
        using var csv = CsvHelper.CsvReader.FromText(text);
        var labels = new List<string>();
        while (csv.Read())
            labels.Add(csv.GetString("row"));
        Assert.Equal(["'=cmd()", "a, \"b\"\nc"], labels);
    }

    [Fact]
    public void Json_line_keeps_a_label_as_it_is()
    {
        var lines = Written(stream => new JsonLines(stream, Hostile.Release.Tables[0])).TrimEnd('\n').Split('\n');
        Assert.Equal(["=cmd()", "a, \"b\"\nc"], lines.Select(line => JsonDocument.Parse(line).RootElement.GetProperty("stub").GetProperty("row").GetString()));
    }

    private static IAppraisedRelease Hostile { get; } = new SmallRelease
    {
        Coverages = new Coverages(Coverage.OfShare(0.95), Coverage.OfShare(0.5), Coverage.OfShare(0.99)),
    }.Stub("row", null, "=cmd()", "a, \"b\"\nc").Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(5), "-7", "12").Appraise();

    private static string Written(Func<Stream, IRowFile> open)
    {
        var stream = new MemoryStream();
        using (var file = open(stream))
            for (var row = 0; row < 2; row++)
                file.Add(row, [Hostile.Figure(new FigureRef(0, 0, row))]);
        return Encoding.UTF8.GetString(stream.ToArray());
    }
}
