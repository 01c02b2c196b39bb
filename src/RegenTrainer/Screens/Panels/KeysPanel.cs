using RegenTrainer.Drawing;
using RegenTrainer.Screens.Pages;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Panels;

/// <summary>The keys of the hands, the bench and the open page; all of them go on working.</summary>
internal sealed class KeysPanel(IPage page) : IPanel
{
    /// <inheritdoc/>
    public bool TakesText => false;

    /// <inheritdoc/>
    public bool IsDone => false;

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => 2;

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage) => KeyList.Draw(canvas, region, page.Name, page.Keys);

    /// <inheritdoc/>
    public bool Press(Key key) => false;

    /// <inheritdoc/>
    public bool Click(Region region, int column, int row) => false;

    /// <inheritdoc/>
    public void Close()
    {
    }
}
