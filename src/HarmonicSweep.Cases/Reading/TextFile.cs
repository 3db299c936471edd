using System.Text;
using HarmonicSweep.Network;

namespace HarmonicSweep.Cases.Reading;

/// <summary>Bytes to text: UTF-8 with or without mark, UTF-16 with mark; anything else is refused with how to mend it.</summary>
internal static class TextFile
{
    private static readonly UTF8Encoding _strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);
    private static readonly UnicodeEncoding _strictLittle = new(bigEndian: false, byteOrderMark: false, throwOnInvalidBytes: true);
    private static readonly UnicodeEncoding _strictBig = new(bigEndian: true, byteOrderMark: false, throwOnInvalidBytes: true);

    /// <summary>The text, or null after a finding.</summary>
    public static string? Decode(byte[] bytes, string file, FindingList findings)
    {
        ReadOnlySpan<byte> span = bytes;
        bool little = span.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]);
        bool big = span.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]);
        Encoding encoding = little ? _strictLittle : big ? _strictBig : _strict;
        ReadOnlySpan<byte> content = span[(little || big ? 2 : span.StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF]) ? 3 : 0)..];
        try
        {
            string text = encoding.GetString(content);
            if (!text.Contains('\0'))
            {
                return text;
            }

            findings.Error(
                Ids.Encoding, new SourceLocation(file, 1 + text.AsSpan(0, text.IndexOf('\0')).Count('\n')), "the file holds zero characters, as UTF-16 without a byte-order mark does; expected UTF-8 text.",
                "save it as 'CSV UTF-8', or as UTF-16 with a byte-order mark.");
            return null;
        }
        catch (DecoderFallbackException) when (little || big)
        {
            findings.Error(
                Ids.Encoding, new SourceLocation(file, 0), "the file begins as UTF-16 but is damaged: half a character stands in it.",
                "save it as 'CSV UTF-8' from the spreadsheet, or as UTF-8 from the editor.");
            return null;
        }
        catch (DecoderFallbackException exception)
        {
            int line = 1 + content[..Math.Clamp(exception.Index, 0, content.Length)].Count((byte)'\n');
            findings.Error(
                Ids.Encoding, new SourceLocation(file, line), "the file is not UTF-8: a letter beyond ASCII is stored in another code page.",
                "save it as 'CSV UTF-8' from the spreadsheet, or as UTF-8 from the editor.");
            return null;
        }
    }
}
