namespace ReleaseKit.Cli;

/// <summary>What a call answers to the shell; the same numbers for every command.</summary>
public static class ExitCode
{
    /// <summary>Done; no stop.</summary>
    public const int Done = 0;

    /// <summary>Stops hold the release back; nothing was written.</summary>
    public const int Stopped = 1;

    /// <summary>The call or the folder cannot be used at all.</summary>
    public const int Unusable = 2;

    /// <summary>A defect of ReleaseKit itself (EX_SOFTWARE of sysexits.h).</summary>
    public const int Defect = 70;
}
