using ReleaseKit.Reading.Mechanisms;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>Which rule decides each row of a measure: the first whose "where" fits. Rows that no rule fits get <see cref="NoiseRule.NotGiven"/>, added last, and are reported by the checks. Where one rule could not be read, it is not known which rows the others would have: none has a rule.</summary>
internal sealed class RuleAssigner(TableDraft draft, IReadOnlyList<StubColumn> stub, int rowCount, MechanismsDraft mechanisms, IReadOnlySet<string> meant)
{
    private readonly Dictionary<int, (List<NoiseRule> Rules, List<int[]> Wanted)> byMeasure = [];

    public IReadOnlyList<NoiseRule> RulesOf(int measure) => Of(measure).Rules;

    public byte[] Assign(int measure)
    {
        var wanted = Of(measure).Wanted;
        var ruleOf = new byte[rowCount];
        for (var row = 0; row < rowCount; row++)
            ruleOf[row] = (byte)(wanted.FindIndex(where => Fits(where, row)) is >= 0 and var rule ? rule : wanted.Count);
        return ruleOf;
    }

    private (List<NoiseRule> Rules, List<int[]> Wanted) Of(int measure)
    {
        if (!byMeasure.TryGetValue(measure, out var rules))
            byMeasure[measure] = rules = Resolve(draft.Figures[measure]);
        return rules;
    }

    private (List<NoiseRule> Rules, List<int[]> Wanted) Resolve(FigureDraft figure)
    {
        var (rules, wanted) = (new List<NoiseRule>(), new List<int[]>());
        foreach (var rule in figure.Rules ?? [])
            if (rule.End is { } end && End(end) is { } resolved && Wanted(rule) is { } where)
            {
                rules.Add(resolved);
                wanted.Add(where);
            }
        return rules.Count == (figure.Rules?.Count ?? 0) ? ([.. rules, NoiseRule.NotGiven.Instance], wanted) : ([NoiseRule.NotGiven.Instance], []);
    }

    private NoiseRule? End(RuleEnd end) => end switch
    {
        RuleEnd.Mechanism named => Mechanism(named),
        RuleEnd.SumOver sum => SumOver(sum),
        RuleEnd.Exact exact => new NoiseRule.Exact(exact.Reason) { At = exact.At },
        RuleEnd.Public known => new NoiseRule.Public(known.Source),
        _ => throw new InvalidOperationException($"No such rule end: {end}"),
    };

    private NoiseRule.FromMechanism? Mechanism(RuleEnd.Mechanism named)
    {
        if (mechanisms.Find(named.Id) is { } mechanism)
            return new NoiseRule.FromMechanism(mechanism);
        if (mechanisms.Account is not null && !mechanisms.DeclaredIds.Contains(named.Id))
            draft.Context.Add(MechanismProblems.UnknownMechanism(named.At, named.Id, mechanisms.DeclaredIds, Review.FindingOwner.Noise));
        return null;
    }

    private NoiseRule.SumOver? SumOver(RuleEnd.SumOver sum)
    {
        var index = StubIndex(sum.Column);
        if (index < 0 && !meant.Contains(sum.Column))
            draft.Context.Add(TableProblems.NotAStub(sum.At, "sumOver", sum.Column, stub.Select(column => column.Column), Review.FindingOwner.Noise));
        return index < 0 ? null : new NoiseRule.SumOver(index);
    }

    /// <summary>For each stub column the code that "where" asks for, −1 for any; null if it asks for what is not there.</summary>
    private int[]? Wanted(RuleDraft rule)
    {
        var wanted = new int[stub.Count];
        Array.Fill(wanted, -1);
        foreach (var (column, value) in rule.Where)
            if (StubIndex(column) is >= 0 and var index)
                wanted[index] = CodeOf(index, value, rule);
            else if (!meant.Contains(column))
                draft.Context.Add(TableProblems.NotAStub(rule.WhereAt, "where", column, stub.Select(one => one.Column), Review.FindingOwner.Noise));
        return wanted.Contains(NotThere) ? null : wanted;
    }

    private const int NotThere = -2;

    private int CodeOf(int index, string value, RuleDraft rule)
    {
        var code = stub[index].Labels.ToList().FindIndex(label => label.Value == value);
        if (code < 0 && rowCount > 0)
            draft.Context.Add(TableProblems.NoSuchValue(rule.WhereAt, stub[index].Column, value, stub[index].Labels.Select(label => label.Value), Review.FindingOwner.Noise));
        return code >= 0 ? code : rowCount > 0 ? NotThere : -1;
    }

    private int StubIndex(string column) => stub.ToList().FindIndex(one => one.Column == column);

    private bool Fits(int[] wanted, int row)
    {
        for (var index = 0; index < wanted.Length; index++)
            if (wanted[index] >= 0 && stub[index].Codes[row] != wanted[index])
                return false;
        return true;
    }
}
