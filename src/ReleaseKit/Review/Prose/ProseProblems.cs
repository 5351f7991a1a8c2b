using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Prose;

/// <summary>What can be wrong in prose, one factory a failure.</summary>
internal static class ProseProblems
{
    public static Finding NoTitle(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-title", owner, at,
        "This page has no heading, or its first heading is empty.",
        "the first heading is the title of the page.",
        "begin the file with a line such as: # Summary");

    public static Finding HeadingSkips(Place at, int from, int to, FindingOwner owner) => new(
        FindingLevel.Caution, "prose-heading", owner, at,
        $"A heading of level {to} follows one of level {from}.",
        "who listens to a page moves by its headings, and looks for the level between.",
        $"begin it with {new string('#', from + 1)} instead.");

    public static Finding SecondTitle(Place at, FindingOwner owner) => new(
        FindingLevel.Caution, "prose-heading", owner, at,
        "This page has a second heading of the first level.",
        "the first is the title of the page; a page has one.",
        "begin it with ## instead.");

    public static Finding StemTaken(Place at, string stem, string by, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-name", owner, at,
        $"The page of this file would be {KeyProblems.Cut(stem)}.html, which is {by}.",
        "one would overwrite the other.",
        "rename the file, and its entry in \"narrative\".");

    public static Finding StemForm(Place at, string stem, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-name", owner, at,
        $"\"{KeyProblems.Cut(stem)}\" cannot be the name of a page.",
        "it becomes part of an address: a to z, 0 to 9, - _ and the point only.",
        Slug.Of(stem) is { Length: > 0 } slug ? $"rename the file to {slug}.md, and its entry in \"narrative\"." : "rename the file, and its entry in \"narrative\".");

    public static Finding LiteralLink(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-link", owner, at,
        "This link was not understood and would be printed as it stands.",
        "a destination that holds a space must stand between angle brackets.",
        "write [value](<figure:table/figure?column=A name>), or %20 for the space.");

    public static Finding Citation(Place at, AddressException problem, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-citation", owner, at,
        $"{problem.Message}.",
        "a citation without a figure would be printed as a hole.",
        problem.Do);

    public static Finding EmptyCitation(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-citation", owner, at,
        "This citation has no text.",
        "it is not clear what is to be printed.",
        "write one of value, margin, value and margin, range, reading between the brackets, or words of your own.");

    public static Finding Disagrees(Place at, IReadOnlyList<string> written, bool isUnread, FigureWords figure, string destination, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-disagrees", owner, at,
        $"The words of this citation say {Quoted(written)}, but {figure.NameIs}.",
        $"the words would be printed as they stand, {(figure.Figure.HasNumber ? "and the table says something else" : "with a number that is not published")}.",
        $"write {Instead(figure, destination)}{(isUnread ? $", with the marks of {figure.Marks}" : "")}; {NotMeant}.")
    {
        Address = figure.Figure.Address,
    };

    public static Finding MayDisagree(Place at, IReadOnlyList<string> written, FigureWords figure, string destination, FindingOwner owner) => new(
        FindingLevel.Caution, "prose-may-disagree", owner, at,
        $"The words of this citation hold {Quoted(written)}, and {figure.NameIs}.",
        "a number within a citation reads as the figure.",
        $"if the figure is meant, write {Instead(figure, destination)}; {NotMeant}.")
    {
        Address = figure.Figure.Address,
    };

    public static Finding BoundInRange(Place at, IReadOnlyList<string> written, bool isRounding, FigureWords figure, string destination, FindingOwner owner) => new(
        FindingLevel.Caution, "prose-may-disagree", owner, at,
        $"The words of this citation say {Quoted(written)}, and {figure.NameIs}.",
        isRounding ? "the figure does not round to it so." : "the number before noise may lie on the other side of it.",
        $"write {(figure.Bounds is { Length: > 0 } bounds ? $"{bounds}, or " : "")}{Instead(figure, destination)}.")
    {
        Address = figure.Figure.Address,
    };

    public static Finding SignLost(Place at, IReadOnlyList<string> written, FigureWords figure, FindingOwner owner) => new(
        FindingLevel.Caution, "prose-may-disagree", owner, at,
        $"The words of this citation say {Quoted(written)}, and {figure.NameIs}.",
        "without its sign the number reads as one above zero.",
        $"write {figure.Number}, or say in the same sentence that it is a loss or below zero.")
    {
        Address = figure.Figure.Address,
    };

    public static Finding RoundedFar(Place at, IReadOnlyList<string> written, FigureWords figure, string destination, FindingOwner owner) => new(
        FindingLevel.Caution, "prose-rounded-far", owner, at,
        $"The words of this citation round to {Quoted(written)}, and {figure.NameIs}.",
        "that moves the figure by more than 5 in 100, and out of its range.",
        $"round less: write {Instead(figure, destination)}.")
    {
        Address = figure.Figure.Address,
    };

    private const string NotMeant = "a number that means something else goes outside the link";

    private static string Quoted(IReadOnlyList<string> written) => string.Join(" and ", written.Select(number => $"\"{KeyProblems.Cut(number)}\""));

    /// <summary>What to paste, and the figure for the writer's own words.</summary>
    private static string Instead(FigureWords figure, string destination) =>
        $"[value and margin]({(NeedsBrackets(destination) ? $"<{destination}>" : destination)}){(figure.Figure.HasNumber ? $", or {figure.Number} in the words" : "")}";

    private static bool NeedsBrackets(string destination) => destination.Any(letter => char.IsWhiteSpace(letter) || letter is '(' or ')');

    public static Finding UnknownChart(Place at, string id, IReadOnlyList<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-chart", owner, at,
        $"There is no chart \"{KeyProblems.Cut(id)}\" in release.json.",
        "nothing can be placed here.",
        Nearest.Of(id, known) is { } near ? $"write chart:{near}." : "add it to \"charts\" in release.json, or take the image out.");

    public static Finding ChartAgain(Place at, string id, int first, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-chart", owner, at,
        $"The chart \"{KeyProblems.Cut(id)}\" stands on this page already; first at line {first}.",
        "a link to the chart must lead to one place, and whoever listens to the page would hear it twice.",
        "take one of the two out, and refer to the other in words.");

    public static Finding NoAlt(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-alt", owner, at,
        "This image has no alternative text.",
        "who cannot see it would not know that it is there (WCAG 2.2, 1.1.1).",
        "say between the brackets what it shows: ![Households in arrears by district](chart:by-district)");

    public static Finding ImageNotChart(Place at, string destination, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-image", owner, at,
        $"\"{KeyProblems.Cut(destination)}\" is no chart of the release.",
        "only charts are placed as images: a picture from elsewhere could show figures without their margins.",
        "write ![what it shows](chart:ID) with the id of a chart in release.json.");

    public static Finding LinkScheme(Place at, string destination, FindingOwner owner) => new(
        FindingLevel.Stop, "bad-link", owner, at,
        $"\"{KeyProblems.Cut(destination)}\" is no link that a page may have.",
        "other kinds of link can run something on a reader's machine, or lead nowhere.",
        "link with https:, http:, mailto: or a path within the site.");

    public static Finding Html(Place at, string tag, FindingOwner owner) => new(
        FindingLevel.Caution, "prose-html", owner, at,
        $"\"{KeyProblems.Cut(tag)}\" looks like HTML, which is not passed through.",
        "readers would see it as written.",
        "write it in Markdown, or take it out.");

    public static Finding HiddenCharacter(Place at, int codePoint, FindingOwner owner) => KeyProblems.HiddenCharacter(at, "The text", codePoint, owner);
}
