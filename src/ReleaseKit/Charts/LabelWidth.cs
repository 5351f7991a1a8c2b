namespace ReleaseKit.Charts;

/// <summary>How wide a label of numbers runs in Asap, whose digits take 535, comma and point 198 and signs 560 thousandths of the size at every weight; other letters are taken as 560.</summary>
internal static class LabelWidth
{
    public static double Of(string text, double size) => size * text.Sum(letter => letter switch
    {
        >= '0' and <= '9' => 0.535,
        ',' or '.' => 0.198,
        ' ' or '\u00A0' => 0.25,
        _ => 0.56,
    });
}
