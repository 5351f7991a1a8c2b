using System.Collections.Concurrent;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>
/// The noise laws that a release declares: one object for each distinct law, however many rows share it. Safe between threads.
/// </summary>
public sealed class DeclaredLaws
{
    private readonly ConcurrentDictionary<LawKey, NoiseLaw> laws = new();

    /// <summary>The law of a mechanism's noise in one row. Table and row are needed only where a parameter stands in a column.</summary>
    /// <exception cref="ArgumentException">The law is "declared" (known by its spending only), a parameter is missing, or its value makes no law.</exception>
    public NoiseLaw LawOf(Mechanism mechanism, Table? table, int row)
    {
        var key = new LawKey(
            mechanism.Law,
            Parameter(mechanism, FirstParameter(mechanism.Law), table, row),
            Parameter(mechanism, SecondParameter(mechanism.Law), table, row),
            Parameter(mechanism, mechanism.Law == LawName.Staircase ? "gamma" : null, table, row),
            mechanism.Grid,
            mechanism.Law == LawName.Tabulated ? mechanism.Tabulated : null);
        return laws.GetOrAdd(key, Build);
    }

    /// <summary>The same, or null where there is no such law.</summary>
    public NoiseLaw? TryLawOf(Mechanism mechanism, Table? table, int row)
    {
        try
        {
            return LawOf(mechanism, table, row);
        }
        catch (ArgumentException)
        {
            return null;
        }
    }

    private static string? FirstParameter(LawName law) => law switch
    {
        LawName.Laplace or LawName.DiscreteLaplace or LawName.TruncatedDiscreteLaplace => "scale",
        LawName.Gaussian or LawName.DiscreteGaussian => "sigma",
        LawName.Uniform or LawName.DiscreteUniform => "halfWidth",
        LawName.Staircase => "epsilon",
        _ => null,
    };

    private static string? SecondParameter(LawName law) => law switch
    {
        LawName.TruncatedDiscreteLaplace => "cutoff",
        LawName.Staircase => "sensitivity",
        _ => null,
    };

    private static double Parameter(Mechanism mechanism, string? key, Table? table, int row)
    {
        if (key is null)
            return 0;
        if (!mechanism.Parameters.TryGetValue(key, out var given))
            throw new ArgumentException($"The mechanism \"{mechanism.Id}\" gives no {key}.", nameof(mechanism));
        return given.Number ?? InColumn(mechanism, given.Column!, table, row);
    }

    private static double InColumn(Mechanism mechanism, string column, Table? table, int row) =>
        table?.SideColumns.FirstOrDefault(side => side.Column == column) is { } found
            ? found.Numbers[row]
            : throw new ArgumentException($"The mechanism \"{mechanism.Id}\" takes a number from the column \"{column}\", which is not there.", nameof(table));

    private static NoiseLaw Build(LawKey key) => key.Law switch
    {
        LawName.Laplace => LaplaceLaw.Of(key.First),
        LawName.DiscreteLaplace => DiscreteLaplaceLaw.Of(key.First, key.Grid),
        LawName.Gaussian => GaussianLaw.Of(key.First),
        LawName.DiscreteGaussian => DiscreteGaussianLaw.Of(key.First, key.Grid),
        LawName.Uniform => UniformLaw.Of(key.First),
        LawName.DiscreteUniform => DiscreteUniformLaw.Of(key.First, key.Grid),
        LawName.Staircase => StaircaseLaw.Of(key.First, key.Second, key.Third),
        LawName.TruncatedDiscreteLaplace => TruncatedDiscreteLaplaceLaw.Of(key.First, key.Second, key.Grid),
        LawName.Tabulated when key.Rows is { } rows => TabulatedLaw.Of(rows, key.Grid),
        _ => throw new ArgumentException("A declared law is known by its spending only: there is no law of its noise.", nameof(key)),
    };

    /// <summary>What makes two laws the same; a tabulated law is known by its table.</summary>
    private readonly record struct LawKey(
        LawName Law, double First, double Second, double Third, double Grid, IReadOnlyList<(long Step, decimal Probability)>? Rows);
}
