using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>Gives each page of a table its path; no two alike.</summary>
internal sealed class PageNames(string table)
{
    private readonly HashSet<string> taken = new(StringComparer.OrdinalIgnoreCase);

    public string Next(StubLabel? part, int number)
    {
        var name = part?.Slug ?? (number == 1 ? "index" : "rows");
        if (number > 1)
            name += "-" + number.ToString(CultureInfo.InvariantCulture);
        while (!taken.Add(name))
            name += "-part";
        return $"tables/{table}/{name}.html";
    }
}
