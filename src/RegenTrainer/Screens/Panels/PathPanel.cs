using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Panels;

/// <summary>Asks for a path to save at.</summary>
internal sealed class PathPanel : IPanel
{
    private const int EntryRow = 3;

    private readonly string _words;
    private readonly Func<string, string> _take;
    private string _refusal = "";

    /// <summary>Asks.</summary>
    /// <param name="words">Why a path is asked for.</param>
    /// <param name="path">The path to begin with.</param>
    /// <param name="take">Takes a path; gives back why it cannot be, or nothing.</param>
    public PathPanel(string words, string path, Func<string, string> take)
    {
        (_words, _take) = (words, take);
        Entry = new Entry(path, region => new Region(region.Left, region.Top + EntryRow, region.Width, 1), _ => _refusal = "");
    }

    /// <inheritdoc/>
    public string Name => "save as";

    /// <inheritdoc/>
    public IReadOnlyList<(string Key, string Does)> Keys => [];

    /// <inheritdoc/>
    public Entry? Entry { get; }

    /// <inheritdoc/>
    public bool TakesText => true;

    /// <inheritdoc/>
    public bool IsDone { get; private set; }

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => 2;

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage)
    {
        canvas.Put(region.Left, region.Top, "save as", Ink.Heading, region.Right);
        canvas.Put(region.Left, region.Top + 1, _words, Ink.Text, region.Right);
        canvas.Put(region.Left, region.Top + EntryRow + 2, "Enter saves, Esc leaves everything as it is", Ink.Label, region.Right);
        canvas.PutWrapped(region with { Top = region.Top + EntryRow + 4, Height = 4 }, _refusal, Ink.Caution);
    }

    /// <inheritdoc/>
    public bool Press(Key key)
    {
        if (key != Key.Enter)
        {
            return false;
        }

        _refusal = _take(Entry!.Text);
        IsDone = _refusal.Length == 0;
        return true;
    }

    /// <inheritdoc/>
    public bool Click(Region region, int column, int row) => false;

    /// <inheritdoc/>
    public bool StepBack() => false;

    /// <inheritdoc/>
    public void Close()
    {
    }
}
