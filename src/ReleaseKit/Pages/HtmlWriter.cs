using System.Buffers;
using System.Text.Unicode;

namespace ReleaseKit.Pages;

/// <summary>
/// Writes HTML as UTF-8 straight to a file. What goes out unescaped is spelled out: <see cref="Raw(ReadOnlySpan{byte})"/> takes markup
/// of ours, <see cref="Text"/> takes everything that came from a folder or a wording file. Not for use by several threads at once.
/// </summary>
public sealed class HtmlWriter : IDisposable
{
    private const int BufferSize = 1 << 16;

    private readonly Stream stream;
    private readonly string closing;
    private readonly byte[] buffer = ArrayPool<byte>.Shared.Rent(BufferSize);
    private int used;
    private bool closed;

    /// <param name="stream">Owned by the writer.</param>
    /// <param name="closing">Markup written last, when the writer is disposed.</param>
    public HtmlWriter(Stream stream, string closing = "")
    {
        this.stream = stream;
        this.closing = closing;
    }

    /// <summary>Markup of ours, as UTF-8 literal.</summary>
    public HtmlWriter Raw(ReadOnlySpan<byte> markup)
    {
        if (markup.Length > buffer.Length - used)
            Flush();
        if (markup.Length > buffer.Length)
            stream.Write(markup);
        else
        {
            markup.CopyTo(buffer.AsSpan(used));
            used += markup.Length;
        }
        return this;
    }

    /// <summary>Markup of ours.</summary>
    public HtmlWriter Raw(ReadOnlySpan<char> markup)
    {
        while (!markup.IsEmpty)
        {
            var status = Utf8.FromUtf16(markup, buffer.AsSpan(used), out var read, out var written);
            used += written;
            markup = markup[read..];
            if (status == OperationStatus.DestinationTooSmall)
                Flush();
        }
        return this;
    }

    /// <summary>Text, escaped; fit for element content and for attribute values in quotes.</summary>
    public HtmlWriter Text(ReadOnlySpan<char> text)
    {
        for (var at = HtmlText.IndexOfSpecial(text); at >= 0; at = HtmlText.IndexOfSpecial(text))
        {
            Raw(text[..at]).Raw(HtmlText.Replacement(text[at]));
            text = text[(at + 1)..];
        }
        return Raw(text);
    }

    /// <summary>A space, the name, and the value in quotes, escaped.</summary>
    public HtmlWriter Attribute(ReadOnlySpan<byte> name, ReadOnlySpan<char> value) =>
        Raw(" "u8).Raw(name).Raw("=\""u8).Text(value).Raw("\""u8);

    /// <summary>An element without attributes that holds only text.</summary>
    public HtmlWriter Element(ReadOnlySpan<byte> name, ReadOnlySpan<char> text) =>
        Raw("<"u8).Raw(name).Raw(">"u8).Text(text).Raw("</"u8).Raw(name).Raw(">"u8);

    public void Dispose()
    {
        if (closed)
            return;
        closed = true;
        using (stream)
        {
            Raw(closing);
            Flush();
        }
        ArrayPool<byte>.Shared.Return(buffer);
    }

    private void Flush()
    {
        stream.Write(buffer, 0, used);
        used = 0;
    }
}
