using ReleaseKit.Reading;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>The example folder of the format's description (tests/reference/example), and the small folder that other tests start from.</summary>
public sealed class ExampleTests
{
    private static readonly Lazy<ReadOutcome> Example = new(() => ReleaseFolder.Read(Repository.Example));

    [Fact]
    public void Example_reads_without_a_finding() => Assert.Empty(Example.Value.Findings.Select(finding => $"{finding.Slug} {finding.At} {finding.Found}"));

    [Fact]
    public void Small_folder_reads_without_a_finding()
    {
        using var folder = new TestFolder();
        Assert.Empty(folder.Read().Findings.Select(finding => $"{finding.Slug} {finding.At} {finding.Found}"));
    }

    [Fact]
    public void Sample_reads_without_a_stop() =>
        Assert.Empty(ReleaseFolder.Read(Repository.Sample).Findings.Where(finding => finding.Level == ReleaseKit.Review.FindingLevel.Stop).Select(finding => $"{finding.Slug} {finding.At} {finding.Found}"));

    [Fact]
    public void Example_table_holds_the_digits_of_its_file()
    {
        var table = Example.Value.Release!.Tables[1];
        Assert.Equal(["212.98", "187.78", "229.85"], Enumerable.Range(0, table.RowCount).Select(row => table.Measures[0].ValueAt(row).ToString()));
    }

    [Fact]
    public void Example_rows_follow_the_first_rule_that_fits()
    {
        var arrears = Example.Value.Release!.Tables[0].Measures[1];
        string MechanismOf(int row) => ((NoiseRule.FromMechanism)arrears.RuleAt(row)).Mechanism.Id;
        Assert.Equal(["total-arrears", "district-arrears", "ward-arrears"], new[] { 0, 1, 2 }.Select(MechanismOf));
    }
}
