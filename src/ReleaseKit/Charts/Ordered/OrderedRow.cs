using ReleaseKit.Appraisal;

namespace ReleaseKit.Charts.Ordered;

/// <summary>A row of an ordered chart: what it is called, its figure in print, its mark.</summary>
public sealed record OrderedRow
{
    public required AppraisedFigure Figure { get; init; }
    public required string Name { get; init; }

    /// <summary>The digits that the noise leaves standing, and those within its reach.</summary>
    public required string Heavy { get; init; }
    public required string Light { get; init; }

    /// <summary>"± 19", or why there is no margin.</summary>
    public required string Margin { get; init; }

    public MarkSubject Subject => field ??= MarkSubject.Of(Figure);
    public bool IsWeak => Figure.Reliability == Reliability.Weak;
}

/// <summary>What an ordered chart shows: its rows, largest first, and the figures that have no number.</summary>
public sealed record OrderedFigures(IReadOnlyList<OrderedRow> Rows, IReadOnlyList<AppraisedFigure> WithoutNumber, string Unit, Func<Releases.PublishedValue, string> Print);
