using System.Drawing;
using RegenTrainer.Drawing;
using Terminal.Gui.Drawing;
using Terminal.Gui.ViewBase;
using Attribute = Terminal.Gui.Drawing.Attribute;

namespace RegenTrainer.Screens;

/// <summary>Brings what is drawn to the terminal.</summary>
internal static class CanvasCopy
{
    /// <summary>Writes only cells that differ into the terminal's buffer, within what other views leave free.</summary>
    public static void Copy(View view, Canvas canvas, Theme theme)
    {
        if (view.App?.Driver is not { Contents: { } cells, Clip: { } clip } driver)
        {
            return;
        }

        bool[] dirty = driver.GetOutputBuffer().DirtyLines;
        Point origin = view.ViewportToScreen(new Point(0, 0));
        var mine = new Rectangle(origin.X, origin.Y, canvas.Width, canvas.Height);
        foreach (Rectangle free in clip.GetRectangles())
        {
            Rectangle area = Rectangle.Intersect(Rectangle.Intersect(mine, free), new Rectangle(0, 0, cells.GetLength(1), cells.GetLength(0)));
            for (int row = area.Top; row < area.Bottom; row++)
            {
                for (int column = area.Left; column < area.Right; column++)
                {
                    DrawnCell drawn = canvas[column - origin.X, row - origin.Y];
                    Attribute attribute = theme.Of(drawn.Ink);
                    ref Cell cell = ref cells[row, column];
                    if (cell.Grapheme != drawn.Grapheme || cell.Attribute != attribute)
                    {
                        (cell.Grapheme, cell.Attribute, cell.IsDirty, dirty[row]) = (drawn.Grapheme, attribute, true, true);
                    }
                }
            }
        }
    }
}
