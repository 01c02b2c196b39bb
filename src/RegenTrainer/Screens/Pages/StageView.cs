using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Pages;

/// <summary>Page 1: the stage now.</summary>
internal sealed class StageView(Bench bench) : IPage
{
    /// <inheritdoc/>
    public char Digit => '1';

    /// <inheritdoc/>
    public string Name => "Stage";

    /// <inheritdoc/>
    public IReadOnlyList<(string Key, string Does)> Keys => [("click", "station there")];

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => StagePage.PointsFor(region, glyphs, bench.Compared);

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage) => StagePage.Draw(canvas, region, stage, bench.Compared);

    /// <inheritdoc/>
    public bool Press(Key key) => false;

    /// <summary>A click on the curve takes the station there.</summary>
    public bool Click(Region region, int column, int row)
    {
        if (StagePage.OffsetAt(region, bench.Compared, column, row) is not { } offsetHz)
        {
            return false;
        }

        bench.Stage.MoveStationBy(offsetHz);
        return true;
    }

    /// <inheritdoc/>
    public bool Poll() => false;
}
