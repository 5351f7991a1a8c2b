using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Cli;

/// <summary>The templates beside the program, and the language they speak.</summary>
internal static class SiteTemplates
{
    public static string Folder => Path.Combine(AppContext.BaseDirectory, "site-templates");

    public static ILanguage? LanguageOf(IAppraisedRelease? appraised) =>
        appraised is null ? null : Language.Load(Folder, appraised.Release.MainLanguage);
}
