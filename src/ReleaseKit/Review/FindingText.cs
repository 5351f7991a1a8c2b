using System.Text;

namespace ReleaseKit.Review;

/// <summary>Findings as plain text, 80 columns wide: level, slug and owner; place and what is there; why it matters; what to do.</summary>
public static class FindingText
{
    public const int Width = 80;

    /// <summary>The findings, a blank line between them, and the last line, which counts all.</summary>
    /// <param name="findings">In the order in which they are to be read.</param>
    /// <param name="folder">The folder as the caller named it, for the next call.</param>
    /// <param name="all">Whether each finding is printed, and not only the first few of a kind.</param>
    public static string Of(IReadOnlyList<Finding> findings, string folder, bool all = false)
    {
        var printed = all ? PrintedFindings.All(findings) : PrintedFindings.Of(findings, folder);
        return string.Concat(printed.Select(finding => Of(finding) + "\n")) + LastLine(findings, folder) + "\n";
    }

    /// <summary>One finding, its lines ended by \n.</summary>
    public static string Of(Finding finding)
    {
        var text = new StringBuilder();
        var head = $"{finding.Level.ToString().ToUpperInvariant()}  {finding.Slug}";
        var owner = $"for: {OwnerWord(finding.For)}";
        text.Append(head).Append(owner.PadLeft(Math.Max(Width - head.Length, owner.Length + 1))).Append('\n');
        var found = finding.Found.Split('\n');
        Append(text, $"{finding.At}  {found[0]}", "", "  ");
        foreach (var line in found.Skip(1))
            Append(text, line, "  ", "    ");
        Append(text, $"Why: {finding.Why}", "  ", "    ");
        Append(text, $"Do: {finding.Do}", "  ", "    ");
        return text.ToString();
    }

    /// <summary>Counts the stops by owner and names the next call.</summary>
    public static string LastLine(IReadOnlyList<Finding> findings, string folder)
    {
        var stops = findings.Where(finding => finding.Level == FindingLevel.Stop).ToList();
        var count = stops.Sum(PrintedFindings.Count);
        if (count == 0)
            return $"No stops. Next: releasekit compose {folder} --to SITE";
        var byOwner = stops.GroupBy(stop => stop.For).OrderBy(group => group.Key).Select(group => $"{group.Sum(PrintedFindings.Count)} for {OwnerWord(group.Key)}");
        return $"{(count == 1 ? "1 stop" : $"{count} stops")}: {string.Join(", ", byOwner)}. Next, when mended: releasekit review {folder}";
    }

    /// <summary>The owner as it stands in messages and in --for.</summary>
    public static string OwnerWord(FindingOwner owner) => owner switch
    {
        FindingOwner.Writer => "writer",
        FindingOwner.Noise => "noise",
        _ => "sign-off",
    };

    /// <summary>Breaks at spaces, so that no line is longer than the width unless one word is.</summary>
    private static void Append(StringBuilder text, string line, string first, string next)
    {
        text.Append(first);
        var (length, isEmpty) = (first.Length, true);
        foreach (var word in line.Split(' '))
        {
            if (!isEmpty && length + 1 + word.Length > Width)
            {
                text.Append('\n').Append(next);
                (length, isEmpty) = (next.Length, true);
            }
            text.Append(isEmpty ? "" : " ").Append(word);
            length += word.Length + (isEmpty ? 0 : 1);
            isEmpty = false;
        }
        text.Append('\n');
    }
}
