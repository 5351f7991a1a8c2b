namespace ReleaseKit.Reading;

/// <summary>The folder cannot be used at all: it does not exist, or holds neither JSON file. The message is one line for the caller.</summary>
public sealed class FolderUnusableException(string message) : Exception(message);
