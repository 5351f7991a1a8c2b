using ReleaseKit.SampleMaker.Population;
using ReleaseKit.SampleMaker.Tables;

namespace ReleaseKit.SampleMaker;

/// <summary>The sample release, made anew: the households are invented and asked once, their tables noised as often as wished.</summary>
public sealed class Sample
{
    /// <summary>Seeds of the published sample. An office never writes its seed anywhere; these households are invented.</summary>
    public const ulong HouseholdsSeed = 2031;
    public const ulong PublishedSeed = 20320316;
    private readonly ISampleQuery[] queries;

    public Sample()
    {
        var households = Census.Invent(HouseholdsSeed);
        queries =
        [
            new ArrearsTable(households), new OwedTable(households), new TenureTable(households),
            new QuarterTable(households), new WeeksTable(households), new HelpTable(households),
        ];
    }

    public IReadOnlyList<SampleTable> Noised(ulong seed = PublishedSeed)
    {
        var noise = new Noiser(seed);
        return [.. queries.Select(query => query.Noised(noise))];
    }

    /// <summary>Writes the noised tables into FOLDER/tables, and nothing else.</summary>
    public static void Write(IEnumerable<SampleTable> tables, string folder)
    {
        var target = Directory.CreateDirectory(Path.Combine(folder, "tables")).FullName;
        foreach (var table in tables)
            File.WriteAllText(Path.Combine(target, table.File), table.Csv);
    }
}
