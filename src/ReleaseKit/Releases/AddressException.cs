namespace ReleaseKit.Releases;

/// <summary>An address that cannot be read or matches nothing, or several figures where one is needed. The message says what is there; Do says what to write.</summary>
public sealed class AddressException(string message, string remedy) : Exception(message)
{
    public string Do { get; } = remedy;
}
