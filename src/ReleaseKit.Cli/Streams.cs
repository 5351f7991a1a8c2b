namespace ReleaseKit.Cli;

/// <summary>How one call speaks: results on one writer, progress and messages on the other, progress left out if quiet.</summary>
public sealed class Streams(TextWriter output, TextWriter error, bool quiet)
{
    /// <summary>Whether progress may redraw its line: standard error is a terminal.</summary>
    public bool IsTerminal { get; } = !quiet && ReferenceEquals(error, Console.Error) && !Console.IsErrorRedirected;

    public bool IsQuiet => quiet;

    public TextWriter Error => error;

    public void Result(string text) => output.WriteLine(text);

    public void Message(string text)
    {
        if (!quiet)
            error.WriteLine(text);
    }

    public TextWriter Output => output;
}
