using System.CommandLine;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages;
using ReleaseKit.Review;
using ReleaseKit.Wording;

namespace ReleaseKit.Cli;

/// <summary>`compose FOLDER --to SITE`: writes the publication, or nothing.</summary>
internal static class ComposeCommand
{
    public static Command Build(Func<ParseResult, Streams> streams)
    {
        var folder = new Argument<string>("FOLDER") { Description = "The release folder." };
        var site = new Option<string>("--to") { Description = "Where the publication goes.", HelpName = "SITE", Required = true };
        folder.Validators.Add(result => CallFault.DemandName(result, "FOLDER"));
        site.Validators.Add(result => CallFault.DemandName(result, "SITE"));
        var command = new Command("compose", "The publication: pages, charts, downloads.") { folder, site };
        command.SetAction(parsed => Run(parsed.GetRequiredValue(folder), parsed.GetRequiredValue(site), streams(parsed)));
        return command;
    }

    private static int Run(string folder, string site, Streams streams)
    {
        SiteFolder.DemandOutside(folder, site);
        var reviewed = ReviewedFolder.Of(folder, streams);
        foreach (var finding in PrintedFindings.Of(reviewed.Findings, folder))
            streams.Error.WriteLine(FindingText.Of(finding));
        if (reviewed.HasStops || reviewed.Appraised is null)
        {
            streams.Error.WriteLine(FindingText.LastLine(reviewed.Findings, folder));
            return ExitCode.Stopped;
        }

        Write(reviewed.Appraised, site, streams);
        return ExitCode.Done;
    }

    private static void Write(IAppraisedRelease appraised, string site, Streams streams)
    {
        var language = Language.Load(SiteTemplates.Folder, appraised.Release.MainLanguage);
        using var target = SiteFolder.Open(site);
        var budget = BudgetStatement.Of(appraised.Release);
        ProgressReport.Around(streams, FigureCount(appraised), progress => Site.Compose(appraised, language, budget, SiteTemplates.Folder, target, progress));
        var changes = target.Finish();
        streams.Result($"Composed {Path.Combine(site, "index.html")}");
        foreach (var line in ChangeText.Of(changes, target))
            streams.Result(line);
    }

    private static long FigureCount(IAppraisedRelease appraised) =>
        appraised.Release.Tables.Sum(table => (long)table.RowCount * table.Measures.Count);
}
