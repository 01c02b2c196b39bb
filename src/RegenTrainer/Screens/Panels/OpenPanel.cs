using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Panels;

/// <summary>Asks which stage to open: a path is typed, or one of the list goes into the line.</summary>
internal sealed class OpenPanel : IPanel
{
    private const int EntryRow = 1;
    private const int ListTop = 3;
    private const int RowsBelow = 2;
    private const int WhereWidth = 11;

    private readonly IReadOnlyList<StageChoice> _choices;
    private readonly Func<string, string> _take;
    private readonly Pick _pick;
    private string _refusal = "";

    /// <summary>Asks.</summary>
    /// <param name="choices">The stages offered, 1 or more.</param>
    /// <param name="take">Opens a stage; gives back why it cannot be, or nothing.</param>
    public OpenPanel(IReadOnlyList<StageChoice> choices, Func<string, string> take)
    {
        (_choices, _take, _pick) = (choices, take, new Pick(choices.Count, -1));
        Entry = new Entry("", region => new Region(region.Left, region.Top + EntryRow, region.Width, 1), _ => _refusal = "");
    }

    /// <inheritdoc/>
    public string Name => "open";

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
        canvas.Put(region.Left, region.Top, "open a stage: type a path, or go down the list", Ink.Heading, region.Right);
        Region list = List(region);
        _pick.Show(list.Height);
        PickList.Draw(canvas, list, [.. _choices.Select(choice => Row(choice, list.Width))], _pick.Selected, _pick.Top);
        bool wrong = _refusal.Length > 0;
        canvas.PutWrapped(
            region with { Top = region.Bottom - RowsBelow, Height = RowsBelow },
            wrong ? _refusal : "Enter opens, Esc leaves everything as it is",
            wrong ? Ink.Caution : Ink.Label);
    }

    /// <inheritdoc/>
    public bool Press(Key key)
    {
        if (_pick.Move(key))
        {
            Fill();
            return true;
        }

        if (key != Key.Enter || Entry!.Text.AsSpan().Trim().IsEmpty)
        {
            return false;
        }

        _refusal = _take(Entry.Text.Trim());
        IsDone = _refusal.Length == 0;
        return true;
    }

    /// <inheritdoc/>
    public bool Click(Region region, int column, int row)
    {
        bool? again = _pick.Click(List(region), column, row);
        if (again is not null)
        {
            Fill();
        }

        return again == true ? Press(Key.Enter) : again is not null;
    }

    /// <inheritdoc/>
    public bool StepBack() => false;

    /// <inheritdoc/>
    public void Close()
    {
    }

    private static Region List(Region region) =>
        region with { Top = region.Top + ListTop, Height = region.Height - ListTop - RowsBelow };

    private static string Row(StageChoice choice, int width)
    {
        string title = choice.Title.Length > 0 ? "  " + choice.Title : "";
        int room = width - PickList.MarkWidth - WhereWidth - title.Length;
        string name = choice.Name.Length > room && room > 1 ? "\u2026" + choice.Name[^(room - 1)..] : choice.Name;
        return choice.Where.PadRight(WhereWidth) + name + title;
    }

    private void Fill()
    {
        Entry!.Text = _choices[_pick.Selected].Name;
        _refusal = "";
    }
}
