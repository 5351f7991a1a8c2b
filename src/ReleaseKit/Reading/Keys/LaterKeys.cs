namespace ReleaseKit.Reading.Keys;

/// <summary>What to do today instead of a key that a later version works out.</summary>
internal static class LaterKeys
{
    public static string Instead(string key) => key switch
    {
        "derived" => "take it out; readers can work it out from the downloads.",
        "stated" or "sampling" => "keep these figures out of the release (\"shown\": false does not help: the downloads hold them).",
        "sameDrawAs" or "drawColumn" => "publish the figure in one table only.",
        "mechanisms" => "name the one \"mechanism\" of these figures, or leave the figures out.",
        "publishedWhen" => "take it out and publish every figure of the measure, or leave the measure out.",
        "disjoint" or "by" => "take \"composition\" out: all losses are added then, which is never too little.",
        "spentBefore" => "take it out, and say in the prose what earlier releases spent.",
        "replaces" or "changes" => "publish a first edition.",
        "selectedFrom" or "selectedAs" => "choose a headline that was not picked for its size.",
        "foundInData" => "publish all rows of a public list and take \"rows\" out.",
        "adjusted" => "publish the values as they were before they were made consistent.",
        _ => "leave what needs it out of the release for now.",
    };
}
