using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>What is said once for a table, and once for a column.</summary>
internal sealed class FactSentences(Voice voice)
{
    /// <summary>How many ranges may miss, and why parts may not add up.</summary>
    public IReadOnlyList<string> Of(TableFacts facts) => [.. Misses(facts), .. Adding(facts)];

    /// <summary>How far the noise of a column reaches: at the main coverage, and in 999 of 1,000 cases.</summary>
    public IReadOnlyList<string> Of(MeasureFacts facts) => [.. Reach(facts), .. Distance(facts)];

    private IEnumerable<string> Misses(TableFacts facts)
    {
        if (facts.Ranges < 2)
            yield break;
        var misses = (long)Math.Ceiling(Math.Round(facts.ExpectedMisses, 9));
        yield return voice.Say(
            misses <= 1 ? "facts.misses.one" : "facts.misses",
            ("ranges", voice.Numerals.Whole(facts.Ranges)), ("misses", voice.Numerals.Whole(Math.Max(misses, 1))));
        yield return voice.Say("facts.cannot-tell");
        if (facts.SharesDraws)
            yield return voice.Say("facts.shared");
    }

    private IEnumerable<string> Adding(TableFacts facts)
    {
        if (facts.HasTotalsOfOwnNoise)
            yield return voice.Say(facts.HasSums ? "facts.own-noise.some" : "facts.own-noise");
        if (facts.HasSums)
            yield return voice.Say(facts.HasTotalsOfOwnNoise ? "facts.sums.other" : "facts.sums");
    }

    private IEnumerable<string> Reach(MeasureFacts facts)
    {
        var kind = ("kind", voice.Kind(facts.Measure));
        var cases = ("cases", voice.Frequency("coverage.cases.at-least", NaturalFrequency.Of(facts.Coverage)));
        if (facts.HasThreshold)
            return [voice.Say("facts.column.ranges", kind, cases)];
        if (facts is not { SmallestMargin: { } smallest, LargestMargin: { } largest })
            return [];
        var margin = voice.WithUnit(largest, facts.Measure.Unit);
        return smallest == largest
            ? [voice.Say("facts.column", kind, cases, ("margin", margin))]
            : [voice.Say("facts.column.several", kind, cases), voice.Say("facts.column.margins", ("smallest", voice.Numerals.InProse(smallest)), ("largest", margin))];
    }

    private IEnumerable<string> Distance(MeasureFacts facts)
    {
        if (facts.Distance999 is { } distance)
            yield return voice.Say(
                facts.IsRounded ? "facts.distance.rounded" : "facts.distance",
                ("cases", voice.Frequency("coverage.cases.at-least", new NaturalFrequency(999, 1000))),
                ("distance", voice.WithUnit(distance, facts.Measure.Unit)));
    }
}
