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
    private readonly PanelStack _panels = new();
    private readonly EntryField _field;
    private readonly FileDesk? _desk;
    private IPage _page;

    public BenchScreen(Bench bench, Glyphs glyphs, Theme theme)
    {
        (_bench, _glyphs, _theme) = (bench, glyphs, theme);
        _pages = [new StageView(bench), new DialView(bench), new SidebandsView(bench), new BiasView(bench)];
        _page = _pages[0];
        (Width, Height, CanFocus) = (Dim.Fill(), Dim.Fill(), true);
        MousePositionTracking = false;
        _field = new EntryField(Pressed, () => Middle, theme);
        Add(_field);
        if (bench.Workbench is { } workbench)
        {
            _desk = new FileDesk(workbench, _panels, bench.Tell, RequestStop);
            _desk.OfferRecovery();
        }
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
            if (_panels.Top is { } panel)
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

        return Pressed(key);
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
            Refresh();
        }

        return taken;
    }

    /// <inheritdoc/>
    protected override void Dispose(bool disposing)
    {
        if (disposing)
        {
            _panels.CloseAll();
            foreach (IDisposable page in _pages.OfType<IDisposable>())
            {
                page.Dispose();
            }
        }

        base.Dispose(disposing);
    }

    /// <summary>Takes a key, whatever it means.</summary>
    private bool Pressed(Key key)
    {
        _bench.PutAway(lasting: key == Key.Esc && _panels.Top is null);
        Press(key);
        Refresh();
        return true;
    }

    private bool Press(Key key)
    {
        if (key == Key.Esc)
        {
            return _panels.StepBack();
        }

        if (_panels.Top is { } panel)
        {
            bool taken = panel.Press(key);
            _panels.CloseDone();
            if (taken || panel.TakesText)
            {
                return true;
            }
        }

        int character = key.IsAlt || key.IsCtrl ? 0 : key.AsRune.Value;
        if (BenchKey(character))
        {
            return true;
        }

        if (Array.Find(_pages, page => page.Digit == character) is { } asked)
        {
            Show(asked);
            return true;
        }

        return (_panels.Top is null && _page.Press(key)) || StageKeys.Press(_bench.Stage, key);
    }

    /// <summary>Does what a key of the bench means; false where it means nothing there.</summary>
    private bool BenchKey(int character)
    {
        Action? action = character switch
        {
            '?' => ToggleKeys,
            'q' => _desk is null ? RequestStop : _desk.Quit,
            'p' => () => _bench.TogglePin(_pages[0].ResponsePoints(Middle, _glyphs)),
            'e' when _bench.Workbench is { } workbench => () => ToggleParts(workbench),
            'u' => () => _bench.Undo(redo: false),
            'r' => () => _bench.Undo(redo: true),
            'w' => _desk is null ? null : _desk.Save,
            'W' => _desk is null ? null : _desk.SaveAs,
            'o' => _desk is null ? null : _desk.Open,
            _ => null,
        };
        action?.Invoke();
        return action is not null;
    }

    private void ToggleKeys()
    {
        if (_panels.Top is KeysPanel keys)
        {
            _panels.Close(keys);
            return;
        }

        _panels.Open(_panels.Top is { } panel ? new KeysPanel(panel.Name, panel.Keys) : new KeysPanel(_page.Name, _page.Keys));
    }

    private void ToggleParts(Workbench workbench)
    {
        bool open = _panels.Top is PartsPanel;
        _panels.CloseAll();
        if (!open)
        {
            _panels.Open(new PartsPanel(_bench, workbench, _pages[0].ResponsePoints(Middle, _glyphs)));
        }
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
        Region middle = Middle;
        bool inMiddle = row >= middle.Top && row < middle.Bottom;
        if (inMiddle && (mouse.Flags.HasFlag(MouseFlags.WheeledUp) || mouse.Flags.HasFlag(MouseFlags.WheeledDown)))
        {
            Key step = mouse.Flags.HasFlag(MouseFlags.WheeledUp) ? Key.CursorUp : Key.CursorDown;
            return _panels.Top?.Press(step) ?? _page.Press(step);
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

        bool taken = _panels.Top?.Click(middle, column, row) ?? _page.Click(middle, column, row);
        _panels.CloseDone();
        return taken;
    }

    private void Show(IPage page)
    {
        _panels.CloseAll();
        _page = page;
    }

    /// <summary>Shows what has changed, and the line that is open for typing, if one is.</summary>
    private void Refresh()
    {
        _field.Show(_panels.Top?.Entry);
        SetNeedsDraw();
    }

    private Region Middle => BenchFrame.Middle(Viewport.Width, Viewport.Height);

    private int ResponsePoints(Region middle) => _panels.Top?.ResponsePoints(middle, _glyphs) ?? _page.ResponsePoints(middle, _glyphs);

    private PageTab[] Tabs() => [.. _pages.Select(page => new PageTab(page.Digit, page.Name, page == _page))];

    private void OnIteration(object? sender, EventArgs<IApplication?> e)
    {
        if (_page.Poll() | _bench.Tick())
        {
            SetNeedsDraw();
        }
    }
}
