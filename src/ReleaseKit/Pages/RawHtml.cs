namespace ReleaseKit.Pages;

/// <summary>Markup of ours on its way through a template: written as it is.</summary>
public sealed record RawHtml(string Html)
{
    public override string ToString() => Html;
}
