using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Appraisal;

public sealed class DeclaredLawsTests
{
    private static readonly Mechanism ByColumn = SmallRelease.Mechanism("m", LawName.Laplace) with
    {
        Parameters = new Dictionary<string, NumberOrColumn> { ["scale"] = NumberOrColumn.From("scale") },
    };

    private static readonly Table Table = new SmallRelease().Side("scale", 2, 5, 2, double.NaN, 0)
        .Figures(MeasureKind.Mean, ByColumn, "1", "2", "3", "4", "5").Build().Tables[0];

    public static TheoryData<LawName, (string, double)[], NoiseLaw> Laws { get; } = new()
    {
        { LawName.Laplace, [("scale", 2)], LaplaceLaw.Of(2) },
        { LawName.DiscreteLaplace, [("scale", 2)], DiscreteLaplaceLaw.Of(2) },
        { LawName.Gaussian, [("sigma", 2)], GaussianLaw.Of(2) },
        { LawName.DiscreteGaussian, [("sigma", 2)], DiscreteGaussianLaw.Of(2) },
        { LawName.Uniform, [("halfWidth", 2)], UniformLaw.Of(2) },
        { LawName.DiscreteUniform, [("halfWidth", 2)], DiscreteUniformLaw.Of(2) },
        { LawName.Staircase, [("epsilon", 1), ("sensitivity", 2), ("gamma", 0.3)], StaircaseLaw.Of(1, 2, 0.3) },
        { LawName.TruncatedDiscreteLaplace, [("scale", 2), ("cutoff", 9)], TruncatedDiscreteLaplaceLaw.Of(2, 9) },
    };

    [Theory]
    [MemberData(nameof(Laws), DisableDiscoveryEnumeration = true)]
    public void Law_is_built_from_its_parameters(LawName name, (string, double)[] parameters, NoiseLaw expected) =>
        Assert.Equal(expected, new DeclaredLaws().LawOf(SmallRelease.Mechanism("m", name, parameters), null, 0));

    [Fact]
    public void Tabulated_law_is_built_from_its_table()
    {
        var mechanism = SmallRelease.Mechanism("m", LawName.Tabulated) with { Tabulated = [(-1, 0.25m), (0, 0.5m), (1, 0.25m)] };
        Assert.Equal(0.5, new DeclaredLaws().LawOf(mechanism, null, 0).Within(0));
    }

    [Fact]
    public void Lattice_law_keeps_the_grid_of_its_mechanism()
    {
        var law = new DeclaredLaws().LawOf(SmallRelease.DiscreteGaussian(2) with { Grid = 0.5 }, null, 0);
        Assert.Equal(0.5, Assert.IsType<LatticeLaw>(law, exactMatch: false).Grid);
    }

    [Fact]
    public void Parameter_is_taken_from_the_row() => Assert.Equal(LaplaceLaw.Of(5), new DeclaredLaws().LawOf(ByColumn, Table, 1));

    [Fact]
    public void Rows_with_the_same_parameter_share_one_law()
    {
        var laws = new DeclaredLaws();
        Assert.Same(laws.LawOf(ByColumn, Table, 0), laws.LawOf(ByColumn, Table, 2));
    }

    [Theory]
    [InlineData(3)]
    [InlineData(4)]
    public void Parameter_that_makes_no_law_gives_none(int row)
    {
        Assert.Null(new DeclaredLaws().TryLawOf(ByColumn, Table, row));
        Assert.ThrowsAny<ArgumentException>(() => new DeclaredLaws().LawOf(ByColumn, Table, row));
    }

    [Fact]
    public void Column_that_is_missing_is_named()
    {
        var mechanism = ByColumn with { Parameters = new Dictionary<string, NumberOrColumn> { ["scale"] = NumberOrColumn.From("scales") } };
        var fault = Assert.Throws<ArgumentException>(() => new DeclaredLaws().LawOf(mechanism, Table, 0));
        Assert.Contains("\"scales\"", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Parameter_that_is_missing_is_named()
    {
        var fault = Assert.Throws<ArgumentException>(() => new DeclaredLaws().LawOf(SmallRelease.Mechanism("m", LawName.Gaussian), null, 0));
        Assert.Contains("\"m\" gives no sigma", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Declared_law_has_no_law_of_noise() => Assert.Null(new DeclaredLaws().TryLawOf(SmallRelease.Mechanism("m", LawName.Declared), null, 0));
}
