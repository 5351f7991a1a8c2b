using System.CommandLine;
using ReleaseKit.Review;

namespace ReleaseKit.Cli;

/// <summary>`review FOLDER`: prints findings; exit code 1 if there are stops.</summary>
internal static class ReviewCommand
{
    public static Command Build(Func<ParseResult, Streams> streams)
    {
        var folder = new Argument<string>("FOLDER") { Description = "The release folder." };
        var command = new Command("review", "What stands in the way, and for whom.") { folder };
        command.SetAction(parsed => Run(parsed.GetRequiredValue(folder), streams(parsed)));
        return command;
    }

    private static int Run(string folder, Streams streams)
    {
        var reviewed = ReviewedFolder.Of(folder, streams);
        streams.Output.Write(FindingText.Of(streams.Shown(reviewed.Findings), folder));
        return reviewed.HasStops ? ExitCode.Stopped : ExitCode.Done;
    }
}
