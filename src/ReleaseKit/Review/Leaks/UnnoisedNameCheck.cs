using System.Text.RegularExpressions;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Leaks;

/// <summary>A column that is declared as free of the records but is called like a value before noise, or like what the noise was drawn with.</summary>
internal sealed partial class UnnoisedNameCheck : IReviewCheck
{
    private static readonly string[] Telling = ["true", "truth", "raw", "seed", "seeds", "unnoised", "noiseless", "unperturbed", "confidential"];

    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        from table in subject.Release?.Tables ?? []
        from side in table.SideColumns
        where side.From is SideColumnOrigin.Public or SideColumnOrigin.Published && WordEnds.Split(side.Column).Any(IsTelling)
        select Found(table, side);

    private static bool IsTelling(string word) => Telling.Contains(word, StringComparer.OrdinalIgnoreCase);

    private static Finding Found(Table table, SideColumn side) => new(
        FindingLevel.Caution, "looks-unnoised", FindingOwner.Noise, side.At,
        $"By its name, column \"{side.Column}\" of table \"{table.Id}\" looks like a value before noise, and \"from\" says that it is {(side.From == SideColumnOrigin.Public ? "public" : "worked out from published values")}.",
        "a value before noise, or the seed of the noise, gives away all that the noise protects.",
        "take the column out of the CSV if it comes from the confidential records; if it does not, give it a name that says what it is.");

    // Between letters and others, and where a small letter meets a capital: true_count, TrueCount.
    [GeneratedRegex(@"[^\p{L}]+|(?<=\p{Ll})(?=\p{Lu})")]
    private static partial Regex WordEnds { get; }
}
