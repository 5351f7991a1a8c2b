using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;

namespace ReleaseKit.Wording;

/// <summary>Why the parts of a table may not add up to its totals. Where the measures shown differ in it, each sentence names those it is true of.</summary>
internal sealed class AddingSentences(Voice voice)
{
    public IEnumerable<string> Of(TableFacts facts)
    {
        var shown = facts.Measures.Where(measure => measure.Measure.Shown).ToList();
        return [.. Noised(shown), .. WithoutNoise(shown), .. Steps(shown)];
    }

    private IEnumerable<string> Noised(List<MeasureFacts> shown)
    {
        var kinds = shown.GroupBy(measure => (measure.HasTotalsOfOwnNoise, measure.HasSums)).ToList();
        return kinds.SelectMany(kind => kind.Key is (true, true)
            ? kind.SelectMany(Mixed)
            : Noised(kind.Key.HasTotalsOfOwnNoise, kind.Key.HasSums, kinds.Count == 1 ? "" : ".of", kinds.Count == 1 ? [] : [("measures", Named(kind))]));
    }

    private IEnumerable<string> Noised(bool ownNoise, bool sums, string of, params (string, string)[] measures)
    {
        if (ownNoise)
            yield return voice.Say($"facts.own-noise{of}", measures);
        if (sums)
            yield return voice.Say($"facts.sums{of}", measures);
    }

    /// <summary>Totals of both kinds in one measure: which are of which is said by the levels they stand at.</summary>
    private IEnumerable<string> Mixed(MeasureFacts facts)
    {
        var measures = ("measures", Named([facts]));
        var (own, sums) = (facts.Totals.OwnNoise, facts.Totals.Sums);
        return own.Intersect(sums).Any()
            ? [voice.Say("facts.own-noise.some.of", measures), voice.Say("facts.sums.other.of", measures)]
            : [voice.Say("facts.own-noise.these", measures, Levels(own)), voice.Say("facts.sums.these", measures, Levels(sums))];
    }

    private (string, string) Levels(IEnumerable<TotalLevel> levels) => ("totals", voice.List([.. levels.Select(Level)]));

    private string Level(TotalLevel level) => level.By.Count == 0
        ? voice.Say("facts.level.all")
        : voice.Say("facts.level.by", ("columns", voice.List([.. level.By.Select(column => Quoted(column.Title.In(voice.Tag)))])));

    private IEnumerable<string> WithoutNoise(List<MeasureFacts> shown)
    {
        var found = shown.Where(measure => measure.Totals.HasTotalsWithoutNoise).ToList();
        if (found.Count > 0)
            yield return voice.Say("facts.totals-without-noise", ("measures", Named(found)));
    }

    private IEnumerable<string> Steps(List<MeasureFacts> shown) => shown
        .SelectMany(facts => facts.Totals.Steps.Select(step => (Facts: facts, Key: Key(step), At: voice.Numerals.Plain(NumberOf(step.Step) * facts.Measure.PrintFactor))))
        .GroupBy(found => (found.Key, found.At), found => found.Facts)
        .Select(alike => voice.Say(alike.Key.Key, ("measures", Named(alike)), ("bound", alike.Key.At)));

    private static string Key(StepOfFigures step) => step.Step switch
    {
        AfterStep.NotBelow => "facts.lifted",
        AfterStep.NotAbove => "facts.lowered",
        AfterStep.ZeroBelow => "facts.zeroed",
        AfterStep.RoundTo { How: RoundingHow.Up } => "facts.rounded-up",
        _ => "facts.rounded-down",
    } + (step.IsEveryRow ? "" : ".some");

    private static double NumberOf(AfterStep step) => step switch
    {
        AfterStep.NotBelow below => below.Bound,
        AfterStep.NotAbove above => above.Bound,
        AfterStep.ZeroBelow zero => zero.Threshold,
        _ => ((AfterStep.RoundTo)step).Unit,
    };

    private string Named(IEnumerable<MeasureFacts> measures) => voice.List([.. measures.Select(measure => Quoted(measure.Measure.Title.In(voice.Tag)))]);

    private string Quoted(string name) => voice.Say("list.quoted", ("name", name));
}
