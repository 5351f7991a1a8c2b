using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Tests.Appraisal.Budget;

/// <summary>Releases with an account, built in code.</summary>
internal static class Accounts
{
    public static Place Place { get; } = new("mechanisms.json", 12, 16);

    public static Authorised SixAtOneInABillion { get; } = new() { Epsilon = 6, Delta = 1e-9, At = new Place("mechanisms.json", 5, 3) };

    public static Mechanism Gaussian(double sigma, string id = "ward-arrears") => SmallRelease.Mechanism(id, LawName.DiscreteGaussian, ("sigma", sigma)) with
    {
        KeyPlaces = new Dictionary<string, Place> { ["spent"] = Place },
    };

    public static Mechanism Laplace(double scale, string id = "ward-accounts") => SmallRelease.Mechanism(id, LawName.DiscreteLaplace, ("scale", scale)) with
    {
        KeyPlaces = new Dictionary<string, Place> { ["spent"] = Place },
    };

    /// <summary>One measure for each mechanism, of the same number of rows, under one account.</summary>
    public static Release Of(Accounting accounting, params Mechanism[] mechanisms) => Of(accounting, Neighbouring.AddOrRemove, SixAtOneInABillion, mechanisms);

    public static Release Of(Accounting accounting, Neighbouring neighbouring, Authorised authorised, params Mechanism[] mechanisms)
    {
        var builder = new SmallRelease();
        foreach (var mechanism in mechanisms.Where(mechanism => mechanism.Law != LawName.Declared))
            builder.Figures(SmallRelease.Measure(MeasureKind.Count, mechanism.Id), [new NoiseRule.FromMechanism(mechanism)], new byte[3], "10", "20", "30");
        var release = builder.Build();
        return release with
        {
            Noise = release.Noise with { Accounting = accounting, Neighbouring = neighbouring, Authorised = authorised, Mechanisms = mechanisms },
        };
    }
}
