using System.Globalization;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>A cell as it is printed in the CSV, and the value before noise, which is null where no noise was added.</summary>
public readonly record struct SampleCell(string Printed, double? Before = null)
{
    public static SampleCell Public(long value) => new(value.ToString(CultureInfo.InvariantCulture));

    public static SampleCell Mark(string mark) => new(mark);

    public static SampleCell Count(long published, long before) => new(published.ToString(CultureInfo.InvariantCulture), before);

    /// <summary>A number of steps of 10^−fine, printed with fewer decimals (to the nearest, ties away from zero).</summary>
    public static SampleCell Steps(long published, long before, int fine, int decimals)
    {
        var perUnit = Power(fine);
        var kept = Rounding.ToNearest(published, Power(fine - decimals)) / (decimal)perUnit;
        return new(kept.ToString("F" + decimals, CultureInfo.InvariantCulture), before / (double)perUnit);
    }

    private static long Power(int exponent) => exponent == 0 ? 1 : 10 * Power(exponent - 1);
}

public sealed record SampleRow(IReadOnlyList<string> Keys, IReadOnlyList<SampleCell> Cells);

/// <summary>A noised table: the names of its columns, and its rows. Only <see cref="Csv"/> leaves this program.</summary>
public sealed record SampleTable(string Id, string File, IReadOnlyList<string> Stub, IReadOnlyList<string> Columns, IReadOnlyList<SampleRow> Rows)
{
    /// <summary>The table as it is published: no value before noise in it. No label of the sample holds a comma, a quote or a line end.</summary>
    public string Csv => string.Concat(Lines.Select(line => string.Join(',', line) + "\n"));

    private IEnumerable<IEnumerable<string>> Lines =>
        Rows.Select(row => row.Keys.Concat(row.Cells.Select(cell => cell.Printed))).Prepend(Stub.Concat(Columns));
}
