using System.Globalization;
using ReleaseKit.Charts;
using ReleaseKit.Charts.Tally;
using Xunit;

namespace ReleaseKit.Tests.Charts;

/// <summary>The split tally, lying and upright: lengths that add up, labels that never meet.</summary>
public sealed class TallyTests
{
    private const double Authorised = 1.5;
    private const double Spent = 1.3;

    public static TheoryData<int, bool> Sizes => new()
    {
        { 1, true }, { 2, true }, { 5, true }, { 12, true }, { 40, true }, { 1, false }, { 2, false }, { 5, false }, { 12, false }, { 40, false },
    };

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Lengths_add_up_to_what_was_spent_and_authorised(int pieces, bool lying)
    {
        using var type = TextBoxes.Type();

        var drawing = Draw(Account(pieces), lying, type).Drawing;

        var whole = lying ? 1158 : 590;
        Assert.Equal(whole * Spent / Authorised, Length(drawing, "table", lying), 0.5);
        Assert.Equal(whole * Spent / Authorised, Length(drawing, "level", lying), 0.5);
        Assert.Equal(whole * (Authorised - Spent) / Authorised, RestLength(drawing, lying), 0.5);
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Labels_never_meet_and_never_leave_the_drawing(int pieces, bool lying)
    {
        using var type = TextBoxes.Type();

        var drawing = Draw(Account(pieces), lying, type).Drawing;

        TextBoxes.DemandNoOverlap(drawing, type);
        TextBoxes.DemandInside(drawing, type);
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Every_piece_is_labelled_or_said_to_be_unlabelled(int pieces, bool lying)
    {
        using var type = TextBoxes.Type();
        var account = Account(pieces);

        var tally = Draw(account, lying, type);

        var text = string.Join(' ', tally.Drawing.Marks.OfType<Shape.Words>().Select(words => words.Text));
        Assert.All(account.ByTable.Concat(account.ByLevel).Except(tally.Unlabelled), piece => Assert.Contains(piece.Amount, text, StringComparison.Ordinal));
        Assert.All(tally.Unlabelled, piece => Assert.DoesNotContain(piece.Amount, text, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(5)]
    [InlineData(12)]
    public void Up_to_twelve_pieces_are_all_labelled_on_a_wide_page(int pieces)
    {
        using var type = TextBoxes.Type();

        Assert.Empty(WideTally.Of(Account(pieces), type).Unlabelled);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Of_forty_pieces_only_the_thinnest_go_without_a_label(bool lying)
    {
        using var type = TextBoxes.Type();
        var account = Account(40);

        var tally = Draw(account, lying, type);

        Assert.NotEmpty(tally.Unlabelled);
        foreach (var half in new[] { account.ByTable, account.ByLevel })
        {
            var labelled = half.Except(tally.Unlabelled).Min(piece => piece.Length);
            Assert.All(half.Intersect(tally.Unlabelled), piece => Assert.True(piece.Length <= labelled + 1e-12));
        }
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Very_uneven_pieces_keep_their_labels_apart(bool lying)
    {
        using var type = TextBoxes.Type();
        double[] lengths = [0.9, 0.3, 0.07, 0.02, 0.006, 0.003, 0.0009, 0.0001];

        var drawing = Draw(AccountOf(lengths), lying, type).Drawing;

        TextBoxes.DemandNoOverlap(drawing, type);
        TextBoxes.DemandInside(drawing, type);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(5)]
    [InlineData(12)]
    public void On_paper_labels_never_meet_either(int pieces)
    {
        using var type = TextBoxes.Type();

        var drawing = WideTally.Of(Account(pieces), type, WideTally.PaperWidth).Drawing;

        TextBoxes.DemandNoOverlap(drawing, type);
        TextBoxes.DemandInside(drawing, type);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Leaders_cross_no_text(bool lying)
    {
        using var type = TextBoxes.Type();
        var drawing = Draw(Account(12), lying, type).Drawing;

        foreach (var leader in drawing.Marks.OfType<Shape.Line>().Where(line => line.Ink == Inks.Leader && line.From.X == line.To.X))
            Assert.DoesNotContain(TextBoxes.Of(drawing, type), box =>
                box.Left < leader.From.X && leader.From.X < box.Right
                && box.Top < Math.Max(leader.From.Y, leader.To.Y) && Math.Min(leader.From.Y, leader.To.Y) < box.Bottom);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Nothing_left_draws_no_rest(bool lying)
    {
        using var type = TextBoxes.Type();

        var drawing = Draw(Account(3) with { Rest = null, Whole = Spent }, lying, type).Drawing;

        Assert.DoesNotContain(drawing.Marks, mark => mark.Mark == "rest");
    }

    [Theory]
    [InlineData(0.001)]
    [InlineData(0.02)]
    public void A_thin_rest_is_labelled_beside_the_stick(double left)
    {
        using var type = TextBoxes.Type();
        var account = Account(5) with { Rest = new TallyPiece("Not spent", "", "0.9876", left), Whole = Spent + left };

        var drawing = WideTally.Of(account, type).Drawing;

        Assert.Contains(drawing.Marks.OfType<Shape.Words>(), words => words.Text == "0.9876");
        TextBoxes.DemandNoOverlap(drawing, type);
        TextBoxes.DemandInside(drawing, type);
    }

    [Theory]
    [InlineData(0.4353)]
    [InlineData(0.4101)]
    public void Label_of_the_whole_takes_no_place_from_the_label_of_a_mark(double whole)
    {
        using var type = TextBoxes.Type();
        var account = AccountOf([0.1, 0.1364]) with { Whole = whole, Rest = new TallyPiece("Not spent", "", "0.1989", whole - 0.2364), WholeLabel = "0.4353 authorised" };

        var drawing = WideTally.Of(account, type).Drawing;

        var words = drawing.Marks.OfType<Shape.Words>().Where(words => words.Ink == Inks.TallyAxisText).ToList();
        Assert.Contains(words, label => label.Text is "0.4" or "0.40");
        Assert.True(words.Single(label => label.Text == account.WholeLabel).At.Y > words.Single(label => label.Text is "0.4" or "0.40").At.Y);
        TextBoxes.DemandNoOverlap(drawing, type);
        TextBoxes.DemandInside(drawing, type);
    }

    private static DrawnTally Draw(TallyAccount account, bool lying, TypeCase type) => lying ? WideTally.Of(account, type) : UprightTally.Of(account, type);

    private static TallyAccount Account(int pieces)
    {
        // Lengths in the ratio 1 : 2 : 3 : 1 : 2 …
        var weights = Enumerable.Range(0, pieces).Select(index => 1.0 + (index % 3)).ToArray();
        return AccountOf([.. weights.Select(weight => weight * Spent / weights.Sum())]);
    }

    private static TallyAccount AccountOf(double[] lengths) => new()
    {
        ByTable = [.. lengths.Select((length, index) => Piece($"Table {index + 1}", "Households behind on heating bills, by district", index, length))],
        ByLevel = [.. lengths.Reverse().Select((length, index) => Piece($"level {index + 1}", "", index + 100, length))],
        Rest = new TallyPiece("Not spent", "", "0.2000", Authorised - lengths.Sum()),
        Whole = Authorised,
        WholeLabel = "1.5000 authorised",
        Print = (number, decimals) => number.ToString($"F{decimals}", CultureInfo.InvariantCulture),
    };

    // The amount in print is a number of its own, so that it can be found again.
    private static TallyPiece Piece(string key, string name, int index, double length) =>
        new(key, name, (0.3001 + (index / 10000.0)).ToString("F4", CultureInfo.InvariantCulture), length);

    private static double Length(Drawing drawing, string mark, bool lying) =>
        drawing.Marks.OfType<Shape.Box>().Where(box => box.Mark == mark).Sum(box => lying ? box.Width : box.Height);

    private static double RestLength(Drawing drawing, bool lying)
    {
        var corners = drawing.Marks.OfType<Shape.Outline>().Single(outline => outline.Mark == "rest").Corners;
        return lying ? corners.Max(corner => corner.X) - corners.Min(corner => corner.X) : corners.Max(corner => corner.Y) - corners.Min(corner => corner.Y);
    }
}
