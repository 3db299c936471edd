using System.Text;

namespace HarmonicSweep.Cli;

/// <summary>A write-only stream of UTF-8 that ends in a text writer, for writers of bytes that share stdout with text.</summary>
internal sealed class TextWriterStream(TextWriter writer) : Stream
{
    private readonly Decoder _decoder = Encoding.UTF8.GetDecoder();

    public override bool CanRead => false;

    public override bool CanSeek => false;

    public override bool CanWrite => true;

    public override long Length => throw new NotSupportedException();

    public override long Position
    {
        get => throw new NotSupportedException();
        set => throw new NotSupportedException();
    }

    public override void Write(byte[] buffer, int offset, int count) => Write(buffer.AsSpan(offset, count));

    public override void Write(ReadOnlySpan<byte> buffer)
    {
        char[] text = new char[_decoder.GetCharCount(buffer, flush: false)];
        int length = _decoder.GetChars(buffer, text, flush: false);
        writer.Write(text, 0, length);
    }

    public override void Flush()
    {
        // the owner of the text writer flushes it when the command ends
    }

    public override int Read(byte[] buffer, int offset, int count) => throw new NotSupportedException();

    public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

    public override void SetLength(long value) => throw new NotSupportedException();
}
