using RegenTrainer.Drawing;
using RegenTrainer.Screens.Pages;
using RegenTrainer.Screens.Panels;
using RegenTrainer.Session;
using Terminal.Gui.App;
using Terminal.Gui.Input;
using Terminal.Gui.ViewBase;
using Terminal.Gui.Views;
using Glyphs = RegenTrainer.Drawing.Glyphs;

namespace RegenTrainer.Screens;

/// <summary>The full screen: hands keys and mouse to the open panel, the open page and the stage, and copies what is drawn to the terminal.</summary>
internal sealed class BenchScreen : Runnable
{
    private const int WheelThousandths = Steps.ThousandthsInPercent / 2;

    /// <summary>A drag sets the travel in these steps: finer than a column of any screen.</summary>
    private const double DragPercent = 0.1;

    private const int TabRow = 1;

    private readonly Bench _bench;
    private readonly Glyphs _glyphs;
    private readonly Theme _theme;
    private readonly IPage[] _pages;
    private IPage _page;
    private IPanel? _panel;

    public BenchScreen(Bench bench, Glyphs glyphs, Theme theme)
    {
        (_bench, _glyphs, _theme) = (bench, glyphs, theme);
        _pages = [new StageView(bench), new DialView(bench), new SidebandsView(bench), new BiasView(bench)];
        _page = _pages[0];
        (Width, Height, CanFocus) = (Dim.Fill(), Dim.Fill(), true);
        MousePositionTracking = false;
    }

    /// <inheritdoc/>
    protected override void OnIsRunningChanged(bool newIsRunning)
    {
        base.OnIsRunningChanged(newIsRunning);
        if (App is { } app)
        {
            app.Iteration -= OnIteration;
            if (newIsRunning)
            {
                app.Iteration += OnIteration;
            }
        }
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

        var canvas = new Canvas(width, height, _glyphs);
        if (BenchFrame.Fits(width, height))
        {
            Region middle = BenchFrame.Middle(width, height);
            StageSnapshot stage = _bench.Stage.Snapshot(ResponsePoints(middle));
            BenchFrame.Draw(canvas, stage, Tabs(), _bench.Words);
            if (_panel is { } panel)
            {
                panel.Draw(canvas, middle, stage);
            }
            else
            {
                _page.Draw(canvas, middle, stage);
            }
        }
        else
        {
            BenchFrame.DrawTooSmall(canvas);
        }

        CanvasCopy.Copy(this, canvas, _theme);
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

        if (Press(key))
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

        bool taken = held || at.Y >= BenchFrame.StripTop(Viewport.Height) ? OnStrip(mouse, at.X, held) : OnPage(mouse, at.X, at.Y);
        if (taken)
        {
            SetNeedsDraw();
        }

        return taken;
    }

    /// <inheritdoc/>
    protected override void Dispose(bool disposing)
    {
        if (disposing)
        {
            Open(null);
            foreach (IDisposable page in _pages.OfType<IDisposable>())
            {
                page.Dispose();
            }
        }

        base.Dispose(disposing);
    }

    private bool Press(Key key)
    {
        if (key == Key.Esc)
        {
            Open(null);
            return true;
        }

        if (_panel is { } panel)
        {
            bool taken = panel.Press(key);
            if (panel.IsDone)
            {
                Open(null);
            }

            if (taken || panel.TakesText)
            {
                return true;
            }
        }

        int character = key.IsAlt || key.IsCtrl ? 0 : key.AsRune.Value;
        if (character == '?')
        {
            Open(_panel is KeysPanel ? null : new KeysPanel(_page));
            return true;
        }

        if (character == 'q')
        {
            RequestStop();
            return true;
        }

        if (Array.Find(_pages, page => page.Digit == character) is { } asked)
        {
            Show(asked);
            return true;
        }

        if (character == 'p')
        {
            _bench.TogglePin(_pages[0].ResponsePoints(BenchFrame.Middle(Viewport.Width, Viewport.Height), _glyphs));
            return true;
        }

        return (_panel is null && _page.Press(key)) || StageKeys.Press(_bench.Stage, key);
    }

    private bool OnStrip(Mouse mouse, int column, bool held)
    {
        if (mouse.Flags.HasFlag(MouseFlags.WheeledUp) || mouse.Flags.HasFlag(MouseFlags.WheeledDown))
        {
            _bench.Stage.TurnControl(mouse.Flags.HasFlag(MouseFlags.WheeledUp) ? WheelThousandths : -WheelThousandths);
            return true;
        }

        if (!mouse.Flags.HasFlag(MouseFlags.LeftButtonPressed))
        {
            return false;
        }

        if (!held)
        {
            App!.Mouse.GrabMouse(this);
        }

        _bench.Stage.SetTravel(Math.Round(RegenerationStrip.TravelAt(column, Viewport.Width) / DragPercent) * DragPercent);
        return true;
    }

    private bool OnPage(Mouse mouse, int column, int row)
    {
        Region middle = BenchFrame.Middle(Viewport.Width, Viewport.Height);
        bool inMiddle = row >= middle.Top && row < middle.Bottom;
        if (inMiddle && (mouse.Flags.HasFlag(MouseFlags.WheeledUp) || mouse.Flags.HasFlag(MouseFlags.WheeledDown)))
        {
            Key step = mouse.Flags.HasFlag(MouseFlags.WheeledUp) ? Key.CursorUp : Key.CursorDown;
            return _panel?.Press(step) ?? _page.Press(step);
        }

        if (!mouse.Flags.HasFlag(MouseFlags.LeftButtonPressed))
        {
            return false;
        }

        if (row == TabRow && PageHead.PageAt(Tabs(), column) is >= 0 and var index)
        {
            Show(_pages[index]);
            return true;
        }

        if (!inMiddle)
        {
            return false;
        }

        bool taken = _panel?.Click(middle, column, row) ?? _page.Click(middle, column, row);
        if (_panel is { IsDone: true })
        {
            Open(null);
        }

        return taken;
    }

    private void Show(IPage page)
    {
        Open(null);
        _page = page;
    }

    private void Open(IPanel? panel)
    {
        _panel?.Close();
        _panel = panel;
    }

    private int ResponsePoints(Region middle) => _panel?.ResponsePoints(middle, _glyphs) ?? _page.ResponsePoints(middle, _glyphs);

    private PageTab[] Tabs() => [.. _pages.Select(page => new PageTab(page.Digit, page.Name, page == _page))];

    private void OnIteration(object? sender, EventArgs<IApplication?> e)
    {
        if (_page.Poll())
        {
            SetNeedsDraw();
        }
    }
}
