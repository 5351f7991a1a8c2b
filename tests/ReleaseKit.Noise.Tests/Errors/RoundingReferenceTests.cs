using ReleaseKit.Noise.Errors;

namespace ReleaseKit.Noise.Tests.Errors;

/// <summary>Every row of tests/reference/rounding.csv, column any_value (mpmath, 50 digits; derived, see its README).</summary>
public sealed class RoundingReferenceTests
{
    public static TheoryData<int> Lines => [.. Rows.Select(row => row.Line)];

    private static IReadOnlyList<ReferenceRow> Rows { get; } = ReferenceTable.Read("rounding.csv").Rows;

    [Theory, MemberData(nameof(Lines))]
    public void Margin_after_rounding_is_the_reference(int line)
    {
        var row = Rows[line - 2];
        var error = FigureError.Of(NamedLaws.Of(row), new AfterStep.RoundTo(row.Number("r")));
        var margin = error.MarginAt(Coverage.OfShare(row.Number("c")));
        Assert.Equal(row.Number("any_value_half_width"), margin.Width);
        Assert.Equal(row.Number("any_value_attained"), margin.Attained, 1e-12);
        Assert.Equal(row.Number("any_value_attained"), error.AttainedAt(margin.Width), 1e-12);
    }
}
