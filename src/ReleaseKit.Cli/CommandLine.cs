using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;
using ReleaseKit.Pages;
using ReleaseKit.Reading;

namespace ReleaseKit.Cli;

/// <summary>The program's commands in the order of the work, and what every one of them shares.</summary>
public static class CommandLine
{
    /// <summary>Runs one call. Results go to <paramref name="output"/>, progress and messages to <paramref name="error"/>.</summary>
    /// <returns>An <see cref="ExitCode"/>.</returns>
    public static int Run(IReadOnlyList<string> arguments, TextWriter output, TextWriter error)
    {
        var quiet = new Option<bool>("--quiet") { Description = "No progress, only results and findings.", Recursive = true };
        var root = new RootCommand("ReleaseKit publishes noised tables so that nobody misreads them.") { quiet };
        root.Subcommands.Add(ReviewCommand.Build(parsed => new Streams(output, error, parsed.GetValue(quiet))));
        root.Subcommands.Add(ComposeCommand.Build(parsed => new Streams(output, error, parsed.GetValue(quiet))));
        UseOwnHelp(root);
        return Answer(root.Parse(arguments), output, error);
    }

    private static int Answer(ParseResult parsed, TextWriter output, TextWriter error)
    {
        if (CallFault.Of(parsed, parsed.Action is HelpTextAction) is { } fault)
        {
            error.WriteLine($"releasekit: {fault} See 'releasekit {CommandName(parsed)}--help'.");
            return ExitCode.Unusable;
        }

        try
        {
            return parsed.Invoke(new InvocationConfiguration { Output = output, Error = error, EnableDefaultExceptionHandler = false });
        }
        catch (Exception unusable) when (unusable is FolderUnusableException or SiteFolderException)
        {
            error.WriteLine($"releasekit: {unusable.Message}");
            return ExitCode.Unusable;
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException)
        {
            error.WriteLine($"releasekit: {failure.Message} What stood before stands unchanged.");
            return ExitCode.Unusable;
        }
        catch (Exception defect)
        {
            error.WriteLine("releasekit: this is a defect of ReleaseKit, not of your folder. What stood before stands unchanged. Please report:");
            error.WriteLine(defect.ToString());
            return ExitCode.Defect;
        }
    }

    private static string CommandName(ParseResult parsed) =>
        parsed.CommandResult.Command is RootCommand ? "" : parsed.CommandResult.Command.Name + " ";

    private static void UseOwnHelp(RootCommand root)
    {
        foreach (var option in root.Options.OfType<HelpOption>())
            option.Action = new HelpTextAction();
        root.SetAction(parsed => HelpText.Write(parsed.CommandResult.Command, parsed.InvocationConfiguration.Output));
    }

    private sealed class HelpTextAction : SynchronousCommandLineAction
    {
        public override bool ClearsParseErrors => true;

        public override int Invoke(ParseResult parseResult) =>
            HelpText.Write(parseResult.CommandResult.Command, parseResult.InvocationConfiguration.Output);
    }
}
