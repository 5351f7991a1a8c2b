using ReleaseKit.Review;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>The layout of messages, against the worked example in the description of the commands.</summary>
public sealed class FindingTextTests
{
    private static readonly Finding Example = new(
        FindingLevel.Stop, "spent-too-low", FindingOwner.Noise, new Place("mechanisms.json", 12, 16),
        "\"ward-arrears\" declares rho 0.0054\nSigma 9.5 with 1 cell a household, 1 a cell, costs 0.005540167.",
        "the budget page would promise more protection than there is.",
        "write 0.005540167, or leave \"spent\" out and the computed value is used.");

    [Fact]
    public void Finding_has_the_layout_of_the_example() => Assert.Equal(
        """
        STOP  spent-too-low                                                   for: noise
        mechanisms.json:12:16  "ward-arrears" declares rho 0.0054
          Sigma 9.5 with 1 cell a household, 1 a cell, costs 0.005540167.
          Why: the budget page would promise more protection than there is.
          Do: write 0.005540167, or leave "spent" out and the computed value is used.

        """,
        FindingText.Of(Example));

    [Fact]
    public void No_line_is_wider_than_80_columns_unless_a_word_is()
    {
        var text = FindingText.Of(Example with { Found = string.Concat(Enumerable.Repeat("eleven long ", 40)), Do = string.Concat(Enumerable.Repeat("to do ", 60)) });
        Assert.All(text.Split('\n'), line => Assert.InRange(line.Length, 0, FindingText.Width));
    }

    [Fact]
    public void Last_line_counts_stops_by_owner_and_names_the_next_call() => Assert.Equal(
        "3 stops: 1 for writer, 2 for noise. Next, when mended: releasekit review ehr-2031",
        FindingText.LastLine([Example, Example with { For = FindingOwner.Writer }, Example, Example with { Level = FindingLevel.Note }], "ehr-2031"));

    [Fact]
    public void Without_stops_the_next_call_is_compose() => Assert.Equal(
        "No stops. Next: releasekit compose ehr-2031 --to SITE", FindingText.LastLine([Example with { Level = FindingLevel.Caution }], "ehr-2031"));

    [Fact]
    public void Of_a_kind_in_one_file_the_first_are_printed_and_all_are_counted()
    {
        var findings = Enumerable.Range(1, 40).Select(line => Example with { At = new Place("tables/a.csv", line, 1) }).ToList();
        var text = FindingText.Of([Example, .. findings], "ehr-2031");
        Assert.Contains("tables/a.csv:12:1 ", text, StringComparison.Ordinal);
        Assert.DoesNotContain("tables/a.csv:13:1 ", text, StringComparison.Ordinal);
        Assert.Contains("  28 more of this kind in tables/a.csv: releasekit review ehr-2031 --all prints\n    them.", text, StringComparison.Ordinal);
        Assert.Contains("\n41 stops: 41 for noise. ", text, StringComparison.Ordinal);
        Assert.Contains("tables/a.csv:40:1 ", FindingText.Of(findings, "ehr-2031", all: true), StringComparison.Ordinal);
    }

    [Fact]
    public void Of_more_findings_than_are_kept_all_are_counted()
    {
        var log = new ReleaseKit.Reading.FindingLog();
        for (var line = 1; line <= ReleaseKit.Reading.FindingLog.MostKept + 5; line++)
            log.Add(Example with { At = new Place("tables/a.csv", line, 1) });
        var text = FindingText.Of(ReleaseReview.Of(new ReleaseKit.Reading.ReadOutcome(null, log.ToList()), null), "ehr-2031");
        Assert.Contains("  9993 more of this kind in tables/a.csv: ", text, StringComparison.Ordinal);
        Assert.Contains("\n10005 stops: 10005 for noise. ", text, StringComparison.Ordinal);
        Assert.Contains("  5 more of this kind in tables/a.csv are counted and not listed", FindingText.Of(log.ToList(), "ehr-2031", all: true), StringComparison.Ordinal);
    }

    [Fact]
    public void Review_is_in_the_order_of_owner_file_line_and_column()
    {
        Finding At(FindingOwner owner, string file, int line, int column) => Example with { For = owner, At = new Place(file, line, column) };
        Finding[] sorted =
        [
            At(FindingOwner.Writer, "narrative/a.md", 9, 1), At(FindingOwner.Writer, "release.json", 2, 9), At(FindingOwner.Writer, "release.json", 10, 1),
            At(FindingOwner.Noise, "mechanisms.json", 1, 1), At(FindingOwner.Noise, "mechanisms.json", 1, 2), At(FindingOwner.SignOff, "a", 0, 0),
        ];
        Assert.Equal(sorted, ReleaseReview.Of(new ReleaseKit.Reading.ReadOutcome(null, [.. sorted.Reverse()]), null));
    }
}
