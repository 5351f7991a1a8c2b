using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

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
public sealed record OrderedFigures
{
    public required IReadOnlyList<OrderedRow> Rows { get; init; }
    public required IReadOnlyList<AppraisedFigure> WithoutNumber { get; init; }

    /// <summary>The unit in words, in the plural.</summary>
    public required string Unit { get; init; }

    /// <summary>A number of the axis in print.</summary>
    public required Func<PublishedValue, string> Print { get; init; }

    /// <summary>A figure's name among the others.</summary>
    public required Func<AppraisedFigure, string> NameOf { get; init; }
}
