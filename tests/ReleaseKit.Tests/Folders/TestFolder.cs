using System.Text;
using ReleaseKit.Reading;
using ReleaseKit.Review;
using Xunit;

namespace ReleaseKit.Tests.Folders;

/// <summary>
/// A release folder for tests, in a directory of its own that goes when the test ends. Begins as a small valid release (one table, two mechanisms,
/// one page of prose, one chart); each call changes one thing.
/// </summary>
public sealed class TestFolder : IDisposable
{
    public const string Release = """
        {
          "title": "Lamps counted",
          "identifier": "lamps-2031",
          "publisher": { "name": "Office of Lamps", "contact": "lamps@office.example" },
          "published": "2032-03-16T09:30:00+01:00",
          "address": "https://office.example/lamps/1/",
          "licence": { "name": "CC BY 4.0", "url": "https://creativecommons.org/licenses/by/4.0/" },
          "units": { "lamp": { "en": { "one": "lamp", "other": "lamps" } } },
          "narrative": [ { "file": "narrative/summary.md" } ],
          "headlines": [ "lamps/lit?street=All" ],
          "tables": [
            {
              "id": "lamps", "file": "tables/lamps.csv", "title": "Lamps, by street",
              "stub": [ { "column": "street", "title": "Street", "all": "All" } ],
              "figures": [
                { "column": "lit", "title": "Lamps lit", "unit": "lamp", "kind": "count",
                  "noise": [ { "where": { "street": "All" }, "sumOver": "street" }, { "mechanism": "lamps-lit" } ] },
                { "column": "broken", "title": "Lamps broken", "unit": "lamp", "kind": "count", "noise": [ { "mechanism": "lamps-broken" } ] }
              ]
            }
          ],
          "charts": [ { "id": "by-street", "title": "Lamps lit, by street", "figures": "lamps/lit" } ]
        }
        """;

    public const string Mechanisms = """
        {
          "unitOfPrivacy": { "who": { "one": "keeper", "other": "keepers" }, "over": "the year 2031" },
          "neighbouring": "add-or-remove",
          "accounting": "concentrated",
          "authorised": { "epsilon": 6.0, "delta": 1e-9 },
          "mechanisms": [
            { "id": "lamps-lit", "law": "discrete-gaussian", "sigma": 4.0, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 } },
            { "id": "lamps-broken", "law": "discrete-laplace", "scale": 3.0, "sensitivity": { "cellsPerUnit": 2, "perCell": 1 } }
          ],
          "practice": { "sampler": "exact integer sampler" }
        }
        """;

    public const string Table = """
        street,lit,broken
        All,60,9
        Kiln Row,31,4
        Quay,20,5
        Weir Lane,9,-1

        """;

    public const string Prose = """
        # Summary

        In 2031 [value and margin](figure:lamps/lit?street=All) lamps were lit.

        ![Lamps lit, by street](chart:by-street)

        """;

    private readonly DirectoryInfo root = Directory.CreateTempSubdirectory("releasekit-test-");

    public TestFolder()
    {
        With("release.json", Release);
        With("mechanisms.json", Mechanisms);
        With("tables/lamps.csv", Table);
        With("narrative/summary.md", Prose);
    }

    public string Root => root.FullName;

    /// <summary>Writes a file, as UTF-8 with \n at the ends of lines.</summary>
    public TestFolder With(string path, string text) => With(path, Encoding.UTF8.GetBytes(text.ReplaceLineEndings("\n")));

    public TestFolder With(string path, byte[] bytes)
    {
        var file = Path.Combine(Root, path);
        Directory.CreateDirectory(Path.GetDirectoryName(file)!);
        File.WriteAllBytes(file, bytes);
        return this;
    }

    public TestFolder Without(string path)
    {
        File.Delete(Path.Combine(Root, path));
        return this;
    }

    /// <summary>Replaces a text that stands in the file exactly once.</summary>
    public TestFolder Edit(string path, string from, string to)
    {
        var text = File.ReadAllText(Path.Combine(Root, path));
        var first = text.IndexOf(from, StringComparison.Ordinal);
        Assert.True(first >= 0 && first == text.LastIndexOf(from, StringComparison.Ordinal), $"\"{from}\" must stand in {path} once.");
        return With(path, text.Replace(from, to, StringComparison.Ordinal));
    }

    public TestFolder Link(string path, string target)
    {
        File.CreateSymbolicLink(Path.Combine(Root, path), target);
        return this;
    }

    public ReadOutcome Read() => ReleaseFolder.Read(Root);

    /// <summary>The one finding of a slug, and that there is no stop but it.</summary>
    public Finding OnlyStop(string slug)
    {
        var stops = Read().Findings.Where(finding => finding.Level == FindingLevel.Stop).ToList();
        Assert.True(stops.Count == 1 && stops[0].Slug == slug, $"Expected one stop {slug}, found: {string.Join("; ", stops.Select(stop => $"{stop.Slug} {stop.At} {stop.Found}"))}");
        return stops[0];
    }

    public void Dispose() => root.Delete(recursive: true);
}
