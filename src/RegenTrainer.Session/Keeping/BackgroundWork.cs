namespace RegenTrainer.Session.Keeping;

/// <summary>File work off the screen's thread: one piece after the other, its outcome taken up by the one who polls.</summary>
internal sealed class BackgroundWork
{
    private readonly Lock _lock = new();
    private readonly Queue<Action> _outcomes = new();
    private Task _last = Task.CompletedTask;

    /// <summary>Whether nothing is under way or waits.</summary>
    public bool IsIdle => _last.IsCompleted;

    /// <summary>Puts a piece behind those that wait.</summary>
    /// <param name="work">The work; gives what is to be done with its outcome on the polling thread, or null.</param>
    public void Post(Func<Action?> work) => _last = _last.ContinueWith(_ => Run(work), TaskScheduler.Default);

    /// <summary>Takes up outcomes that have come since.</summary>
    public void Poll()
    {
        while (TryNext() is { } outcome)
        {
            outcome();
        }
    }

    /// <summary>Waits until everything is done, or the time is over, and takes up the outcomes.</summary>
    /// <returns>Whether everything was done.</returns>
    public bool Finish(TimeSpan longest)
    {
        bool done = _last.Wait(longest);
        Poll();
        return done;
    }

    private Action? TryNext()
    {
        lock (_lock)
        {
            return _outcomes.TryDequeue(out Action? outcome) ? outcome : null;
        }
    }

    private void Run(Func<Action?> work)
    {
        Action? outcome;
        try
        {
            outcome = work();
        }
        catch (Exception e)
        {
            // A fault of our own must not vanish with its thread: the one who polls gets it.
            var fault = System.Runtime.ExceptionServices.ExceptionDispatchInfo.Capture(e);
            outcome = fault.Throw;
        }

        if (outcome is not null)
        {
            lock (_lock)
            {
                _outcomes.Enqueue(outcome);
            }
        }
    }
}
