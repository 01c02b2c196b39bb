using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Panels;

/// <summary>The keys of the hands, the bench and what is open beneath; all of them go on working.</summary>
/// <param name="heading">What is open beneath.</param>
/// <param name="keys">Its own keys.</param>
internal sealed class KeysPanel(string heading, IReadOnlyList<(string Key, string Does)> keys) : IPanel
{
    /// <inheritdoc/>
    public string Name => "keys";

    /// <inheritdoc/>
    public IReadOnlyList<(string Key, string Does)> Keys => keys;

    /// <inheritdoc/>
    public Entry? Entry => null;

    /// <inheritdoc/>
    public bool TakesText => false;

    /// <inheritdoc/>
    public bool IsDone => false;

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => 2;

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage) => KeyList.Draw(canvas, region, heading, keys);

    /// <inheritdoc/>
    public bool Press(Key key) => false;

    /// <inheritdoc/>
    public bool Click(Region region, int column, int row) => false;

    /// <inheritdoc/>
    public bool StepBack() => false;

    /// <inheritdoc/>
    public void Close()
    {
    }
}
