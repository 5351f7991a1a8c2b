namespace ReleaseKit.Cli.Tests;

/// <summary>One call of the program inside the test's process.</summary>
public sealed record Call(int ExitCode, string Output, string Error)
{
    public static Call Of(params string[] arguments)
    {
        var (output, error) = (new StringWriter(), new StringWriter());
        var code = CommandLine.Run(arguments, output, error);
        return new Call(code, output.ToString(), error.ToString());
    }
}
