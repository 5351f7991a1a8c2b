using ReleaseKit.Review;
using ReleaseKit.Review.Leaks;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Leaks;

/// <summary>The seed of the noise in texts that are published.</summary>
public sealed class SeedTests
{
    [Theory]
    [InlineData("PCG64, seed 20310904")]
    [InlineData("np.random.seed(12345)")]
    [InlineData("generator state 0xdeadbeef")]
    [InlineData("seed=99")]
    [InlineData("Drawn with Seed: 42.")]
    [InlineData("seeded with 1701")]
    [InlineData("the seed was 8f3a")]
    public void Seed_with_its_number_is_found(string text) => Assert.Single(SeedText.In(text));

    [Theory]
    [InlineData("seeded with 256 bits from the operating system")]
    [InlineData("a 128-bit seed, kept by the Registrar")]
    [InlineData("seeded from the operating system, PCG64")]
    [InlineData("5 seedlings")]
    [InlineData("no seed is kept")]
    [InlineData("state 3 of the union")]
    public void What_is_no_seed_is_not(string text) => Assert.Empty(SeedText.In(text));

    [Fact]
    public void Seed_in_the_account_of_the_noise_is_a_stop()
    {
        using var broken = new Broken(folder => folder.Edit("mechanisms.json", "exact integer sampler", "PCG64, seed 20310904"));
        var finding = Assert.Single(broken.Review(), finding => finding.Slug == "seed-given");
        Assert.Equal((FindingLevel.Stop, "mechanisms.json"), (finding.Level, finding.At.File));
    }

    [Theory]
    [InlineData("release.json")]
    [InlineData("narrative/summary.md")]
    public void Seed_in_words_for_readers_is_a_caution(string file)
    {
        using var broken = new Broken(folder =>
        {
            if (file == "release.json")
                folder.Edit(file, "\"tables\": [", "\"lead\": \"Drawn with seed 42.\",\n\"tables\": [");
            else
                folder.With(file, "# In short\n\nIt was drawn with seed 42.\n").Edit("release.json", "\"tables\": [", $"\"narrative\": [ {{ \"file\": \"{file}\", \"language\": \"en\" }} ],\n\"tables\": [");
        });
        var finding = Assert.Single(broken.Review(), finding => finding.Slug == "seed-given");
        Assert.Equal((FindingLevel.Caution, file), (finding.Level, finding.At.File));
    }
}
