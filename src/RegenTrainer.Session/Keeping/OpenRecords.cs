using System.Text;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Saving;

namespace RegenTrainer.Session.Keeping;

/// <summary>Records in the user's state folder of which process has which file open.</summary>
/// <param name="around">Where and by which process they are kept.</param>
internal sealed class OpenRecords(Surroundings around)
{
    private const string Suffix = ".open";
    private const int LettersOfPath = 16;
    private const UnixFileMode UserOnly = UnixFileMode.UserRead | UnixFileMode.UserWrite;

    private static int _sessions;

    private readonly int _session = Interlocked.Increment(ref _sessions);
    private string? _own;
    private string? _path;

    /// <summary>Puts down that this session has a file open, and no longer the one before.</summary>
    /// <param name="path">Its full path; null for no file.</param>
    /// <param name="reason">Why that could not be put down, a phrase; empty where it could.</param>
    public bool TryTake(string? path, out string reason)
    {
        reason = "";
        if (_own is not null && path == _path)
        {
            return true;
        }

        Release();
        _path = path;
        if (around.Places.State is not { } folder)
        {
            return true;   // told once, at the start
        }

        try
        {
            AtomicFile.MakeOwnFolder(folder);
            if (path is null)
            {
                return true;
            }

            string own = Path.Combine(folder, $"{Start(path)}{around.Process.Id}-{_session}{Suffix}");
            bool taken = AtomicFile.TryWrite(own, Encoding.UTF8.GetBytes($"{around.Process}\n{Printable.Text(path)}\n"), UserOnly, out reason);
            _own = taken ? own : null;
            return taken;
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            reason = FileTrouble.Words(e);
            return false;
        }
    }

    /// <summary>Takes the record of this session away.</summary>
    public void Release()
    {
        AtomicFile.TryDelete(_own);
        _own = null;
    }

    /// <summary>A running process other than this one that has a file open; records of ended ones are taken away.</summary>
    /// <param name="path">The file's full path.</param>
    public ProcessMark? Other(string path)
    {
        try
        {
            if (around.Places.State is not { } folder || !Directory.Exists(folder))
            {
                return null;
            }

            foreach (string record in Directory.GetFiles(folder, Start(path) + "*" + Suffix))
            {
                ProcessMark? mark = ProcessMark.Parse(File.ReadAllText(record).Split('\n')[0]);
                if (mark is { IsRunning: true } running && running != around.Process)
                {
                    return running;
                }

                if (mark is not { IsRunning: true })
                {
                    AtomicFile.TryDelete(record);
                }
            }
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            // Without records nothing is known of others; saving still looks at what stands in the file.
        }

        return null;
    }

    private static string Start(string path) => Fingerprint.Of(path)[..LettersOfPath] + "-";
}
