namespace ReleaseKit.Charts.Tally;

/// <summary>Text beside one half of the upright stick: each label at the top of its length, moved down where lengths are thin.</summary>
internal sealed record UprightLabels(IReadOnlyList<UprightLabel> Labels, IReadOnlyList<TallyPiece> Unlabelled)
{
    public const double Line = 17;

    public static UprightLabels Of(IReadOnlyList<Slice> slices, double room, double top, double bottom, TypeCase type)
    {
        var wishes = slices.Select(slice => Wish(slice, room, type)).OfType<UprightLabel>().ToList();
        var unlabelled = slices.Where(slice => !wishes.Exists(wish => wish.Slice == slice)).Select(slice => slice.Piece).ToList();
        // The thinnest give way first; they stand in the account's table.
        while (wishes.Sum(wish => wish.Height) > bottom - top)
        {
            var thinnest = wishes.MinBy(wish => wish.Slice.Length)!;
            wishes.Remove(thinnest);
            unlabelled.Add(thinnest.Slice.Piece);
        }

        return new UprightLabels(Dodge(wishes, top, bottom), unlabelled);
    }

    private static UprightLabel? Wish(Slice slice, double room, TypeCase type)
    {
        var most = Math.Max(1, (int)(slice.Length / Line));
        var text = TallyText.Within(slice.Piece, room, most, type, TallyInks.Upright)
            ?? OneLine(slice.Piece, room, type)
            ?? TallyText.ShortWithin(slice.Piece, room, 4, type, TallyInks.Upright);
        return text is null ? null : new UprightLabel(slice, text, slice.From);
    }

    private static TallyText? OneLine(TallyPiece piece, double room, TypeCase type)
    {
        var line = new TallyLine(TallyInks.Upright.Key, $"{piece.Key} · {piece.Amount}");
        return type.Width(line.Text, line.Ink) <= room ? new TallyText([line]) : null;
    }

    private static UprightLabel[] Dodge(IReadOnlyList<UprightLabel> wishes, double top, double bottom)
    {
        var placed = wishes.ToArray();
        var free = top;
        for (var index = 0; index < placed.Length; index++)
        {
            placed[index] = placed[index] with { Top = Math.Max(placed[index].Top, free) };
            free = placed[index].Top + placed[index].Height;
        }

        free = bottom;
        for (var index = placed.Length - 1; index >= 0; index--)
        {
            placed[index] = placed[index] with { Top = Math.Min(placed[index].Top, free - placed[index].Height) };
            free = placed[index].Top;
        }

        return placed;
    }
}

/// <summary>A label of a slice and where its first line begins.</summary>
internal sealed record UprightLabel(Slice Slice, TallyText Text, double Top)
{
    public double Height => Text.Lines.Count * UprightLabels.Line;

    /// <summary>Whether it stands beside its own length, so that no leader is needed.</summary>
    public bool IsAtHome => Top < Slice.From + 1 && Top > Slice.From - 1 && Height <= Slice.Length + 4;
}
