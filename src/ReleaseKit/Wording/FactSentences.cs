using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>What is said once for a table, and once for a column.</summary>
internal sealed class FactSentences(Voice voice)
{
    private readonly AddingSentences adding = new(voice);

    /// <summary>How many ranges may miss, and why parts may not add up.</summary>
    public IReadOnlyList<string> Of(TableFacts facts, bool onSeveralPages) => [.. Misses(facts, onSeveralPages), .. adding.Of(facts)];

    /// <summary>How far the noise of a column reaches: at the main coverage, and in 999 of 1,000 cases.</summary>
    public IReadOnlyList<string> Of(MeasureFacts facts, bool onSeveralPages) => [.. Reach(facts, onSeveralPages), .. Distance(facts, onSeveralPages)];

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

    private IEnumerable<string> Reach(MeasureFacts facts, bool onSeveralPages)
    {
        var kind = ("kind", voice.Kind(facts.Measure));
        var cases = ("cases", voice.Frequency("coverage.cases.at-least", NaturalFrequency.Of(facts.Coverage)));
        if (facts.HasThreshold)
            return Ranges(facts, kind, cases);
        if (facts is not { SmallestMargin: { } smallest, LargestMargin: { } largest })
            return [];
        var margin = voice.WithUnit(largest, facts.Measure);
        return smallest == largest
            ? [voice.Say("facts.column", kind, cases, ("margin", margin))]
            : [voice.Say("facts.column.several", kind, cases), voice.Say(onSeveralPages ? "facts.column.margins.pages" : "facts.column.margins", ("smallest", voice.Numerals.InProse(smallest)), ("largest", margin))];
    }

    /// <summary>Under a threshold the promise is about the figures that passed it; of a 0 that stands for small values it is said how rarely larger ones become 0.</summary>
    private IEnumerable<string> Ranges(MeasureFacts facts, (string, string) kind, (string, string) cases) => facts.Promise is RangePromise.AmongNotZero
        ? [voice.Say("facts.column.ranges.not-zero", kind, cases), voice.Say("facts.column.ranges.zero", ("cases", voice.CasesOfZero(facts.Coverage)))]
        : [voice.Say("facts.column.ranges.published", kind, cases)];

    private IEnumerable<string> Distance(MeasureFacts facts, bool onSeveralPages)
    {
        if (facts.Distance999 is { } distance)
            yield return voice.Say(
                (facts.IsRounded ? "facts.distance.rounded" : "facts.distance") + (onSeveralPages ? ".pages" : ""),
                ("cases", voice.Frequency("coverage.cases.at-least", new NaturalFrequency(999, 1000))),
                ("distance", voice.WithUnit(distance, facts.Measure)));
    }
}
