using System.Text;

namespace ReleaseKit.SampleMaker.Chance;

/// <summary>
/// A stream of uniform 64-bit words, the same on every machine: SplitMix64 (Steele, Lea and Flood 2014, "Fast splittable pseudorandom number
/// generators", OOPSLA; constants of its public-domain C version, from memory). For invented data only: an office draws from a source nobody can replay.
/// </summary>
public sealed class UniformStream
{
    private const ulong Step = 0x9E3779B97F4A7C15;
    private ulong state;

    public UniformStream(ulong seed) => state = seed;

    /// <summary>A stream of its own for each name, so that a new mechanism moves no other's draws (FNV-1a of the name, mixed with the seed).</summary>
    public static UniformStream Named(ulong seed, string name)
    {
        var hash = Encoding.UTF8.GetBytes(name).Aggregate(0xCBF29CE484222325UL, (so, far) => unchecked((so ^ far) * 0x100000001B3UL));
        return new UniformStream(Mixed(unchecked(seed + Mixed(hash))));
    }

    public ulong Next() => Mixed(state = unchecked(state + Step));

    /// <summary>A whole number from 0 up to, not including, the limit; every one equally likely (draws past the last full block are thrown away).</summary>
    public UInt128 Below(UInt128 limit)
    {
        var bits = UInt128.Log2(limit) + UInt128.One;
        var mask = bits >= 128 ? UInt128.MaxValue : (UInt128.One << (int)bits) - 1;
        while (true)
        {
            var drawn = Word(limit) & mask;
            if (drawn < limit)
                return drawn;
        }
    }

    public int Below(int limit) => (int)Below((UInt128)limit);

    /// <summary>True with chance part ÷ whole, exactly.</summary>
    public bool Happens(UInt128 part, UInt128 whole) => Below(whole) < part;

    private UInt128 Word(UInt128 limit) => limit <= ulong.MaxValue ? Next() : new UInt128(Next(), Next());

    private static ulong Mixed(ulong z)
    {
        unchecked
        {
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
            return z ^ (z >> 31);
        }
    }
}
