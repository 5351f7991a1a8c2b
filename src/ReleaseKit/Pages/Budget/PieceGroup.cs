using ReleaseKit.Appraisal;

namespace ReleaseKit.Pages.Budget;

/// <summary>Pieces of the account gathered under one heading; groups of one kind add up to what was spent.</summary>
internal sealed record PieceGroup(string Key, string Name, IReadOnlyList<BudgetPiece> Pieces)
{
    public double Amount => Pieces.Sum(piece => piece.Amount);

    /// <summary>By the tables a mechanism touches, in the order of the release; what touches none comes last.</summary>
    public static IReadOnlyList<PieceGroup> ByTables(BudgetWords words) =>
    [
        .. words.Statement.Pieces.GroupBy(piece => string.Join(' ', piece.Tables)).OrderBy(group => FirstTable(group.First()))
            .Select(group => new PieceGroup(TablesKey(group.First(), words), TablesName(group.First(), words), [.. group])),
    ];

    /// <summary>By level, in the order in which levels first appear.</summary>
    public static IReadOnlyList<PieceGroup> ByLevel(BudgetWords words) =>
        [.. words.Statement.Pieces.GroupBy(piece => piece.LevelKey).Select(group => new PieceGroup(words.Level(group.First()), "", [.. group]))];

    /// <summary>The pieces of a group by the measures that carry their noise.</summary>
    public IReadOnlyList<PieceGroup> ByMeasures(BudgetWords words) =>
    [
        .. Pieces.GroupBy(piece => piece.Measures.Count == 0 ? piece.Mechanism : string.Join(' ', piece.Measures))
            .Select(group => new PieceGroup("", MeasuresName(group.First(), words), [.. group])),
    ];

    /// <summary>What one level of this group cost; null where it has no piece there.</summary>
    public double? AmountAt(string levelKey)
    {
        var pieces = Pieces.Where(piece => piece.LevelKey == levelKey).ToList();
        return pieces.Count == 0 ? null : pieces.Sum(piece => piece.Amount);
    }

    private static int FirstTable(BudgetPiece piece) => piece.Tables.Count == 0 ? int.MaxValue : piece.Tables[0];

    private static string TablesKey(BudgetPiece piece, BudgetWords words) => piece.Tables.Count switch
    {
        0 => words.Say("budget.table.none"),
        1 => words.TableName(piece.Tables[0]),
        _ => words.Say("budget.table-numbers", ("numbers", words.Language.List([.. piece.Tables.Select(words.TableNumber)]))),
    };

    private static string TablesName(BudgetPiece piece, BudgetWords words) =>
        string.Join("; ", piece.Tables.Select(table => words.Context.In(words.Release.Tables[table].Title)));

    private static string MeasuresName(BudgetPiece piece, BudgetWords words)
    {
        if (piece.Measures.Count == 0)
            return MechanismName(piece.Mechanism, words);
        return string.Join("; ", piece.Measures.Select(at => words.Context.In(words.Release.Tables[at.Table].Measures[at.Measure].Title)).Distinct());
    }

    private static string MechanismName(string id, BudgetWords words)
    {
        var mechanism = words.Statement.Mechanisms.First(account => account.Mechanism.Id == id).Mechanism;
        return mechanism.Answers is { } answers ? words.Context.In(answers) : id;
    }
}
