using System.Runtime.ExceptionServices;

namespace RegenTrainer.Session;

/// <summary>An answer with what it is the answer to.</summary>
/// <typeparam name="TKey">What is asked.</typeparam>
/// <typeparam name="TResult">What is answered.</typeparam>
/// <param name="Key">What was asked.</param>
/// <param name="Result">The answer.</param>
public sealed record LatestAnswer<TKey, TResult>(TKey Key, TResult Result);

/// <summary>
/// Answers the newest of many requests on a thread of its own. The last answer stays, with the request it belongs to, until a newer
/// one comes.
/// </summary>
/// <typeparam name="TKey">What is asked; equal keys have equal answers.</typeparam>
/// <typeparam name="TResult">What is answered; immutable.</typeparam>
/// <param name="answer">Works an answer out; told to stop by throwing for the token it may do so, and is asked on one thread at a time.</param>
/// <param name="cutShort">
/// Whether a newer request stops the work on an older one. Where work takes longer than a key repeats, an answer then comes only
/// after the last key; without it every piece of work ends and gives an answer.
/// </param>
public sealed class LatestRequest<TKey, TResult>(Func<TKey, CancellationToken, TResult> answer, bool cutShort) : IDisposable
    where TKey : notnull
{
    private readonly Lock _lock = new();
    private (TKey Key, CancellationTokenSource Stop)? _working;
    private (TKey Key, bool Is) _waiting;
    private (TKey Key, bool Is) _asked;
    private LatestAnswer<TKey, TResult>? _latest;
    private ExceptionDispatchInfo? _fault;
    private bool _news;
    private bool _disposed;

    /// <summary>The last answer; null before there is one.</summary>
    public LatestAnswer<TKey, TResult>? Latest
    {
        get
        {
            lock (_lock)
            {
                return _latest;
            }
        }
    }

    /// <summary>Whether an answer to the newest request is on its way.</summary>
    public bool IsWorking
    {
        get
        {
            lock (_lock)
            {
                return _working is not null;
            }
        }
    }

    /// <summary>Asks; what was asked last is not asked again.</summary>
    public void Ask(TKey key)
    {
        lock (_lock)
        {
            ObjectDisposedException.ThrowIf(_disposed, this);
            if (_asked.Is && EqualityComparer<TKey>.Default.Equals(_asked.Key, key))
            {
                return;
            }

            _asked = _waiting = (key, true);
            if (_working is not { } working)
            {
                Start();
            }
            else if (cutShort)
            {
                working.Stop.Cancel();
            }
        }
    }

    /// <summary>Stops the work, and forgets what was asked; the last answer stays.</summary>
    public void Cancel()
    {
        lock (_lock)
        {
            _asked = _waiting = default;
            _working?.Stop.Cancel();
        }
    }

    /// <summary>Whether there is news since the last call.</summary>
    /// <exception cref="Exception">What the work threw, once.</exception>
    public bool Poll()
    {
        lock (_lock)
        {
            (bool news, _news) = (_news, false);
            (ExceptionDispatchInfo? fault, _fault) = (_fault, null);
            fault?.Throw();
            return news;
        }
    }

    /// <summary>Stops the work; nothing can be asked any more.</summary>
    public void Dispose()
    {
        Cancel();
        lock (_lock)
        {
            _disposed = true;
        }
    }

    private void Start()
    {
        var stop = new CancellationTokenSource();
        TKey key = _waiting.Key;
        (_working, _waiting) = ((key, stop), default);
        _ = Task.Factory.StartNew(() => Work(key, stop), CancellationToken.None, TaskCreationOptions.LongRunning, TaskScheduler.Default);
    }

    private void Work(TKey key, CancellationTokenSource stop)
    {
        LatestAnswer<TKey, TResult>? found = null;
        ExceptionDispatchInfo? fault = null;
        try
        {
            found = new LatestAnswer<TKey, TResult>(key, answer(key, stop.Token));
        }
        catch (OperationCanceledException) when (stop.IsCancellationRequested)
        {
            // A newer request waits, or nobody wants it any more.
        }
        catch (Exception e)
        {
            fault = ExceptionDispatchInfo.Capture(e);
        }

        lock (_lock)
        {
            if (!stop.IsCancellationRequested)
            {
                (_latest, _fault) = (found ?? _latest, fault ?? _fault);
                _news = true;
            }

            _working = null;
            if (_waiting.Is)
            {
                Start();
            }
        }

        stop.Dispose();
    }
}
