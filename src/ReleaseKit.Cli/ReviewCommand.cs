using System.CommandLine;
using ReleaseKit.Review;

namespace ReleaseKit.Cli;

/// <summary>`review FOLDER`: prints findings; exit code 1 if there are stops.</summary>
internal static class ReviewCommand
{
    public static Command Build(Func<ParseResult, Streams> streams)
    {
        var folder = new Argument<string>("FOLDER") { Description = "The release folder." };
        var all = new Option<bool>("--all") { Description = "Every finding in full, however many of a kind." };
        folder.Validators.Add(result => CallFault.DemandName(result, "FOLDER"));
        var command = new Command("review", "What stands in the way, and for whom.") { folder, all };
        command.SetAction(parsed => Run(parsed.GetRequiredValue(folder), parsed.GetValue(all), streams(parsed)));
        return command;
    }

    private static int Run(string folder, bool all, Streams streams)
    {
        var reviewed = ReviewedFolder.Of(folder, streams);
        streams.Output.Write(FindingText.Of(reviewed.Findings, folder, all));
        return reviewed.HasStops ? ExitCode.Stopped : ExitCode.Done;
    }
}
