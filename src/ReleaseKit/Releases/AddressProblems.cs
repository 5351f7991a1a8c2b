namespace ReleaseKit.Releases;

/// <summary>Everything that can be wrong with an address, one factory a failure.</summary>
internal static class AddressProblems
{
    private const int Listed = 3;

    public static AddressException NotAnAddress(string text) => new(
        $"\"{text}\" is no figure address", "write table/figure?column=value, for example arrears/in_arrears?ward=All.");

    public static AddressException UnknownName(string text, IEnumerable<string> names) => new(
        $"\"{text}\" is neither an address nor a short name", Nearest.Of(text, names) is { } near
            ? $"write {near}, or a full address: table/figure?column=value."
            : "write a full address, table/figure?column=value, or add the name to \"short\" in release.json.");

    public static AddressException NotAPair(string pair, string whole) => new(
        $"\"{pair}\" in \"{whole}\" is no column=value", "write column=value, joined by &: ?district=Aldermoor&ward=All.");

    public static AddressException BadPercent(string part, string whole) => new(
        $"\"{part}\" in \"{whole}\" is not properly percent-encoded", "write % as %25, # as %23, & as %26, a space as %20.");

    public static AddressException UnknownTable(FigureAddress address, IReadOnlyList<Table> tables) => new(
        $"{Quoted(address)} names a table \"{address.Table}\" that is not in the release", Suggest(address.Table, tables.Select(table => table.Id)));

    public static AddressException UnknownFigure(FigureAddress address, Table table) => new(
        $"{Quoted(address)} names a figure \"{address.Figure}\" that table \"{table.Id}\" does not have",
        Suggest(address.Figure, table.Measures.Select(measure => measure.Column)));

    public static AddressException UnknownColumn(FigureAddress address, string column, Table table) => new(
        $"{Quoted(address)} names a column \"{column}\" that is no stub column of \"{table.Id}\"", Suggest(column, table.Stub.Select(stub => stub.Column)));

    public static AddressException UnknownValue(FigureAddress address, StubColumn column, string value) => new(
        $"{Quoted(address)}: column \"{column.Column}\" has no value \"{value}\"", Suggest(value, column.Labels.Select(label => label.Value)));

    public static AddressException NamedTwice(FigureAddress address, string column) => new(
        $"{Quoted(address)} names the column \"{column}\" twice", "name each column once.");

    public static AddressException NothingMatches(FigureAddress address, Table table) => new(
        $"{Quoted(address)} matches no row of \"{table.Id}\"",
        "check the values against the CSV; rows for all are left out of a column that the address does not name.");

    public static AddressException Several(FigureAddress address, FigureSelection selection, Release release) =>
        Several(address, selection, release.Tables);

    public static AddressException Several(FigureAddress address, FigureSelection selection, IReadOnlyList<Table> tables)
    {
        var table = tables[selection.Table];
        var first = selection.Rows.Take(Listed).Select(row => FigureAddress.Canonical(table, table.Measures[selection.Measure], row));
        return new AddressException(
            $"{Quoted(address)} means {selection.Rows.Count} figures, but one is needed here",
            $"name every stub column. The first are: {string.Join(", ", first)}.");
    }

    private static string Quoted(FigureAddress address) => address.Written is { } written ? $"\"{written}\"" : address.ToString();

    private static string Suggest(string given, IEnumerable<string> known)
    {
        var names = known.ToList();
        if (Nearest.Of(given, names) is { } near)
            return $"write {near}.";
        return names.Count == 0 ? "there is none yet." : $"use one of these: {string.Join(", ", names.Take(Listed))}{(names.Count > Listed ? ", …" : "")}.";
    }
}
