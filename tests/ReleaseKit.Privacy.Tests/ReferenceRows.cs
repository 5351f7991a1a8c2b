using System.Globalization;

namespace ReleaseKit.Privacy.Tests;

/// <summary>Rows of a file in tests/reference by column name; an empty field is no number.</summary>
internal sealed class ReferenceRow(IReadOnlyDictionary<string, string> fields)
{
    public string this[string column] => fields[column];

    public double Number(string column) => double.Parse(fields[column], CultureInfo.InvariantCulture);

    public bool Has(string column) => fields[column].Length > 0;

    public static IReadOnlyList<ReferenceRow> Of(string file)
    {
        var lines = File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "reference", file));
        var columns = lines[0].Split(',');
        return [.. lines.Skip(1).Select(line => new ReferenceRow(columns.Zip(line.Split(',')).ToDictionary(pair => pair.First, pair => pair.Second)))];
    }

    /// <summary>"3x[eps=0.1 delta=0];1x[…]": each run's parameters, repeated.</summary>
    public IEnumerable<IReadOnlyDictionary<string, double>> Runs() => fields["mechanisms"].Split(';').SelectMany(part =>
    {
        var (count, rest) = (part[..part.IndexOf('x', StringComparison.Ordinal)], part[(part.IndexOf('[', StringComparison.Ordinal) + 1)..^1]);
        var pairs = rest.Split(' ').Select(pair => pair.Split('='));
        var one = pairs.ToDictionary(pair => pair[0], pair => double.Parse(pair[1], CultureInfo.InvariantCulture));
        return Enumerable.Repeat<IReadOnlyDictionary<string, double>>(one, int.Parse(count, CultureInfo.InvariantCulture));
    });

    public static void Near(double expected, double actual, string about, double tolerance = 1e-9) =>
        Assert.True(Math.Abs(actual - expected) <= tolerance * Math.Abs(expected), string.Create(CultureInfo.InvariantCulture, $"{about}: {actual:R}, not {expected:R}"));
}
