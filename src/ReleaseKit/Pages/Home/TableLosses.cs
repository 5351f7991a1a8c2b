using ReleaseKit.Appraisal;

namespace ReleaseKit.Pages.Home;

/// <summary>What was spent by each table alone, and what mechanisms spent that serve several tables or none.</summary>
internal sealed record TableLosses(IReadOnlyDictionary<int, double> Alone, double Shared)
{
    public static TableLosses Of(BudgetStatement budget)
    {
        var alone = budget.Pieces.Where(piece => piece.Tables.Count == 1).GroupBy(piece => piece.Tables[0])
            .ToDictionary(pieces => pieces.Key, pieces => pieces.Sum(piece => piece.Amount));
        return new TableLosses(alone, budget.Pieces.Where(piece => piece.Tables.Count != 1).Sum(piece => piece.Amount));
    }

    public double Of(int table) => Alone.GetValueOrDefault(table);
}
