using System.CommandLine;
using ReleaseKit.Review;

namespace ReleaseKit.Cli;

/// <summary>`review FOLDER`: prints findings; exit code 1 if there are stops.</summary>
internal static class ReviewCommand
{
    public static Command Build(Func<ParseResult, Talk> talk)
    {
        var folder = new Argument<string>("FOLDER") { Description = "The release folder." };
        var command = new Command("review", "What stands in the way, and for whom.") { folder };
        command.SetAction(parsed => Run(parsed.GetRequiredValue(folder), talk(parsed)));
        return command;
    }

    private static int Run(string folder, Talk talk)
    {
        var reviewed = ReviewedFolder.Of(folder, talk);
        talk.Output.Write(FindingText.Of(talk.Shown(reviewed.Findings), folder));
        return reviewed.HasStops ? ExitCode.Stopped : ExitCode.Done;
    }
}
