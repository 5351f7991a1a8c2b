using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Review;
using ReleaseKit.Tests.Wording;
using Xunit;

namespace ReleaseKit.Tests.Folders;

/// <summary>A folder with one thing wrong: the whole review must report it once, at its place, with the remedy, and nothing else as a stop.</summary>
internal sealed class Broken : IDisposable
{
    private readonly TestFolder folder = new();

    public Broken(Action<TestFolder> damage) => damage(folder);

    public static void Stops(string slug, string file, string? at, string remedy, Action<TestFolder> damage) => Has(FindingLevel.Stop, slug, file, at, remedy, damage);

    public static void Cautions(string slug, string file, string? at, string remedy, Action<TestFolder> damage) => Has(FindingLevel.Caution, slug, file, at, remedy, damage);

    /// <summary>A stop at a line and column, for files that cannot be searched as text.</summary>
    public static void StopsAt(string slug, string file, int line, int column, string remedy, Action<TestFolder> damage)
    {
        using var broken = new Broken(damage);
        broken.Check(FindingLevel.Stop, slug, new Place(file, line, column), remedy);
    }

    private static void Has(FindingLevel level, string slug, string file, string? at, string remedy, Action<TestFolder> damage)
    {
        using var broken = new Broken(damage);
        broken.Check(level, slug, at is null ? new Place(file) : broken.PlaceOf(file, at), remedy);
    }

    public IReadOnlyList<Finding> Review()
    {
        var read = folder.Read();
        var appraised = read.Release is { } release && !read.HasStops ? AppraisedRelease.Of(release) : null;
        return ReleaseReview.Of(read, appraised, English.Language);
    }

    public void Dispose() => folder.Dispose();

    private void Check(FindingLevel level, string slug, Place place, string remedy)
    {
        var findings = Review();
        var all = FindingText.Of(findings, "FOLDER");
        var found = findings.Where(finding => finding.Slug == slug).ToList();
        Assert.True(found.Count == 1, $"Expected one {slug}, found:\n{all}");
        Assert.Equal(level, found[0].Level);
        Assert.Equal(place.ToString(), found[0].At.ToString());
        Assert.Contains(remedy, found[0].Do, StringComparison.Ordinal);
        Assert.True(findings.Count(finding => finding.Level == FindingLevel.Stop) == (level == FindingLevel.Stop ? 1 : 0), $"Other stops:\n{all}");
        Assert.DoesNotContain("Exception", all, StringComparison.Ordinal);
        Assert.All(findings, finding => Assert.False(char.IsUpper(finding.Why[0]) || char.IsUpper(finding.Do[0]), $"\"Why\" and \"Do\" go on in small letters:\n{all}"));
    }

    /// <summary>Line and column, from 1, of the first place where a text stands in a file.</summary>
    private Place PlaceOf(string file, string text)
    {
        var whole = File.ReadAllText(Path.Combine(folder.Root, file), Encoding.UTF8);
        var at = whole.IndexOf(text, StringComparison.Ordinal);
        Assert.True(at >= 0, $"\"{text}\" is not in {file}");
        var before = whole[..at];
        return new Place(file, before.Count(letter => letter == '\n') + 1, at - before.LastIndexOf('\n'));
    }
}
