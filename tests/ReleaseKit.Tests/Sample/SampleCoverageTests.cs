using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Reading;
using ReleaseKit.SampleMaker.Tables;
using Xunit;

namespace ReleaseKit.Tests.Sample;

/// <summary>
/// The ranges of the sample hold the values before noise as often as they say: for the published draw, and for many more that are drawn anew and
/// never published. Each figure misses with at most 1 − its attained coverage; the law of the number of misses is then exact (level 1e-6 a test).
/// </summary>
public sealed class SampleCoverageTests(RedrawnSamples samples) : IClassFixture<RedrawnSamples>
{
    private const double Level = 1e-6;

    public static TheoryData<int> Coverages => [0, 1, 2];

    [Theory]
    [MemberData(nameof(Coverages))]
    public void Published_ranges_miss_no_oftener_than_they_say(int coverage) =>
        AssertHoldsAtLeast([.. samples.Published.Where(figure => figure.IsOwnDraw)], coverage);

    [Theory]
    [MemberData(nameof(Coverages))]
    public void Redrawn_ranges_miss_no_oftener_than_they_say(int coverage) =>
        AssertHoldsAtLeast([.. samples.Redrawn.Where(figure => figure.IsOwnDraw)], coverage);

    // Where the coverage is known exactly, a range that is too wide is as wrong as one that is too narrow.
    [Theory]
    [MemberData(nameof(Coverages))]
    public void Redrawn_ranges_of_plain_integer_noise_miss_as_often_as_they_say(int coverage)
    {
        var plain = samples.Redrawn.Where(figure => figure.IsOwnDraw && figure.HasPlainIntegerNoise && figure.IsFarFromZero).ToList();
        AssertHoldsAtLeast(plain, coverage);
        Assert.True(MissCount.AtMost(plain.Select(figure => 1 - figure.Attained(coverage)), plain.Count(figure => figure.Misses(coverage))) > Level);
    }

    // Sums over different parts share no draw; those over the same parts do, so only the widest sum of each kind is taken.
    [Theory]
    [MemberData(nameof(Coverages))]
    public void Redrawn_sums_of_parts_miss_no_oftener_than_they_say(int coverage)
    {
        var sums = samples.Redrawn.Where(figure => figure.Figure.Draws > 1 && figure.IsWholeOfAll).ToList();
        Assert.Equal(RedrawnSamples.Seeds * 7, sums.Count);
        AssertHoldsAtLeast(sums, coverage);
    }

    [Fact]
    public void Redrawn_figures_are_enough_to_see_a_coverage_one_hundredth_too_low()
    {
        var own = samples.Redrawn.Where(figure => figure.IsOwnDraw).Select(figure => 1 - figure.Attained(1)).ToList();
        var expected = (int)own.Sum(miss => miss + 0.01);
        Assert.True(MissCount.AtLeast(own, expected) < Level);
    }

    private static void AssertHoldsAtLeast(IReadOnlyList<DrawnFigure> figures, int coverage)
    {
        Assert.NotEmpty(figures);
        var misses = figures.Count(figure => figure.Misses(coverage));
        Assert.True(
            MissCount.AtLeast(figures.Select(figure => 1 - figure.Attained(coverage)), misses) > Level,
            $"{misses} of {figures.Count} ranges miss.");
    }
}

/// <summary>A figure of the sample with its value before noise.</summary>
public sealed record DrawnFigure(AppraisedFigure Figure, double Before)
{
    // Values before noise stand on a fine grid; a range end is compared with that much grace.
    private const double Grace = 1e-9;

    public bool IsOwnDraw => Figure.Draws == 1;

    public bool HasPlainIntegerNoise => Figure.Error is { Steps.Count: 0, Law: LatticeLaw };

    public bool IsFarFromZero => Before > 4 * Figure.Ranges[2].Margin;

    public bool IsWholeOfAll => Figure.Table.Stub.All(column => column.Period || column.IsAll(Figure.Row));

    public double Attained(int coverage) => Figure.Ranges[coverage].Attained;

    public bool Misses(int coverage) => Before < Figure.Ranges[coverage].Low - Grace || Before > Figure.Ranges[coverage].High + Grace;
}

/// <summary>The published sample, and copies of it with noise drawn from other seeds, read and appraised like any release.</summary>
public sealed class RedrawnSamples
{
    public const int Seeds = 40;

    public RedrawnSamples()
    {
        Published = Drawn(SampleMaker.Sample.PublishedSeed);
        Redrawn = [.. Enumerable.Range(1, Seeds).SelectMany(seed => Drawn((ulong)seed))];
    }

    public IReadOnlyList<DrawnFigure> Published { get; }
    public IReadOnlyList<DrawnFigure> Redrawn { get; }

    private static List<DrawnFigure> Drawn(ulong seed)
    {
        using var folder = new TemporaryFolder();
        var tables = SampleRelease.Maker.Noised(seed);
        var outcome = ReleaseFolder.Read(SampleRelease.CopyWith(tables, folder.Path));
        var release = outcome.Release ?? throw new InvalidOperationException(string.Join('\n', outcome.Findings));
        var appraised = AppraisedRelease.Of(release);
        return [.. tables.SelectMany((table, index) => Figures(appraised, table, index))];
    }

    private static IEnumerable<DrawnFigure> Figures(IAppraisedRelease appraised, SampleTable drawn, int table)
    {
        var measures = appraised.Release.Tables[table].Measures;
        for (var row = 0; row < drawn.Rows.Count; row++)
            for (var measure = 0; measure < measures.Count; measure++)
            {
                var cell = drawn.Rows[row].Cells[drawn.Columns.ToList().IndexOf(measures[measure].Column)];
                var figure = appraised.Figure(new FigureRef(table, measure, row));
                if (cell.Before is { } before && figure.HasNumber)
                    yield return new DrawnFigure(figure, before);
            }
    }
}
