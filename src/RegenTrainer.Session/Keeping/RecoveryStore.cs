using System.Text;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files;
using RegenTrainer.Files.Saving;

namespace RegenTrainer.Session.Keeping;

/// <summary>The recoveries in the user's state folder: the one this session keeps, and those that others left.</summary>
/// <param name="around">Where and by which process they are kept.</param>
internal sealed class RecoveryStore(Surroundings around)
{
    private const string Prefix = "recovery-";
    private const string Suffix = ".toml";
    private const UnixFileMode UserOnly = UnixFileMode.UserRead | UnixFileMode.UserWrite;

    private static int _sessions;

    private readonly string _name = $"{Prefix}{around.Process.Id}-{Interlocked.Increment(ref _sessions)}{Suffix}";

    /// <summary>Whether there is a place to keep recoveries in.</summary>
    public bool HasPlace => around.Places.State is not null;

    /// <summary>Keeps this session's unsaved work in place of what it kept before.</summary>
    /// <param name="content">The work.</param>
    /// <param name="notice">Why it cannot be kept; empty where it can.</param>
    public bool TryKeep(RecoveryContent content, out string notice)
    {
        notice = "";
        if (around.Places.State is not { } folder)
        {
            return false;   // told once, at the start
        }

        string reason;
        try
        {
            AtomicFile.MakeOwnFolder(folder);
            string path = Path.Combine(folder, _name);
            if (AtomicFile.TryWrite(path, Encoding.UTF8.GetBytes(RecoveryText.Write(content)), UserOnly, out reason))
            {
                return true;
            }
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            reason = FileTrouble.Words(e);
        }

        notice = $"unsaved work is not kept for recovery: {Printable.Text(folder)}: {reason}";
        return false;
    }

    /// <summary>Deletes what this session kept.</summary>
    public void Remove()
    {
        if (around.Places.State is { } folder)
        {
            AtomicFile.TryDelete(Path.Combine(folder, _name));
        }
    }

    /// <summary>The recoveries of sessions whose process is gone, newest first. One whose work was saved after all is deleted.</summary>
    public IReadOnlyList<(Recovery Found, RecoveryContent Content)> Left()
    {
        List<(Recovery, RecoveryContent)> left = [];
        foreach (string file in Files())
        {
            try
            {
                RecoveryContent content = RecoveryText.Read(File.ReadAllText(file));
                DateTimeOffset at = content.At > DateTimeOffset.UnixEpoch ? content.At : new DateTimeOffset(File.GetLastWriteTimeUtc(file));
                if (content.Process is { } process && (process == around.Process || process.IsRunning))
                {
                    continue;
                }

                if (content.Path is { } path && TextFiles.TryRead(path, out string text, out _) && text == content.Text)
                {
                    AtomicFile.TryDelete(file);
                    continue;
                }

                string name = content.Name.Length > 0 ? content.Name : Path.GetFileName(file);
                left.Add((new Recovery(name, content.Path, at, file), content));
            }
            catch (Exception e) when (FileTrouble.Is(e))
            {
                // What cannot be read now may be readable at the next start: it stays.
            }
        }

        return [.. left.OrderByDescending(l => l.Item1.At)];
    }

    private IReadOnlyList<string> Files()
    {
        try
        {
            return around.Places.State is { } folder && Directory.Exists(folder) ? Directory.GetFiles(folder, Prefix + "*" + Suffix) : [];
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            return [];
        }
    }
}
