using System.CommandLine;

namespace ReleaseKit.Cli;

/// <summary>The help pages: the whole program and one page a command, each with an example and the next step.</summary>
public static class HelpText
{
    private const string Program = """
        releasekit: publishes noised tables so that nobody misreads a noisy number.

        In the order of the work:
          releasekit review FOLDER              what stands in the way, and for whom
          releasekit compose FOLDER --to SITE   the publication: pages and files

        Everywhere:
          --quiet      no progress, only results and findings
          --help       this page, or a command's own
          --version    the version

        Results go to standard output, progress and messages to standard error.
        Exit codes: 0 done; 1 stops, nothing written; 2 call or folder unusable;
        70 a defect of ReleaseKit.

        Example:
          releasekit compose sample-release --to site

        Next: releasekit review FOLDER, with the folder that holds your
        release.json, mechanisms.json and tables.
        """;

    private const string Review = """
        releasekit review FOLDER: what stands in the way of publishing this folder.

        FOLDER holds release.json, mechanisms.json, tables and prose. Each half can
        be reviewed alone: mechanisms.json with the tables, or release.json with them.

        Prints every finding of the folder in one run, first the writer's, then
        noise, then sign-off. A stop holds publication back; a caution asks for a
        look; a note tells. The last line counts the stops by owner. Of a kind in one
        file the first 12 are printed in full, and how many more there are.

        Options:
          --all        every finding in full, however many of a kind

        Exit codes: 0 no stop; 1 stops; 2 call or folder unusable.

        Example:
          releasekit review sample-release

        Next: mend the stops, then releasekit compose FOLDER --to SITE.
        """;

    private const string Compose = """
        releasekit compose FOLDER --to SITE: the publication.

        FOLDER is reviewed first. With any stop nothing is written.
        SITE must be missing, empty, or a folder that compose wrote before, and lie
        outside FOLDER. Files of your own in it or in SITE.before are never lost: they
        are named, and nothing is changed until you have moved them away. The new
        pages are made beside it and swapped in at the end, so a crash or a full
        disk leaves what stood. The site that was replaced is kept as SITE.before,
        only the last one. The last lines say what changed since, how to switch the
        new site on, and the lines to paste to go back. If nothing changed, all is
        left as it was.

        Options:
          --to SITE    where the publication goes

        Exit codes: 0 done; 1 stops, nothing written; 2 call or folder unusable.

        Example:
          releasekit compose sample-release --to site

        Next: open SITE/index.html in a browser; read downloads.html for the files.
        """;

    /// <summary>Writes the page of a command, or the program's.</summary>
    public static int Write(Command command, TextWriter output)
    {
        output.WriteLine(command.Name switch
        {
            "review" => Review,
            "compose" => Compose,
            _ => Program,
        });
        return ExitCode.Done;
    }
}
