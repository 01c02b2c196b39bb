using System.Collections.Concurrent;
using System.Diagnostics;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;
using RegenTrainer.Files;

namespace RegenTrainer.Session.Tests;

public sealed class BatchesTests
{
    private static readonly StageModel _model = StageModel.Compile(Presets.Read("plain-tank"));

    [Theory]
    [InlineData(1)]
    [InlineData(3)]
    public void Results_come_in_the_order_of_the_indices_whatever_the_threads(int threads)
    {
        BatchResult<double> result = Batches.Run(_model, 40, Q, null, threads, CancellationToken.None);
        Assert.False(result.IsCut);
        Assert.Equal(Enumerable.Range(0, 40).Select(k => Q(k, new StageWorkspace(_model))), result.Results);
    }

    [Fact]
    public void Each_thread_has_buffers_of_its_own()
    {
        var users = new ConcurrentDictionary<StageWorkspace, int>();
        Batches.Run(
            _model,
            64,
            (_, workspace) =>
            {
                Assert.Equal(Environment.CurrentManagedThreadId, users.GetOrAdd(workspace, Environment.CurrentManagedThreadId));
                Thread.Sleep(1);
                return 0;
            },
            null,
            4,
            CancellationToken.None);
        Assert.InRange(users.Count, 1, 4);
    }

    [Fact]
    public void Nothing_to_do_is_done_at_once() =>
        Assert.Equal((0, false), (Batches.Run(_model, 0, Q, null, null, CancellationToken.None).Results.Count, Batches.Run(_model, 0, Q, null, null, CancellationToken.None).IsCut));

    [Fact]
    public void Progress_rises_to_the_end()
    {
        var told = new Told();
        Batches.Run(_model, 20, (index, _) => index, told, 3, CancellationToken.None);
        Assert.Equal(Enumerable.Range(1, 20), told.Seen);
    }

    /// <summary>The limit is that of a stop by the user, 0.2 s.</summary>
    [Fact]
    public void A_stop_comes_within_a_fifth_of_a_second_and_says_how_far_it_got()
    {
        using var stop = new CancellationTokenSource();
        var told = new Told { At = 10, Then = stop.Cancel };
        var watch = Stopwatch.StartNew();
        BatchResult<int> result = Batches.Run(
            _model,
            1_000_000,
            (index, _) =>
            {
                Thread.Sleep(1);
                return index;
            },
            told,
            2,
            stop.Token);
        Assert.InRange(watch.Elapsed.TotalSeconds, 0, 2);   // ten sleeps and 0.2 s, on a machine with other work
        Assert.True(result.IsCut);
        Assert.InRange(result.Results.Count, 9, 12);
        Assert.Equal(Enumerable.Range(0, result.Results.Count), result.Results);
    }

    [Fact]
    public void Of_faults_the_one_of_the_lowest_index_surfaces()
    {
        InvalidOperationException fault = Assert.Throws<InvalidOperationException>(() => Batches.Run<int>(
            _model, 100, (index, _) => index is 5 or 6 ? throw new InvalidOperationException($"at {index}") : index, null, 2, CancellationToken.None));
        Assert.Equal("at 5", fault.Message);
    }

    private static double Q(int index, StageWorkspace workspace) =>
        StageReader.Read(workspace, new Setting(1e6, index), StageReader.DefaultAudioHz).EffectiveQ ?? -1;

    private sealed class Told : IProgress<int>
    {
        public List<int> Seen { get; } = [];

        public int At { get; init; }

        public Action? Then { get; init; }

        public void Report(int value)
        {
            Seen.Add(value);
            if (value == At)
            {
                Then?.Invoke();
            }
        }
    }
}
