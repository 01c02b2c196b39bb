using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Session;
using RegenTrainer.Session.Tests;

namespace RegenTrainer.Tests.Drawing;

/// <summary>Pages of made-up stages, drawn without a terminal.</summary>
internal static class Pages
{
    public static TheoryData<int, int> Sizes => new() { { 80, 24 }, { 100, 30 }, { 140, 45 } };

    public static Canvas Draw(LiveStage live, int width, int height, Glyphs? glyphs = null, bool keysOpen = false)
    {
        Glyphs chosen = glyphs ?? Glyphs.Braille;
        return StagePage.Draw(live.Snapshot(StagePage.PointsFor(width, height, chosen)), width, height, chosen, keysOpen);
    }

    public static Canvas Draw(MadeUpStage stage, double travelPercent, int width, int height, Glyphs? glyphs = null, double dialHz = 1e6) =>
        Draw(new LiveStage(stage, new Setting(dialHz, travelPercent)), width, height, glyphs);

    public static string Text(Canvas canvas) => string.Join('\n', canvas.Rows());
}
