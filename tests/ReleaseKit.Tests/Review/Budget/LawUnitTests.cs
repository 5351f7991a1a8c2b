using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Budget;

/// <summary>Hours lit, in thousands in the CSV, whose law is given in thousands of hours or in hours.</summary>
public sealed class LawUnitTests
{
    private const string Count = "\"title\": \"Lamps lit\", \"unit\": \"lamp\", \"kind\": \"count\",";
    private const string AllIsSum = "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ";

    private static TestFolder Folder(string mechanism, string kind = "amount", string values = "7.114,3.106,2.008,2") => new TestFolder()
        .With("tables/lamps.csv", $"street,lit,broken,lamps\nAll,{values.Split(',')[0]},9,650\nKiln Row,{values.Split(',')[1]},4,50\nQuay,{values.Split(',')[2]},5,200\nWeir Lane,{values.Split(',')[3]},-1,400\n")
        .Edit("release.json", "\"figures\": [\n", "\"columns\": { \"lamps\": { \"from\": \"public\" } }, \"figures\": [\n")
        .Edit("release.json", Count, $"\"title\": \"Hours lit\", \"unit\": \"hour\", \"kind\": \"{kind}\", \"multiplier\": 1000,")
        .Edit("release.json", AllIsSum, "")
        .WithLit($$"""{ "id": "lamps-lit", {{mechanism}} }""");

    // The deviation 0.9 is below 1000 ÷ 10³ = 1; Laplace has √2 times its scale.
    [Theory]
    [InlineData("\"law\": \"gaussian\", \"sigma\": 0.9")]
    [InlineData("\"law\": \"laplace\", \"scale\": 0.7")]
    public void Continuous_noise_below_the_last_digit_of_the_file_is_a_caution(string law)
    {
        using var folder = Folder($"{law}, \"sensitivity\": {{ \"cellsPerUnit\": 1, \"perCell\": 0.4 }}");
        var text = folder.Text("noise-below-unit");
        Assert.StartsWith("Caution mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains("is smaller than 1 for the most part, but column \"lit\" of table \"lamps\" has \"multiplier\": 1000 and its digits move in steps of 1.", text, StringComparison.Ordinal);
        Assert.Contains("write the numbers of the law, of \"sensitivity\" and of \"clipped\" 1000 times as large;", text, StringComparison.Ordinal);
        folder.Edit("mechanisms.json", law, law + ", \"afterwards\": [ { \"roundTo\": 1 } ]");
        folder.HasNo("noise-below-unit");
    }

    [Theory]
    [InlineData("\"law\": \"gaussian\", \"sigma\": 900")]
    [InlineData("\"law\": \"laplace\", \"scale\": 0.8")]
    public void Continuous_noise_of_the_size_of_the_digits_passes(string law)
    {
        using var folder = Folder($"{law}, \"sensitivity\": {{ \"cellsPerUnit\": 1, \"perCell\": 400 }}");
        folder.HasNo("noise-below-unit");
    }

    // 205 hours and more, where contributions end at 0.4 hours: clipped at 0.4 thousand.
    [Fact]
    public void Means_far_outside_their_clipping_are_a_stop()
    {
        using var folder = Folder("\"law\": \"gaussian\", \"sigma\": 9, \"clipped\": { \"from\": 0, \"to\": 0.4 }, \"denominator\": { \"public\": \"lamps\" }, \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 0.008 }", "mean", "0.231,0.207,0.301,0.205");
        var text = folder.Text("mean-outside-clipped");
        Assert.StartsWith("Stop mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains("lamps/lit?street=All is 0.231 in the CSV, which is 231 with \"multiplier\": 1000, but \"lamps-lit\" clips what goes into the means of column \"lit\" to 0 to 0.4.", text, StringComparison.Ordinal);
        Assert.Contains("1000 times as large; else correct \"clipped\" or \"multiplier\".", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Means_within_their_clipping_pass()
    {
        using var folder = Folder("\"law\": \"gaussian\", \"sigma\": 9, \"clipped\": { \"from\": 0, \"to\": 400 }, \"denominator\": { \"public\": \"lamps\" }, \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 8 }", "mean", "0.231,0.207,0.301,0.405");
        folder.HasNo("mean-outside-clipped");
    }
}
