using ReleaseKit.Testing;

namespace ReleaseKit.Privacy.Tests;

public sealed class PublicApiTests
{
    /// <summary>A wanted change of the surface is approved by writing what the failure shows into PublicApi.approved.txt.</summary>
    [Fact]
    public void Surface_is_the_approved_one()
    {
        var approved = File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "PublicApi.approved.txt"));
        Assert.Equal(approved, PublicSurface.Of(typeof(Epsilon).Assembly), ignoreLineEndingDifferences: true);
    }

    [Fact]
    public void Public_types_are_sealed_or_abstract() => Assert.All(
        typeof(Epsilon).Assembly.GetExportedTypes(), type => Assert.True(type.IsSealed || type.IsAbstract, type.Name));
}
