using System.Text.RegularExpressions;
using Xunit;

namespace ReleaseKit.Tests.Wording;

public sealed partial class KeysTests
{
    /// <summary>Keys that stand in the code as they are; keys put together from pieces are met by the tests of what says them.</summary>
    [Fact]
    public void Every_key_named_in_the_code_has_a_text()
    {
        var missing = Directory.EnumerateFiles(Path.Combine(Repository.Root, "src"), "*.cs", SearchOption.AllDirectories)
            .Where(file => !file.Contains($"{Path.DirectorySeparatorChar}obj{Path.DirectorySeparatorChar}", StringComparison.Ordinal))
            .SelectMany(file => NamedKey().Matches(File.ReadAllText(file)).Select(match => match.Groups["key"].Value))
            .Where(key => !English.Texts.Has(key));
        Assert.Empty(missing.Distinct());
    }

    /// <summary>The publisher is called one thing in one publication.</summary>
    [Fact]
    public void Office_is_written_one_way() =>
        Assert.DoesNotContain(English.Texts.Keys, key => Regex.IsMatch(English.Texts.Template(key), @"\b[tT]he office\b"));

    [Fact]
    public void Apostrophes_are_curly() => Assert.DoesNotContain(English.Texts.Keys, key => English.Texts.Template(key).Contains('\'', StringComparison.Ordinal));

    [GeneratedRegex("""\b([lL]anguage|voice|texts)\.(Text|Say|Fill|Template)\("(?<key>[a-z][a-z0-9.-]*)"[,)]""")]
    private static partial Regex NamedKey();
}
