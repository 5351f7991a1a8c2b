using System.Text;
using System.Text.Json.Nodes;
using CsCheck;
using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Whatever is done to a folder, the review answers with findings: no exception reaches the caller.</summary>
public sealed class DamagedFolderTests
{
    private static readonly string[] Replacements = ["null", "-1", "0", "1e308", "\"x\"", "\"All\"", "[{}]", "{\"column\":\"lit\"}"];

    /// <summary>Of the replacements, how many are tried at each place; neighbouring places get others.</summary>
    private const int TriedAtEachPlace = 3;

    private const string Steps = """
        { "mechanisms": [
            { "id": "lamps-lit", "law": "staircase", "epsilon": 1, "gamma": 0.5, "sensitivity": { "cellsPerUnit": 1, "perCell": 1, "perUnit": 2, "signed": true, "moves": false } },
            { "id": "lamps-broken", "law": "truncated-discrete-laplace", "scale": 3.0, "cutoff": 9, "grid": 1, "sensitivity": { "l1": 1, "l2": 1, "l1Levels": 1 }, "spent": { "epsilon": 1, "delta": 0.1, "rho": 0.1 },
              "afterwards": [ { "roundTo": 5, "how": "nearest", "ties": "even" }, { "notBelow": 0 }, { "notAbove": 50 }, { "zeroBelow": 5 } ],
              "clipped": { "from": 0, "to": 9 }, "denominator": { "public": "lit" }, "use": "figures", "describedAt": "https://office.example/" } ],
          "unitOfPrivacy": { "who": "lamp" }, "neighbouring": "replace", "accounting": "approximate", "authorised": { "epsilon": 6.0, "delta": 0.1, "rho": 1, "on": "2031-01-01" },
          "composition": { "together": [ "lamps-lit" ] } }
        """;

    [Theory]
    [InlineData("release.json", TestFolder.Release)]
    [InlineData("mechanisms.json", TestFolder.Mechanisms)]
    [InlineData("mechanisms.json", Steps)]
    public void Any_value_replaced_by_any_other_is_answered_with_findings(string file, string json)
    {
        using var folder = new TestFolder();
        foreach (var (index, path) in Paths(JsonNode.Parse(json)!).Index())
            foreach (var replacement in Enumerable.Range(index, TriedAtEachPlace).Select(number => Replacements[number * 3 % Replacements.Length]))
                Review(folder.With(file, Replaced(json, path, JsonNode.Parse(replacement))), $"{path} = {replacement}");
    }

    [Theory]
    [InlineData("release.json", TestFolder.Release)]
    [InlineData("mechanisms.json", TestFolder.Mechanisms)]
    public void Any_value_taken_out_is_answered_with_findings(string file, string json)
    {
        using var folder = new TestFolder();
        foreach (var path in Paths(JsonNode.Parse(json)!))
            Review(folder.With(file, Without(json, path)), $"without {path}");
    }

    [Theory]
    [InlineData("release.json", TestFolder.Release)]
    [InlineData("mechanisms.json", TestFolder.Mechanisms)]
    [InlineData("tables/lamps.csv", TestFolder.Table)]
    [InlineData("narrative/summary.md", TestFolder.Prose)]
    public void Any_bytes_replaced_are_answered_with_findings(string file, string text)
    {
        using var folder = new TestFolder();
        var bytes = Encoding.UTF8.GetBytes(text.ReplaceLineEndings("\n"));
        Gen.Select(Gen.Int[0, bytes.Length - 1], Gen.Byte.Array[1, 6]).Sample((at, damage) =>
        {
            byte[] damaged = [.. bytes];
            damage.AsSpan(0, Math.Min(damage.Length, damaged.Length - at)).CopyTo(damaged.AsSpan(at));
            Review(folder.With(file, damaged), $"{Convert.ToHexString(damage)} at {at}");
        }, iter: 150, threads: 1);
    }

    private static void Review(TestFolder folder, string what)
    {
        try
        {
            var read = folder.Read();
            var findings = ReleaseReview.Of(read, null);
            Assert.True(read.Release is not null || read.HasStops);
            Assert.NotEqual("", FindingText.Of(findings, "FOLDER"));
        }
        catch (Exception defect)
        {
            throw new InvalidOperationException(what, defect);
        }
    }

    private static IEnumerable<string> Paths(JsonNode node) => node switch
    {
        JsonObject json => json.Where(member => member.Value is not null).SelectMany(member => Paths(member.Value!).Prepend(member.Value!.GetPath())),
        JsonArray list => list.Where(item => item is not null).SelectMany(item => Paths(item!).Prepend(item!.GetPath())),
        _ => [],
    };

    private static string Replaced(string json, string path, JsonNode? by) => Changed(json, path, node => node.ReplaceWith(by));

    private static string Without(string json, string path) => Changed(json, path, node =>
    {
        if (node.Parent is JsonObject parent)
            parent.Remove(node.GetPropertyName());
        else
            ((JsonArray)node.Parent!).Remove(node);
    });

    private static string Changed(string json, string path, Action<JsonNode> change)
    {
        var root = JsonNode.Parse(json)!;
        change(All(root).First(node => node.GetPath() == path));
        return root.ToJsonString();
    }

    private static IEnumerable<JsonNode> All(JsonNode node) => node switch
    {
        JsonObject json => json.Where(member => member.Value is not null).SelectMany(member => All(member.Value!)).Prepend(node),
        JsonArray list => list.Where(item => item is not null).SelectMany(item => All(item!)).Prepend(node),
        _ => [node],
    };
}
