using System.Diagnostics;

namespace ReleaseKit.Site.Tests.Fixtures;

/// <summary>Runs releasekit as a program of its own, as its users do.</summary>
public static class ReleaseKitProgram
{
    public sealed record Answer(int ExitCode, string Output, string Error);

    public static Answer Run(IReadOnlyList<string> arguments, IReadOnlyDictionary<string, string>? environment = null, string? workingFolder = null)
    {
        var program = Path.Combine(AppContext.BaseDirectory, "releasekit.dll");
        return Start("dotnet", [program, .. arguments], environment, workingFolder);
    }

    public static Answer Start(string file, IReadOnlyList<string> arguments, IReadOnlyDictionary<string, string>? environment = null, string? workingFolder = null)
    {
        var start = new ProcessStartInfo(file, arguments)
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            WorkingDirectory = workingFolder ?? Repository.Root,
        };
        foreach (var (name, value) in environment ?? new Dictionary<string, string>())
            start.Environment[name] = value;
        using var process = Process.Start(start)!;
        var error = process.StandardError.ReadToEndAsync();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return new Answer(process.ExitCode, output, error.GetAwaiter().GetResult());
    }
}
