using System.Diagnostics;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Fields;
using RegenTrainer.Drawing;
using RegenTrainer.Files;
using RegenTrainer.Screens;
using RegenTrainer.Session;
using RegenTrainer.Session.Keeping;
using RegenTrainer.Tests.Screens;
using Terminal.Gui.Input;

namespace RegenTrainer.Benchmarks;

/// <summary>From a step of the turns in the Parts panel to the end of the draw, on the default preset at 120x40: all of the coil is computed anew.</summary>
internal static class PartsStepToFrame
{
    private const int Steps = 200;
    private const int WarmUp = 100;

    /// <summary>Steps in one direction: from 84 to 74 turns and back.</summary>
    private const int Stretch = 10;

    /// <summary>The median and the 99th percentile in microseconds, and the bytes allocated per step.</summary>
    public static (double Median, double P99, double Bytes) Run()
    {
        StageDocument document = StageDocument.Of(Presets.Default, StageFiles.Open(Presets.Default, Places.None));
        var nowhere = new Surroundings(Places.None, TimeProvider.System, ProcessMark.Own);
        using var workbench = new Workbench(document, new Setting(1e6, 45), StageReader.DefaultAudioHz, nowhere);
        Theme theme = Theme.Choose(_ => null);
        using var terminal = new HeadlessTerminal(new BenchScreen(new Bench(workbench), Glyphs.Of(GlyphSet.Braille), theme), theme, 120, 40);
        terminal.Type("e");
        terminal.Press([.. workbench.Design.Family.Fields.TakeWhile(field => field.Key != CoilFields.Turns).Select(_ => Key.CursorDown)]);
        Step(terminal, WarmUp, null);
        double[] microseconds = new double[Steps];
        long before = GC.GetAllocatedBytesForCurrentThread();
        Step(terminal, Steps, microseconds);
        double bytes = (GC.GetAllocatedBytesForCurrentThread() - before) / (double)Steps;
        if (workbench.UndoCount < Steps)
        {
            throw new InvalidOperationException("the steps changed nothing");
        }

        Array.Sort(microseconds);
        return (microseconds[Steps / 2], microseconds[Steps * 99 / 100], bytes);
    }

    private static void Step(HeadlessTerminal terminal, int count, double[]? microseconds)
    {
        for (int k = 0; k < count; k++)
        {
            long start = Stopwatch.GetTimestamp();
            terminal.Type(k / Stretch % 2 == 0 ? "-" : "+");
            if (microseconds is not null)
            {
                microseconds[k] = Stopwatch.GetElapsedTime(start).TotalMicroseconds;
            }
        }
    }
}
