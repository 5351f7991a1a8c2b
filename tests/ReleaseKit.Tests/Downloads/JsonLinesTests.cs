using System.Text.Json;
using ReleaseKit.Appraisal;
using ReleaseKit.Downloads;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using Xunit;

namespace ReleaseKit.Tests.Downloads;

public sealed class JsonLinesTests(SampleDownloads downloads) : IClassFixture<SampleDownloads>
{
    public static TheoryData<int> Tables => [0, 1, 2, 3, 4, 5];

    [Theory]
    [MemberData(nameof(Tables))]
    public void Line_gives_the_figure_with_all_digits(int table)
    {
        foreach (var (figure, line) in Lines(table))
        {
            Assert.Equal(figure.Address, line.GetProperty("address").GetString());
            Assert.Equal(figure.HasNumber ? figure.Value.ToString() : "null", line.GetProperty("value").GetRawText());
            Assert.Equal(figure.Main?.Margin, NumberOrNull(line, "margin"));
            Assert.Equal(figure.Main?.Low, NumberOrNull(line, "low"));
            Assert.Equal(figure.Main?.High, NumberOrNull(line, "high"));
            Assert.Equal(figure.Main?.UncutLow, NumberOrNull(line, "uncutLow"));
            Assert.Equal(figure.Main?.UncutHigh, NumberOrNull(line, "uncutHigh"));
            Assert.Equal(figure.Main?.Attained, NumberOrNull(line, "coverage"));
            Assert.Equal(ReliabilityWord.Of(figure.Reliability), line.GetProperty("reliability").GetString());
            Assert.Equal(figure.Status.ToString(), line.GetProperty("status").GetString());
        }
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Margin_worked_out_again_from_law_draws_and_steps_is_the_margin(int table)
    {
        var worked = 0;
        foreach (var (figure, line) in Lines(table).Where(pair => pair.Figure.Main is not null))
        {
            Assert.NotEqual(JsonValueKind.Null, line.GetProperty("law").ValueKind);
            Assert.Equal(figure.Main!.Margin, ErrorOf(line).MarginAt(downloads.Release.Coverages.Main).Width, 12);
            worked++;
        }
        Assert.True(worked > 0);
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Draws_are_named_by_figures_that_were_drawn_themselves(int table)
    {
        foreach (var (figure, line) in Lines(table).Where(pair => pair.Figure.Main is not null))
        {
            var draws = line.GetProperty("draws").EnumerateArray().ToList();
            Assert.Equal(figure.Draws, draws.Count);
            Assert.Equal(draws.Count, draws.Select(draw => draw.GetProperty("id").GetString()).Distinct().Count());
            Assert.All(draws, draw => Assert.Equal(1, downloads.Appraised.FigureAt(draw.GetProperty("id").GetString()!).Draws));
            Assert.All(draws, draw => Assert.Equal(1, draw.GetProperty("times").GetInt32()));
        }
    }

    [Fact]
    public void Figures_without_noise_have_no_law_and_no_draws()
    {
        var lines = Lines(0).Where(pair => pair.Figure.Reliability is Reliability.Public or Reliability.NotStated).ToList();
        Assert.NotEmpty(lines);
        Assert.All(lines, pair => Assert.Equal(JsonValueKind.Null, pair.Line.GetProperty("law").ValueKind));
        Assert.All(lines, pair => Assert.Equal(0, pair.Line.GetProperty("draws").GetArrayLength()));
    }

    private IEnumerable<(AppraisedFigure Figure, JsonElement Line)> Lines(int table)
    {
        var lines = File.ReadLines(downloads.PathOf(DownloadNames.JsonLines(downloads.Release.Tables[table])));
        var parsed = lines.Select(line => JsonDocument.Parse(line).RootElement).ToList();
        Assert.Equal(downloads.Figures(table).Count(), parsed.Count);
        return downloads.Figures(table).Zip(parsed);
    }

    private static double? NumberOrNull(JsonElement line, string name) =>
        line.GetProperty(name) is { ValueKind: JsonValueKind.Number } number ? number.GetDouble() : null;

    private static FigureError ErrorOf(JsonElement line)
    {
        var law = LawOf(line.GetProperty("law"));
        var draws = line.GetProperty("draws").GetArrayLength();
        return FigureError.Of(
            draws == 1 ? law : IntegerSum.Of(((LatticeLaw)law, draws)),
            [.. line.GetProperty("afterwards").EnumerateArray().Select(StepOf)]);
    }

    private static NoiseLaw LawOf(JsonElement law)
    {
        return law.GetProperty("name").GetString() switch
        {
            "laplace" => LaplaceLaw.Of(Parameter("scale")),
            "discrete-laplace" => DiscreteLaplaceLaw.Of(Parameter("scale"), Parameter("grid")),
            "gaussian" => GaussianLaw.Of(Parameter("sigma")),
            "discrete-gaussian" => DiscreteGaussianLaw.Of(Parameter("sigma"), Parameter("grid")),
            "staircase" => StaircaseLaw.Of(Parameter("epsilon"), Parameter("sensitivity"), Parameter("gamma")),
            var other => throw new InvalidOperationException($"No law {other} in the sample."),
        };

        double Parameter(string name) => law.GetProperty(name).GetDouble();
    }

    private static AfterStep StepOf(JsonElement step) => step.TryGetProperty("roundTo", out var unit)
        ? new AfterStep.RoundTo(
            unit.GetDouble(),
            Enum.Parse<RoundingHow>(step.GetProperty("how").GetString()!, ignoreCase: true),
            Enum.Parse<RoundingTies>(step.GetProperty("ties").GetString()!, ignoreCase: true))
        : new AfterStep.NotBelow(step.GetProperty("notBelow").GetDouble());
}
