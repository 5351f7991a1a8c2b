using ReleaseKit.Pages;

namespace ReleaseKit.Cli;

/// <summary>The last lines of a composing: what changed since the last one, how to switch the new site on, and how to go back.</summary>
internal static class ChangeText
{
    public static IEnumerable<string> Of(SiteChanges? changes, SiteFolder site) =>
    [
        .. changes is null ? [] : Changes(changes),
        .. changes is { Unlisted.Count: > 0 } ? [Unlisted(changes.Unlisted, site)] : (IEnumerable<string>)[],
        $"To switch it on: copy what is in {site.Target} to the folder of your web server. index.html is its first page, and no program has to run there.",
        .. changes is null or { IsNone: true } ? [] : WayBack(site),
    ];

    private static IEnumerable<string> Changes(SiteChanges changes)
    {
        if (changes.IsNone)
            return ["Nothing changed since the last composing: what stood was left as it was."];
        return
        [
            "Changed since the last composing:",
            .. changes.Figures.Count == 0 ? ["  figures: none"] : changes.Figures.Select(table => $"  figures of {table.Table}: {Counts(table.New, table.Changed, table.Gone)}"),
            .. Line("pages", changes.Pages),
            .. Line("other files", changes.Others),
        ];
    }

    private static IEnumerable<string> Line(string what, FileChanges files) =>
        files.IsNone ? [] : [$"  {what}: {Counts(files.New, files.Changed, files.Gone)}"];

    private static string Unlisted(IReadOnlyList<string> files, SiteFolder site) =>
        $"Gone, and kept in {site.Before} only until the next composing: {SiteChanges.Named(files)}. If one of them is your own, fetch it from there.";

    private static string Counts(int added, int changed, int gone) => $"{added} new, {changed} changed, {gone} gone";

    /// <summary>Three moves that exchange the two sites: the same lines bring the new one back.</summary>
    private static IEnumerable<string> WayBack(SiteFolder site)
    {
        var aside = FreeNameBeside(site.Target);
        return
        [
            $"To go back to the last composing, kept in {site.Before}, paste these lines; pasted again, they bring the new one back:",
            Move(site.Target, aside), Move(site.Before, site.Target), Move(aside, site.Before),
        ];
    }

    private static string FreeNameBeside(string target)
    {
        var aside = target + ".aside";
        for (var number = 2; Path.Exists(aside); number++)
            aside = $"{target}.aside{number}";
        return aside;
    }

    /// <summary>"move" means the same in both shells of Windows.</summary>
    private static string Move(string from, string to) =>
        OperatingSystem.IsWindows() ? $"  move \"{from}\" \"{to}\"" : $"  mv {Quoted(from)} {Quoted(to)}";

    private static string Quoted(string path) => $"'{path.Replace("'", @"'\''", StringComparison.Ordinal)}'";
}
