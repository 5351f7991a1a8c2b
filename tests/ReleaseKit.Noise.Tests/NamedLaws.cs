using System.Globalization;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests;

/// <summary>Laws by the names and parameters that the reference files use.</summary>
internal static class NamedLaws
{
    public static NoiseLaw Of(ReferenceRow row) => Of(row.Text("law"), [.. new[] { "p1", "p2", "p3" }
        .Where(column => row.Cells.ContainsKey(column) && row.Has(column))
        .Select(row.Number)]);

    public static NoiseLaw Of(string text)
    {
        var parts = text.Split(':');
        return Of(parts[0], [.. parts.Skip(1).Select(part => double.Parse(part, CultureInfo.InvariantCulture))]);
    }

    public static NoiseLaw Of(string name, double[] p) => name switch
    {
        "laplace" => LaplaceLaw.Of(p[0]),
        "gaussian" => GaussianLaw.Of(p[0]),
        "uniform" => UniformLaw.Of(p[0]),
        "staircase" => StaircaseLaw.Of(p[0], p[1], p[2]),
        "discrete-laplace" => DiscreteLaplaceLaw.Of(p[0]),
        "discrete-gaussian" => DiscreteGaussianLaw.Of(p[0]),
        "discrete-uniform" => DiscreteUniformLaw.Of(p[0]),
        "discrete-laplace-truncated" => TruncatedDiscreteLaplaceLaw.Of(p[0], p[1]),
        _ => throw new ArgumentException($"No law is called {name}."),
    };
}
