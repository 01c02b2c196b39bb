using System.Text;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files;

/// <summary>Reads text files: UTF-8 alone, up to the size limit, with reasons in plain words.</summary>
public static class TextFiles
{
    /// <summary>Reads a file.</summary>
    /// <param name="path">Its path.</param>
    /// <param name="text">The text without a byte order mark.</param>
    /// <param name="reason">Why it cannot be read, a phrase; empty where it can.</param>
    public static bool TryRead(string path, out string text, out string reason)
    {
        (text, reason) = ("", "");
        try
        {
            var file = new FileInfo(path);
            if (!file.Exists)
            {
                reason = Directory.Exists(path) ? "it is a folder" : "there is no such file";
                return false;
            }

            // Twice the limit in bytes still fits the limit in characters; more cannot.
            if (file.Length > 4L * TomlReader.MostCharacters)
            {
                reason = $"it has {file.Length} bytes, more than 1 MB";
                return false;
            }

            byte[] bytes = File.ReadAllBytes(path);
            ReadOnlySpan<byte> body = bytes.AsSpan().StartsWith(Encoding.UTF8.Preamble) ? bytes.AsSpan(3) : bytes;
            text = new UTF8Encoding(false, throwOnInvalidBytes: true).GetString(body);
            return true;
        }
        catch (DecoderFallbackException e)
        {
            reason = $"it is no UTF-8 text: byte {e.Index + 1} cannot be read";
            return false;
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
}
