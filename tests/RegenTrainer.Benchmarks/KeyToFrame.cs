using System.Diagnostics;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Files;
using RegenTrainer.Screens;
using RegenTrainer.Session;
using RegenTrainer.Tests.Screens;
using Terminal.Gui.Input;

namespace RegenTrainer.Benchmarks;

/// <summary>From a key of the control to the end of the draw, on the screen of the default preset at 120x40.</summary>
internal static class KeyToFrame
{
    /// <summary>Keys timed.</summary>
    private const int Keys = 1000;

    /// <summary>Keys pressed first, so that the compiler has seen everything.</summary>
    private const int WarmUp = 300;

    /// <summary>Keys in one direction: from below tip-over to well above and back.</summary>
    private const int Stretch = 60;

    /// <summary>The median and the 99th percentile in microseconds, and the bytes allocated per key.</summary>
    public static (double Median, double P99, double Bytes) Run()
    {
        var solver = new StageSolver(StageModel.Compile(Presets.Read(Presets.Default)), StageReader.DefaultAudioHz);
        var stage = new LiveStage(solver, new Setting(1e6, 45));
        Theme theme = Theme.Choose(_ => null);
        using var terminal = new HeadlessTerminal(new BenchScreen(new Bench(stage), Glyphs.Of(GlyphSet.Braille), theme), theme, 120, 40);
        Press(terminal, WarmUp, null);
        double[] microseconds = new double[Keys];
        long before = GC.GetAllocatedBytesForCurrentThread();
        Press(terminal, Keys, microseconds);
        double bytes = (GC.GetAllocatedBytesForCurrentThread() - before) / (double)Keys;
        Array.Sort(microseconds);
        return (microseconds[Keys / 2], microseconds[Keys * 99 / 100], bytes);
    }

    private static void Press(HeadlessTerminal terminal, int count, double[]? microseconds)
    {
        for (int k = 0; k < count; k++)
        {
            long start = Stopwatch.GetTimestamp();
            terminal.Press(k / Stretch % 2 == 0 ? Key.CursorRight : Key.CursorLeft);
            if (microseconds is not null)
            {
                microseconds[k] = Stopwatch.GetElapsedTime(start).TotalMicroseconds;
            }
        }
    }
}
