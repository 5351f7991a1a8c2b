using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;

namespace ReleaseKit.Tests.Wording;

/// <summary>A thousand figures of every kind, law and step, the same on every run.</summary>
internal static class GeneratedFigures
{
    private const int Count = 1000;

    public static IReadOnlyList<AppraisedFigure> All { get; } = Make();

    private static IReadOnlyList<AppraisedFigure> Make()
    {
        var chance = new Random(2031);
        return [.. Enumerable.Range(0, Count).Select(_ => One(chance))];
    }

    private static AppraisedFigure One(Random chance)
    {
        var kind = (MeasureKind)chance.Next(0, 8);
        var isWhole = kind == MeasureKind.Count || chance.Next(0, 3) == 0;
        var spread = Pick(chance, 0.3, 1, 4, 9.5, 40, 700);
        var mechanism = Mechanism(chance, isWhole, spread);
        var measure = SmallRelease.Measure(kind) with
        {
            Per = kind == MeasureKind.Rate ? 1000 : null,
            Decimals = isWhole ? null : Pick<int?>(chance, null, 1, 2),
            Lowest = kind == MeasureKind.Mean && chance.Next(0, 2) == 0 ? 0 : null,
        };
        return new SmallRelease()
            .Stub("district", "Norrvale", "Norrvale", "Aldermoor")
            .Stub("ward", "All", "All", "Skerry")
            .Figures(measure, mechanism, Value(chance, mechanism, spread * 40, isWhole), Value(chance, mechanism, spread * 8, isWhole))
            .Figure(1);
    }

    private static Mechanism Mechanism(Random chance, bool isWhole, double spread)
    {
        var (law, key) = isWhole
            ? Pick(chance, (LawName.DiscreteGaussian, "sigma"), (LawName.DiscreteLaplace, "scale"))
            : Pick(chance, (LawName.Laplace, "scale"), (LawName.Gaussian, "sigma"), (LawName.Uniform, "halfWidth"));
        return SmallRelease.Mechanism("m", law, (key, spread)) with
        {
            Afterwards = isWhole ? Steps(chance) : [],
            Clipped = chance.Next(0, 6) == 0 ? new ClippedTo(chance.Next(0, 2) * 5, 400) : null,
        };
    }

    private static AfterStep[] Steps(Random chance) => chance.Next(0, 5) switch
    {
        0 => [new AfterStep.RoundTo(5)],
        1 => [new AfterStep.RoundTo(3), new AfterStep.NotBelow(0)],
        2 => [new AfterStep.ZeroBelow(30)],
        _ => [],
    };

    /// <summary>A value that the steps can lead to.</summary>
    private static string Value(Random chance, Mechanism mechanism, double reach, bool isWhole)
    {
        var value = (decimal)Math.Round((chance.NextDouble() - 0.15) * reach, isWhole ? 0 : 2);
        foreach (var step in mechanism.Afterwards)
            value = step switch
            {
                AfterStep.RoundTo rounding => Math.Round(value / (decimal)rounding.Unit) * (decimal)rounding.Unit,
                AfterStep.NotBelow floor => Math.Max(value, (decimal)floor.Bound),
                AfterStep.ZeroBelow zero => value < (decimal)zero.Threshold ? 0 : value,
                _ => value,
            };
        return value.ToString(isWhole ? "0" : "0.00", CultureInfo.InvariantCulture);
    }

    private static T Pick<T>(Random chance, params T[] from) => from[chance.Next(from.Length)];
}
