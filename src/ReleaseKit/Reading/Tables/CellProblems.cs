using ReleaseKit.Reading.Keys;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>What can be wrong with the cells of a table, one factory a failure.</summary>
internal static class CellProblems
{
    public static Finding Number(Place at, string column, string text, NumberFault fault, FindingOwner owner)
    {
        var (slug, what, how) = Say(fault, text, MeantNumber.Of(text, fault));
        return new Finding(
            FindingLevel.Stop, slug, owner, at,
            $"\"{KeyProblems.Cut(text)}\" in column \"{column}\" {what}.",
            "a number that is read wrong is published wrong.",
            how);
    }

    private static (string Slug, string What, string How) Say(NumberFault fault, string text, string? meant) => fault switch
    {
        NumberFault.DecimalComma => ("csv-decimal-comma", "has a decimal comma",
            $"export the table with a point as decimal sign: {meant ?? "12.5"}. In a spreadsheet set the language of the file to English before saving."),
        NumberFault.ThousandsMarks => ("csv-thousands", "has marks between thousands",
            $"export bare digits: {meant ?? "1240"}. In a spreadsheet set the cells to the format \"Number\" without thousands marks before saving."),
        NumberFault.Exponent => ("csv-number", "is written with an exponent", $"export all digits: {meant ?? "120000"}. In a spreadsheet set the cells to the format \"Number\"."),
        NumberFault.PlusSign => ("csv-number", "begins with a plus sign", meant is null ? "write the number without it." : $"write the number without it: {meant}."),
        NumberFault.OtherMinus => ("csv-number", "begins with a dash or a typographic minus", $"write the hyphen of the keyboard: {meant ?? "-7"}."),
        NumberFault.Percent => ("csv-number", "has a per cent sign", "write the number alone, and \"kind\": \"share\" in release.json."),
        NumberFault.TooLong => ("csv-overflow", $"has more than 18 digits, or more than {FigureParser.MostDecimals} after the point",
            "no figure is known that well: round it as declared in \"afterwards\", or give it in a larger unit."),
        NumberFault.SpreadsheetError => ("csv-number", "is the error of a formula in a spreadsheet", "mend the formula and export the table again; leave the cell empty if there is no figure."),
        NumberFault.NoNumber => ("csv-number", "is no number", $"leave the cell empty if there is no figure{(IsMark(text) ? $", or say what it means: {Marks(text)}" : "")}."),
        _ => ("csv-number", "is no number", $"write a number, or leave the cell empty if there is none{(IsMark(text) ? $"; if it is a mark, declare the mark: {Marks(text)}" : "")}."),
    };

    /// <summary>Whether it can be pasted as a key of JSON as it stands.</summary>
    private static bool IsMark(string text) => text == KeyProblems.Cut(text) && text.AsSpan().IndexOfAny('"', '\\') < 0;

    private static string Marks(string text) => $"\"statuses\": {{ \"marks\": {{ \"{text}\": \"O\" }} }} for a figure that is not available, \"Q\" in the place of \"O\" for one that is hidden";

    public static Finding CountNotWhole(Place at, string column, string text, FindingOwner owner) => new(
        FindingLevel.Stop, "count-not-whole", owner, at,
        $"\"{KeyProblems.Cut(text)}\" in column \"{column}\" is no whole number, but its kind is count.",
        "margins and sentences of counts are made for whole numbers.",
        "write \"kind\": \"estimate\" for weighted counts, or another kind, or correct the value.");

    public static Finding HiddenHasValue(Place at, string column, char status, FindingOwner owner) => new(
        FindingLevel.Stop, "hidden-has-value", owner, at,
        $"Column \"{column}\" has a value here, but its status {status} says that there is none.",
        "a hidden value in a published file is not hidden.",
        "empty the cell, or correct the status.");

    public static Finding StatusWithoutValue(Place at, string column, char status, FindingOwner owner) => new(
        FindingLevel.Stop, "status-without-value", owner, at,
        $"Column \"{column}\" is empty here, but its status {status} belongs to a figure that is there.",
        "the page would have nothing to print.",
        "write the value, or a status that says why it is missing: Q hidden, O not available, M cannot exist, L not collected.");

    public static Finding UnknownStatus(Place at, string text, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-status", owner, at,
        $"\"{KeyProblems.Cut(text)}\" is no status.",
        "readers are told in words what a mark means.",
        "use a letter of SDMX CL_OBS_STATUS (A, B, D, E, F, P, O, Q, L, M …), or say what the mark means: \"statuses\": { \"marks\": { \"..\": \"O\" } }.");

    public static Finding EmptyLabel(Place at, string column, FindingOwner owner) => new(
        FindingLevel.Stop, "empty-label", owner, at,
        $"The row heading in column \"{column}\" is empty.",
        "a row that is not named cannot be found or cited.",
        "write its name; for a total the word that \"all\" gives.");

    public static Finding LabelTooLong(Place at, string column, int length, FindingOwner owner) =>
        KeyProblems.TooLong(at, $"A row heading in column \"{column}\"", length, FolderLimits.LabelLength, owner);

    public static Finding Formula(Place at, string column, string label, FindingOwner owner) => new(
        FindingLevel.Caution, "formula-cell", owner, at,
        $"\"{KeyProblems.Cut(label)}\" in column \"{column}\" begins like a formula.",
        "a spreadsheet that opens the file would run it (CWE-1236). It is written to the downloads so that it is not run.",
        $"let it begin with a letter or digit, if you can: \"{KeyProblems.Cut(label.TrimStart('=', '+', '-', '@', '\t', '\r', ' '))}\".");

    public static Finding DoubledRow(Place at, string row, int firstLine, FindingOwner owner) => new(
        FindingLevel.Stop, "doubled-row", owner, at,
        $"The row {row} stands there twice; first at line {firstLine}.",
        "a figure must have one value.",
        "remove one of them, or add the stub column that tells them apart.");

    public static Finding BadPeriod(Place at, string column, string value, FindingOwner owner) => new(
        FindingLevel.Stop, "bad-date", owner, at,
        $"\"{KeyProblems.Cut(value)}\" in column \"{column}\" is no ISO 8601 period.",
        "periods are put in order and printed as dates.",
        "write 2031, 2031-Q1, 2031-03, 2031-W05, 2031-03-16, or two dates with a slash between them.");
}
