using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>The pieces that sentences of one language are put together from.</summary>
internal sealed class Voice(WordingTexts texts, ILanguage language)
{
    public string Tag => texts.Tag;

    public Numerals Numerals { get; } = new(texts);

    public bool Has(string key) => texts.Has(key);

    public string Say(string key, params ReadOnlySpan<(string Name, string Value)> fill) => texts.Fill(key, fill);

    /// <summary>"wards, districts and Norrvale".</summary>
    public string List(IReadOnlyList<string> items) => language.List(items);

    public string WithUnit(PublishedValue value, Measure measure)
    {
        var form = UnitOf(measure, value);
        return form.Length == 0 ? Numerals.InProse(value) : $"{Numerals.InProse(value)}{Numerals.NoBreak}{form}";
    }

    /// <summary>The unit as it goes with a number, with what a rate is for; of a share its own words may say already that it counts in each 100.</summary>
    public string UnitOf(Measure measure, PublishedValue value)
    {
        var form = PluralCategory.Form(measure.Unit, Tag, value);
        return measure switch
        {
            { Kind: MeasureKind.Rate, Per: { } per } => OneOf("unit.rate", form, ("per", Numerals.Plain(per))),
            { Kind: MeasureKind.Share } when !Say("unit.share.said").Split('|').Any(said => form.Contains(said, StringComparison.OrdinalIgnoreCase)) => OneOf("unit.share", form),
            _ => form,
        };
    }

    private string OneOf(string key, string unit, params ReadOnlySpan<(string, string)> fill) => unit.Length == 0 ? Say(key, fill) : Say(key + "-of", [("unit", unit), .. fill]);

    /// <summary>What a row is called in a stub column: its name for readers, else its period in words, else its value.</summary>
    public string Label(StubColumn column, int row)
    {
        var label = column.LabelOf(row);
        return column.Period && !(label.Name?.Has(Tag) ?? false) ? PeriodText.Of(label.Value, language) : label.In(Tag);
    }

    /// <summary>"count", "amount", "share" … of "the count before noise".</summary>
    public string Kind(Measure measure) => Say($"kind.{measure.Kind.ToString().ToLowerInvariant()}");

    /// <summary>"95 of 100 cases", "at least 95 of 100 cases".</summary>
    public string Cases(AppraisedFigure figure, FigureRange range) => CasesAs("cases", figure, range);

    /// <summary>"95 of 100 such cases", "at least 95 of 100 such cases".</summary>
    public string SuchCases(AppraisedFigure figure, FigureRange range) => CasesAs("such-cases", figure, range);

    /// <summary>The least a value before noise can be, as printed.</summary>
    public string Lowest(AppraisedFigure figure) => Numerals.Plain(figure.Possible.Lowest * figure.Measure.PrintFactor);

    public string Highest(AppraisedFigure figure) => Numerals.Plain(figure.Possible.Highest * figure.Measure.PrintFactor);

    /// <summary>The level from which values are published as they are.</summary>
    public string Threshold(AppraisedFigure figure) => Numerals.Plain(figure.Measure.PrintFactor * figure.Error!.Steps.Max(step => step switch
    {
        AfterStep.ZeroBelow zero => zero.Threshold,
        AfterStep.PublishedFrom from => from.Threshold,
        _ => double.NegativeInfinity,
    }));

    public string Frequency(string key, NaturalFrequency frequency) =>
        Say(key, ("cases", Numerals.Whole(frequency.Cases)), ("all", Numerals.Whole(frequency.All)));

    /// <summary>In how many cases at most a value above the range of a 0 that stands for small values becomes 0: (1 − c)/2 of them.</summary>
    public string CasesOfZero(Coverage coverage) => Frequency("coverage.cases", NaturalFrequency.UpTo(coverage.Rest / 2, NaturalFrequency.Of(coverage).All));

    private string CasesAs(string which, AppraisedFigure figure, FigureRange range) =>
        Frequency(figure.HoldsAtLeast(range) ? $"coverage.{which}.at-least" : $"coverage.{which}", NaturalFrequency.Of(range.Coverage));
}
