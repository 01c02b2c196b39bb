namespace RegenTrainer.Files.Saving;

/// <summary>
/// Writes files whole or not at all: into a file of its own beside the wanted one, on to the disk, then under the wanted name
/// in one step. What stood there before stays until then.
/// </summary>
public static class AtomicFile
{
    private const int MostTries = 100;

    private static int _last;

    /// <summary>Writes a file. A link stays a link: what it points to is written. A file that is there keeps its mode.</summary>
    /// <param name="path">The file.</param>
    /// <param name="bytes">Its content.</param>
    /// <param name="mode">The mode on systems that know modes; null keeps that of the file there, or takes the user's usual one.</param>
    /// <param name="reason">Why it could not be written and what helps, a phrase; empty where it could.</param>
    public static bool TryWrite(string path, ReadOnlySpan<byte> bytes, UnixFileMode? mode, out string reason)
    {
        string? beside = null;
        reason = "";
        try
        {
            var asked = new FileInfo(path);
            string target = asked.LinkTarget is null ? asked.FullName : asked.ResolveLinkTarget(returnFinalTarget: true)!.FullName;
            if (Directory.Exists(target))
            {
                reason = "it is a folder; give the name of a file in it";
                return false;
            }

            UnixFileMode? wanted = mode ?? ModeOf(target);
            using (FileStream stream = OpenBeside(target, wanted, out beside))
            {
                stream.Write(bytes);
                stream.Flush(flushToDisk: true);
            }

            if (wanted is { } known && !OperatingSystem.IsWindows())
            {
                File.SetUnixFileMode(beside, known);   // the user's mask took some of it away
            }

            File.Move(beside, target, overwrite: true);
            return true;
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            reason = FileTrouble.Words(e);
            TryDelete(beside);
            return false;
        }
    }

    /// <summary>Makes a folder for the user alone, with those above it, where it is not there.</summary>
    /// <exception cref="IOException">The disk would not take it.</exception>
    /// <exception cref="UnauthorizedAccessException">The user may not make it.</exception>
    public static void MakeOwnFolder(string folder)
    {
        if (OperatingSystem.IsWindows())
        {
            Directory.CreateDirectory(folder);
        }
        else
        {
            Directory.CreateDirectory(folder, UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute);
        }
    }

    /// <summary>Deletes a file where that can be done; one that is not there is no trouble.</summary>
    public static bool TryDelete(string? path)
    {
        try
        {
            if (path is not null)
            {
                File.Delete(path);
            }

            return true;
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            return false;
        }
    }

    /// <summary>The mode of a file that is there; null where there is none. One the user may not write is refused.</summary>
    private static UnixFileMode? ModeOf(string target)
    {
        if (!File.Exists(target))
        {
            return null;
        }

        // A new name over it would not ask for the right to write: a file set aside as read-only is asked here.
        using (new FileStream(target, FileMode.Open, FileAccess.Write, FileShare.ReadWrite))
        {
            return OperatingSystem.IsWindows() ? null : File.GetUnixFileMode(target);
        }
    }

    private static FileStream OpenBeside(string target, UnixFileMode? mode, out string path)
    {
        string folder = Path.GetDirectoryName(target) ?? ".";
        var options = new FileStreamOptions { Mode = FileMode.CreateNew, Access = FileAccess.Write, Share = FileShare.None };
        if (mode is { } known && !OperatingSystem.IsWindows())
        {
            options.UnixCreateMode = known;
        }

        for (int attempt = 1; ; attempt++)
        {
            path = Path.Combine(folder, $".regentrainer-{Environment.ProcessId}-{Interlocked.Increment(ref _last)}.tmp");
            try
            {
                return new FileStream(path, options);
            }
            catch (IOException) when (attempt < MostTries && File.Exists(path))
            {
                // Left by a program that was ended in the middle of a save: the next number is free.
            }
        }
    }
}
