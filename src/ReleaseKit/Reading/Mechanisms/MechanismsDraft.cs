using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Mechanisms;

/// <summary>mechanisms.json as read: the account if it could be formed, every id that is declared (even where the rest of it is wrong), and what mechanisms say they cover.</summary>
internal sealed record MechanismsDraft(NoiseAccount? Account, IReadOnlyList<Mechanism> Mechanisms, IReadOnlySet<string> DeclaredIds, IReadOnlyList<Covering> Covers)
{
    public static MechanismsDraft Unread { get; } = new(null, [], new HashSet<string>(), []);

    /// <summary>The mechanism of an id; null if it is not declared or could not be read.</summary>
    public Mechanism? Find(string id) => Mechanisms.FirstOrDefault(mechanism => mechanism.Id == id);
}

/// <summary>A selection that a mechanism says it covers.</summary>
internal sealed record Covering(string MechanismId, string Address, Place At);
