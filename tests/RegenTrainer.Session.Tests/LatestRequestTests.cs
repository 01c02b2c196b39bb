using System.Diagnostics;

namespace RegenTrainer.Session.Tests;

public sealed class LatestRequestTests
{
    [Fact]
    public void An_answer_stays_with_its_request_until_a_newer_one_comes()
    {
        using var go = new SemaphoreSlim(1);
        using var request = new LatestRequest<int, string>(
            (key, stop) =>
            {
                go.Wait(stop);
                return $"answer {key}";
            },
            cutShort: true);
        Assert.Null(request.Latest);
        request.Ask(1);
        Wait(request);
        Assert.Equal(new LatestAnswer<int, string>(1, "answer 1"), request.Latest);
        Assert.False(request.IsWorking);
        request.Ask(2);
        Assert.True(request.IsWorking);
        Assert.Equal(1, request.Latest!.Key);
        go.Release();
        Wait(request);
        Assert.Equal(new LatestAnswer<int, string>(2, "answer 2"), request.Latest);
        Assert.False(request.Poll());
    }

    [Fact]
    public void The_newest_request_wins_and_stops_the_older()
    {
        int asked = 0;
        using var request = new LatestRequest<int, int>(
            (key, stop) =>
            {
                Interlocked.Increment(ref asked);
                if (key < 100)
                {
                    stop.WaitHandle.WaitOne();
                    stop.ThrowIfCancellationRequested();
                }

                return key;
            },
            cutShort: true);
        for (int key = 1; key <= 100; key++)
        {
            request.Ask(key);
        }

        Wait(request);
        Assert.Equal(100, request.Latest!.Key);
        Assert.InRange(asked, 1, 100);
    }

    [Fact]
    public void Work_that_is_not_cut_short_gives_its_answer_and_then_the_newest_is_taken()
    {
        List<int> done = [];
        using var first = new ManualResetEventSlim();
        using var request = new LatestRequest<int, int>(
            (key, stop) =>
            {
                first.Wait(stop);
                done.Add(key);
                return key;
            },
            cutShort: false);
        request.Ask(1);
        request.Ask(2);
        request.Ask(3);
        request.Ask(3);
        first.Set();
        for (int turn = 0; request.IsWorking; turn++)
        {
            Assert.True(turn < 1000);
            Thread.Sleep(5);
        }

        Assert.Equal([1, 3], done);
        Assert.Equal(3, request.Latest!.Key);
    }

    [Fact]
    public void A_fault_surfaces_once_and_the_next_request_is_answered()
    {
        using var request = new LatestRequest<int, int>((key, _) => key == 1 ? throw new InvalidOperationException("of the work") : key, cutShort: true);
        request.Ask(1);
        InvalidOperationException fault = Assert.Throws<InvalidOperationException>(() => Wait(request));
        Assert.Equal("of the work", fault.Message);
        Assert.False(request.Poll());
        Assert.Null(request.Latest);
        request.Ask(2);
        Wait(request);
        Assert.Equal(2, request.Latest!.Result);
    }

    /// <summary>The limit is that of a stop by the user, 0.2 s; the rest is for a machine with other work.</summary>
    [Fact]
    public void A_stop_ends_the_work_at_once_and_keeps_the_last_answer()
    {
        using var ended = new ManualResetEventSlim();
        using var request = new LatestRequest<int, int>(
            (key, stop) =>
            {
                if (key == 2)
                {
                    stop.WaitHandle.WaitOne();
                    ended.Set();
                    stop.ThrowIfCancellationRequested();
                }

                return key;
            },
            cutShort: true);
        request.Ask(1);
        Wait(request);
        request.Ask(2);
        var watch = Stopwatch.StartNew();
        request.Cancel();
        Assert.True(ended.Wait(5000, TestContext.Current.CancellationToken));
        Assert.InRange(watch.Elapsed.TotalSeconds, 0, 1);
        Assert.Equal(1, request.Latest!.Key);
        request.Ask(1);   // what was asked last is forgotten: it is asked again
        Wait(request);
    }

    [Fact]
    public void Nothing_can_be_asked_behind_the_end()
    {
        var request = new LatestRequest<int, int>((key, _) => key, cutShort: true);
        request.Dispose();
        Assert.Throws<ObjectDisposedException>(() => request.Ask(1));
    }

    private static void Wait<TKey, TResult>(LatestRequest<TKey, TResult> request)
        where TKey : notnull
    {
        for (int turn = 0; !request.Poll(); turn++)
        {
            Assert.True(turn < 1000, "no answer came");
            Thread.Sleep(5);
        }
    }
}
