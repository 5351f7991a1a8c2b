using System.Globalization;

namespace ReleaseKit.Noise.Tests;

/// <summary>A file of tests/reference: rows by column name, numbers read as doubles.</summary>
internal sealed record ReferenceTable(IReadOnlyList<ReferenceRow> Rows)
{
    public static ReferenceTable Read(string file)
    {
        var lines = File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "reference", file));
        var columns = lines[0].Split(',');
        return new([.. lines.Index().Skip(1).Select(line => new ReferenceRow(line.Index + 1, Cells(columns, line.Item)))]);
    }

    private static Dictionary<string, string> Cells(string[] columns, string line)
    {
        var cells = line.Split(',');
        return columns.Index().ToDictionary(column => column.Item, column => cells[column.Index]);
    }
}

/// <summary>One row; Line is its line in the file.</summary>
internal sealed record ReferenceRow(int Line, IReadOnlyDictionary<string, string> Cells)
{
    public string Text(string column) => Cells[column];
    public bool Has(string column) => Cells[column].Length > 0;
    public double Number(string column) => double.Parse(Cells[column], CultureInfo.InvariantCulture);
}
