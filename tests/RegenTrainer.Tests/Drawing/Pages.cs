using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Session;
using RegenTrainer.Session.Tests;

namespace RegenTrainer.Tests.Drawing;

/// <summary>Pages of made-up stages, drawn without a terminal.</summary>
internal static class Pages
{
    public static TheoryData<int, int> Sizes => new() { { 80, 24 }, { 100, 30 }, { 140, 45 } };

    /// <summary>The tabs of a bench with the first page open.</summary>
    private static readonly PageTab[] _tabs = [new('1', "Stage", true)];

    public static Canvas Draw(LiveStage live, int width, int height, Glyphs? glyphs = null, bool keysOpen = false, Compared compared = default)
    {
        var canvas = new Canvas(width, height, glyphs ?? Glyphs.Braille);
        if (!BenchFrame.Fits(width, height))
        {
            BenchFrame.DrawTooSmall(canvas);
            return canvas;
        }

        Region middle = BenchFrame.Middle(width, height);
        StageSnapshot stage = live.Snapshot(StagePage.PointsFor(middle, canvas.Glyphs, compared));
        BenchFrame.Draw(canvas, stage, _tabs, default(BenchWords) with { Pinned = "", Notice = "" });
        if (keysOpen)
        {
            KeyList.Draw(canvas, middle, "Stage", []);
        }
        else
        {
            StagePage.Draw(canvas, middle, stage, compared);
        }

        return canvas;
    }

    public static Canvas Draw(MadeUpStage stage, double travelPercent, int width, int height, Glyphs? glyphs = null, double dialHz = 1e6) =>
        Draw(new LiveStage(stage, new Setting(dialHz, travelPercent)), width, height, glyphs);

    public static string Text(Canvas canvas) => string.Join('\n', canvas.Rows());
}
