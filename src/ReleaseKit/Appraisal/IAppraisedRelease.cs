using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>The release with the error of every figure at hand. Figures are worked out when asked for, from error laws computed once per distinct law.</summary>
public interface IAppraisedRelease
{
    Release Release { get; }

    AppraisedFigure Figure(FigureRef at);

    /// <summary>The one figure an address (or short name) means.</summary>
    AppraisedFigure FigureAt(string address);

    /// <summary>All figures a selection means, in row order.</summary>
    IReadOnlyList<FigureRef> Select(string address);

    /// <summary>What can be said once of all ranges of a table, by its index in the release.</summary>
    TableFacts FactsOf(int table);
}
