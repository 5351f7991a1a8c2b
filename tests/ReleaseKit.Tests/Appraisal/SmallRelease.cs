using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Tests.Appraisal;

/// <summary>
/// Builds a release in code: one table, as many measures as a test needs. Values stand as in a CSV; a letter in place of a number, or after it
/// and a space, is a status.
/// </summary>
internal sealed class SmallRelease
{
    private readonly List<StubColumn> stub = [];
    private readonly List<Measure> measures = [];
    private readonly List<SideColumn> sides = [];
    private readonly List<Addition> adds = [];
    private int rowCount;

    public Hiding? Hidden { get; init; }

    public Coverages Coverages { get; init; } =
        new(Coverage.OfShare(0.95), Coverage.OfShare(0.5), Coverage.OfShare(0.99));

    public ReliabilityThresholds Thresholds { get; init; } = new(0.1, 0.5);

    public static Unit Households { get; } = UnitOf("household", "households");

    public static Unit UnitOf(string one, string other) =>
        new(one, new Dictionary<string, UnitForms> { ["en"] = new(one, other) });

    public static ReaderText Words(string text) => ReaderText.Plain("en", text);

    public static Mechanism Mechanism(string id, LawName law, params (string Key, double Value)[] parameters) => new()
    {
        Id = id,
        Law = law,
        Parameters = parameters.ToDictionary(pair => pair.Key, pair => NumberOrColumn.Of(pair.Value)),
        Sensitivity = new Sensitivity { CellsPerUnit = 1, PerCell = 1 },
        Afterwards = [],
        At = new Place("mechanisms.json", 1, 1),
        KeyPlaces = new Dictionary<string, Place>(),
    };

    public static Mechanism DiscreteGaussian(double sigma, params AfterStep[] afterwards) =>
        Mechanism("gauss", LawName.DiscreteGaussian, ("sigma", sigma)) with { Afterwards = afterwards };

    public SmallRelease Stub(string column, string? all, params string[] values)
    {
        var labels = values.Distinct().Select(value => new StubLabel(value, Slug.Of(value), null, null)).ToList();
        rowCount = values.Length;
        stub.Add(new StubColumn
        {
            Column = column,
            Title = Words(column),
            All = all,
            Labels = labels,
            Codes = [.. values.Select(value => labels.FindIndex(label => label.Value == value))],
            AllCode = labels.FindIndex(label => label.Value == all),
        });
        return this;
    }

    public SmallRelease Side(string column, params double[] numbers)
    {
        sides.Add(new SideColumn(column, SideColumnOrigin.Public, null, numbers));
        return this;
    }

    public SmallRelease Adds(string measure, string over, string total)
    {
        adds.Add(new Addition(measure, over, total));
        return this;
    }

    /// <summary>A measure whose rows all have one rule.</summary>
    public SmallRelease Figures(MeasureKind kind, Mechanism mechanism, params string[] values) => Figures(Measure(kind), mechanism, values);

    public SmallRelease Figures(Measure measure, Mechanism mechanism, params string[] values) =>
        Figures(measure, [new NoiseRule.FromMechanism(mechanism)], new byte[values.Length], values);

    public SmallRelease Figures(Measure measure, IReadOnlyList<NoiseRule> rules, byte[] ruleOf, params string[] values)
    {
        var cells = values.Select(Cell).ToList();
        measures.Add(measure with
        {
            Rules = rules,
            RuleOf = ruleOf,
            Unscaled = [.. cells.Select(cell => cell.Number.Unscaled)],
            DecimalsOf = [.. cells.Select(cell => cell.Number.Decimals)],
            Status = [.. cells.Select(cell => (byte)cell.Status)],
        });
        return this;
    }

    public static Measure Measure(MeasureKind kind, string column = "figure") => new()
    {
        Column = column,
        Slug = Slug.Of(column),
        Title = Words(column),
        Unit = Households,
        Kind = kind,
        Rules = [],
        RuleOf = [],
        Unscaled = [],
        DecimalsOf = [],
        Status = [],
    };

    public Release Build()
    {
        if (stub.Count == 0)
            Stub("row", null, [.. Enumerable.Range(1, measures[0].Unscaled.Length).Select(row => $"r{row}")]);
        return new Release
        {
            Title = Words("A small release"),
            Identifier = "small-1",
            Publisher = new Publisher("Office", "office@office.example", null),
            Published = new DateTimeOffset(2032, 3, 16, 9, 30, 0, TimeSpan.FromHours(1)),
            Languages = ["en"],
            Coverages = Coverages,
            Reliability = Thresholds,
            Edition = new Edition(1, 1, EditionStatus.First),
            Units = new Dictionary<string, Unit> { ["household"] = Households },
            Look = new Look(null, null),
            Narrative = [],
            Short = new Dictionary<string, string>(),
            Headlines = [],
            Tables = [Table()],
            Charts = [],
            Noise = Account(),
            SignOff = SignOff.Empty,
        };
    }

    public IAppraisedRelease Appraise() => AppraisedRelease.Of(Build());

    /// <summary>The appraised figure of one row of the first measure.</summary>
    public AppraisedFigure Figure(int row = 0) => Appraise().Figure(new FigureRef(0, 0, row));

    private static (PublishedValue Number, char Status) Cell(string value)
    {
        if (char.IsAsciiLetter(value[0]))
            return (default, value[0]);
        var parts = value.Split(' ');
        return (PublishedValue.Of(decimal.Parse(parts[0], CultureInfo.InvariantCulture)), parts.Length == 1 ? 'A' : parts[1][0]);
    }

    private Table Table() => new()
    {
        Id = "table",
        File = "tables/table.csv",
        Title = Words("A table"),
        Notes = [],
        Stub = stub,
        Measures = measures,
        SideColumns = sides,
        Adds = adds,
        RowCount = rowCount,
        Hidden = Hidden,
    };

    private static NoiseAccount Account() => new()
    {
        Who = Households,
        Neighbouring = Neighbouring.AddOrRemove,
        Accounting = Accounting.Concentrated,
        Authorised = new Authorised { Rho = 1, At = new Place("mechanisms.json", 1, 1) },
        Mechanisms = [],
        Practice = new Practice(null, null, null, null, null, null, null),
    };
}
