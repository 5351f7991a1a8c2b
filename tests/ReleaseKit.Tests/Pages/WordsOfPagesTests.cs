using System.Globalization;
using ReleaseKit.Downloads;
using ReleaseKit.Pages;
using ReleaseKit.Pages.Downloads;
using ReleaseKit.Pages.Home;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using ReleaseKit.Wording;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class WordsOfPagesTests
{
    [Theory]
    [InlineData("2031", "2031")]
    [InlineData("2031-01-01/2031-12-31", "2031")]
    [InlineData("2031-03", "March 2031")]
    [InlineData("2031-Q4", "October to December 2031")]
    [InlineData("2031-03-09", "9\u00A0March 2031")]
    [InlineData("2031-W01", "week 1 of 2031")]
    [InlineData("2031-W54", "2031-W54")]
    [InlineData("2031-W01/2031-W13", "weeks 1 to 13 of 2031")]
    [InlineData("2031-W52/2032-W02", "week 52 of 2031 to week 2 of 2032")]
    [InlineData("2031-07/2031-12", "July to December 2031")]
    [InlineData("2031-Q1/2031-Q2", "January to June 2031")]
    [InlineData("2030-Q4/2031-03", "October 2030 to March 2031")]
    [InlineData("2029/2031", "2029 to 2031")]
    [InlineData("2031-04-01/2032-03-31", "1\u00A0April 2031 to 31\u00A0March 2032")]
    [InlineData("2031-13", "2031-13")]
    [InlineData("P1Y", "P1Y")]
    public void Period_is_said_in_words(string iso, string words) => Assert.Equal(words, PeriodText.Of(iso, PagesRelease.English));

    [Theory]
    [InlineData("2032-03-16T09:30:00+01:00", "16\u00A0March 2032, 09:30, UTC+1")]
    [InlineData("2032-03-16T09:30:00Z", "16\u00A0March 2032, 09:30, UTC")]
    [InlineData("2032-03-16T00:05:00-03:30", "16\u00A0March 2032, 00:05, UTC\u22123:30")]
    public void Moment_of_publication_is_said_with_its_distance_from_UTC(string moment, string words) =>
        Assert.Equal(words, MomentText.Of(DateTimeOffset.Parse(moment, CultureInfo.InvariantCulture), PagesRelease.English));

    [Theory]
    [InlineData("https://office.example/small/1/", "https://office.example/small/")]
    [InlineData("https://office.example/small/1", "https://office.example/small/")]
    [InlineData("https://office.example/1/", "https://office.example/")]
    [InlineData("https://office.example/", null)]
    [InlineData("javascript:alert(1)", null)]
    [InlineData(null, null)]
    public void Latest_is_the_address_above(string? address, string? above) => Assert.Equal(above, WebAddress.Above(address));

    [Theory]
    [InlineData("a@office.example", "mailto:a@office.example")]
    [InlineData("https://office.example/ask", "https://office.example/ask")]
    [InlineData("Room 12", null)]
    [InlineData("javascript:a@b", null)]
    public void Contact_is_a_link_only_where_it_can_be(string contact, string? link) => Assert.Equal(link, WebAddress.OfContact(contact));

    [Theory]
    [InlineData(840, "840 bytes")]
    [InlineData(1_000, "1.0 kB")]
    [InlineData(1_001, "1.1 kB")]
    [InlineData(2_340_000, "2.4 MB")]
    public void File_size_is_rounded_up(long bytes, string words) => Assert.Equal(words, FileSize.Of(bytes, PagesRelease.English));

    [Theory]
    [InlineData(EditionStatus.First, 1, "Edition 2, as first published")]
    [InlineData(EditionStatus.Corrected, 1, "Edition 2, corrected")]
    [InlineData(EditionStatus.Provisional, 3, "Edition 2, provisional, printing 3")]
    public void Edition_names_number_status_and_printing(EditionStatus status, int printing, string words) => Assert.Equal(
        words, EditionLine.Of(PagesRelease.ContextOf(PagesRelease.Make() with { Edition = new Edition(2, printing, status) })));

    [Fact]
    public void List_of_chances_is_called_by_the_noise_it_is_of()
    {
        var release = PagesRelease.Make();
        var drawn = SmallRelease.Mechanism("North noise", LawName.Tabulated);
        var file = DownloadFile.Of(PagesRelease.ContextOf(release with { Noise = release.Noise with { Mechanisms = [drawn] } }), DownloadNames.Law(drawn));

        Assert.Equal("CSV: the list of chances that the noise “North noise” was drawn by", file.What(PagesRelease.English));
    }

    [Theory]
    [InlineData("downloads/late.csv", 0, "wide")]
    [InlineData("downloads/late-long.csv", 0, "long")]
    [InlineData("downloads/late-99.csv", 0, "coverage")]
    [InlineData("downloads/paid.jsonl", 1, "lines")]
    [InlineData("downloads/budget.json", null, "budget")]
    [InlineData("images/late.svg", null, "picture-drawn")]
    public void Download_belongs_to_its_table_and_says_what_it_holds(string path, int? table, string kind)
    {
        var file = DownloadFile.Of(PagesRelease.ContextOf(PagesRelease.Make()), path);
        Assert.Equal((table, kind), (file.Table, file.Kind));
    }
}
