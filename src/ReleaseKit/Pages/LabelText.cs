using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages;

/// <summary>A stub value as readers see it: its name in their language; a period in words.</summary>
public static class LabelText
{
    public static string Of(StubColumn column, int row, ILanguage language) => Of(column, column.LabelOf(row), language);

    public static string Of(StubColumn column, StubLabel label, ILanguage language) =>
        column.Period && label.Name is null ? PeriodText.Of(label.Value, language) : label.In(language.Tag);
}
