using System.Globalization;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Json;

/// <summary>A value of a JSON file that knows where it stands.</summary>
public abstract record JsonValue(Place At)
{
    /// <summary>What it is, in words for messages: "text", "a number" …</summary>
    public abstract string Kind { get; }
}

public sealed record JsonObject(Place At, IReadOnlyList<JsonMember> Members) : JsonValue(At)
{
    public override string Kind => "an object { … }";

    public JsonMember? Member(string name) => Members.FirstOrDefault(member => member.Name == name);
}

public sealed record JsonMember(string Name, Place At, JsonValue Value);

public sealed record JsonArray(Place At, IReadOnlyList<JsonValue> Items) : JsonValue(At)
{
    public override string Kind => "a list [ … ]";
}

public sealed record JsonText(Place At, string Value) : JsonValue(At)
{
    public override string Kind => "text";
}

/// <summary>A number with its digits as written; <see cref="Value"/> is infinite if it is beyond a double.</summary>
public sealed record JsonNumber(Place At, string Digits) : JsonValue(At)
{
    public override string Kind => "a number";

    public double Value => double.Parse(Digits, NumberStyles.Float, CultureInfo.InvariantCulture);
}

public sealed record JsonFlag(Place At, bool Value) : JsonValue(At)
{
    public override string Kind => Value ? "true" : "false";
}

public sealed record JsonNull(Place At) : JsonValue(At)
{
    public override string Kind => "null";
}
