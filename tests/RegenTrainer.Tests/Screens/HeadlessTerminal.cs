using System.Drawing;
using System.Runtime.CompilerServices;
using RegenTrainer.Screens;
using Terminal.Gui.App;
using Terminal.Gui.Drawing;
using Terminal.Gui.Drivers;
using Terminal.Gui.Input;
using Terminal.Gui.Testing;
using Terminal.Gui.Time;

namespace RegenTrainer.Tests.Screens;

/// <summary>A terminal without one: keys and mouse are handed in, what would be shown is read back.</summary>
internal sealed class HeadlessTerminal : IDisposable
{
    private readonly SessionToken _session;

    public HeadlessTerminal(IRunnable top, Theme theme, int columns = 80, int rows = 24)
    {
        theme.Publish();
        App = Application.Create(new VirtualTimeProvider()).Init(DriverRegistry.Names.ANSI);
        App.Driver!.SetScreenSize(columns, rows);
        _session = App.Begin(top)!;
        Show();
    }

    public IApplication App { get; }

    public IReadOnlyList<string> Rows => [.. App.Driver!.ToString()!.Split('\n').Select(row => row.TrimEnd())];

    public string Text => string.Join('\n', Rows);

    /// <summary>The library looks at this variable once, before its first use.</summary>
    [ModuleInitializer]
    internal static void WithoutRealTerminal() => Environment.SetEnvironmentVariable("DisableRealDriverIO", "1");

    public Cell CellAt(int column, int row) => App.Driver!.Contents![row, column];

    public void Press(params Key[] keys)
    {
        foreach (Key key in keys)
        {
            App.InjectKey(key);
        }

        Show();
    }

    /// <summary>Lets iterations of the screen's loop pass until something shows, at most some seconds.</summary>
    public void PressUntil(Func<bool> shown)
    {
        bool there = SpinWait.SpinUntil(
            () =>
            {
                Iterate();
                return shown();
            },
            TimeSpan.FromSeconds(20));
        if (!there)
        {
            throw new TimeoutException("it never showed:\n" + Text);
        }
    }

    /// <summary>One iteration of the screen's loop without keys.</summary>
    public void Iterate()
    {
        App.RaiseIteration();
        Show();
    }

    public void Type(string text) => Press([.. text.Select(character => (Key)character)]);

    public void Move(int column, int row, MouseFlags flags)
    {
        App.InjectMouse(new Mouse { ScreenPosition = new Point(column, row), Flags = flags });
        Show();
    }

    public void Resize(int columns, int rows)
    {
        App.Driver!.SetScreenSize(columns, rows);
        Show();
    }

    public void Dispose()
    {
        if (_session.Runnable is not null)
        {
            App.End(_session);
        }

        App.Dispose();
    }

    private void Show()
    {
        App.TimedEvents!.RunTimers();
        App.LayoutAndDraw();
    }
}
