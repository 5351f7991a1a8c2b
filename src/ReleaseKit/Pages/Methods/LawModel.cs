using System.Globalization;
using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Downloads;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Methods;

/// <summary>A noise law as the methods page's template sees it, with the mechanisms that use it.</summary>
internal static class LawModel
{
    public static ScriptObject Of(SiteContext context, LawName law, IEnumerable<Mechanism> mechanisms)
    {
        var key = "methods.law." + KeyOf(law);
        return new ScriptObject
        {
            ["id"] = "law-" + KeyOf(law),
            ["name"] = context.Language.Text(key),
            ["formula"] = new RawHtml(Formula.ToHtml(context.Language.Text(key + ".formula"))),
            ["margin"] = new RawHtml(Formula.ToHtml(Margin(context, law, key))),
            ["source"] = context.Language.Text(key + ".source"),
            ["mechanisms"] = new ScriptArray(mechanisms.Select(mechanism => Row(context, mechanism))),
        };
    }

    /// <summary>"discrete-laplace" for DiscreteLaplace: the law's name as mechanisms.json writes it.</summary>
    public static string KeyOf(LawName law)
    {
        var key = new StringBuilder();
        foreach (var letter in law.ToString())
        {
            if (char.IsAsciiLetterUpper(letter) && key.Length > 0)
                key.Append('-');
            key.Append(char.ToLowerInvariant(letter));
        }
        return key.ToString();
    }

    private static ScriptObject Row(SiteContext context, Mechanism mechanism) => new()
    {
        ["id"] = "mechanism-" + mechanism.Id,
        ["name"] = mechanism.Id,
        ["answers"] = mechanism.Answers is { } answers ? context.In(answers) : "",
        ["parameters"] = string.Join(", ", Parameters(context, mechanism)),
        ["list"] = mechanism.Law == LawName.Tabulated ? Link.From(PageMap.Methods, DownloadNames.Law(mechanism)) : null,
        ["sensitivity"] = string.Join(", ", SensitivityOf(context, mechanism.Sensitivity)),
        ["afterwards"] = string.Join(", ", Afterwards(context, mechanism).DefaultIfEmpty(context.Language.Text("methods.no-steps"))),
    };

    private static string Margin(SiteContext context, LawName law, string key) =>
        context.Language.Text(key + ".margin") + (FileRounding.IsContinuous(law) ? " " + context.Language.Text("methods.margin.rounded") : "");

    /// <summary>The declared steps; continuous noise is at least rounded to the decimals that its figures are written with.</summary>
    private static IEnumerable<string> Afterwards(SiteContext context, Mechanism mechanism)
    {
        var numbers = new MechanismNumbers(context, mechanism);
        return
        [
            .. mechanism.Afterwards.Select(step => StepOf(context, step)),
            .. numbers.FileRounding is { } unit ? [Named(context, "methods.after.written", unit)] : Array.Empty<string>(),
            .. numbers.Thresholds.Select(from => StepOf(context, new AfterStep.PublishedFrom(from))),
        ];
    }

    private static IEnumerable<string> Parameters(SiteContext context, Mechanism mechanism)
    {
        foreach (var (name, value) in mechanism.Parameters.OrderBy(parameter => parameter.Key, StringComparer.Ordinal))
            if (name != "grid")
                yield return Named(context, "methods.parameter." + name, value.Number is { } number
                    ? Number(context, number)
                    : context.Language.Text("methods.by-row", ("column", value.Column!)));
        if (mechanism.Grid != 1)
            yield return Named(context, "methods.parameter.grid", Number(context, mechanism.Grid));
    }

    private static IEnumerable<string> SensitivityOf(SiteContext context, Sensitivity sensitivity)
    {
        (string Key, double? Value)[] given =
        [
            ("cellsPerUnit", sensitivity.CellsPerUnit), ("perCell", sensitivity.PerCell), ("perUnit", sensitivity.PerUnit),
            ("l1", sensitivity.L1), ("l2", sensitivity.L2),
        ];
        return given.Where(one => one.Value is not null).Select(one => Named(context, "methods.sensitivity." + one.Key, Number(context, one.Value!.Value)));
    }

    private static string StepOf(SiteContext context, AfterStep step) => step switch
    {
        AfterStep.RoundTo round => Named(context, "methods.after." + Rounding(round), Number(context, round.Unit)),
        AfterStep.NotBelow bound => Named(context, "methods.after.not-below", Number(context, bound.Bound)),
        AfterStep.NotAbove bound => Named(context, "methods.after.not-above", Number(context, bound.Bound)),
        AfterStep.ZeroBelow threshold => Named(context, "methods.after.zero-below", Number(context, threshold.Threshold)),
        AfterStep.PublishedFrom threshold => Named(context, "methods.after.published-from", Number(context, threshold.Threshold)),
        _ => throw new InvalidOperationException($"No words for {step}."),
    };

    private static string Rounding(AfterStep.RoundTo round) => round switch
    {
        { How: RoundingHow.Up } => "round-up",
        { How: RoundingHow.Down } => "round-down",
        { How: RoundingHow.AtRandom } => "round-at-random",
        { Ties: RoundingTies.Up } => "round.up",
        { Ties: RoundingTies.Even } => "round.even",
        _ => "round.away",
    };

    private static string Named(SiteContext context, string key, string value) => context.Language.Text(key, ("value", value));

    private static string Number(SiteContext context, double value) =>
        context.Language.Number(PublishedValue.Shortest(decimal.Parse(value.ToString("G12", CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture)));
}
