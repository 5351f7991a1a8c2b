using System.Diagnostics;
using Spectre.Console;

namespace ReleaseKit.Cli;

/// <summary>Says how far long work is: a bar with figures done, rate and time left on a terminal, plain lines in a log, nothing if quiet.</summary>
internal static class ProgressReport
{
    /// <summary>Runs the work; it reports figures done out of <paramref name="total"/>.</summary>
    public static void Around(Streams streams, long total, Action<IProgress<long>> work)
    {
        if (streams.IsTerminal)
            OnTerminal(streams.Error, total, work);
        else
            work(new Lines(streams, total));
    }

    private static void OnTerminal(TextWriter error, long total, Action<IProgress<long>> work)
    {
        var console = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(error) });
        console.Progress().AutoClear(true)
            .Columns(new TaskDescriptionColumn(), new ProgressBarColumn(), new PercentageColumn(), new RemainingTimeColumn())
            .Start(context =>
            {
                var task = context.AddTask($"Writing {total} figures", maxValue: Math.Max(total, 1));
                work(new Bar(task));
            });
    }

    private sealed class Bar(ProgressTask task) : IProgress<long>
    {
        public void Report(long value) => task.Value = value;
    }

    private sealed class Lines(Streams streams, long total) : IProgress<long>
    {
        private static readonly TimeSpan Between = TimeSpan.FromSeconds(10);
        private readonly Stopwatch clock = Stopwatch.StartNew();
        private TimeSpan last;

        public void Report(long value)
        {
            if (clock.Elapsed - last < Between)
                return;
            last = clock.Elapsed;
            var rate = value / clock.Elapsed.TotalSeconds;
            var left = rate > 0 ? (total - value) / rate : 0;
            streams.Message($"{value} of {total} figures, {rate:F0} a second, about {left:F0} s left");
        }
    }
}
