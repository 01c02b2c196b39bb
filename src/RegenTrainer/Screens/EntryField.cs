using Terminal.Gui.Drawing;
using Terminal.Gui.Input;
using Terminal.Gui.ViewBase;
using Terminal.Gui.Views;
using Attribute = Terminal.Gui.Drawing.Attribute;
using Region = RegenTrainer.Drawing.Region;

namespace RegenTrainer.Screens;

/// <summary>The text field of the screen: shows the line that is open over a panel, and is not there otherwise.</summary>
internal sealed class EntryField : TextField
{
    private static readonly Key[] _others =
        [Key.Enter, Key.Esc, Key.CursorUp, Key.CursorDown, Key.PageUp, Key.PageDown, Key.Tab, Key.Tab.WithShift];

    private readonly Func<Key, bool> _press;
    private readonly Func<Region> _panel;
    private readonly Attribute _text;
    private readonly Attribute _selected;
    private Entry? _entry;
    private bool _showing;

    /// <summary>Makes the field, not shown.</summary>
    /// <param name="press">Takes keys that are not text.</param>
    /// <param name="panel">The region of panels now.</param>
    /// <param name="theme">Colours.</param>
    public EntryField(Func<Key, bool> press, Func<Region> panel, Theme theme)
    {
        (_press, _panel) = (press, panel);
        _text = theme.Typed(selected: false);
        _selected = theme.Typed(selected: true);
        (Visible, CanFocus, Height) = (false, true, 1);
        X = Pos.Func(_ => Place.Left);
        Y = Pos.Func(_ => Place.Top);
        Width = Dim.Func(_ => Place.Width);
        ValueChanged += (_, _) =>
        {
            if (!_showing)
            {
                _entry?.Type(Text);
                SuperView?.SetNeedsDraw();
            }
        };
    }

    private Region Place => _entry?.Place(_panel()) ?? new Region(0, 0, 1, 1);

    /// <summary>Shows a line, or none.</summary>
    public void Show(Entry? entry)
    {
        if (entry == _entry && (entry is null || entry.Text == Text))
        {
            return;
        }

        bool opens = entry != _entry;
        (_entry, _showing) = (entry, true);
        Text = entry?.Text ?? "";
        ClearHistoryChanges();
        _showing = false;
        Visible = entry is not null;
        if (entry is null)
        {
            SuperView?.SetFocus();
        }
        else
        {
            SetNeedsLayout();
            SetFocus();
            MoveEnd();
            if (opens)
            {
                SelectAll();
            }
        }

        SuperView?.SetNeedsDraw();
    }

    /// <summary>What moves in lists, takes and leaves is the panel's; the rest is text. The library's own menu stays closed.</summary>
    protected override bool OnKeyDown(Key key) =>
        Array.IndexOf(_others, key) >= 0 ? _press(key) : key == Key.F10.WithShift || base.OnKeyDown(key);

    /// <inheritdoc/>
    protected override bool OnMouseEvent(Mouse mouse) =>
        (mouse.Flags & (MouseFlags.RightButtonPressed | MouseFlags.RightButtonReleased | MouseFlags.RightButtonClicked)) != MouseFlags.None || base.OnMouseEvent(mouse);

    /// <inheritdoc/>
    protected override bool OnGettingAttributeForRole(in VisualRole role, ref Attribute currentAttribute)
    {
        currentAttribute = role is VisualRole.Highlight or VisualRole.Active or VisualRole.HotActive ? _selected : _text;
        return true;
    }
}
