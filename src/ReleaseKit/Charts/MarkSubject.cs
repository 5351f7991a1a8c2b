using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Charts;

/// <summary>One range of a mark: its ends before they are cut to the possible.</summary>
public readonly record struct MarkRange(double Low, double High);

/// <summary>What a mark shows of a figure, in the figure's unit.</summary>
public sealed record MarkSubject
{
    public required double Value { get; init; }

    /// <summary>Ranges at the lower, main and upper coverage, the last left out where it is not known; empty for a figure without a margin, which is a stem alone.</summary>
    public required IReadOnlyList<MarkRange> Ranges { get; init; }

    /// <summary>The thickness of the body, 0 to 1, at an offset of the noise (published − before noise); null: a line with stops.</summary>
    public Func<double, double>? Density { get; init; }

    /// <summary>What the density belongs to: marks of the same law look alike.</summary>
    public object? Law { get; init; }

    /// <summary>The grid of a law on whole steps, 0 for a law with a density.</summary>
    public double Grid { get; init; }

    /// <summary>Too noisy to use alone: drawn hollow.</summary>
    public bool Weak { get; init; }
    public double Lowest { get; init; } = double.NegativeInfinity;
    public double Highest { get; init; } = double.PositiveInfinity;

    public bool IsStemAlone => Ranges.Count == 0;
    public MarkRange Core => Ranges[0];
    public MarkRange Body => Ranges[1];
    public MarkRange Tail => Ranges[^1];

    /// <summary>The figure in the unit in which it is printed: shares that the files hold in ones count to 100.</summary>
    public static MarkSubject Of(AppraisedFigure figure)
    {
        double factor = figure.Measure.PrintFactor;
        // Where one value was published for all below a threshold, how likely each of them is does not follow the law around the figure: a line with stops.
        var error = figure.Ranges.All(range => double.IsFinite(range.UncutLow) && double.IsFinite(range.UncutHigh)) ? figure.Error : null;
        return new()
        {
            Value = factor * figure.Value.ToDouble(),
            Ranges = figure.Main is null ? [] : [.. figure.Ranges.Select(range => RangeOf(figure, range, factor))],
            Density = error is null ? null : offset => error.RelativeDensity(offset / factor),
            Law = error,
            Grid = error?.Law is LatticeLaw law ? law.Grid * factor : 0,
            Weak = figure.Reliability == Reliability.Weak,
            Lowest = figure.Possible.Lowest * factor,
            Highest = figure.Possible.Highest * factor,
        };
    }

    /// <summary>The thickness at a place; between the steps of a grid on the straight line from one to the next.</summary>
    public double ThicknessAt(double place)
    {
        var offset = Value - place;
        if (Grid <= 0)
            return Density!(offset);
        var step = Math.Floor((offset / Grid) + 1e-9);
        var share = Math.Max(0, (offset / Grid) - step);
        var here = Density!(step * Grid);
        return share < 1e-9 ? here : here + (share * (Density((step + 1) * Grid) - here));
    }

    // A range of a figure below the possible ends higher than the law alone would have it, so the larger of both ends is drawn. Under a threshold a range can reach
    // far beyond the possible, or have no end there: it is drawn up to its limit.
    private static MarkRange RangeOf(AppraisedFigure figure, FigureRange range, double factor) => figure.Promise is RangePromise.Every
        ? new(factor * Math.Min(range.UncutLow, range.Low), factor * Math.Max(range.UncutHigh, range.High))
        : new(factor * range.Low, factor * range.High);
}
