using System.Text;
using System.Text.RegularExpressions;

namespace ReleaseKit.Cli.Tests;

/// <summary>A folder with one thing wrong: compose answers 1, says file, place and remedy, shows no stack trace, writes nothing.</summary>
public sealed partial class BrokenFolderTests
{
    private const string Release = "release.json";
    private const string Mechanisms = "mechanisms.json";
    private const string Wards = "tables/arrears-by-ward.csv";
    private const string Owed = "tables/owed-by-district.csv";
    private const string Summary = "narrative/summary.md";

    /// <summary>What is wrong; the file that is edited; what is replaced by what (empty old text: the whole file); the file the message names.</summary>
    public static TheoryData<string, string, string, string, string> Faults => new()
    {
        { "broken JSON", Release, "\"identifier\": \"ehr-2031\",", "\"identifier\": ehr-2031,", Release },
        { "JSON cut short", Mechanisms, "", "{ \"unitOfPrivacy\": { \"who\": \"household\" ", Mechanisms },
        { "a doubled key", Release, "\"identifier\": \"ehr-2031\",", "\"identifier\": \"ehr-2031\", \"identifier\": \"ehr\",", Release },
        { "an unknown key", Release, "\"referencePeriod\"", "\"referencePeriode\"", Release },
        { "a missing title", Release, "\"title\": \"Energy Hardship Register 2031\",", "", Release },
        { "a date that is none", Release, "2032-03-16T09:30:00+01:00", "16 March 2032", Release },
        { "a coverage of 95", Release, "\"main\": 0.95", "\"main\": 95", Release },
        { "thresholds the wrong way round", Release, "\"close\": 0.1, \"rough\": 0.5", "\"close\": 0.5, \"rough\": 0.1", Release },
        { "a kind that is none", Release, "\"kind\": \"mean\"", "\"kind\": \"average\"", Release },
        { "an accent nobody can read", Release, "#7A1D4E", "#FFE0F0", Release },
        { "a key of a later edition", Release, "\"licence\"", "\"derived\": [], \"licence\"", Release },
        { "another language", Release, "\"languages\": [\"en\"]", "\"languages\": [\"en\", \"es\"]", Release },
        { "a path out of the folder", Release, "tables/owed-by-district.csv", "../owed-by-district.csv", Release },
        { "an absolute path", Release, "tables/owed-by-district.csv", "/etc/passwd", Release },
        { "a table file that is missing", Release, "tables/owed-by-district.csv", "tables/owed.csv", Release },
        { "a figure column that is missing", Release, "\"column\": \"mean_owed\"", "\"column\": \"mean_owing\"", Release },
        { "a headline that matches nothing", Release, "\"arrears/in_arrears?district=All&ward=All\",\n", "\"arrears/in_arrears?district=Nowhere&ward=All\",\n", Release },
        { "two tables of one id", Release, "\"id\": \"owed\"", "\"id\": \"arrears\"", Release },
        { "a prose file that is missing", Release, "narrative/summary.md", "narrative/none.md", Release },
        { "a mechanism that nobody declared", Release, "\"mechanism\": \"mean-owed\"", "\"mechanism\": \"mean-owing\"", Release },
        { "a law that is none", Mechanisms, "\"law\": \"discrete-laplace\"", "\"law\": \"discrete-laplas\"", Mechanisms },
        { "sigma of nought", Mechanisms, "\"sigma\": 6.0", "\"sigma\": 0", Mechanisms },
        { "a negative scale", Mechanisms, "\"scale\": 4.0", "\"scale\": -4.0", Mechanisms },
        { "spending too low", Mechanisms, "0.005540167", "0.0054", Mechanisms },
        { "more spent than authorised", Mechanisms, "\"epsilon\": 6.0", "\"epsilon\": 0.5", Mechanisms },
        { "accounting that is for later", Mechanisms, "\"accounting\": \"concentrated\"", "\"accounting\": \"exact\"", Mechanisms },
        { "an accounting in which a law has no loss", Mechanisms, "\"accounting\": \"concentrated\"", "\"accounting\": \"pure\"", Mechanisms },
        { "a sensitivity that is missing", Mechanisms, "\"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 1 },\n      \"answers\": \"Households with an account in each ward\"", "\"answers\": \"Households with an account in each ward\"", Mechanisms },
        { "a table cut by semicolons", Owed, "", "district;mean_owed;owed_scale;accounts_2030\nAldermoor;212.98;1.5;4800\n", Owed },
        { "decimal commas", Owed, "212.98", "\"212,98\"", Owed },
        { "thousands marks", Wards, "9872", "\"9,872\"", Wards },
        { "a ragged row", Owed, "Brackwater,187.78,2.5,2900", "Brackwater,187.78,2.5", Owed },
        { "words for a number", Owed, "229.85", "about 230", Owed },
        { "a row given twice", Owed, "Cindry,229.85,2.0,3600", "Aldermoor,229.85,2.0,3600", Owed },
        { "a column that nobody declared", Owed, "", "district,mean_owed,owed_scale,accounts_2030,true_mean\nAldermoor,212.98,1.5,4800,213.1\nBrackwater,187.78,2.5,2900,187.0\nCindry,229.85,2.0,3600,230.4\n", Owed },
        { "an empty table", Owed, "", "district,mean_owed,owed_scale,accounts_2030\n", Owed },
        { "an empty file", Owed, "", "", Owed },
        { "a scale of nought", Owed, "212.98,1.5,", "212.98,0,", Owed },
        { "a total that is not the sum of its parts", Wards, "All,All,9872,1323", "All,All,9873,1323", Wards },
        { "a figure off the grid", Wards, "Aldermoor,All,3807,618", "Aldermoor,All,3807,618.5", Wards },
        { "a rounded figure off its rounding", Wards, "Aldermoor,Harrow Lane,1599,230", "Aldermoor,Harrow Lane,1599,231", Wards },
        { "a cited figure that does not exist", Summary, "ward=All>) households", "ward=Moon>) households", Summary },
        { "a citation whose words say another number", Summary, "[value](figure:behind-aldermoor)", "[more than 1,500](figure:behind-aldermoor)", Summary },
        { "a citation that was not closed", Summary, "[value](figure:behind-aldermoor)", "[value] (figure:behind-aldermoor and [x](figure:y z)", Summary },
        { "a script link in prose", Summary, "# Summary", "# Summary\n\n[here](javascript:alert(1))", Summary },
        { "a chart that nobody asked for", Summary, "chart:by-district", "chart:by-ward", Summary },
    };

    [Theory]
    [MemberData(nameof(Faults))]
    public void One_thing_wrong_stops_with_place_and_remedy(string fault, string file, string old, string replacement, string named)
    {
        using var folder = new TemporaryFolder();
        var release = Broken(folder, file, old, replacement);
        var call = Call.Of("compose", release, "--to", folder.In("site"));
        Assert.True(call.ExitCode == ExitCode.Stopped, $"{fault}: answered {call.ExitCode}\n{call.Error}");
        var stops = Stop().Matches(call.Error).Select(match => match.Value).ToList();
        Assert.True(stops.Any(stop => stop.Contains($"\n{named}", StringComparison.Ordinal)), $"{fault}: no stop names {named}\n{call.Error}");
        Assert.All(stops, stop => Assert.Contains("Do: ", stop));
        Assert.DoesNotMatch("(Why|Do): [A-Z]", call.Error);
        Assert.DoesNotContain("   at ReleaseKit", call.Error);
        Assert.Equal("", call.Output);
        Assert.False(Directory.Exists(folder.In("site")), $"{fault}: something was written");
    }

    /// <summary>What a message is about that stands in no one line of a file: the file as a whole, or one that is not there.</summary>
    private static readonly string[] OfWholeFiles = ["csv-empty"];

    [Theory]
    [MemberData(nameof(Faults))]
    public void Every_message_names_line_and_column(string fault, string file, string old, string replacement, string named)
    {
        using var folder = new TemporaryFolder();
        var heads = Head().Matches(Call.Of("review", Broken(folder, file, old, replacement)).Output).ToList();
        Assert.True(heads.Count > 0, $"{fault}: nothing was found in {named}");
        Assert.All(heads, head => Assert.True(
            PlaceInFile().IsMatch(head.Groups["place"].Value) || OfWholeFiles.Contains(head.Groups["slug"].Value), $"{fault}: {head.Value}"));
    }

    [Theory]
    [InlineData("review")]
    [InlineData("review", "--quiet")]
    [InlineData("compose", "--to", "site", "--quiet")]
    public void Quiet_silences_progress_and_no_finding(string command, params string[] options)
    {
        using var folder = new TemporaryFolder();
        var release = Broken(folder, Summary, "# Summary", "# Summary\n\n<b>Bold</b>");
        var call = Call.Of([command, release, .. options.Select(option => option == "site" ? folder.In(option) : option)]);
        Assert.Contains("CAUTION  prose-html", call.Output + call.Error);
        Assert.Equal(!options.Contains("--quiet"), call.Error.Contains("Reading "));
    }

    [Fact]
    public void Review_prints_every_finding_when_asked_for_all()
    {
        using var folder = new TemporaryFolder();
        var release = Broken(folder, Summary, "# Summary", "# Summary\n\n" + string.Concat(Enumerable.Repeat("<i>", 20)));
        Assert.Contains($"8 more of this kind in {Summary}", Call.Of("review", release).Output);
        Assert.Equal(20, Call.Of("review", release, "--all").Output.Split("CAUTION  prose-html").Length - 1);
    }

    [Fact]
    public void A_table_in_another_encoding_stops_and_says_how_to_export_it()
    {
        using var folder = new TemporaryFolder();
        var release = Broken(folder, Owed, "", "district,mean_owed,owed_scale,accounts_2030\nÅldermoor,212.98,1.5,4800\n");
        File.WriteAllText(Path.Combine(release, Owed), File.ReadAllText(Path.Combine(release, Owed)), Encoding.Latin1);
        var call = Call.Of("compose", release, "--to", folder.In("site"));
        Assert.Equal(ExitCode.Stopped, call.ExitCode);
        Assert.Contains("UTF-8", call.Error);
    }

    [Fact]
    public void A_link_out_of_the_folder_stops()
    {
        using var folder = new TemporaryFolder();
        var outside = folder.Write("outside.csv", File.ReadAllText(Path.Combine(Repository.Release("example"), Owed)));
        var release = Broken(folder, Owed, "Cindry", "Cindry");
        File.Delete(Path.Combine(release, Owed));
        File.CreateSymbolicLink(Path.Combine(release, Owed), outside);
        var call = Call.Of("compose", release, "--to", folder.In("site"));
        Assert.Equal(ExitCode.Stopped, call.ExitCode);
        Assert.False(Directory.Exists(folder.In("site")));
    }

    private static string Broken(TemporaryFolder folder, string edited, string old, string replacement)
    {
        var from = Repository.Release("example");
        foreach (var file in Directory.EnumerateFiles(from, "*", SearchOption.AllDirectories))
        {
            var name = Path.GetRelativePath(from, file).Replace('\\', '/');
            var text = File.ReadAllText(file).ReplaceLineEndings("\n");
            if (name == edited)
                text = old.Length == 0 ? replacement : Replaced(text, old, replacement);
            folder.Write(Path.Combine("release", name), text);
        }

        return folder.In("release");
    }

    private static string Replaced(string text, string old, string replacement)
    {
        Assert.Contains(old, text);
        var at = text.IndexOf(old, StringComparison.Ordinal);
        return text[..at] + replacement + text[(at + old.Length)..];
    }

    [GeneratedRegex(@"^(?:STOP|CAUTION|NOTE)  (?<slug>\S+) +for: .*\n(?<place>\S+)\s", RegexOptions.Multiline)]
    private static partial Regex Head();

    [GeneratedRegex(@"^[^:]+:[1-9][0-9]*:[1-9][0-9]*$")]
    private static partial Regex PlaceInFile();

    [GeneratedRegex(@"^STOP .*?(?=\n\n|\z)", RegexOptions.Singleline | RegexOptions.Multiline)]
    private static partial Regex Stop();
}
