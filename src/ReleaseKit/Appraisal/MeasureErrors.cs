using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>The distinct errors of the figures of one measure, gathered.</summary>
internal sealed class MeasureErrors(Measure measure, Coverage main)
{
    private readonly HashSet<DistinctError> errors = [];
    private readonly PossibleValues possible = PossibleOf.Measure(measure);

    public Measure Measure { get; } = measure;

    public IReadOnlyCollection<DistinctError> Errors => errors;

    /// <summary>All its published numbers.</summary>
    public FigureKinds Figures { get; private set; } = FigureKinds.None;

    public int Ranges { get; private set; }

    public double ExpectedMisses { get; private set; }

    public bool HasSums { get; private set; }

    /// <summary>Adds a figure; its error only if it reaches the main coverage.</summary>
    public void Add(FigureOrigin origin, PublishedValue value, bool isSum)
    {
        Figures = Figures.With(origin.Rule);
        if (origin.Error is not { HasMain: true } error)
            return;
        errors.Add(error);
        Ranges += error.HasMainRange(value, possible) ? 1 : 0;
        ExpectedMisses += Misses(error);
        HasSums |= isSum;
    }

    /// <summary>Under a threshold the range is worked out for each figure, and whether it became 0 is chance too: it counts with all that can come of it.</summary>
    private double Misses(DistinctError error) => error.Error.DependsOnPublished
        ? error.Error.MissesAtMost(main)
        : 1 - error.MainHalfWidth.Attained;
}
