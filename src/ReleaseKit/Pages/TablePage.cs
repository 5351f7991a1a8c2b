using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>One page of a table.</summary>
/// <param name="Path">Path in the site: "tables/arrears/aldermoor.html".</param>
/// <param name="Part">The value of the cutting column that the page holds; null for the table's first page, or where nothing cuts.</param>
/// <param name="Number">Counts the pages of one part from 1.</param>
/// <param name="Rows">The table's rows on this page, in the order of the stub.</param>
public sealed record TablePage(string Path, StubLabel? Part, int Number, IReadOnlyList<int> Rows);
