using System.Runtime.ExceptionServices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Session;

/// <summary>The one place that runs functions by index on threads, each with buffers of its own.</summary>
public static class Batches
{
    private const int MostThreads = 256;

    /// <summary>Evaluates indices 0 to <paramref name="count"/> - 1 on threads; the results come in the order of the indices.</summary>
    /// <typeparam name="T">One index's result.</typeparam>
    /// <param name="model">The stage.</param>
    /// <param name="count">How many, 0 or more.</param>
    /// <param name="evaluate">A function of index and stage alone, asked on any thread with buffers that are its own meanwhile.</param>
    /// <param name="progress">Is told how many are done, rising, on any thread; null for nobody.</param>
    /// <param name="threads">So many threads at most, 1 to 256; null for as many as the machine has processors.</param>
    /// <param name="cancel">Stops between two indices; what was done by then is the result.</param>
    /// <returns>The results; fewer than asked for only where it was stopped.</returns>
    /// <exception cref="Exception">What <paramref name="evaluate"/> threw, of several the one of the lowest index.</exception>
    public static BatchResult<T> Run<T>(
        StageModel model, int count, Func<int, StageWorkspace, T> evaluate, IProgress<int>? progress, int? threads, CancellationToken cancel)
    {
        Guard.InRange(count, 0, int.MaxValue, nameof(count));
        var run = new Indices<T>(count, progress, cancel);
        int most = Math.Min(Guard.InRange(threads ?? Environment.ProcessorCount, 1, MostThreads, nameof(threads)), count);
        Thread[] others = [.. Enumerable.Range(1, Math.Max(most - 1, 0)).Select(_ => new Thread(Work) { IsBackground = true })];
        foreach (Thread thread in others)
        {
            thread.Start();
        }

        Work();
        foreach (Thread thread in others)
        {
            thread.Join();
        }

        return run.Result();

        void Work()
        {
            StageWorkspace? workspace = null;
            while (run.TryNext(out int index))
            {
                try
                {
                    run.Put(index, evaluate(index, workspace ??= new StageWorkspace(model)));
                }
                catch (Exception e)
                {
                    run.Fail(index, ExceptionDispatchInfo.Capture(e));
                }
            }
        }
    }

    /// <summary>Hands out indices and gathers what comes of them.</summary>
    private sealed class Indices<T>(int count, IProgress<int>? progress, CancellationToken cancel)
    {
        private readonly Lock _lock = new();
        private readonly T[] _results = new T[count];
        private readonly bool[] _there = new bool[count];
        private int _next;
        private int _done;
        private (int Index, ExceptionDispatchInfo Fault)? _failed;

        public bool TryNext(out int index)
        {
            lock (_lock)
            {
                index = _next;
                bool more = _next < count && _failed is null && !cancel.IsCancellationRequested;
                _next += more ? 1 : 0;
                return more;
            }
        }

        public void Put(int index, T result)
        {
            lock (_lock)
            {
                (_results[index], _there[index]) = (result, true);
                progress?.Report(++_done);
            }
        }

        public void Fail(int index, ExceptionDispatchInfo fault)
        {
            lock (_lock)
            {
                _failed = _failed is { } earlier && earlier.Index < index ? earlier : (index, fault);
            }
        }

        public BatchResult<T> Result()
        {
            _failed?.Fault.Throw();
            int gap = Array.IndexOf(_there, false);
            return new BatchResult<T>(gap < 0 ? _results : _results[..gap], count);
        }
    }
}
