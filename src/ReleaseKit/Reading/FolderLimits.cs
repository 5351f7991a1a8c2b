namespace ReleaseKit.Reading;

/// <summary>How large the parts of a folder may be. Far above any real release; they keep a hostile folder from filling memory or disk.</summary>
public static class FolderLimits
{
    /// <summary>Bytes of a JSON file.</summary>
    public const long JsonBytes = 16 * 1024 * 1024;

    /// <summary>Nesting of a JSON file; the deepest key of the format stands at 9.</summary>
    public const int JsonDepth = 32;

    /// <summary>Bytes of a prose file.</summary>
    public const long ProseBytes = 4 * 1024 * 1024;

    /// <summary>Bytes of a table: about 200 million short rows.</summary>
    public const long TableBytes = 8L * 1024 * 1024 * 1024;

    /// <summary>Bytes of one row of a table.</summary>
    public const int RecordBytes = 256 * 1024;

    /// <summary>Rows of a table.</summary>
    public const int TableRows = 20_000_000;

    /// <summary>Rows of a tabulated noise law.</summary>
    public const int LawRows = 2_000_000;

    /// <summary>Characters of a row heading; longer ones cannot be printed in a stub.</summary>
    public const int LabelLength = 200;

    /// <summary>Characters of a text for readers in a JSON file.</summary>
    public const int TextLength = 4_000;
}
