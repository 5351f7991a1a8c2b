using ReleaseKit.Noise.Laws;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>The cells of a release that carry the noise of one mechanism.</summary>
/// <param name="Measures">In the order of the release.</param>
/// <param name="ByLaw">How many cells carry each law; a row whose law cannot be formed (a stop of the reading) is left out.</param>
public sealed record MechanismCells(IReadOnlyList<MeasureRef> Measures, IReadOnlyList<NoisedCells> ByLaw)
{
    private const byte HiddenStatus = (byte)'Q';

    public static MechanismCells None { get; } = new([], []);

    /// <summary>How many of them have a published number.</summary>
    public long Published { get; init; }

    /// <summary>How many were drawn and then hidden.</summary>
    public long Hidden { get; init; }

    /// <summary>How many were drawn: what the account counts.</summary>
    public long Count => ByLaw.Sum(part => part.Count);

    public IReadOnlyList<int> Tables => [.. Measures.Select(measure => measure.Table).Distinct()];

    /// <summary>By mechanism id, for every mechanism that a rule names.</summary>
    public static IReadOnlyDictionary<string, MechanismCells> Of(Release release)
    {
        var gathered = new Dictionary<string, Gathering>();
        for (var table = 0; table < release.Tables.Count; table++)
        {
            for (var measure = 0; measure < release.Tables[table].Measures.Count; measure++)
                Gather(gathered, release.Tables[table], new MeasureRef(table, measure));
        }

        return gathered.ToDictionary(pair => pair.Key, pair => pair.Value.Cells());
    }

    private static void Gather(Dictionary<string, Gathering> gathered, Table table, MeasureRef at)
    {
        var measure = table.Measures[at.Measure];
        for (var rule = 0; rule < measure.Rules.Count; rule++)
        {
            if (measure.Rules[rule] is not NoiseRule.FromMechanism { Mechanism: var mechanism })
                continue;
            if (!gathered.TryGetValue(mechanism.Id, out var into))
                gathered[mechanism.Id] = into = new Gathering(mechanism);
            into.Add(table, at, rule);
        }
    }

    private sealed class Gathering(Mechanism mechanism)
    {
        private readonly DeclaredLaws declared = new();
        private readonly List<MeasureRef> measures = [];
        private readonly Dictionary<NoiseLaw, long> counts = [];
        private long published;
        private long hidden;

        public void Add(Table table, MeasureRef at, int rule)
        {
            if (!measures.Contains(at))
                measures.Add(at);
            var (noised, ruleOf) = (table.Measures[at.Measure], table.Measures[at.Measure].RuleOf);
            published += Enumerable.Range(0, ruleOf.Length).LongCount(row => ruleOf[row] == rule && noised.HasNumber(row));
            hidden += Enumerable.Range(0, ruleOf.Length).LongCount(row => ruleOf[row] == rule && noised.Status[row] == HiddenStatus);
            if (mechanism.Parameters.Values.All(parameter => parameter.Number is not null))
            {
                Count(declared.TryLawOf(mechanism, table, 0), ruleOf.LongCount(one => one == rule));
                return;
            }

            for (var row = 0; row < ruleOf.Length; row++)
            {
                if (ruleOf[row] == rule)
                    Count(declared.TryLawOf(mechanism, table, row), 1);
            }
        }

        private void Count(NoiseLaw? law, long cells)
        {
            if (law is not null && cells > 0)
                counts[law] = counts.GetValueOrDefault(law) + cells;
        }

        public MechanismCells Cells() => new(measures, [.. counts.Select(pair => new NoisedCells(pair.Key, pair.Value))])
        {
            Published = published,
            Hidden = hidden,
        };
    }
}
