using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Reading.Mechanisms;
using ReleaseKit.Reading.Prose;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;
using ReleaseKit.Review;
using ReleaseKit.Review.Leaks;

namespace ReleaseKit.Reading;

/// <summary>Reads a release folder whole: everything that is wrong with it is found in one run.</summary>
public static class ReleaseFolder
{
    public const string ReleaseFileName = "release.json";
    public const string MechanismsFileName = "mechanisms.json";

    /// <summary>The only language so far.</summary>
    private const string Language = "en";

    /// <exception cref="FolderUnusableException">There is no such folder, or it holds neither JSON file.</exception>
    public static ReadOutcome Read(string folder)
    {
        if (!Directory.Exists(folder))
            throw new FolderUnusableException($"There is no folder {folder}. Name the release folder: the one with release.json and mechanisms.json.");
        var files = new FolderFiles(folder);
        if (!files.Exists(ReleaseFileName) && !files.Exists(MechanismsFileName))
            throw new FolderUnusableException($"{folder} is no release folder: it has neither release.json nor mechanisms.json.");
        return new FolderReading(files).Read();
    }

    /// <summary>One reading of one folder.</summary>
    private sealed class FolderReading(FolderFiles files)
    {
        private readonly FindingLog log = new();
        private bool tablesAreWhole = true;
        private bool rulesAreWhole = true;
        private IReadOnlyCollection<string> tablesInPart = [];

        public ReadOutcome Read()
        {
            var (release, noise) = (
                Json(ReleaseFileName, FindingOwner.Writer, "what is published, by whom and when"), Json(MechanismsFileName, FindingOwner.Noise, "which noise was added and what it spent"));
            CheckSeeds(release, FindingLevel.Caution, FindingOwner.Writer);
            CheckSeeds(noise, FindingLevel.Stop, FindingOwner.Noise);
            var draft = release is null ? null : ReleaseFile.Read(release, Context(FindingOwner.Writer));
            var mechanisms = noise is null
                ? MechanismsDraft.Unread : MechanismsFile.Read(noise, draft?.Units ?? new Dictionary<string, Unit>(), files, Context(FindingOwner.Noise));
            var signOff = SignOffFile.Read(OptionalJson(SignOffFile.FileName, FindingOwner.SignOff), Context(FindingOwner.SignOff));
            if (files.Exists("wording"))
                log.Add(ReleaseProblems.WordingNotYet(new Place("wording"), FindingOwner.Writer));
            var formed = draft is null ? LoneTables() : Form(draft, mechanisms, signOff);
            return new ReadOutcome(formed, CellPlaces.Fill(log.ToList(), files))
            {
                Files = files,
                Noise = mechanisms.Account,
                TablesAreWhole = tablesAreWhole,
                TablesInPart = tablesInPart,
                RulesAreWhole = rulesAreWhole,
            };
        }

        private Release? Form(ReleaseDraft draft, MechanismsDraft mechanisms, SignOff signOff)
        {
            var labels = LabelBook.Read(files, Context(FindingOwner.Writer));
            var read = draft.Tables.Select(table => new TableReader(table, mechanisms, labels).Read(files)).ToList();
            var tables = CoverAssigner.Assign(read, mechanisms, draft.HasAllTables, log);
            var prose = ProseReader.Read(draft.Narrative, files, Context(FindingOwner.Writer));
            var release = Assemble(draft, tables, prose, mechanisms, signOff);
            FolderChecks.Run(draft, tables, mechanisms, release, log);
            tablesAreWhole = draft.HasAllTables && tables.All(table => table.IsWhole);
            tablesInPart = [.. tables.Where(table => !table.IsWhole).Select(table => table.Table.Id)];
            rulesAreWhole = tablesAreWhole && tables.All(table => RuleChecks.AreWhole(table, mechanisms));
            if (tablesAreWhole)
                labels.CheckUsed(release.Tables, Context(FindingOwner.Writer));
            return mechanisms.Account is null ? null : release;
        }

        /// <summary>Before release.json exists: the tables are looked at as files.</summary>
        private Release? LoneTables()
        {
            LoneTableChecks.Run(files, Context(FindingOwner.Noise));
            return null;
        }

        private static Release Assemble(
            ReleaseDraft draft, IReadOnlyList<ReadTable> tables, IReadOnlyList<ProsePage> prose, MechanismsDraft mechanisms, SignOff signOff)
        {
            return new Release
            {
                Title = draft.Head.Title,
                Identifier = draft.Head.Identifier,
                Lead = draft.Head.Lead,
                Publisher = draft.Head.Publisher,
                Published = draft.Head.Published,
                ReferencePeriod = draft.Head.ReferencePeriod,
                Next = draft.Head.Next,
                Address = draft.Head.Address,
                Licence = draft.Head.Licence,
                Languages = draft.Head.Languages,
                Coverages = draft.Head.Coverages,
                Reliability = draft.Head.Reliability,
                Edition = draft.Head.Edition,
                Units = draft.Units,
                Look = draft.Head.Look,
                Narrative = prose,
                Short = draft.Short.DistinctBy(name => name.Value.Name).ToDictionary(name => name.Value.Name, name => name.Value.Address),
                Headlines = [.. draft.Headlines.Select(headline => headline.Value)],
                Tables = [.. tables.Select(table => table.Table)],
                Charts = [.. draft.Charts.Select(chart => chart.Value)],
                Noise = mechanisms.Account!,
                SignOff = signOff,
            };
        }

        // Where the noise is told of, a seed with its number is one; in titles and notes it can be something else.
        private void CheckSeeds(JsonValue? root, FindingLevel level, FindingOwner owner)
        {
            foreach (var text in root is null ? [] : JsonTexts.In(root))
                foreach (var (_, words) in SeedText.In(text.Value))
                    log.Add(SeedText.Found(level, owner, text.At, words));
        }

        private JsonValue? Json(string file, FindingOwner owner, string contents)
        {
            if (files.Exists(file))
                return OptionalJson(file, owner);
            log.Add(ReleaseProblems.FileMissing(file, owner, contents));
            return null;
        }

        private JsonValue? OptionalJson(string file, FindingOwner owner) =>
            files.Exists(file) && files.Bytes(file, FolderLimits.JsonBytes, new Place(file), Context(owner)) is { } bytes
                ? JsonTreeReader.Read(file, bytes, owner, log)
                : null;

        private ReadContext Context(FindingOwner owner) => new(log, owner, Language);
    }
}
