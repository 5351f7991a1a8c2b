using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>What is put behind the key of a text that says in how many cases a range holds, so that it says among which figures.</summary>
public static class PromiseKey
{
    public static string Of(RangePromise promise) => promise switch
    {
        RangePromise.AmongPublished => ".published",
        RangePromise.AmongNotZero => ".not-zero",
        RangePromise.ZeroForSmall => ".zero",
        _ => "",
    };

    /// <summary>Of several figures together: zeros that stand for small values are spoken of apart.</summary>
    public static string OfAll(IEnumerable<AppraisedFigure> figures) => Of(figures
        .Select(figure => figure.Promise is RangePromise.ZeroForSmall ? RangePromise.AmongNotZero : figure.Promise).DefaultIfEmpty().Max());
}
