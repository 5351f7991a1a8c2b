namespace ReleaseKit.Downloads;

/// <summary>Text in a CSV cell that no spreadsheet runs as a formula (CWE-1236). Numbers never pass through here: theirs is a bare minus.</summary>
internal static class SafeCell
{
    // The signs that begin a formula, with the wide forms some spreadsheets take for them.
    private const string FormulaBeginnings = "=+-@\t\r\n\uFF1D\uFF0B\uFF0D\uFF20";

    /// <summary>The text, with an apostrophe before it if it begins like a formula.</summary>
    public static string Of(string text) => text.Length > 0 && FormulaBeginnings.Contains(text[0], StringComparison.Ordinal) ? "'" + text : text;
}
