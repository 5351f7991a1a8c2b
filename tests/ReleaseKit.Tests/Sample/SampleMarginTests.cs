using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Reading;
using ReleaseKit.SampleMaker.Tables;
using Xunit;

namespace ReleaseKit.Tests.Sample;

/// <summary>
/// Mechanism by mechanism: the noise that the program really adds, in a thousand draws of the whole sample, against the margins that are worked out
/// from mechanisms.json. Limits are 5.5 standard deviations of a binomial and two cases more (chance of a false alarm below 1e-6 a comparison).
/// </summary>
public sealed class SampleMarginTests(SampleErrors errors) : IClassFixture<SampleErrors>
{
    public static TheoryData<string> Mechanisms =>
        [.. ReleaseFolder.Read(SampleRelease.Folder).Release!.Noise.Mechanisms.Select(mechanism => mechanism.Id)];

    [Theory]
    [MemberData(nameof(Mechanisms))]
    public void Margin_is_missed_no_oftener_than_stated(string mechanism)
    {
        foreach (var (expected, misses, spread) in errors.Misses(mechanism))
            Assert.True(misses <= expected + (5.5 * spread) + 2, $"{misses} misses where {expected:0} were expected.");
    }

    [Theory]
    [MemberData(nameof(Mechanisms))]
    public void Margin_of_plain_integer_noise_is_missed_as_often_as_stated(string mechanism)
    {
        if (!errors.IsPlainIntegerNoise(mechanism))
            return;
        foreach (var (expected, misses, spread) in errors.Misses(mechanism))
            Assert.True(misses >= expected - (5.5 * spread) - 2, $"{misses} misses where {expected:0} were expected.");
    }

    [Fact]
    public void Every_mechanism_is_drawn_and_its_noise_leans_to_no_side()
    {
        foreach (var mechanism in Mechanisms.Select(row => row.Data))
        {
            var (above, below) = errors.Sides(mechanism);
            Assert.True(above + below >= SampleErrors.Seeds / 2);
            if (errors.IsPlainIntegerNoise(mechanism))
                Assert.InRange(above - below, -5.5 * Math.Sqrt(above + below), 5.5 * Math.Sqrt(above + below));
        }
    }
}

/// <summary>The errors, published less before noise, of every figure with a draw of its own, in many draws of the whole sample.</summary>
public sealed class SampleErrors
{
    public const int Seeds = 1000;
    private readonly ILookup<string, FigureErrors> byMechanism;

    public SampleErrors()
    {
        var figures = Figures(AppraisedRelease.Of(ReleaseFolder.Read(SampleRelease.Folder).Release!)).ToList();
        for (var seed = 1; seed <= Seeds; seed++)
        {
            var tables = SampleRelease.Maker.Noised((ulong)seed);
            foreach (var figure in figures)
                figure.Add(tables);
        }
        byMechanism = figures.ToLookup(figure => figure.Figure.Mechanism!.Id);
    }

    public bool IsPlainIntegerNoise(string mechanism) => byMechanism[mechanism].All(figure => figure.Figure.Error is { Steps.Count: 0, Law: LatticeLaw });

    /// <summary>For each coverage: how many misses the attained coverages lead to expect, how many there are, and their standard deviation.</summary>
    public IEnumerable<(double Expected, int Misses, double Spread)> Misses(string mechanism) => Enumerable.Range(0, 3).Select(coverage =>
    {
        var attained = byMechanism[mechanism].Select(figure => figure.Figure.Error!.MarginAt(figure.Figure.Ranges[coverage].Coverage).Attained).ToList();
        return (
            Seeds * attained.Sum(share => 1 - share),
            byMechanism[mechanism].Sum(figure => figure.Misses[coverage]),
            Math.Sqrt(Seeds * attained.Sum(share => share * (1 - share))));
    });

    public (int Above, int Below) Sides(string mechanism) =>
        (byMechanism[mechanism].Sum(figure => figure.Above), byMechanism[mechanism].Sum(figure => figure.Below));

    private static IEnumerable<FigureErrors> Figures(IAppraisedRelease appraised) =>
        from table in Enumerable.Range(0, appraised.Release.Tables.Count)
        from measure in Enumerable.Range(0, appraised.Release.Tables[table].Measures.Count)
        from row in Enumerable.Range(0, appraised.Release.Tables[table].RowCount)
        let figure = appraised.Figure(new FigureRef(table, measure, row))
        where figure is { Error: not null, HasNumber: true, Draws: 1 }
        select new FigureErrors(figure);
}

/// <summary>One figure's errors, counted.</summary>
internal sealed class FigureErrors(AppraisedFigure figure)
{
    // Continuous values stand on a fine grid, so that an end may be met within a rounding of doubles.
    private const double Grace = 1e-9;
    private readonly double[] margins = [.. figure.Ranges.Select(range => figure.Error!.MarginAt(range.Coverage).Width)];
    private int column = -1;

    public AppraisedFigure Figure => figure;
    public int[] Misses { get; } = new int[3];
    public int Above { get; private set; }
    public int Below { get; private set; }

    public void Add(IReadOnlyList<SampleTable> tables)
    {
        var table = tables[figure.Ref.Table];
        column = column < 0 ? table.Columns.ToList().IndexOf(figure.Measure.Column) : column;
        var cell = table.Rows[figure.Row].Cells[column];
        var error = double.Parse(cell.Printed, CultureInfo.InvariantCulture) - cell.Before!.Value;
        for (var coverage = 0; coverage < margins.Length; coverage++)
            Misses[coverage] += Math.Abs(error) > margins[coverage] + Grace ? 1 : 0;
        Above += error > 0 ? 1 : 0;
        Below += error < 0 ? 1 : 0;
    }
}
