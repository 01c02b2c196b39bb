using System.Drawing;
using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Drawing;
using Terminal.Gui.Input;
using Terminal.Gui.ViewBase;
using Terminal.Gui.Views;
using Attribute = Terminal.Gui.Drawing.Attribute;
using Glyphs = RegenTrainer.Drawing.Glyphs;

namespace RegenTrainer.Screens;

/// <summary>The full screen of one stage: hands keys and mouse to it and copies what is drawn to the terminal.</summary>
internal sealed class StageScreen : Runnable
{
    private const int WheelThousandths = Steps.ThousandthsInPercent / 2;

    /// <summary>A drag sets the travel in these steps: finer than a column of any screen.</summary>
    private const double DragPercent = 0.1;

    private readonly LiveStage _stage;
    private readonly Glyphs _glyphs;
    private readonly Theme _theme;
    private bool _keysOpen;

    public StageScreen(LiveStage stage, Glyphs glyphs, Theme theme)
    {
        (_stage, _glyphs, _theme) = (stage, glyphs, theme);
        (Width, Height, CanFocus) = (Dim.Fill(), Dim.Fill(), true);
        MousePositionTracking = false;
    }

    /// <summary>Every cell is written below, so that nothing need be cleared first.</summary>
    protected override bool OnClearingViewport() => true;

    /// <inheritdoc/>
    protected override bool OnDrawingContent(DrawContext? context)
    {
        (int width, int height) = (Viewport.Width, Viewport.Height);
        if (width <= 0 || height <= 0)
        {
            return true;
        }

        StageSnapshot snapshot = _stage.Snapshot(StagePage.PointsFor(width, height, _glyphs));
        Copy(StagePage.Draw(snapshot, width, height, _glyphs, _keysOpen));
        return true;
    }

    /// <summary>
    /// Takes every key but suspend: the library's own bindings would end the program on Esc, and its settings could bind others.
    /// </summary>
    protected override bool OnKeyDown(Key key)
    {
        if (key == Key.Z.WithCtrl)
        {
            return false;
        }

        if (key == Key.Esc || key.AsRune.Value == '?')
        {
            _keysOpen = key != Key.Esc && !_keysOpen;
            SetNeedsDraw();
        }
        else if (key.AsRune.Value == 'q' && !key.IsAlt && !key.IsCtrl)
        {
            RequestStop();
        }
        else if (StageKeys.Press(_stage, key))
        {
            SetNeedsDraw();
        }

        return true;
    }

    /// <inheritdoc/>
    protected override bool OnMouseEvent(Mouse mouse)
    {
        if (mouse.Position is not { } at || App is null)
        {
            return false;
        }

        bool held = App.Mouse.IsGrabbed(this);
        if (mouse.Flags.HasFlag(MouseFlags.LeftButtonReleased) && held)
        {
            App.Mouse.UngrabMouse();
            return true;
        }

        if (!held && at.Y < StagePage.StripTop(Viewport.Height))
        {
            return false;
        }

        if (mouse.Flags.HasFlag(MouseFlags.WheeledUp) || mouse.Flags.HasFlag(MouseFlags.WheeledDown))
        {
            _stage.TurnControl(mouse.Flags.HasFlag(MouseFlags.WheeledUp) ? WheelThousandths : -WheelThousandths);
        }
        else if (mouse.Flags.HasFlag(MouseFlags.LeftButtonPressed))
        {
            if (!held)
            {
                App.Mouse.GrabMouse(this);
            }

            _stage.SetTravel(Math.Round(RegenerationStrip.TravelAt(at.X, Viewport.Width) / DragPercent) * DragPercent);
        }
        else
        {
            return false;
        }

        SetNeedsDraw();
        return true;
    }

    /// <summary>Writes only cells that differ into the terminal's buffer, within what other views leave free.</summary>
    private void Copy(Canvas canvas)
    {
        if (App?.Driver is not { Contents: { } cells, Clip: { } clip } driver)
        {
            return;
        }

        bool[] dirty = driver.GetOutputBuffer().DirtyLines;
        Point origin = ViewportToScreen(new Point(0, 0));
        var mine = new Rectangle(origin.X, origin.Y, canvas.Width, canvas.Height);
        foreach (Rectangle free in clip.GetRectangles())
        {
            Rectangle area = Rectangle.Intersect(Rectangle.Intersect(mine, free), new Rectangle(0, 0, cells.GetLength(1), cells.GetLength(0)));
            for (int row = area.Top; row < area.Bottom; row++)
            {
                for (int column = area.Left; column < area.Right; column++)
                {
                    DrawnCell drawn = canvas[column - origin.X, row - origin.Y];
                    Attribute attribute = _theme.Of(drawn.Ink);
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
