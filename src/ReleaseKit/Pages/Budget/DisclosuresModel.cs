using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>The twenty disclosures of a complete release, each stated or not stated: by this program from its own reckoning, or by the office in its words.</summary>
internal static class DisclosuresModel
{
    private enum Standing
    {
        /// <summary>Stands on these pages.</summary>
        Here,

        /// <summary>The office's statement, which cannot be worked out again.</summary>
        Office,
        NotStated,
    }

    public static ScriptArray Of(BudgetWords words) => new(Standings(words).Select((standing, index) => Row(index + 1, standing, words)));

    private static ScriptObject Row(int number, (Standing Standing, string? Words) stated, BudgetWords words) => new()
    {
        ["name"] = words.Say($"budget.disclosure.{Wording.Numerals.Digits(number)}"),
        ["standing"] = words.Say(stated.Standing == Standing.NotStated ? "budget.not-stated" : "budget.stated"),
        ["is_stated"] = stated.Standing != Standing.NotStated,
        ["text"] = stated.Words ?? (stated.Standing == Standing.Here ? words.Say($"budget.disclosure.{Wording.Numerals.Digits(number)}.here") : null),
        ["stop"] = stated.Words is [.., '.' or '!' or '?' or '…'] ? "" : ".",
        ["by_office"] = stated.Standing == Standing.Office,
    };

    private static IEnumerable<(Standing Standing, string? Words)> Standings(BudgetWords words)
    {
        var release = words.Release;
        var practice = release.Noise.Practice;
        (Standing, string?) OfNoise((Standing, string?) stated) => words.Context.HasNoise ? stated : (Standing.Here, words.Say("budget.disclosure.no-noise"));
        var ofRanges = words.Context.HasNoise ? If(true) : (Standing.Here, words.Say("budget.disclosure.no-range"));
        return
        [
            If(release.Licence is not null),
            If(release.ReferencePeriod is not null && release.Tables.All(table => table.Universe is not null && table.Source is not null)),
            If(release.Noise.Over is not null),
            If(true),
            OfNoise(If(release.Noise.Mechanisms.All(IsBounded))),
            Said(practice.HeldBy),
            If(true),
            If(true),
            If(true),
            OfNoise(If(release.Noise.Mechanisms.All(mechanism => mechanism.Law != LawName.Declared))),
            OfNoise(Said(practice.Sampler)),
            If(true),
            Said(practice.Rows),
            OfNoise(If(true)),
            ofRanges,
            ofRanges,
            Said(Joined(practice.Span, practice.Renewal)),
            Said(Joined(practice.Tuned, null)),
            If(true),
            Said(practice.Corrections),
        ];
    }

    private static bool IsBounded(Mechanism mechanism) =>
        mechanism.Sensitivity is { CellsPerUnit: not null, PerCell: not null } or { L1: not null } or { L2: not null };

    private static string? Joined(string? first, string? second) =>
        first is null ? second : second is null ? first : $"{first}; {second}";

    private static (Standing, string?) If(bool stated) => (stated ? Standing.Here : Standing.NotStated, null);

    private static (Standing, string?) Said(string? text) => text is null ? (Standing.NotStated, null) : (Standing.Office, text);
}
