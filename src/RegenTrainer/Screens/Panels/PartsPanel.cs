using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Panels;

/// <summary>Every value of the design: to step, to type and to pick, with what each change does to the stage beside it.</summary>
internal sealed class PartsPanel : IPanel
{
    private const string Hint = "Enter edits  + - step  Delete default  Tab section  u undo  r redo  Esc closes";
    private const string TypingHint = "Enter takes it, Esc leaves it; an empty line is the default";
    private const string PickHint = "Enter takes it, Esc leaves it";

    private readonly Bench _bench;
    private readonly Workbench _workbench;
    private readonly CoilFigures _coil;
    private readonly IReadOnlyList<PartRow> _rows;
    private readonly Pick _place;
    private (Pick Place, string Heading, IReadOnlyList<string> Words, IReadOnlyList<string> Shown)? _pick;
    private string _refusal = "";
    private int? _faultAt;

    /// <summary>Opens it.</summary>
    /// <param name="bench">The bench.</param>
    /// <param name="workbench">The design.</param>
    /// <param name="responsePoints">Points of the response as it was before.</param>
    public PartsPanel(Bench bench, Workbench workbench, int responsePoints)
    {
        (_bench, _workbench, _coil) = (bench, workbench, new CoilFigures(workbench));
        _rows = PartRow.Of(workbench.Design.Family);
        _place = new Pick(_rows.Count, 1);
        bench.Before = bench.Stage.Snapshot(responsePoints);
    }

    /// <inheritdoc/>
    public string Name => "Parts";

    /// <inheritdoc/>
    public IReadOnlyList<(string Key, string Does)> Keys =>
        [("Enter", "type or pick; clicks too"), ("+ -", "step along the series"), ("Delete", "back to the default"), ("Tab", "next section")];

    /// <inheritdoc/>
    public Entry? Entry { get; private set; }

    /// <inheritdoc/>
    public bool TakesText => Entry is not null;

    /// <inheritdoc/>
    public bool IsDone => false;

    private Field Selected => _rows[_place.Selected].Field!;

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => PartsPage.PointsFor(region, glyphs);

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage)
    {
        _place.Show(PartsPage.ListRows(region));
        _pick?.Place.Show(PartsPage.Pick(region).Height);
        var picture = new PartsPicture(_rows, _place.Selected, _place.Top, _workbench.Design, _workbench.Document.Design, _coil.Now)
        {
            Pick = _pick is { } pick ? new PickPicture(pick.Heading, pick.Shown, pick.Place.Selected, pick.Place.Top) : null,
            Refusal = _refusal,
            FaultAt = _faultAt,
            Hint = Entry is not null ? TypingHint : _pick is not null ? PickHint : Hint,
        };
        PartsPage.Draw(canvas, region, picture, stage, _bench.Compared);
    }

    /// <inheritdoc/>
    public bool Press(Key key)
    {
        if (Entry is { } entry)
        {
            return key == Key.Enter && TakeTyped(entry);
        }

        if (_pick is { } pick)
        {
            return pick.Place.Move(key) || (key == Key.Enter && TakePicked(pick.Words[pick.Place.Selected]));
        }

        (_refusal, _faultAt) = ("", null);
        if (key == Key.Tab || key == Key.Tab.WithShift)
        {
            ToSection(forward: key == Key.Tab);
            return true;
        }

        int before = _place.Selected;
        if (_place.Move(key))
        {
            OffHeading(_place.Selected >= before ? 1 : -1);
            return true;
        }

        if (key == Key.Enter)
        {
            Edit();
            return true;
        }

        if (key == Key.Delete)
        {
            _workbench.TryChange(Selected.Key, null, out _refusal);
            return true;
        }

        int character = key.IsAlt || key.IsCtrl ? 0 : key.AsRune.Value;
        if (character is not ('+' or '-'))
        {
            return false;
        }

        _workbench.TryStep(Selected.Key, character == '+', out _refusal);
        return true;
    }

    /// <inheritdoc/>
    public bool Click(Region region, int column, int row)
    {
        if (_pick is { } pick && pick.Place.Click(PartsPage.Pick(region), column, row) is { } takes)
        {
            return !takes || TakePicked(pick.Words[pick.Place.Selected]);
        }

        int before = _place.Selected;
        if (_place.Click(PartsPage.List(region), column, row) is not { } again)
        {
            return false;
        }

        if (_rows[_place.Selected].Field is null)
        {
            _place.Selected = before;
            return false;
        }

        StepBack();
        if (again)
        {
            Edit();
        }

        return true;
    }

    /// <inheritdoc/>
    public bool StepBack()
    {
        bool open = Entry is not null || _pick is not null;
        (Entry, _pick, _refusal, _faultAt) = (null, null, "", null);
        return open;
    }

    /// <inheritdoc/>
    public void Close() => _bench.Before = null;

    private void Edit()
    {
        Field field = Selected;
        switch (field.Kind)
        {
            case FieldKind.Choice:
                OpenPick(field, field.Meaning, field.Choices, field.Choices);
                break;
            case FieldKind.Device:
                IReadOnlyList<string> names = _workbench.Devices(field.Key);
                OpenPick(
                    field,
                    DeviceFigures.Heading(field.Socket),
                    names,
                    [.. names.Select(name => _workbench.Device(name) is { } model ? DeviceFigures.Row(model) : name)]);
                break;
            case FieldKind.Pairs:
                _refusal = "a table of measured pairs is edited in the file";
                break;
            default:
                int index = _place.Selected;
                Entry = new Entry(_workbench.Typed(field.Key), region => PartsPage.Value(region, index - _place.Top), Check);
                break;
        }
    }

    private void OpenPick(Field field, string heading, IReadOnlyList<string> words, IReadOnlyList<string> shown)
    {
        if (words.Count == 0)
        {
            _refusal = "nothing on the shelf can stand here";
            return;
        }

        int now = words.ToList().FindIndex(word => string.Equals(word, _workbench.Design.WordOrNull(field.Key), StringComparison.OrdinalIgnoreCase));
        _pick = (new Pick(words.Count, Math.Max(0, now)), heading, words, shown);
    }

    private void Check(string text)
    {
        bool can = _workbench.CanType(Selected.Key, text, out int? character, out _refusal);
        _faultAt = can ? null : character - 1;
    }

    private bool TakeTyped(Entry entry)
    {
        if (_workbench.TryType(Selected.Key, entry.Text, out string refusal))
        {
            StepBack();
        }
        else
        {
            Check(entry.Text);
            _refusal = refusal;
        }

        return true;
    }

    private bool TakePicked(string word)
    {
        _pick = null;
        _workbench.TryChange(Selected.Key, FieldValue.Of(word), out _refusal);
        return true;
    }

    /// <summary>Goes to the first field of the next section, or back to that of this one or the one before.</summary>
    private void ToSection(bool forward)
    {
        int at = _place.Selected;
        int[] firsts = [.. Enumerable.Range(1, _rows.Count - 1).Where(k => _rows[k - 1].Field is null)];
        int first = forward ? firsts.FirstOrDefault(k => k > at, firsts[0]) : firsts.LastOrDefault(k => k < at, firsts[^1]);
        _place.SeeFrom(first - 1, first);
    }

    /// <summary>A heading is passed over; at the very top there is a heading and nothing above it.</summary>
    private void OffHeading(int direction)
    {
        if (_rows[_place.Selected].Field is null)
        {
            _place.Selected = _place.Selected == 0 ? 1 : _place.Selected + direction;
        }
    }
}
