using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>
/// Answers requests on another thread. The work going on is finished, then the newest request is taken, so that answers keep
/// coming while a key is held; the last answer stays, with the request it belongs to.
/// </summary>
/// <typeparam name="TRequest">A request; equal ones have the same answer.</typeparam>
/// <typeparam name="TAnswer">Its answer, immutable.</typeparam>
/// <param name="work">Answers a request; runs on one other thread at a time.</param>
public sealed class LatestRequest<TRequest, TAnswer>(Func<TRequest, TAnswer> work)
    where TRequest : class
    where TAnswer : class
{
    private readonly Lock _lock = new();
    private TRequest? _asked;
    private TRequest? _waiting;
    private bool _working;
    private (TRequest Request, TAnswer Answer)? _latest;
    private Exception? _fault;
    private bool _changed;

    /// <summary>The last answer and its request; null before there is one.</summary>
    public (TRequest Request, TAnswer Answer)? Latest
    {
        get
        {
            lock (_lock)
            {
                return _latest;
            }
        }
    }

    /// <summary>Whether a newer answer than <see cref="Latest"/> is on its way.</summary>
    public bool IsWorking
    {
        get
        {
            lock (_lock)
            {
                return _working;
            }
        }
    }

    /// <summary>Asks; asking for what was asked last does nothing.</summary>
    public void Ask(TRequest request)
    {
        lock (_lock)
        {
            if (request.Equals(_asked))
            {
                return;
            }

            _asked = _waiting = request;
            if (!_working)
            {
                _working = true;
                _ = Task.Run(Work);
            }
        }
    }

    /// <summary>Whether there is news since the last call.</summary>
    /// <exception cref="AggregateException">The work failed by a fault of the program.</exception>
    public bool Poll()
    {
        lock (_lock)
        {
            if (_fault is { } fault)
            {
                _fault = null;
                throw new AggregateException(fault);
            }

            (bool changed, _changed) = (_changed, false);
            return changed;
        }
    }

    private void Work()
    {
        while (true)
        {
            TRequest next;
            lock (_lock)
            {
                if (_waiting is not { } waiting)
                {
                    (_working, _changed) = (false, true);
                    return;
                }

                (next, _waiting) = (waiting, null);
            }

            TAnswer? answer = null;
            Exception? failed = null;
            try
            {
                answer = work(next);
            }
            catch (Exception fault)
            {
                failed = fault;
            }

            lock (_lock)
            {
                (_latest, _fault, _changed) = (answer is null ? _latest : (next, answer), failed ?? _fault, true);
            }
        }
    }
}

/// <summary>A stage at a setting, as a request.</summary>
/// <param name="Solver">The stage; it is asked on other threads only through <see cref="IStageSolver.Fork"/>.</param>
/// <param name="Setting">The setting.</param>
public sealed record StageRequest(IStageSolver Solver, Setting Setting);
