namespace ReleaseKit.Releases;

/// <summary>The stub values of a row as one number, one column left out or put in its place: how rows of a table find each other without a search.</summary>
internal sealed class RowKeys
{
    private readonly Table table;
    private readonly UInt128[] weights;

    public RowKeys(Table table)
    {
        this.table = table;
        weights = new UInt128[table.Stub.Count];
        UInt128 weight = 1;
        for (var column = 0; column < weights.Length; column++)
            (weights[column], weight) = (weight, checked(weight * (UInt128)(table.Stub[column].Labels.Count + 1)));
    }

    public UInt128 Of(int row)
    {
        UInt128 key = 0;
        for (var column = 0; column < weights.Length; column++)
            key += weights[column] * (UInt128)(table.Stub[column].Codes[row] + 1);
        return key;
    }

    /// <summary>The key of a row, one column left out: alike for rows that differ in it alone.</summary>
    public UInt128 Without(int row, int column) => With(Of(row), row, column, -1);

    /// <summary>The key of a row like this one that has another value in one column.</summary>
    public UInt128 With(UInt128 key, int row, int column, int code) =>
        key - weights[column] * (UInt128)(table.Stub[column].Codes[row] + 1) + weights[column] * (UInt128)(code + 1);
}
