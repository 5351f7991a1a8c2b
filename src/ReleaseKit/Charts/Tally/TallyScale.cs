namespace ReleaseKit.Charts.Tally;

/// <summary>The scale under the stick: marks at round numbers, labels at every fifth of them.</summary>
internal static class TallyScale
{
    private const double Short = 5;
    private const double Long = 9;

    // Past the line of the numbers: the label of the whole stands below it, so that it is read as the label of no other mark.
    private const double Deep = 27;

    public static IEnumerable<Shape> Lying(TallyAccount account, TypeCase type, double left, double right, double y)
    {
        var step = Steps.LabelStep(account.Whole, most: 6);
        var perUnit = (right - left) / account.Whole;
        double X(double amount) => left + (amount * perUnit);
        IEnumerable<Shape> Tick(double amount, double length) => [new Shape.Line(Inks.TallyAxis, new Spot(X(amount), y), new Spot(X(amount), y + length))];

        var minor = Enumerable.Range(1, Steps.CountBelow(account.Whole, step.Size / 5)).Select(mark => mark * step.Size / 5);
        var labelled = Enumerable.Range(0, Steps.CountBelow(account.Whole, step.Size) + 1).Select(mark => mark * step.Size);
        return
        [
            new Shape.Line(Inks.TallyAxis, new Spot(left, y), new Spot(right, y)),
            .. minor.SelectMany(amount => Tick(amount, Short)),
            .. labelled.SelectMany(amount => Tick(amount, Long)),
            .. Tick(account.Whole, Deep),
            .. labelled.Select(amount => Label(amount, X(amount), step.Decimals))
                .Where(label => label.At.X + (type.Width(label.Text, label.Ink) / 2) < right - 4),
            new Shape.Words(Inks.TallyAxisText, new Spot(right, y + 40), account.WholeLabel, Anchor.End),
        ];

        Shape.Words Label(double amount, double x, int decimals) => amount == 0
            ? new Shape.Words(Inks.TallyAxisText, new Spot(left, y + 22), account.Print(0, decimals))
            : new Shape.Words(Inks.TallyAxisText, new Spot(x, y + 22), account.Print(amount, decimals), Anchor.Middle);
    }
}
