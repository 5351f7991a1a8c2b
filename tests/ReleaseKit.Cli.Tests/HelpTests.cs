namespace ReleaseKit.Cli.Tests;

public sealed class HelpTests
{
    [Theory]
    [InlineData("--help")]
    [InlineData("review", "--help")]
    [InlineData("compose", "--help")]
    [InlineData("compose", "-h")]
    public void Help_says_what_for_gives_an_example_and_the_next_step(params string[] arguments)
    {
        var call = Call.Of(arguments);
        Assert.Equal(0, call.ExitCode);
        Assert.Contains("Example:", call.Output);
        Assert.Contains("Next:", call.Output);
        Assert.Contains("Exit codes:", call.Output);
        Assert.Equal("", call.Error);
    }

    [Fact]
    public void Help_lists_the_commands_in_the_order_of_the_work()
    {
        var text = Call.Of("--help").Output;
        Assert.True(text.IndexOf("releasekit review", StringComparison.Ordinal) < text.IndexOf("releasekit compose", StringComparison.Ordinal));
    }

    [Fact]
    public void No_arguments_give_the_help()
    {
        Assert.Equal(Call.Of("--help").Output, Call.Of().Output);
    }

    [Fact]
    public void Help_fits_a_terminal_of_80_columns()
    {
        foreach (var arguments in new string[][] { ["--help"], ["review", "--help"], ["compose", "--help"] })
            Assert.All(Call.Of(arguments).Output.Split('\n'), line => Assert.True(line.Length <= 80, line));
    }

    [Fact]
    public void Version_is_one_line()
    {
        var call = Call.Of("--version");
        Assert.Equal(0, call.ExitCode);
        Assert.Matches(@"^\d+\.\d+\.\d+", call.Output);
    }
}
