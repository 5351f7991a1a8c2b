using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>Reads signoff.json: waivers and approvals. What must not be waived is a stop here.</summary>
internal static class SignOffFile
{
    public const string FileName = "signoff.json";

    public static SignOff Read(JsonValue? root, ReadContext context)
    {
        if (root is null || ObjectReader.Open(root, FileName, SignOffShapes.Root, context) is not { } keys)
            return SignOff.Empty;
        return new SignOff(
            [.. keys.List("waivers").Select(value => ReadWaiver(value, context)).OfType<Waiver>()],
            [.. keys.List("approvals").Select(value => ReadApproval(value, context)).OfType<Approval>()]);
    }

    private static Waiver? ReadWaiver(JsonValue value, ReadContext context)
    {
        if (ObjectReader.Open(value, "waivers", SignOffShapes.Waiver, context) is not { } keys)
            return null;
        var (finding, reason, by, on) = (keys.Text("finding"), keys.Text("reason"), keys.Text("by"), Date(keys, "on"));
        var waiver = finding is null || reason is null || by is null || on is null
            ? null
            : new Waiver(finding, keys.Text("at"), reason, by, on.Value, Date(keys, "until")) { Place = keys.At };
        var isFilledIn = IsFilledIn(keys, "reason", reason) & IsFilledIn(keys, "by", by);
        if (finding is null || Waivers.Waivable.Contains(finding))
            return isFilledIn ? waiver : null;
        context.Add(WaiverProblems.CannotBeWaived(keys.PlaceOf("finding"), finding, context.Owner));
        return null;
    }

    /// <summary>False for the dots of the pattern that a finding gives to paste.</summary>
    private static bool IsFilledIn(ObjectReader keys, string key, string? text)
    {
        if (text is null || text.AsSpan().ContainsAnyExcept(" .\u2026"))
            return true;
        keys.Context.Add(WaiverProblems.NotFilledIn(keys.PlaceOf(key), key, keys.Context.Owner));
        return false;
    }

    private static Approval? ReadApproval(JsonValue value, ReadContext context) =>
        ObjectReader.Open(value, "approvals", SignOffShapes.Approval, context) is { } keys
        && keys.Text("by") is { } by && keys.Text("role") is { } role && Date(keys, "on") is { } on && keys.Text("folder") is { } folder
            ? new Approval(by, role, on, folder)
            : null;

    private static DateOnly? Date(ObjectReader keys, string key) => keys.Find(key) is { } value ? Values.Date(value, key, keys.Context) : null;
}
