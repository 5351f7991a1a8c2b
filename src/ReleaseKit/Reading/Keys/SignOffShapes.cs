namespace ReleaseKit.Reading.Keys;

/// <summary>The objects of signoff.json.</summary>
public static class SignOffShapes
{
    public static ObjectShape Root { get; } = new("signoff:", [], ["$schema", "waivers", "approvals"], []);

    public static ObjectShape Waiver { get; } = new("signoff:waiver",
        [
            ("finding", "\"finding\": \"undeclared-unit\""), ("reason", "\"reason\": \"why it may stand\""), ("by", "\"by\": \"Registrar\""),
            ("on", "\"on\": \"2032-03-01\""),
        ],
        ["at", "until"], []);

    public static ObjectShape Approval { get; } = new("signoff:approval",
        [
            ("by", "\"by\": \"A. Holm\""), ("role", "\"role\": \"Registrar\""), ("on", "\"on\": \"2032-03-10\""),
            ("folder", "\"folder\": \"sha256:…\""),
        ],
        [], []);
}
