using System.Globalization;

namespace ReleaseKit.Site.Tests.Fixtures;

/// <summary>A small release whose one table has so many measures, each named by a word of a given length, with figures and noise of every size.</summary>
public static class OddRelease
{
    private const string Letters = "harbourmastersgatekeeperslodgeandlongdroveallotmentgardens";
    private const int Rows = 4;

    /// <summary>Writes the release into a folder, and composes it.</summary>
    public static ComposedSample Compose(TemporaryFolder folder, int measures, int letters = 12)
    {
        folder.Write("release.json", $$"""
            { "title": "Odd figures", "identifier": "odd", "publisher": { "name": "Statistics Norrvale", "contact": "office@stats.example" },
              "published": "2032-03-16T09:30:00Z", "units": { "person": { "en": { "one": "person", "other": "persons" } } },
              "charts": [ { "id": "order", "title": "By size", "form": "ordered", "figures": "odd/m0" } ],
              "narrative": [ { "file": "narrative/a.md", "language": "en" } ],
              "headlines": [ { "figure": "odd/m0?area={{Word(0, letters)}}" } ],
              "tables": [ { "id": "odd", "file": "tables/odd.csv", "title": "Persons by area", "stub": [ { "column": "area", "title": "Area" } ],
                "figures": [ {{Each(measures, index => $$"""{ "column": "m{{index}}", "title": "{{Word(index, letters)}}", "unit": "person", "kind": "count", "noise": [ { "mechanism": "n{{index}}" } ] }""")}} ] } ] }
            """);
        folder.Write("mechanisms.json", $$"""
            { "unitOfPrivacy": { "who": "person", "over": "the year 2031" }, "neighbouring": "add-or-remove", "accounting": "pure", "authorised": { "epsilon": 6.5 },
              "mechanisms": [ {{Each(measures, index => $$"""{ "id": "n{{index}}", "law": "discrete-laplace", "scale": {{ScaleOf(index)}}, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 }, "answers": "persons", "level": "area" }""")}} ] }
            """);
        folder.Write("tables/odd.csv", $"area,{Each(measures, index => $"m{index}")}\n"
            + string.Concat(Enumerable.Range(0, Rows).Select(row => $"{Word(row, letters)},{Each(measures, index => Figure(row, index))}\n")));
        folder.Write("narrative/a.md", "# Odd figures\n\n![By size](chart:order)\n");
        return ComposedSample.Of(folder.Path);
    }

    /// <summary>Words that differ in their first letters and run on without a space.</summary>
    private static string Word(int index, int letters) => $"{(char)('A' + (index % 26))}{index}{Letters}"[..letters];

    private static long ScaleOf(int index) => index % 3 == 2 ? 500_000 : 4;

    private static string Figure(int row, int index) => (ScaleOf(index) * (3 + (row * 7) + index) + row + index).ToString(CultureInfo.InvariantCulture);

    private static string Each(int count, Func<int, string> text) => string.Join(',', Enumerable.Range(0, count).Select(text));
}
