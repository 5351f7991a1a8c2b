using System.CommandLine;
using System.CommandLine.Parsing;

namespace ReleaseKit.Cli;

/// <summary>What is wrong with a call, in one sentence: the word that is unknown, before what the parser made of the words after it.</summary>
internal static class CallFault
{
    /// <returns>Null if nothing is wrong.</returns>
    public static string? Of(ParseResult parsed, bool isHelp)
    {
        if (UnknownCommand(parsed) is { } command)
            return $"'{command}' is no command; the commands are {string.Join(" and ", parsed.RootCommandResult.Command.Subcommands.Select(known => known.Name))}.";
        if (isHelp)
            return null;
        return UnknownOption(parsed) is { } option ? $"'{option}' is no option{Command(parsed)}." : FirstOfParser(parsed);
    }

    /// <summary>An empty or blank name is a variable that was not set; taken as it stands it would name the present folder, or make one called " ".</summary>
    public static void DemandName(SymbolResult result, string name)
    {
        if (result.Tokens.Any(token => string.IsNullOrWhiteSpace(token.Value)))
            result.AddError($"{name} is empty; name the folder.");
    }

    private static string? FirstOfParser(ParseResult parsed) => parsed.Errors.Count > 0 ? parsed.Errors[0].Message : null;

    private static string? UnknownCommand(ParseResult parsed) =>
        parsed.CommandResult.Command is RootCommand ? parsed.UnmatchedTokens.FirstOrDefault(token => !IsOption(token)) : null;

    private static string? UnknownOption(ParseResult parsed) =>
        parsed.Tokens.TakeWhile(token => token.Type != TokenType.DoubleDash).FirstOrDefault(token => token.Type == TokenType.Argument && IsOption(token.Value))?.Value;

    private static bool IsOption(string token) => token.Length > 1 && token[0] == '-';

    private static string Command(ParseResult parsed) =>
        parsed.CommandResult.Command is RootCommand ? "" : $" of {parsed.CommandResult.Command.Name}";
}
