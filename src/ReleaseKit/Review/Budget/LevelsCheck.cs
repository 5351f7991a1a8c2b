using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>The declared sensitivity against the structure of the tables: totals and their parts, periods, several columns.</summary>
internal sealed class LevelsCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Noise: { } account }
        ? subject.Spendings.Where(spending => spending.Cells.Measures.Count > 0).SelectMany(spending => CheckMechanism(spending, release, account))
        : [];

    private static IEnumerable<Finding> CheckMechanism(MechanismSpending spending, Release release, NoiseAccount account)
    {
        var mechanism = spending.Mechanism;
        var levels = spending.Cells.Measures.Select(at => Levels.Of(release, at, mechanism.Id)).ToList();
        var table = release.Tables[spending.Cells.Measures[levels.IndexOf(levels.Max())].Table];
        if (Counted(mechanism.Sensitivity) is not { } counted)
            return levels.Max() > 1 ? [NotCounted(mechanism, levels.Max(), table, account)] : [];
        if (counted < levels.Max())
            return [TooFew(mechanism, counted, levels.Max(), table, account)];
        return counted < levels.Sum() ? [SeveralColumns(mechanism, counted, levels, account)] : [];
    }

    // What the office says it counted; a norm without it may have counted one cell only.
    private static int? Counted(Sensitivity sensitivity) => sensitivity is { CellsPerUnit: { } cells, PerCell: not null } ? cells : sensitivity.L1Levels;

    private static Finding TooFew(Mechanism mechanism, int counted, int levels, Table table, NoiseAccount account) => new(
        FindingLevel.Stop, "sensitivity-too-small", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" counts a {BudgetText.One(account)} in {counted} {(counted == 1 ? "cell" : "cells")}, but table \"{table.Id}\" has it in {levels}: totals beside their parts, or several periods.",
        "what one " + BudgetText.One(account) + " costs is worked out from every cell that it moves.",
        mechanism.Sensitivity.CellsPerUnit is null
            ? $"work the norm out over all {levels} and write \"l1Levels\": {levels}."
            : $"write \"cellsPerUnit\": {levels}, or noise totals and periods by mechanisms of their own, or publish totals as sums of their parts.");

    private static Finding NotCounted(Mechanism mechanism, int levels, Table table, NoiseAccount account) => new(
        FindingLevel.Stop, "levels-not-counted", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" gives {(mechanism.Sensitivity.L1 is null ? "an l2" : "an l1")}, and table \"{table.Id}\" has a {BudgetText.One(account)} in {levels} cells of it: totals beside their parts, or several periods.",
        "a norm over one cell alone would be too small, and the loss with it.",
        $"if the norm is over all of them, say so: \"l1Levels\": {levels}; else work it out again.");

    private static Finding SeveralColumns(Mechanism mechanism, int counted, List<int> levels, NoiseAccount account) => new(
        FindingLevel.Caution, "counted-in-several-columns", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" noises {levels.Count} columns and counts a {BudgetText.One(account)} in {counted} {(counted == 1 ? "cell" : "cells")}; one that stands in every column is in {levels.Sum()}.",
        $"a {BudgetText.One(account)} that is in two columns is moved in both.",
        $"write {(mechanism.Sensitivity.CellsPerUnit is null ? "\"l1Levels\"" : "\"cellsPerUnit\"")}: {levels.Sum()}, or leave it if no {BudgetText.One(account)} can be in so many.");
}
