using System.Globalization;
using ReleaseKit.Tests.Folders;
using ReleaseKit.Tests.Review.Budget;
using Xunit;

namespace ReleaseKit.Tests.Review.Leaks;

/// <summary>Lamps broken, one lamp more or less, and a column that comes from the records. The noise is discrete Laplace of scale 3: its variance is 17.8.</summary>
public sealed class ConfidentialCountTests
{
    private static readonly int[] Noise = [2, -3, 0, 5, -1, 1, -6, 3, 0, -2];

    private static TestFolder Folder(Func<int, int> column, string side = "\"from\": \"confidential\"", int streets = 10) => new TestFolder()
        .With("tables/lamps.csv", "street,lit,broken,kept\n" + string.Concat(Enumerable.Range(0, streets)
            .Select(street => string.Create(CultureInfo.InvariantCulture, $"Row {street},{(street * 7) + 11},{(street * 11) + Noise[street]},{column(street)}\n"))))
        .Edit("release.json", "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ", "")
        .Edit("release.json", "\"figures\": [\n", $"\"columns\": {{ \"kept\": {{ {side} }} }}, \"figures\": [\n")
        .Edit("mechanisms.json", "\"who\": { \"one\": \"keeper\", \"other\": \"keepers\" }", "\"who\": \"lamp\"");

    [Fact]
    public void Counts_before_noise_in_a_confidential_column_are_a_stop()
    {
        using var folder = Folder(street => street * 11);
        var text = folder.Text("exact-unit-count");
        Assert.StartsWith("Stop release.json:", text, StringComparison.Ordinal);
        Assert.Contains("Column \"kept\" of table \"lamps\" is \"from\": \"confidential\" without a mechanism, and its numbers are those of \"broken\" but for the noise: exact numbers of lamps.", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Replaced_lamps_leave_their_number_as_it_is()
    {
        using var folder = Folder(street => street * 11).Edit("mechanisms.json", "\"add-or-remove\"", "\"replace\"");
        folder.HasNo("exact-unit-count");
        Assert.Contains("comes from the confidential records", folder.Text("confidential-column"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"from\": \"confidential\"", 40, 10)]
    [InlineData("\"from\": \"public\"", 0, 10)]
    [InlineData("\"from\": \"confidential\", \"mechanism\": \"lamps-lit\"", 0, 10)]
    [InlineData("\"from\": \"confidential\"", 0, 7)]
    public void Other_numbers_public_ones_noised_ones_and_few_of_them_pass(string side, int more, int streets)
    {
        using var folder = Folder(street => (street * 11) + more, side, streets);
        folder.HasNo("exact-unit-count");
    }
}
