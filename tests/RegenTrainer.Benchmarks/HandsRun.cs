using System.Diagnostics;
using System.Globalization;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Screens;
using RegenTrainer.Session;
using RegenTrainer.Tests.Screens;

namespace RegenTrainer.Benchmarks;

/// <summary>A long run of random hands on the default preset: every frame within the width, memory flat, nothing thrown.</summary>
internal static class HandsRun
{
    private const int EventsPerFrame = 10;
    private const ulong Seed = 20261201;

    /// <summary>Runs and prints what came of it; a frame at fault or an exception ends it.</summary>
    public static int Run(int events, TextWriter output)
    {
        var solver = new StageSolver(StageModel.Compile(Presets.Read(Presets.Default)), StageReader.DefaultAudioHz);
        using var hands = new RandomHands(new Bench(new LiveStage(solver, new Setting(1e6, 50))), Seed);
        long start = Stopwatch.GetTimestamp();
        hands.Run(events, EventsPerFrame);
        output.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"{events} events, {hands.Frames} frames in {Stopwatch.GetElapsedTime(start).TotalSeconds:0.0} s; memory grew by {hands.GrowthBytes / 1024} KiB"));
        return 0;
    }
}
