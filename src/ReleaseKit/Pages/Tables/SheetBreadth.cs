namespace ReleaseKit.Pages.Tables;

/// <summary>
/// The classes that say how a sheet stands on a screen and on paper: whether it fits beside its stub, which paper it takes, whether its bars find room there. All
/// widths are those of the style sheet.
/// </summary>
internal static class SheetBreadth
{
    /// <summary>In rem. A sheet that fits needs no scrolling of its own: from 1121 px up, or from 1264 px.</summary>
    private const double Fits = 63.5;
    private const double FitsWide = 71.75;
    private const double Stub = 11.25;
    private const double Bar = 5.25;
    private const int MeasuresThatFit = 3;
    private const int MeasuresThatFitWide = 4;

    /// <summary>In mm: A4 upright, A4 across, A3 across, each less its margins.</summary>
    private const double Upright = 180;
    private const double Across = 267;
    private const double Large = 390;
    private const double StubOnPaper = 30;
    private const double BarUpright = 12;
    private const double BarOnPaper = 6;

    /// <summary>In rem: a phone's narrowest sheet, its stub, bars with one number beside them.</summary>
    private const double Phone = 18;
    private const double StubOnPhone = 6.75;
    private const double StubsOnPhone = 5;
    private const double LeastStub = 4.4;
    private const double BarOnPhone = 3;

    /// <summary>Widths on a phone are told apart by so many rem, up to the most.</summary>
    private const int Grade = 2;
    private const int MostRem = 40;

    public static string Of(Sheet sheet) => ScreenOf(sheet) + PaperOf(sheet) + Graded(" o", (LeastStub * sheet.Stub.Width) + sheet.Widths.Select(NumbersOnPhone).DefaultIfEmpty().Max());

    /// <summary>The class of a measure's bars: the narrowest sheet on a phone that has room for them and the ends of their scale.</summary>
    public static string BarsOf(Sheet sheet, int column, SheetAxis axis)
    {
        var stub = sheet.Stub.Width == 1 ? StubOnPhone : StubsOnPhone * sheet.Stub.Width;
        return Graded(" n", stub + NumbersOnPhone(sheet.Widths[column - 1]) + Math.Max(BarOnPhone, axis.Room + 0.25));
    }

    private static string ScreenOf(Sheet sheet)
    {
        var columns = sheet.Shown.Count + sheet.Stub.Width - 1;
        var rest = (Stub * sheet.Stub.Width) + (Bar * sheet.Shown.Count);
        return columns <= MeasuresThatFit && rest + sheet.Widths.Sum(width => Rem(width, 5, 1.4, 5.1)) <= Fits ? " fits"
            : columns <= MeasuresThatFitWide && rest + sheet.Widths.Sum(width => Rem(width, 4.7, 1.4, 4.6)) <= FitsWide ? " fits-wide" : "";
    }

    private static string PaperOf(Sheet sheet)
    {
        var rest = (StubOnPaper * sheet.Stub.Width) + sheet.Widths.Sum(width => Math.Max(13.5, (1.73 * width.Figure) + 2) + Math.Max(14, (1.55 * width.Margin) + 5.8));
        return rest + (BarUpright * sheet.Shown.Count) <= Upright ? ""
            : rest + (BarOnPaper * sheet.Shown.Count) <= Across ? " wide"
            : rest + (BarOnPaper * sheet.Shown.Count) <= Large ? " huge" : " huge bare";
    }

    private static double NumbersOnPhone(ColumnWidth width) => Rem(width, 3.6, 0.75, 4.4);

    private static double Rem(ColumnWidth width, double figure, double padding, double margin) =>
        Math.Max(figure, (0.56 * width.Figure) + padding) + Math.Max(margin, (0.51 * width.Margin) + 1.45);

    private static string Graded(string name, double rem) =>
        rem <= Phone ? "" : name + Sheet.Digits(Math.Min(MostRem, Grade * (int)Math.Ceiling(rem / Grade)));
}
