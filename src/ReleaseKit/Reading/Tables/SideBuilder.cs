using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>Gathers a declared column that is no stub, measure or status; NaN where it holds no number.</summary>
internal sealed class SideBuilder(SideDraft draft, int field)
{
    private const NumberStyles Plain = NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent;

    private readonly List<double> numbers = [];

    public void Add(CsvFile rows) =>
        numbers.Add(double.TryParse(rows.Span(field), Plain, CultureInfo.InvariantCulture, out var number) && double.IsFinite(number) ? number : double.NaN);

    public SideColumn Build() => new(draft.Column, draft.From, draft.Mechanism, [.. numbers]) { At = draft.At };
}
