using ReleaseKit.Reading;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Figure addresses: RFC 3986 relative references, section 2.1 for percent-encoding.</summary>
public sealed class FigureAddressTests
{
    private static readonly Lazy<Release> Example = new(() => ReleaseFolder.Read(Repository.Example).Release!);

    [Fact]
    public void Percent_signs_are_decoded_as_utf8() =>
        Assert.Equal([new StubValue("w\u00E4rd", "A&B=C/ \u20AC")], FigureAddress.Parse("t/f?w%C3%A4rd=A%26B%3DC/%20%E2%82%AC").Query);

    [Fact]
    public void Plus_sign_is_a_plus_sign() => Assert.Equal("65+", FigureAddress.Parse("t/f?age=65+").Query[0].Value);

    [Theory]
    [InlineData("arrears")]
    [InlineData("a/b/c")]
    [InlineData("/b")]
    [InlineData("t/f?ward")]
    [InlineData("t/f?=x")]
    [InlineData("t/f?w=%4")]
    [InlineData("t/f?w=%zz")]
    [InlineData("t/f#x")]
    public void What_has_not_the_form_is_refused(string text) => Assert.NotEqual("", Assert.Throws<AddressException>(() => FigureAddress.Parse(text)).Do);

    [Fact]
    public void Parsing_what_was_printed_gives_the_same_address()
    {
        var address = new FigureAddress("t", "f", [new StubValue("a b", "1+1=2 & 50%"), new StubValue("\u00E9", "#/?")]);
        Assert.Equal(address, FigureAddress.Parse(address.ToString()));
    }

    [Theory]
    [InlineData("arrears/in_arrears", 8)]
    [InlineData("arrears/in_arrears?ward=All", 3)]
    [InlineData("arrears/in_arrears?district=All&ward=All", 1)]
    [InlineData("arrears/in_arrears?district=Cindry", 3)]
    [InlineData("arrears/in_arrears?ward=Skerry%20End", 1)]
    [InlineData("behind-aldermoor", 1)]
    public void Selection_leaves_out_totals_of_columns_it_does_not_name(string address, int figures) =>
        Assert.Equal(figures, FigureAddress.Of(Example.Value, address).Resolve(Example.Value).Rows.Count);

    [Fact]
    public void Several_matches_list_the_first_three()
    {
        var problem = Assert.Throws<AddressException>(() => FigureAddress.Parse("arrears/in_arrears?ward=All").ResolveOne(Example.Value));
        Assert.Equal(
            "name every stub column. The first are: arrears/in_arrears?district=Aldermoor&ward=All, arrears/in_arrears?district=Brackwater&ward=All, "
            + "arrears/in_arrears?district=Cindry&ward=All.", problem.Do);
    }

    [Theory]
    [InlineData("arears/in_arrears", "write arrears.")]
    [InlineData("arrears/in_arears", "write in_arrears.")]
    [InlineData("arrears/in_arrears?wrd=All", "write ward.")]
    [InlineData("arrears/in_arrears?district=Cindri", "write Cindry.")]
    [InlineData("arrears/in_arrears?ward=All&ward=All", "name each column once.")]
    public void What_is_misspelt_is_told_the_nearest(string address, string remedy) =>
        Assert.Equal(remedy, Assert.Throws<AddressException>(() => FigureAddress.Parse(address).Resolve(Example.Value)).Do);

    [Fact]
    public void Canonical_address_of_every_figure_finds_it_again()
    {
        foreach (var (index, table) in Example.Value.Tables.Index())
            for (var row = 0; row < table.RowCount; row++)
            {
                var found = FigureAddress.Parse(FigureAddress.Canonical(table, table.Measures[0], row)).ResolveOne(Example.Value);
                Assert.Equal((index, row), (found.Table, found.Rows[0]));
            }
    }

    [Theory]
    [InlineData("?ward=Skerry%20End", 1)]
    [InlineData("in_arrears?district=Cindry", 3)]
    [InlineData(null, 12)]
    public void Note_is_for_the_rows_of_its_query(string? at, int rows) => Assert.Equal(rows, NoteQuery.Rows(Example.Value.Tables[0], at).Count);
}
