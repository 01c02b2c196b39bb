using System.Text;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files;

/// <summary>Reads text files: UTF-8 alone, up to the size limit, with reasons in plain words.</summary>
public static class TextFiles
{
    private static readonly UTF8Encoding _strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    /// <summary>Reads a file.</summary>
    /// <param name="path">Its path.</param>
    /// <param name="text">The text without a byte order mark.</param>
    /// <param name="reason">Why it cannot be read, a phrase; empty where it can.</param>
    public static bool TryRead(string path, out string text, out string reason)
    {
        (text, reason) = ("", "");
        try
        {
            if (!File.Exists(path))
            {
                reason = Directory.Exists(path) ? "it is a folder" : "there is no such file";
                return false;
            }

            // What a pipe will send cannot be known beforehand: no more is read than the limit and the byte that breaks it.
            using FileStream stream = File.OpenRead(path);
            byte[] bytes = new byte[TomlReader.MostBytes + Encoding.UTF8.Preamble.Length + 1];
            int length = stream.ReadAtLeast(bytes, bytes.Length, throwOnEndOfStream: false);
            if (length == bytes.Length)
            {
                reason = "it has more than 1 MB";
                return false;
            }

            return TryDecode(bytes.AsSpan(0, length), out text, out reason);
        }
        catch (UnauthorizedAccessException)
        {
            reason = "access is denied";
            return false;
        }
        catch (Exception e) when (e is IOException or ArgumentException or NotSupportedException)
        {
            reason = e is PathTooLongException ? "the path is too long" : "it cannot be read";
            return false;
        }
    }

    /// <summary>Turns the bytes of a file into text.</summary>
    /// <param name="bytes">The bytes, with or without a byte order mark.</param>
    /// <param name="text">The text without the mark; empty where there is none.</param>
    /// <param name="reason">Which byte is no part of UTF-8 and where it stands; empty on success.</param>
    public static bool TryDecode(ReadOnlySpan<byte> bytes, out string text, out string reason)
    {
        ReadOnlySpan<byte> body = bytes.StartsWith(Encoding.UTF8.Preamble) ? bytes[Encoding.UTF8.Preamble.Length..] : bytes;
        try
        {
            (text, reason) = (_strict.GetString(body), "");
            return true;
        }
        catch (DecoderFallbackException e)
        {
            int wrong = Math.Clamp(e.Index, 0, body.Length - 1);
            ReadOnlySpan<byte> before = body[..wrong];
            int line = before.Count((byte)'\n') + 1;
            int column = Encoding.UTF8.GetCharCount(before[(before.LastIndexOf((byte)'\n') + 1)..]) + 1;
            (text, reason) = ("", $"it is no UTF-8 text: byte {body[wrong]:X2} in line {line}, column {column} belongs to no character");
            return false;
        }
    }
}
