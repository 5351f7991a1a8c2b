namespace ReleaseKit.Charts.Tally;

/// <summary>One line of a label and the ink it is set in.</summary>
internal readonly record struct TallyLine(Ink Ink, string Text);

/// <summary>A label beside the stick: lines in reading order.</summary>
internal sealed record TallyText(IReadOnlyList<TallyLine> Lines)
{
    /// <summary>Name of the key, its longer name, its amount, each line no wider than the room; null if a word is wider or the lines are too many.</summary>
    public static TallyText? Within(TallyPiece piece, double room, int mostLines, TypeCase type, TallyInks inks)
    {
        TallyLine[] lines =
        [
            .. type.Wrap(piece.Key, inks.Key, room).Select(line => new TallyLine(inks.Key, line)),
            .. type.Wrap(piece.Name, inks.Name, room).Select(line => new TallyLine(inks.Name, line)),
            new TallyLine(inks.Amount, piece.Amount),
        ];
        return lines.Length <= mostLines && lines.All(line => type.Width(line.Text, line.Ink) <= room) ? new TallyText(lines) : null;
    }

    /// <summary>The same without the longer name, which the account's table gives.</summary>
    public static TallyText? ShortWithin(TallyPiece piece, double room, int mostLines, TypeCase type, TallyInks inks) =>
        Within(piece with { Name = "" }, room, mostLines, type, inks);
}

/// <summary>The inks of a tally's labels; the upright one is set a little smaller.</summary>
internal sealed record TallyInks(Ink Key, Ink Name, Ink Amount)
{
    public static TallyInks Wide { get; } = new(Inks.TallyKey, Inks.TallyName, Inks.TallyValue);
    public static TallyInks Upright { get; } = new(Inks.TallyKeySmall, Inks.TallyNameSmall, Inks.TallyValueSmall);
}
