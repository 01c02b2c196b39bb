using RegenTrainer.Drawing;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Panels;

/// <summary>A list to pick from: which entry is selected and which are seen.</summary>
/// <param name="count">Entries, 1 or more.</param>
/// <param name="selected">The entry selected first; -1 for none.</param>
internal sealed class Pick(int count, int selected)
{
    private int _rows = 1;

    /// <summary>The selected entry; -1 where none is.</summary>
    public int Selected { get; set; } = selected;

    /// <summary>The first entry to be seen.</summary>
    public int Top { get; private set; }

    /// <summary>Makes the selected entry one of those that are seen.</summary>
    /// <param name="rows">Rows there are.</param>
    public void Show(int rows)
    {
        _rows = Math.Max(1, rows);
        Top = PickList.Top(Top, Math.Max(0, Selected), count, _rows);
    }

    /// <summary>Selects an entry and has the list seen from another on, as far as it reaches.</summary>
    public void SeeFrom(int top, int selected) => (Top, Selected) = (top, selected);

    /// <summary>Moves with Up, Down, PageUp and PageDown; false for any other key.</summary>
    public bool Move(Key key)
    {
        int? by = key == Key.CursorUp ? -1 : key == Key.CursorDown ? 1 : key == Key.PageUp ? -_rows : key == Key.PageDown ? _rows : null;
        if (by is not { } step)
        {
            return false;
        }

        Selected = Math.Clamp(Selected + step, 0, count - 1);
        return true;
    }

    /// <summary>Selects the entry of a cell.</summary>
    /// <returns>Whether it was selected before: then the click takes it. Null where the cell has none.</returns>
    public bool? Click(Region list, int column, int row)
    {
        if (PickList.At(list, Top, count, column, row) is not { } index)
        {
            return null;
        }

        bool again = Selected == index;
        Selected = index;
        return again;
    }
}
