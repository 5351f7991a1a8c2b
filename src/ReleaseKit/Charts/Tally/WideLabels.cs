namespace ReleaseKit.Charts.Tally;

/// <summary>Text along one side of the lying stick. Slots are lines counted outward; leaders run from the stick to a slot.</summary>
internal sealed record WideLabels(IReadOnlyList<PlacedLine> Lines, IReadOnlyList<(double X, int Slot)> Leaders, IReadOnlyList<TallyPiece> Unlabelled)
{
    private const double Inset = 4;
    private const int MostBlockLines = 5;
    private const int MostSlots = 9;

    /// <summary>How many slots are in use.</summary>
    public int Depth => Lines.Select(line => line.Slot + 1).DefaultIfEmpty().Max();

    /// <summary>
    /// A label stands at the left of its length if it fits there; else on a line of its own with a leader, the rightmost nearest to the stick.
    /// Where not all find a place, the thinnest give way.
    /// </summary>
    /// <param name="slices">The slices of this half.</param>
    /// <param name="right">Where the drawing ends.</param>
    /// <param name="outwardIsUp">Whether reading order runs toward the stick (text above it) or away from it.</param>
    /// <param name="type">For measuring.</param>
    public static WideLabels Of(IReadOnlyList<Slice> slices, double right, bool outwardIsUp, TypeCase type)
    {
        var unlabelled = new List<TallyPiece>();
        while (true)
        {
            var page = new Builder(right, outwardIsUp, type);
            var thin = slices.Where(slice => !unlabelled.Contains(slice.Piece) && !page.TryBlock(slice)).ToList();
            if (thin.AsEnumerable().Reverse().All(page.TryLeader))
                return new WideLabels(page.Lines, page.Leaders, unlabelled);
            unlabelled.Add(thin.MinBy(slice => slice.Length).Piece);
        }
    }

    private sealed class Builder(double right, bool outwardIsUp, TypeCase type)
    {
        private readonly TakenSlots taken = new(MostSlots);

        public List<PlacedLine> Lines { get; } = [];
        public List<(double X, int Slot)> Leaders { get; } = [];

        public bool TryBlock(Slice slice)
        {
            var room = slice.Length - (2 * Inset);
            var text = TallyText.Within(slice.Piece, room, MostBlockLines, type, TallyInks.Wide)
                ?? TallyText.ShortWithin(slice.Piece, room, MostBlockLines, type, TallyInks.Wide);
            if (text is null)
                return false;
            for (var index = 0; index < text.Lines.Count; index++)
                Put(text.Lines[index], slice.From + Inset, outwardIsUp ? text.Lines.Count - 1 - index : index);
            return true;
        }

        // To the left only where the right has no room: there it would stand in the way of the leaders still to come.
        public bool TryLeader(Slice slice)
        {
            var slots = Enumerable.Range(0, taken.Count).ToList();
            return slots.Exists(slot => TrySlot(slice, slot, toTheRight: true)) || slots.Exists(slot => TrySlot(slice, slot, toTheRight: false));
        }

        private bool TrySlot(Slice slice, int slot, bool toTheRight)
        {
            var keyWidth = type.Width(slice.Piece.Key, Inks.TallyKey);
            var width = keyWidth + Inset + type.Width(slice.Piece.Amount, Inks.TallyValue);
            var from = toTheRight ? slice.Handle + Inset : slice.Handle - Inset - width;
            if (from < 0 || from + width > right || !taken.IsFree(slot, from, from + width) || !taken.IsFreeUpTo(slot + 1, slice.Handle))
                return false;
            Put(new TallyLine(Inks.TallyKey, slice.Piece.Key), from, slot);
            Put(new TallyLine(Inks.TallyValue, slice.Piece.Amount), from + keyWidth + Inset, slot);
            taken.TakeUpTo(slot + 1, slice.Handle);
            Leaders.Add((slice.Handle, slot));
            return true;
        }

        private void Put(TallyLine line, double x, int slot)
        {
            Lines.Add(new PlacedLine(line, x, slot));
            taken.Take(slot, x, x + type.Width(line.Text, line.Ink));
        }
    }
}

/// <summary>A line of text at a place along the stick and a slot away from it.</summary>
internal readonly record struct PlacedLine(TallyLine Line, double X, int Slot);
