namespace ReleaseKit.Reading.Files;

/// <summary>Which paths a folder may name: the same file on every system, and none outside the folder.</summary>
internal static class PathRules
{
    private const int Longest = 240;

    private const string Unwritable = "<>\"|?*";

    /// <summary>Names that Windows keeps for devices, with any extension.</summary>
    private static readonly string[] DeviceNames =
    [
        "con", "prn", "aux", "nul",
        .. Enumerable.Range(1, 9).Select(number => $"com{number}"), .. Enumerable.Range(1, 9).Select(number => $"lpt{number}"),
    ];

    /// <summary>What is wrong with a path, in words that complete "the path …"; null if nothing is.</summary>
    public static string? Problem(string path)
    {
        if (path.Length is 0 or > Longest)
            return $"is empty or longer than {Longest} characters";
        if (path[0] == '/' || path.Contains(':', StringComparison.Ordinal))
            return "is not relative to the folder";
        if (path.Contains('\\', StringComparison.Ordinal))
            return "is written with \\ instead of /";
        return path.Split('/').Select(ProblemOfName).FirstOrDefault(problem => problem is not null);
    }

    /// <summary>Whether a file name is kept for a device on some systems.</summary>
    public static bool IsDevice(string name) => DeviceNames.Contains(name.Split('.')[0].ToLowerInvariant());

    private static string? ProblemOfName(string name) => name switch
    {
        ".." => "leaves the folder",
        "" or "." => "has an empty part",
        _ when name.Any(letter => char.IsControl(letter) || Unwritable.Contains(letter)) => "holds a character that no file name should have",
        _ when name[^1] is '.' or ' ' => "has a part that ends in a point or a space",
        _ when IsDevice(name) => $"has the part \"{name}\", which is a device on Windows",
        _ => null,
    };
}
