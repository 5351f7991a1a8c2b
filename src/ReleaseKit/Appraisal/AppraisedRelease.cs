using System.Collections.Concurrent;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>A release appraised. Immutable to its readers; what it works out once it keeps; safe between threads.</summary>
public sealed class AppraisedRelease : IAppraisedRelease
{
    private readonly AppraisedFigures figures;
    private readonly ConcurrentDictionary<int, TableFacts> facts = new();

    private AppraisedRelease(Release release) => (Release, figures) = (release, new AppraisedFigures(release));

    public Release Release { get; }

    public static IAppraisedRelease Of(Release release) => new AppraisedRelease(release);

    public AppraisedFigure Figure(FigureRef at) => figures.Of(at);

    /// <exception cref="AddressException">The address matches nothing, or several figures.</exception>
    public AppraisedFigure FigureAt(string address)
    {
        var found = FigureAddress.Of(Release, address).ResolveOne(Release);
        return Figure(new(found.Table, found.Measure, found.Rows[0]));
    }

    /// <exception cref="AddressException">The address matches nothing.</exception>
    public IReadOnlyList<FigureRef> Select(string address)
    {
        var found = FigureAddress.Of(Release, address).Resolve(Release);
        return [.. found.Rows.Select(row => new FigureRef(found.Table, found.Measure, row))];
    }

    public TableFacts FactsOf(int table) => facts.GetOrAdd(table, index => new TableFactsMaker(Release, figures.Origins).Of(index));
}
