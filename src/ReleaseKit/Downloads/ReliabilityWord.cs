using ReleaseKit.Appraisal;

namespace ReleaseKit.Downloads;

/// <summary>The fixed words of the files, the same in every language.</summary>
internal static class ReliabilityWord
{
    public static string Of(Reliability reliability) => reliability switch
    {
        Reliability.Close => "close",
        Reliability.Rough => "rough",
        Reliability.Weak => "weak",
        Reliability.Exact => "exact",
        Reliability.Public => "public",
        _ => "not stated",
    };
}
