using System.Drawing;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Drawing;
using RegenTrainer.Screens;
using Terminal.Gui.Input;
using Terminal.Gui.Testing;
using Glyphs = RegenTrainer.Drawing.Glyphs;

namespace RegenTrainer.Tests.Screens;

/// <summary>
/// Keys, typed characters, mouse events and resizes at random, repeatable from a seed; of the keys only those that lead to writing files or
/// end the program are left out.
/// </summary>
internal sealed class RandomHands : IDisposable
{
    private const int LeastColumns = 60;
    private const int MostColumns = 170;
    private const int LeastRows = 15;
    private const int MostRows = 55;

    /// <summary>Frames after which memory should no longer grow.</summary>
    private const int WarmUp = 100;

    private static readonly Key[] _keys =
    [
        Key.CursorLeft, Key.CursorRight, Key.CursorUp, Key.CursorDown, Key.PageUp, Key.PageDown, Key.Home, Key.End, Key.Tab, Key.Tab.WithShift,
        Key.Enter, Key.Esc, Key.Delete, Key.Backspace, Key.CursorLeft.WithShift, Key.CursorRight.WithCtrl, Key.Space,
    ];

    private static readonly MouseFlags[] _buttons =
    [
        MouseFlags.LeftButtonPressed, MouseFlags.LeftButtonReleased, MouseFlags.WheeledUp, MouseFlags.WheeledDown, MouseFlags.RightButtonPressed,
        MouseFlags.LeftButtonPressed | MouseFlags.PositionReport,
    ];

    private const string Characters = "12381238epp?ttnmNM,.<>[]{}=vVcCdlurr+-0.5k";

    private readonly BenchScreen _screen;
    private readonly HeadlessTerminal _terminal;
    private ulong _state;
    private int _columns = 80;
    private int _rows = 24;

    /// <summary>Sits down before a bench.</summary>
    public RandomHands(Bench bench, ulong seed)
    {
        Theme theme = Theme.Choose(_ => null);
        _screen = new BenchScreen(bench, Glyphs.Braille, theme);
        _terminal = new HeadlessTerminal(_screen, theme);
        _state = seed;
    }

    /// <summary>Frames drawn.</summary>
    public int Frames { get; private set; }

    /// <summary>Bytes in use after the last frame beyond those after the first frames.</summary>
    public long GrowthBytes { get; private set; }

    /// <summary>Does so many things, and looks at every frame.</summary>
    /// <exception cref="InvalidOperationException">A frame is beyond the width, or the foot of the screen is missing.</exception>
    public void Run(int events, int eventsPerFrame)
    {
        long first = 0;
        for (int k = 0; k < events; k++)
        {
            Act();
            if ((k + 1) % eventsPerFrame != 0)
            {
                continue;
            }

            _terminal.Iterate();
            Look();
            if (++Frames == WarmUp)
            {
                first = GC.GetTotalMemory(forceFullCollection: true);
            }
        }

        GrowthBytes = GC.GetTotalMemory(forceFullCollection: true) - first;
    }

    public void Dispose()
    {
        _terminal.Dispose();
        _screen.Dispose();
    }

    private void Act()
    {
        switch (Next(20))
        {
            case 0:
                (_columns, _rows) = (LeastColumns + Next(MostColumns - LeastColumns), LeastRows + Next(MostRows - LeastRows));
                _terminal.App.Driver!.SetScreenSize(_columns, _rows);
                break;
            case < 5:
                _terminal.App.InjectMouse(new Mouse { ScreenPosition = new Point(Next(_columns), Next(_rows)), Flags = _buttons[Next(_buttons.Length)] });
                break;
            case < 12:
                _terminal.App.InjectKey(_keys[Next(_keys.Length)]);
                break;
            default:
                _terminal.App.InjectKey((Key)Characters[Next(Characters.Length)]);
                break;
        }
    }

    private void Look()
    {
        IReadOnlyList<string> rows = _terminal.Rows;
        if (rows.FirstOrDefault(row => Printable.Width(row) > _columns) is { } wide)
        {
            throw new InvalidOperationException($"beyond {_columns} columns: {wide}");
        }

        string expected = BenchFrame.Fits(_columns, _rows) ? "1 Stage" : "needs";
        if (!_terminal.Text.Contains(expected, StringComparison.Ordinal))
        {
            throw new InvalidOperationException($"no \"{expected}\" at {_columns}x{_rows}:\n{_terminal.Text}");
        }
    }

    /// <summary>A number from 0 to below a limit: xorshift64 [Marsaglia 2003].</summary>
    private int Next(int limit)
    {
        _state ^= _state << 13;
        _state ^= _state >> 7;
        _state ^= _state << 17;
        return (int)(_state % (ulong)limit);
    }
}
