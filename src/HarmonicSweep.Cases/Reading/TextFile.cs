using System.Text;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Bytes to text: UTF-8 with or without mark, UTF-16 with mark; anything else is refused with how to mend it.</summary>
internal static class TextFile
{
    private static readonly UTF8Encoding _strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    /// <summary>The text, or null after a finding.</summary>
    public static string? Decode(byte[] bytes, string file, FindingList findings)
    {
        ReadOnlySpan<byte> span = bytes;
        if (span.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]))
        {
            return Encoding.Unicode.GetString(span[2..]);
        }

        if (span.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]))
        {
            return Encoding.BigEndianUnicode.GetString(span[2..]);
        }

        if (span.Contains((byte)0))
        {
            findings.Error(
                Ids.Encoding, new SourceLocation(file, 0), "the file holds zero bytes and no byte-order mark; expected UTF-8 text.",
                "save it as 'CSV UTF-8', or as UTF-16 with a byte-order mark.");
            return null;
        }

        try
        {
            return _strict.GetString(span.StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF]) ? span[3..] : span);
        }
        catch (DecoderFallbackException exception)
        {
            int line = 1 + span[..Math.Clamp(exception.Index, 0, span.Length)].Count((byte)'\n');
            findings.Error(
                Ids.Encoding, new SourceLocation(file, line), "the file is not UTF-8: a letter beyond ASCII is stored in another code page.",
                "save it as 'CSV UTF-8' from the spreadsheet, or as UTF-8 from the editor.");
            return null;
        }
    }
}
