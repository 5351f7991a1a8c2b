using ReleaseKit.SampleMaker.Population;
using ReleaseKit.SampleMaker.Tables;

namespace ReleaseKit.SampleMaker;

/// <summary>The sample release, made anew: invents the households once, and noises their tables as often as asked.</summary>
public sealed class Sample
{
    /// <summary>Seeds of the published sample. An office never writes its seed anywhere; these households are invented.</summary>
    public const ulong HouseholdsSeed = 2031;
    public const ulong PublishedSeed = 20320316;
    private readonly IReadOnlyList<Household> households = Census.Invent(HouseholdsSeed);

    public IReadOnlyList<SampleTable> Noised(ulong seed = PublishedSeed)
    {
        var noise = new Noiser(seed);
        return
        [
            ArrearsTable.Of(households, noise),
            OwedTable.Of(households, noise),
            TenureTable.Of(households, noise),
            QuarterTable.Of(households, noise),
            WeeksTable.Of(households, noise),
            HelpTable.Of(households, noise),
        ];
    }

    /// <summary>Writes the noised tables into FOLDER/tables, and nothing else.</summary>
    public static void Write(IEnumerable<SampleTable> tables, string folder)
    {
        var target = Directory.CreateDirectory(Path.Combine(folder, "tables")).FullName;
        foreach (var table in tables)
            File.WriteAllText(Path.Combine(target, table.File), table.Csv);
    }
}
