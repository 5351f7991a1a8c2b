using System.Globalization;
using System.Text.RegularExpressions;
using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Tests.Wording;

/// <summary>
/// Reads sentences as a person would, without the templates that made them, and compares every number with the figure.
/// A sentence that no pattern knows, or a number that does not agree, is a fault.
/// </summary>
internal static class ReadingBack
{
    private const string N = @"((?:minus )?[0-9][0-9,]*(?:\.[0-9]+)?)";
    private const string Cases = @"(at least )?([0-9]+) of ([0-9,]+) (?:such )?cases";
    private const string Kind = "(count|estimate|amount|share|rate|mean|median|index)";

    private static readonly (Regex Pattern, Func<AppraisedFigure, GroupCollection, bool> Agrees)[] Patterns =
    [
        Sentence($@"The published figure is (about )?{N} [^.]+?( per [0-9,]+)?\.", (figure, g) => Is(g[2], figure.Printed) && figure.HasNumber && g[3].Success == figure.Measure.Per.HasValue
            && g[1].Success == (Number(g[2]) != figure.Value.ToDecimal() * figure.Measure.PrintFactor)),
        Sentence($@"Noise( and rounding together moved it by| of) up to {N} either way (?:was added )?in {Cases}\.",
            (figure, g) => Is(g[2], figure.Main!.Printed.MarginUp) && Is(g[2], figure.Main.Printed.MarginDown)
                && g[1].Value.Contains("rounding", StringComparison.Ordinal) == HoldsRounding(figure) && Holds(figure, g, 3)),
        Sentence($@"Together that noise was up to {N} either way in {Cases}\.", (figure, g) => Is(g[1], figure.Main!.Printed.Margin) && figure.Draws > 1 && Holds(figure, g, 2)),
        Sentence($@"It rests on {N} figures, each with noise of its own\.", (figure, g) => Number(g[1]) == figure.Draws && figure.Draws > 1),
        Sentence($@"Noise (?:and rounding together )?moved it by up to {N} upward or {N} downward in {Cases}\.",
            (figure, g) => Is(g[1], figure.Main!.Printed.MarginDown) && Is(g[2], figure.Main.Printed.MarginUp) && Holds(figure, g, 3)),
        Sentence($@"Noise was added, and figures below {N} were then set to 0\.", (figure, g) => figure.Error!.Steps.Contains(new AfterStep.ZeroBelow((double)Number(g[1])))),
        Sentence($@"Noise was added, and figures below {N} were then not published\.", (figure, g) => figure.Measure.PublishedFrom == (double)Number(g[1])),
        Sentence($@"Here it was more, for the {Kind} cannot be (below|above) {N}\.", (figure, g) => g[2].Value == "below"
            ? Bound(g[3], figure.Possible.Lowest) && figure.Value.ToDouble() + figure.Main!.Margin < figure.Possible.Lowest
            : Bound(g[3], figure.Possible.Highest) && figure.Value.ToDouble() - figure.Main!.Margin > figure.Possible.Highest),
        Sentence("For such a figure the range reaches further than the margin.", (figure, _) => figure.Value.ToDouble() < figure.Possible.Lowest
            ? figure.Main!.High > figure.Value.ToDouble() + figure.Main.Margin
            : figure.Value.ToDouble() > figure.Possible.Highest && figure.Main!.Low < figure.Value.ToDouble() - figure.Main.Margin),
        Sentence($@"(So the|The|For those not set to 0, the|For those published, the) {Kind} before noise is between {N} and {N} in {Cases}\.",
            (figure, g) => IsAbout(figure, g[1]) && IsKind(figure, g[2]) && Is(g[3], Best(figure).Printed.Low) && Is(g[4], Best(figure).Printed.High)
                && Number(g[3]) < Number(g[4]) && Contains(figure, g[3], g[4]) && Holds(figure, g, 5)),
        Sentence($@"When the {Kind} before noise is above {N}, 0 is published in at most {N} of {N} cases\.", (figure, g) => IsKind(figure, g[1]) && Is(g[2], figure.Main!.Printed.High)
            && figure.Value.Unscaled == 0 && (Number(g[3]), Number(g[4])) == (3, 100) && figure.Error!.Steps.OfType<AfterStep.ZeroBelow>().Any()),
        Sentence($@"(?:So t|T)he {Kind} before noise is {N} in {Cases}\.",
            (figure, g) => IsKind(figure, g[1]) && Is(g[2], figure.Main!.Printed.Low) && figure.Main.Low == figure.Main.High && Holds(figure, g, 3)),
        Sentence($@"The {Kind} cannot be below {N}, so the range ends there\.", (figure, g) => Bound(g[2], figure.Possible.Lowest) && figure.Main!.Printed.LowIsCut),
        Sentence($@"The {Kind} cannot be above {N}, so the range ends there\.", (figure, g) => Bound(g[2], figure.Possible.Highest) && figure.Main!.Printed.HighIsCut),
        Sentence($@"The {Kind} cannot be below {N} or above {N}, so the range ends there\.",
            (figure, g) => Bound(g[2], figure.Possible.Lowest) && Bound(g[3], figure.Possible.Highest) && figure.Main!.Printed is { LowIsCut: true, HighIsCut: true }),
        Sentence("This figure was not collected.", (figure, _) => figure.Status == 'L'),
        Sentence("This figure does not apply here.", (figure, _) => figure.Status == 'M'),
        Sentence("This figure is not available.", (figure, _) => figure.Status == 'O'),
        Sentence("This figure is hidden to protect people.", (figure, _) => figure.Status == 'Q'),
        Sentence("It is below the level for publication.", (figure, _) => !figure.HasNumber && figure.Measure.PublishedFrom is not null),
        Sentence("It is published without added noise.", (figure, _) => figure.Reliability == Reliability.Exact),
        Sentence("The limits on what can be learned do not hold for it.", (figure, _) => figure.Reliability == Reliability.Exact),
        Sentence("Late records or wrong answers can still make it wrong.", (figure, _) => figure.Reliability == Reliability.Exact),
        Sentence("It is known from a public source, so no noise was added.", (figure, _) => figure.Reliability == Reliability.Public),
        Sentence("No valid margin is known for it, so none is given.", (figure, _) => figure is { HasNumber: true, Main: null, Reliability: Reliability.NotStated }),
        Sentence("No margin is known that holds in more cases.", (figure, _) => figure is { Main: null, Ranges.Count: 1, Reliability: Reliability.NotStated }),
        Sentence("Noise carried it below zero.", (figure, _) => figure.Value.IsNegative && figure.Possible.Lowest == 0),
        Sentence($@"Noise carried it (below|above) {N}, the (least|most) that the {Kind} can be\.",
            (figure, g) => g[1].Value == "below" ? figure.Value.ToDouble() < figure.Possible.Lowest && Bound(g[2], figure.Possible.Lowest) : figure.Value.ToDouble() > figure.Possible.Highest && Bound(g[2], figure.Possible.Highest)),
        Sentence($@"Read it as a (?:small )?number,? from {N} to {N}\.", (figure, g) => Is(g[1], figure.Main!.Printed.Low) && Is(g[2], figure.Main.Printed.High)),
        Sentence("It need not be 0.", (figure, _) => figure.Printed.Unscaled == 0),
        Sentence($@"Numbers (below|above) {N} were published as {N}\.", SetTo),
        Sentence($@"Figures just above {N} tend to be too high; the range allows for that\.", (figure, g) =>
            figure.Error!.Steps.Contains(new AfterStep.ZeroBelow((double)Number(g[1]))) || figure.Measure.PublishedFrom == (double)Number(g[1])),
        Sentence("Parts below zero were published as 0, so this sum tends to be too high.", (figure, _) => figure.Case.First == SpecialCase.FlooredSum),
        Sentence($@"Noise was added, but in about ([0-9,]+) of ([0-9,]+) cases it leaves the {Kind} as it was\.",
            (figure, g) => (double)Number(g[1]) / (double)Number(g[2]) is var said && said <= figure.Error!.Law.Within(0) && figure.Error.Law.Within(0) - said < 1.0 / (double)Number(g[2])),
        Sentence($@"Amounts (above|below) {N} [^.]+ were counted as {N}\.", (figure, g) =>
            Number(g[2]) == Number(g[3]) && (double)Number(g[2]) == (g[1].Value == "above" ? figure.Mechanism!.Clipped!.To : figure.Mechanism!.Clipped!.From)),
        Sentence("Its margin is (as large as|larger than) the figure.", IsThatLarge),
        Sentence($@"The figure was rounded to a multiple of {N} after the noise\.", (figure, g) => figure.Mechanism!.Afterwards.Contains(new AfterStep.RoundTo((double)Number(g[1])))),
        Sentence($@"The figure was rounded up to a multiple of {N} after the noise, so it tends to be too high\.", (figure, g) => figure.Mechanism!.Afterwards.Contains(new AfterStep.RoundTo((double)Number(g[1]), RoundingHow.Up))),
        Sentence($@"The figure was rounded down to a multiple of {N} after the noise, so it tends to be too low\.", (figure, g) => figure.Mechanism!.Afterwards.Contains(new AfterStep.RoundTo((double)Number(g[1]), RoundingHow.Down))),
        Sentence($@"Of its {N} parts, {N} (?:is|are) not published and not in this sum\.", HasUnseen),
        Sentence($@"Of its {N} parts, {N} (?:is|are) hidden but counted in this sum\.", (figure, g) => HasUnseen(figure, g) && figure.Table.Hidden!.InTotals),
        Sentence("The Office marks it as provisional.", (figure, _) => figure.Status == 'P'),
        Sentence("This figure is (close|rough|weak): its margin is (less than )?([0-9]+) in 100 of it.", Ratio),
        Sentence("This figure is weak: its margin is (as large as|larger than) the figure.", (figure, g) => Is(figure, Reliability.Weak) && IsThatLarge(figure, g)),
        Sentence("This figure is weak: it is not above zero.", (figure, _) => Is(figure, Reliability.Weak) && figure.Value.ToDouble() <= 0),
        Sentence("This figure is weak: do not use it alone.", (figure, _) => Is(figure, Reliability.Weak)),
        Sentence(@"Use the published (total|figure) “([^.]+)” instead\.", (figure, g) => figure.UseInstead is { } whole && NamesRow(figure.Table, whole.Row, g[2].Value)),
        Sentence($@"Read it as {N}\.", (figure, g) => Is(g[1], figure.Main!.Printed.Low) && Is(g[1], figure.Main.Printed.High)),
        Sentence("Do not use it alone.", (figure, _) => Is(figure, Reliability.Weak) && figure.UseInstead is null),
        Sentence("The range covers the added noise only, not late records or wrong answers.", (figure, _) => figure.Main is not null && !HoldsRounding(figure)),
        Sentence("The range covers noise and rounding only, not late records or wrong answers.", (figure, _) => figure.Main is not null && HoldsRounding(figure)),
    ];

    /// <summary>What is wrong with the reading of a figure; empty if nothing is.</summary>
    public static IReadOnlyList<string> Faults(AppraisedFigure figure, ReleaseKit.Wording.Reading reading) =>
        [.. reading.Sentences.Select(sentence => sentence.Text.Replace(Numerals.NoBreak, ' ')).Where(text => !IsRight(figure, text))];

    private static bool IsRight(AppraisedFigure figure, string text)
    {
        var known = Patterns.Select(pattern => (Match: pattern.Pattern.Match(text), pattern.Agrees)).Where(one => one.Match.Success).ToList();
        return known.Count == 1 && known[0].Agrees(figure, known[0].Match.Groups);
    }

    private static (Regex, Func<AppraisedFigure, GroupCollection, bool>) Sentence(string pattern, Func<AppraisedFigure, GroupCollection, bool> agrees) =>
        (new Regex($"^{pattern}$", RegexOptions.CultureInvariant), agrees);

    /// <summary>A rounding on purpose, or continuous noise written with the decimals of a file.</summary>
    private static bool HoldsRounding(AppraisedFigure figure) => figure.Error!.Law is ContinuousLaw || figure.Error.Steps.OfType<AfterStep.RoundTo>().Any();

    private static bool IsThatLarge(AppraisedFigure figure, GroupCollection groups) => groups[1].Value == "as large as"
        ? figure.Main!.Margin == Math.Abs(figure.Value.ToDouble())
        : figure.Main!.Margin > Math.Abs(figure.Value.ToDouble());

    /// <summary>Every heading of the row down to the last one that is not "all" is in the name.</summary>
    private static bool NamesRow(Table table, int row, string name)
    {
        var parts = name.Split(", ");
        var said = table.Stub.Take(parts.Length).Select((column, at) => column.Period || column.LabelOf(row).In("en") == parts[at]);
        return said.All(one => one) && table.Stub.Skip(parts.Length).All(column => column.IsAll(row));
    }

    private static decimal Number(Group group) =>
        decimal.Parse(group.Value.Replace("minus ", "-", StringComparison.Ordinal), NumberStyles.Number, CultureInfo.InvariantCulture);

    /// <summary>The main range, or the only one that is known.</summary>
    private static FigureRange Best(AppraisedFigure figure) => figure.Main ?? figure.Ranges[0];

    /// <summary>A threshold makes the promise one about the figures that passed it, and nothing else does.</summary>
    private static bool IsAbout(AppraisedFigure figure, Group group) => group.Value switch
    {
        "For those not set to 0, the" => figure.Error!.Steps.OfType<AfterStep.ZeroBelow>().Any() && figure.Value.Unscaled != 0,
        "For those published, the" => figure.Measure.PublishedFrom is not null,
        _ => !figure.Error!.DependsOnPublished,
    };

    /// <summary>The figure as it stands in print; one that print leaves nothing of, to two digits of its own.</summary>
    private static bool Is(Group group, PublishedValue value) =>
        Number(group) == value.ToDecimal() && group.Value.Contains('.', StringComparison.Ordinal) == (value.Decimals > 0);

    private static bool Is(AppraisedFigure figure, Reliability reliability) => figure.Reliability == reliability;

    private static bool IsKind(AppraisedFigure figure, Group group) => string.Equals(group.Value, figure.Measure.Kind.ToString(), StringComparison.OrdinalIgnoreCase);

    private static bool Bound(Group group, double bound) => (double)Number(group) == bound;

    /// <summary>What is said holds all that the range holds.</summary>
    private static bool Contains(AppraisedFigure figure, Group low, Group high) =>
        (double)Number(low) <= Best(figure).Low + 1e-9 && Best(figure).High <= (double)Number(high) + 1e-9;

    private static bool Holds(AppraisedFigure figure, GroupCollection groups, int at)
    {
        var said = (double)Number(groups[at + 1]) / (double)Number(groups[at + 2]);
        var (range, nominal) = (Best(figure), figure.Main is null ? 0.5 : 0.95);
        return said == nominal && said <= range.Attained + 1e-12 && (groups[at].Success || range.Attained <= nominal + 1e-9);
    }

    /// <summary>The parts are all rows but the first, which is the total.</summary>
    private static bool HasUnseen(AppraisedFigure figure, GroupCollection groups)
    {
        var parts = Enumerable.Range(1, figure.Table.RowCount - 1).Where(row => figure.Measure.StatusAt(row) != 'M').ToList();
        return Number(groups[1]) == parts.Count && Number(groups[2]) == parts.Count(row => !figure.Measure.HasNumber(row));
    }

    private static bool SetTo(AppraisedFigure figure, GroupCollection groups)
    {
        var (bound, value) = ((double)Number(groups[2]), (double)Number(groups[3]));
        return value == figure.Value.ToDouble() && figure.Error!.Steps.Any(step => groups[1].Value == "below"
            ? step == new AfterStep.NotBelow(bound)
            : step == new AfterStep.NotAbove(bound));
    }

    private static bool Ratio(AppraisedFigure figure, GroupCollection groups)
    {
        var inHundred = 100 * figure.Main!.Margin / Math.Abs(figure.Value.ToDouble());
        var said = (double)Number(groups[3]);
        return string.Equals(groups[1].Value, figure.Reliability.ToString(), StringComparison.OrdinalIgnoreCase) && groups[2].Value switch
        {
            "" => Math.Abs(said - inHundred) < 1e-9,
            _ => inHundred < said && said <= inHundred + 1,
        };
    }
}
