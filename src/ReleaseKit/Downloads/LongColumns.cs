using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>The columns of a long file, in their order; Key says what it holds in the wording file, null for a stub column.</summary>
internal sealed record LongColumn(string Name, string? Key, ReaderText? Title, bool IsNumber)
{
    public const string Address = "address";

    private static readonly string[] Numbers = ["value", "margin", "noise_margin", "low", "high", "uncut_low", "uncut_high", "coverage"];

    public static IReadOnlyList<LongColumn> Of(Table table) =>
    [
        Plain(Address),
        .. table.Stub.Select(column => new LongColumn(column.Column, null, column.Title, false)),
        Plain("figure"),
        .. Numbers.Select(name => new LongColumn(name, name, null, true)),
        Plain("reliability"), Plain("status"), Plain("changed"),
    ];

    private static LongColumn Plain(string name) => new(name, name, null, false);
}
