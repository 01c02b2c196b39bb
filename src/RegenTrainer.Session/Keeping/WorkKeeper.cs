using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Saving;

namespace RegenTrainer.Session.Keeping;

/// <summary>Keeps what must not be lost and watches what others do, behind the screen's thread; one thread uses it.</summary>
internal sealed class WorkKeeper : IDisposable
{
    /// <summary>Unsaved work is kept so long after the first edit since the last time, so that a held key writes a few times only.</summary>
    private static readonly TimeSpan _keepAfter = TimeSpan.FromSeconds(0.3);

    private static readonly TimeSpan _lookEvery = TimeSpan.FromSeconds(1);
    private static readonly TimeSpan _longestEnd = TimeSpan.FromSeconds(5);

    private readonly Surroundings _around;
    private readonly BackgroundWork _work = new();
    private readonly RecoveryStore _recoveries;
    private readonly OpenRecords _records;
    private readonly SettingsStore _settings;
    private readonly Queue<(Recovery Found, RecoveryContent Content)> _left;
    private FileWatch? _watch;
    private string? _path;
    private string _seen = "";
    private long? _editedAt;
    private long _lookedAt;
    private bool _looking;
    private bool _leaving;
    private bool _disposed;

    public WorkKeeper(Surroundings around)
    {
        _around = around;
        _recoveries = new RecoveryStore(around);
        _records = new OpenRecords(around);
        _settings = new SettingsStore(around.Places);
        _left = new Queue<(Recovery, RecoveryContent)>(_recoveries.Left());
        LastUsed = _settings.Load(out string notice).LastUsed;
        Notice = notice.Length == 0 && !_recoveries.HasPlace ? "there is no home folder: unsaved work is not kept for recovery" : notice;
    }

    public string Notice { get; private set; }

    public IReadOnlyList<string> LastUsed { get; private set; }

    public Recovery? Found => Content is null ? null : _left.Peek().Found;

    public RecoveryContent? Content => _left.TryPeek(out (Recovery, RecoveryContent Content) first) ? first.Content : null;

    /// <summary>Whether another running program had the file open when it was opened.</summary>
    public bool OpenElsewhere { get; private set; }

    /// <summary>Begins with a file, or the content it has from now on.</summary>
    /// <param name="path">Its full path; null for none.</param>
    /// <param name="fingerprint">Of its content.</param>
    public void Begin(string? path, string fingerprint)
    {
        _watch = path is null ? null : new FileWatch(path, fingerprint);
        OpenElsewhere = path is not null && _records.Other(path) is not null;
        if (OpenElsewhere && path != _path)
        {
            Notice = $"{Printable.Text(path!)} is open in another running program: the last to save is asked first";
        }

        _path = path;
        _work.Post(() =>
        {
            string notice = _records.TryTake(path, out string reason) ? "" : $"unsaved work may not be kept: {Printable.Text(_around.Places.State!)}: {reason}";
            string settingsNotice = "";
            IReadOnlyList<string>? used = path is null ? null : _settings.Use(path, out settingsNotice)?.LastUsed;
            return () =>
            {
                LastUsed = used ?? LastUsed;
                Tell(settingsNotice);
                Tell(notice);
            };
        });
    }

    /// <summary>Notes that the design, or whether it is saved, has changed.</summary>
    public void Edited() => _editedAt ??= _around.Clock.GetTimestamp();

    /// <summary>Does what is due.</summary>
    /// <param name="content">Gives the unsaved work; null where there is none.</param>
    public void Tick(Func<RecoveryContent>? content)
    {
        _work.Poll();
        if (_editedAt is { } since && _around.Clock.GetElapsedTime(since) >= _keepAfter)
        {
            _editedAt = null;
            _work.Post(() => Keep(content));
        }

        if (_watch is { } watch && !_looking && _around.Clock.GetElapsedTime(_lookedAt) >= _lookEvery)
        {
            (_looking, _lookedAt) = (true, _around.Clock.GetTimestamp());
            _work.Post(() =>
            {
                string? seen = watch.Look();
                return () =>
                {
                    _looking = false;
                    Seen(ReferenceEquals(watch, _watch) ? seen : null);
                };
            });
        }
    }

    /// <summary>Leaves the recovery found where it is, with a notice; the next one, if any, is found then.</summary>
    public void Leave(string notice)
    {
        _left.Dequeue();
        Notice = notice;
    }

    /// <summary>Has the recovery found kept under this session's name, and only then deletes it.</summary>
    public void Taken(string storedIn, Func<RecoveryContent> content)
    {
        _left.Dequeue();
        _work.Post(() =>
        {
            if (!_recoveries.TryKeep(content(), out string notice))
            {
                return () => Tell(notice);
            }

            AtomicFile.TryDelete(storedIn);
            return null;
        });
    }

    public void Dismiss() => Notice = "";

    public void Drop()
    {
        if (_left.TryDequeue(out (Recovery Found, RecoveryContent) first))
        {
            _work.Post(() =>
            {
                bool gone = AtomicFile.TryDelete(first.Found.StoredIn);
                return gone ? null : () => Tell($"{Printable.Text(first.Found.StoredIn)} cannot be deleted");
            });
        }
    }

    public void LeaveBehind(Func<RecoveryContent>? content)
    {
        _leaving = true;
        _work.Post(() => Keep(content));
        _work.Finish(_longestEnd);
    }

    public void Dispose()
    {
        if (_disposed)
        {
            return;
        }

        _disposed = true;
        _work.Post(() =>
        {
            if (!_leaving)
            {
                _recoveries.Remove();
            }

            _records.Release();
            return null;
        });
        _work.Finish(_longestEnd);
    }

    private Action? Keep(Func<RecoveryContent>? content)
    {
        if (content is null)
        {
            _recoveries.Remove();
            return null;
        }

        return _recoveries.TryKeep(content(), out string notice) ? null : () => Tell(notice);
    }

    /// <summary>Tells what the watch saw; what it told before is no longer true.</summary>
    private void Seen(string? notice)
    {
        if (notice is not null)
        {
            Notice = Notice == _seen ? "" : Notice;
            _seen = notice;
            Tell(notice);
        }
    }

    private void Tell(string? notice) => Notice = string.IsNullOrEmpty(notice) ? Notice : notice;
}
