using ReleaseKit.Noise;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>The distinct errors of the figures of one measure, gathered.</summary>
internal sealed class MeasureErrors(Measure measure, Coverage main)
{
    private readonly HashSet<DistinctError> errors = [];

    public Measure Measure { get; } = measure;

    public IReadOnlyCollection<DistinctError> Errors => errors;

    public int Ranges { get; private set; }

    public double ExpectedMisses { get; private set; }

    public bool HasSums { get; private set; }

    public void Add(DistinctError error, bool isSum)
    {
        errors.Add(error);
        Ranges++;
        // Under a threshold the range is worked out for each figure: it misses at most as often as it says.
        ExpectedMisses += error.Error.DependsOnPublished ? main.Rest : 1 - error.MainHalfWidth.Attained;
        HasSums |= isSum;
    }
}
