using CsCheck;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Slugs: a-z, 0-9, - and _ only, the same under every culture.</summary>
public sealed class SlugTests
{
    [Theory]
    [InlineData("Aldermoor", "aldermoor")]
    [InlineData("Skerry End", "skerry-end")]
    [InlineData("  St. John's,  East ", "st-john-s-east")]
    [InlineData("in_arrears", "in_arrears")]
    [InlineData("2031-Q1", "2031-q1")]
    [InlineData("65+", "65-plus")]
    [InlineData("Heat & Light", "heat-and-light")]
    [InlineData("Caf\u00E9 \u00C5lesund \u00D8rsta", "cafe-alesund-orsta")]
    [InlineData("Gro\u00DFstra\u00DFe \u00C6r\u00F8", "grossstrasse-aero")]
    [InlineData("ISPARTA \u0130zmir \u0131l\u0131ca", "isparta-izmir-ilica")]
    [InlineData("\u0141\u00F3d\u017A", "lodz")]
    [InlineData("e\u0301te\u0301", "ete")]
    [InlineData("\u8857\u9053", "")]
    [InlineData("...", "")]
    public void Text_becomes_its_slug(string text, string slug) => Assert.Equal(slug, Slug.Of(text));

    [Fact]
    public void Every_slug_is_an_id_and_its_own_slug() => Gen.String.Sample(text =>
    {
        var slug = Slug.Of(text);
        return slug.Length == 0 || slug.Length > 100 || slug[0] == '_' || (Slug.IsOne(slug) && Slug.Of(slug) == slug);
    });

    [Theory]
    [InlineData("a.b-c_1", true)]
    [InlineData("", false)]
    [InlineData("A", false)]
    [InlineData(".a", false)]
    [InlineData("-a", false)]
    [InlineData("a b", false)]
    [InlineData("\u00E9", false)]
    public void Id_has_these_letters_only(string text, bool isOne) => Assert.Equal(isOne, Slug.IsOne(text));
}
