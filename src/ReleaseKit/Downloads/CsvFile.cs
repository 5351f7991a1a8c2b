using CsvHelper;
using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>A CSV file as RFC 4180 has it, in UTF-8: text made harmless to spreadsheets, numbers bare.</summary>
internal sealed class CsvFile(Stream stream) : IDisposable
{
    private readonly CsvWriter csv = CsvWriter.Create(stream);

    public CsvFile Text(string text) => Digits(SafeCell.Of(text));

    /// <summary>A number as published; an empty cell for null.</summary>
    public CsvFile Number(PublishedValue? value) => Digits(value?.ToString() ?? "");

    /// <summary>A number with all its digits; an empty cell for null.</summary>
    public CsvFile Number(double? number) => Digits(number is { } given ? PlainNumber.Of(given) : "");

    /// <summary>A number whose digits are made elsewhere; an empty cell for none.</summary>
    public CsvFile Digits(string digits)
    {
        csv.WriteField(digits);
        return this;
    }

    public void EndRow() => csv.EndRecord();

    public void Dispose() => csv.Dispose();
}
