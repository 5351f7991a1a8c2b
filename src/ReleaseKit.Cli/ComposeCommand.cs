using System.CommandLine;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages;
using ReleaseKit.Review;
using ReleaseKit.Wording;

namespace ReleaseKit.Cli;

/// <summary>`compose FOLDER --to SITE`: writes the publication, or nothing.</summary>
internal static class ComposeCommand
{
    public static Command Build(Func<ParseResult, Talk> talk)
    {
        var folder = new Argument<string>("FOLDER") { Description = "The release folder." };
        var site = new Option<string>("--to") { Description = "Where the publication goes.", HelpName = "SITE", Required = true };
        var command = new Command("compose", "The publication: pages, charts, downloads.") { folder, site };
        command.SetAction(parsed => Run(parsed.GetRequiredValue(folder), parsed.GetRequiredValue(site), talk(parsed)));
        return command;
    }

    private static int Run(string folder, string site, Talk talk)
    {
        var reviewed = ReviewedFolder.Of(folder, talk);
        foreach (var finding in talk.Shown(reviewed.Findings))
            talk.Error.WriteLine(FindingText.Of(finding));
        if (reviewed.HasStops || reviewed.Appraised is null)
        {
            talk.Error.WriteLine(FindingText.LastLine(reviewed.Findings, folder));
            return ExitCode.Stopped;
        }

        Write(reviewed.Appraised, site, talk);
        return ExitCode.Done;
    }

    private static void Write(IAppraisedRelease appraised, string site, Talk talk)
    {
        var language = Language.Load(SiteTemplates.Folder, appraised.Release.MainLanguage);
        using var target = SiteFolder.Open(site);
        var budget = BudgetStatement.Of(appraised.Release);
        ProgressReport.Around(talk, FigureCount(appraised), progress => Site.Compose(appraised, language, budget, SiteTemplates.Folder, target, progress));
        var changes = target.Finish();
        talk.Result($"Composed {Path.Combine(site, "index.html")}");
        foreach (var line in ChangeText.Of(changes, target))
            talk.Result(line);
    }

    private static long FigureCount(IAppraisedRelease appraised) =>
        appraised.Release.Tables.Sum(table => (long)table.RowCount * table.Measures.Count);
}
