using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>What is said once for a table, and once for a column.</summary>
internal sealed class FactSentences(Voice voice)
{
    /// <summary>How many ranges may miss, and why parts may not add up.</summary>
    public IReadOnlyList<string> Of(TableFacts facts, bool onSeveralPages) => [.. Misses(facts, onSeveralPages), .. Adding(facts)];

    /// <summary>How far the noise of a column reaches: at the main coverage, and in 999 of 1,000 cases.</summary>
    public IReadOnlyList<string> Of(MeasureFacts facts) => [.. Reach(facts), .. Distance(facts)];

    private IEnumerable<string> Misses(TableFacts facts, bool onSeveralPages)
    {
        if (facts.Ranges < 2)
            yield break;
        var ranges = ("ranges", voice.Numerals.Whole(facts.Ranges));
        var where = ("where", voice.Say(onSeveralPages ? "facts.in-table.pages" : "facts.in-table"));
        yield return Math.Round(facts.ExpectedMisses, 9) switch
        {
            < 1 => voice.Say("facts.misses.fewer", ranges, where),
            1 => voice.Say("facts.misses.one", ranges, where),
            var misses => voice.Say("facts.misses", ranges, where, ("misses", voice.Numerals.Whole((long)Math.Ceiling(misses)))),
        };
        yield return voice.Say("facts.cannot-tell");
        if (facts.SharesDraws)
            yield return voice.Say("facts.shared");
    }

    /// <summary>Where the measures shown differ in it, each kind of total is said of the measures it is true of.</summary>
    private IEnumerable<string> Adding(TableFacts facts)
    {
        var groups = facts.Measures.Where(measure => measure.Measure.Shown).GroupBy(measure => (measure.HasTotalsOfOwnNoise, measure.HasSums)).ToList();
        return groups.Count == 1
            ? Adding(groups[0].Key.HasTotalsOfOwnNoise, groups[0].Key.HasSums, "")
            : groups.SelectMany(group => Adding(group.Key.HasTotalsOfOwnNoise, group.Key.HasSums, ".of", ("measures", Named(group))));
    }

    private IEnumerable<string> Adding(bool ownNoise, bool sums, string of, params (string, string)[] measures)
    {
        if (ownNoise)
            yield return voice.Say((sums ? "facts.own-noise.some" : "facts.own-noise") + of, measures);
        if (sums)
            yield return voice.Say((ownNoise ? "facts.sums.other" : "facts.sums") + of, measures);
    }

    private string Named(IEnumerable<MeasureFacts> measures) =>
        voice.List([.. measures.Select(measure => voice.Say("list.quoted", ("name", measure.Measure.Title.In(voice.Tag))))]);

    private IEnumerable<string> Reach(MeasureFacts facts)
    {
        var kind = ("kind", voice.Kind(facts.Measure));
        var cases = ("cases", voice.Frequency("coverage.cases.at-least", NaturalFrequency.Of(facts.Coverage)));
        if (facts.HasThreshold)
            return [voice.Say("facts.column.ranges", kind, cases)];
        if (facts is not { SmallestMargin: { } smallest, LargestMargin: { } largest })
            return [];
        var margin = voice.WithUnit(largest, facts.Measure);
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
                ("distance", voice.WithUnit(distance, facts.Measure)));
    }
}
