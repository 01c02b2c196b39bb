using RegenTrainer.Core.Quantities;
using RegenTrainer.Files;
using RegenTrainer.Files.Saving;

namespace RegenTrainer.Session.Keeping;

/// <summary>What a file looked like at one moment.</summary>
/// <param name="Length">Its length; -1 where it is not there.</param>
/// <param name="WrittenTicks">When it was written.</param>
internal readonly record struct FileStamp(long Length, long WrittenTicks);

/// <summary>Looks whether a file has still the content it was read with: by length and time first, by the content where they differ.</summary>
/// <param name="path">The file.</param>
/// <param name="fingerprint">Of the content it was read with.</param>
internal sealed class FileWatch(string path, string fingerprint)
{
    private FileStamp? _seen;

    /// <summary>Looks. Called from one thread at a time.</summary>
    /// <returns>What changed, as a notice; empty where the content is as it was; null where nothing moved since the last look.</returns>
    public string? Look()
    {
        FileStamp now = Stamp();
        if (now == _seen)
        {
            return null;
        }

        _seen = now;
        string shown = Printable.Text(path);
        return now.Length < 0 ? $"{shown} is no longer there; saving writes it anew"
            : !TextFiles.TryRead(path, out string text, out string reason) ? $"{shown} can no longer be read: {reason}"
            : Fingerprint.Of(text) == fingerprint ? ""
            : $"{shown} was changed by another program; saving will ask first";
    }

    private FileStamp Stamp()
    {
        try
        {
            var file = new FileInfo(path);
            return file.Exists ? new FileStamp(file.Length, file.LastWriteTimeUtc.Ticks) : new FileStamp(-1, 0);
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            return new FileStamp(-1, 0);
        }
    }
}
