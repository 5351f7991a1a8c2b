using ReleaseKit.Charts;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Tables;

/// <summary>A tick of the boxhead at its place in per cent of the column, its label, how the label stands to it, and the narrowest column in pixels that has room for it.</summary>
internal sealed record SheetTick(string Label, double Place, string Anchor, double Room);

/// <summary>
/// The ticks of one measure's scale. Where the column is narrow, every second or fourth stays, then only the outermost, so that no label runs into another: each
/// tick knows the width from which it is shown.
/// </summary>
internal sealed record SheetAxis(IReadOnlyList<SheetTick> Ticks)
{
    private const int MostTicks = 5;
    private const int FewTicks = 3;
    private const int ShortLabel = 4;

    /// <summary>In per cent of the column: a label further out than this ends, or begins, at its tick.</summary>
    private const double NearStart = 5;
    private const double NearEnd = 85;

    /// <summary>In pixels, as the styles set them: a narrow column of bars, how far a label may stand out of it, the labels' size, and the least gap between two of them.</summary>
    private const double NarrowColumn = 84;
    private const double Overhang = 12;
    private const double LabelSize = 13;
    private const double LabelGap = 5;

    private const double PixelsOfRem = 16;
    private const int UsualRem = 10;

    /// <summary>The narrowest column, in rem, that has room for the outermost labels; 0 where there is but one.</summary>
    public double Room => Ticks.Count == 0 ? 0 : Ticks[^1].Room / PixelsOfRem;

    /// <summary>The class that makes the column of bars wide enough for the outermost labels.</summary>
    public string WidthClass => ColumnWidth.ClassOf((int)Math.Ceiling(Room) + 1, UsualRem);

    public static SheetAxis Of(Sheet sheet, HeadScale head)
    {
        var labels = (head.Ends ?? NumbersOf(sheet, head.Scale)).Select(number => LabelOf(sheet.Language.Number(number), head.Scale.At(number.ToDouble()))).ToList();
        var rooms = RoomsOf(labels);
        return new([.. labels.Select((label, index) => label with { Room = rooms[index] })]);
    }

    private static SheetTick LabelOf(string text, double place)
    {
        var half = LabelWidth.Of(text, LabelSize) / 2;
        var anchor = place > NearEnd || half > ((100 - place) * NarrowColumn / 100) + Overhang ? " end"
            : place < NearStart || half > (place * NarrowColumn / 100) + Overhang ? " start" : "";
        return new(text, place, anchor, 0);
    }

    private static double[] RoomsOf(IReadOnlyList<SheetTick> ticks)
    {
        var rooms = new double[ticks.Count];
        var last = ticks.Count - 1;
        var room = 0.0;
        // From the outermost alone to all: what stays at a wider step keeps its room.
        foreach (var step in Enumerable.Range(1, Math.Max(1, last)).Where(step => last % step == 0).Reverse())
        {
            room = Math.Max(room, RoomOf([.. ticks.Where((_, index) => index % step == 0)]));
            for (var index = step; index <= last; index += step)
                rooms[index] = rooms[index] == 0 ? room : rooms[index];
        }
        return rooms;
    }

    // Places grow with the column, labels do not.
    private static double RoomOf(IReadOnlyList<SheetTick> ticks) => ticks.Zip(ticks.Skip(1))
        .Select(pair => 100 * (Right(pair.First) + LabelGap + Left(pair.Second)) / (pair.Second.Place - pair.First.Place)).DefaultIfEmpty().Max();

    private static double Left(SheetTick tick) => LabelWidth.Of(tick.Label, LabelSize) * tick.Anchor switch { " end" => 1, " start" => 0, _ => 0.5 };

    private static double Right(SheetTick tick) => LabelWidth.Of(tick.Label, LabelSize) - Left(tick);

    // Long labels leave room for few, but one alone would give no scale.
    private static IReadOnlyList<PublishedValue> NumbersOf(Sheet sheet, Scale scale)
    {
        var ticks = Charts.Ticks.Between(scale.From, scale.To, MostTicks);
        if (ticks.Max(tick => sheet.Language.Number(tick).Length) <= ShortLabel)
            return ticks;
        var few = Charts.Ticks.Between(scale.From, scale.To, FewTicks);
        return few.Count > 1 ? few : ticks;
    }
}
