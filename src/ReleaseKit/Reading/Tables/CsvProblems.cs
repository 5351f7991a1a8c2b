using CsvHelper;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>What can be wrong with the form of a CSV file, one factory a failure. Each says how to export it right.</summary>
internal static class CsvProblems
{
    private const string Export = "export it again as \"CSV UTF-8 (comma delimited)\"";

    public static Finding Empty(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-empty", owner, at,
        "The file holds no rows.",
        "an empty table says nothing, and nothing can be said about it.",
        "write the table into it: a header row with the column names, then one row a line.");

    public static Finding Encoding(Place at, string likely, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-encoding", owner, at,
        $"This is no UTF-8; it looks like {likely}.",
        "names would be read wrong, or not at all.",
        $"{Export}, or convert it: iconv -f {(likely == "UTF-16" ? "UTF-16" : "WINDOWS-1252")} -t UTF-8 OLD.csv > NEW.csv");

    public static Finding Nul(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-nul", owner, at,
        "There is a zero byte in the file.",
        "a CSV file is text and has none: it is damaged, or no CSV at all.",
        $"{Export} from its source.");

    public static Finding Separator(Place at, char separator, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-separator", owner, at,
        $"The columns are cut by {Name(separator)}, not by commas.",
        "the whole row would be read as one column.",
        $"{Export} with a point as decimal sign; a spreadsheet set to a language with decimal commas writes semicolons.");

    public static Finding UnnamedColumn(Place at, int number, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-header", owner, at,
        $"Column {number} has no name in the first row.",
        "columns are found by their names.",
        "name it, or remove the column; a comma at the end of each line makes an empty one.");

    public static Finding TwinColumns(Place at, string name, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-header", owner, at,
        $"Two columns are called \"{KeyProblems.Cut(name)}\".",
        "it is not clear which of them is meant.",
        "rename or remove one of them.");

    public static Finding Ragged(Place at, int wanted, string record, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-ragged", owner, at,
        $"This row does not have {wanted} fields, as many as the first row names columns: {KeyProblems.Cut(record)}",
        "values would stand under the wrong heads.",
        "put a value that holds a comma between double quotes (\"Lane, Upper\"), and write an empty field for a missing value.");

    public static Finding Quotes(Place at, CsvMalformedReason reason, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-quotes", owner, at,
        reason switch
        {
            CsvMalformedReason.UnterminatedQuote => "A double quote opens here and is never closed.",
            CsvMalformedReason.TextAfterClosingQuote => "Text follows a closing double quote.",
            _ => "A double quote stands inside a field that is not quoted.",
        },
        "it is not clear where the field ends.",
        "write a quote inside a field twice, and the whole field between quotes: \"the \"\"old\"\" kiln\".");

    public static Finding RowTooLong(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-row-too-long", owner, at,
        $"A row is longer than {FolderLimits.RecordBytes} bytes.",
        "no row of a table is; most often a double quote was opened and never closed.",
        "look for a lone double quote in this row.");

    public static Finding TooManyRows(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-too-many-rows", owner, at,
        $"The table has more than {FolderLimits.TableRows} rows.",
        "more are not read at once.",
        "cut it into several tables.");

    private static string Name(char separator) => separator switch { ';' => "semicolons", '\t' => "tabs", _ => "upright strokes" };
}
