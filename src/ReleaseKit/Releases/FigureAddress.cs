using System.Text;

namespace ReleaseKit.Releases;

/// <summary>
/// The address of one figure or a selection: table/figure?column=value&amp;…, an RFC 3986 relative reference. Percent signs are decoded as UTF-8;
/// a plus sign is a plus sign.
/// </summary>
public sealed record FigureAddress(string Table, string Figure, IReadOnlyList<StubValue> Query)
{
    /// <summary>As the writer wrote it where that is not a whole address; messages quote it.</summary>
    public string? Written { get; init; }

    /// <summary>Reads an address as written; short names are not looked up here, see <see cref="Of"/>.</summary>
    /// <exception cref="AddressException">It does not have the form of an address.</exception>
    public static FigureAddress Parse(string text)
    {
        var (path, query) = Cut(text, '?');
        var parts = path.Split('/');
        if (parts.Length != 2 || parts[0].Length == 0 || parts[1].Length == 0)
            throw AddressProblems.NotAnAddress(text);
        return new FigureAddress(Decode(parts[0], text), Decode(parts[1], text), ParseQuery(query, text));
    }

    /// <summary>Reads an address or a short name of the release.</summary>
    /// <exception cref="AddressException">Neither an address nor a short name.</exception>
    public static FigureAddress Of(Release release, string text)
    {
        if (release.Short.TryGetValue(text, out var address))
            return Parse(address);
        return text.Contains('/', StringComparison.Ordinal) ? Parse(text) : throw AddressProblems.UnknownName(text, release.Short.Keys);
    }

    /// <summary>The query of an address or of a note ("ward=Skerry%20End&amp;district=Cindry"), without the question mark.</summary>
    public static IReadOnlyList<StubValue> ParseQuery(string query, string whole) =>
        query.Length == 0 ? [] : [.. query.Split('&').Select(pair => ParsePair(pair, whole))];

    /// <summary>The figures it means in a release, in row order; never empty.</summary>
    /// <exception cref="AddressException">No such table, figure, column or value, or nothing matches.</exception>
    public FigureSelection Resolve(Release release) => FigureSelector.Select(this, release.Tables);

    /// <summary>The one row it means.</summary>
    /// <exception cref="AddressException">It matches nothing or several figures.</exception>
    public FigureSelection ResolveOne(Release release)
    {
        var selection = Resolve(release);
        // Where every stub column is named, several rows are one row that stands there again: a finding of its own.
        return selection.Rows.Count == 1 || Query.Count == release.Tables[selection.Table].Stub.Count
            ? selection with { Rows = [selection.Rows[0]] }
            : throw AddressProblems.Several(this, selection, release);
    }

    /// <summary>The canonical address of one figure: all stub columns named, in stub order.</summary>
    public static string Canonical(Table table, Measure measure, int row) => new FigureAddress(
        table.Id, measure.Column, [.. table.Stub.Select(column => new StubValue(column.Column, column.LabelOf(row).Value))]).ToString();

    /// <summary>As it is written in links: everything but letters, digits and - . _ ~ percent-encoded.</summary>
    public override string ToString()
    {
        var text = new StringBuilder().Append(Encode(Table)).Append('/').Append(Encode(Figure));
        for (var index = 0; index < Query.Count; index++)
            text.Append(index == 0 ? '?' : '&').Append(Encode(Query[index].Column)).Append('=').Append(Encode(Query[index].Value));
        return text.ToString();
    }

    public bool Equals(FigureAddress? other) => other is not null && ToString() == other.ToString();

    public override int GetHashCode() => ToString().GetHashCode(StringComparison.Ordinal);

    private static string Encode(string part) => Uri.EscapeDataString(part);

    private static StubValue ParsePair(string pair, string whole)
    {
        var (column, value) = Cut(pair, '=');
        return column.Length > 0 && column.Length < pair.Length
            ? new StubValue(Decode(column, whole), Decode(value, whole))
            : throw AddressProblems.NotAPair(pair, whole);
    }

    private static string Decode(string part, string whole)
    {
        if (part.Contains('#', StringComparison.Ordinal) || !PercentSignsAreSound(part))
            throw AddressProblems.BadPercent(part, whole);
        return Uri.UnescapeDataString(part);
    }

    private static bool PercentSignsAreSound(string part)
    {
        for (var at = part.IndexOf('%', StringComparison.Ordinal); at >= 0; at = part.IndexOf('%', at + 1))
            if (at + 2 >= part.Length || !char.IsAsciiHexDigit(part[at + 1]) || !char.IsAsciiHexDigit(part[at + 2]))
                return false;
        return true;
    }

    private static (string Before, string After) Cut(string text, char mark)
    {
        var at = text.IndexOf(mark, StringComparison.Ordinal);
        return at < 0 ? (text, "") : (text[..at], text[(at + 1)..]);
    }
}

/// <summary>A stub column and one of its values, as in the CSV.</summary>
public readonly record struct StubValue(string Column, string Value);

/// <summary>The figures an address means: the index of the table in the release, of the measure in the table, and the rows in order.</summary>
public sealed record FigureSelection(int Table, int Measure, IReadOnlyList<int> Rows);
