namespace ReleaseKit.Charts.Tally;

/// <summary>A piece laid along the stick, from one pixel to another.</summary>
internal readonly record struct Slice(TallyPiece Piece, double From, double To)
{
    public double Length => To - From;

    /// <summary>Where a leader line leaves it: near its left or upper end, but on it.</summary>
    public double Handle => From + Math.Min(Length / 2, 6);

    /// <summary>The pieces that have a length, end to end from an origin.</summary>
    public static IReadOnlyList<Slice> Lay(IEnumerable<TallyPiece> pieces, double origin, double pixelsPerUnit)
    {
        var slices = new List<Slice>();
        var sum = 0.0;
        foreach (var piece in pieces.Where(piece => piece.Length > 0))
        {
            slices.Add(new Slice(piece, origin + (sum * pixelsPerUnit), origin + ((sum + piece.Length) * pixelsPerUnit)));
            sum += piece.Length;
        }

        return slices;
    }
}

/// <summary>A cut between two slices: its place, and how wide its notch may be so that thin slices survive it.</summary>
internal readonly record struct Notch(double At, double HalfWidth, double CutWidth)
{
    private const double FullHalfWidth = 9;
    private const double FullCut = 2;

    public double Share => HalfWidth / FullHalfWidth;

    public static IEnumerable<Notch> Between(IReadOnlyList<Slice> slices) => slices.Zip(slices.Skip(1), Of);

    private static Notch Of(Slice before, Slice after)
    {
        var room = Math.Min(before.Length, after.Length);
        return new Notch(after.From, Math.Min(FullHalfWidth, room / 3), Math.Min(FullCut, room / 4));
    }
}
