using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;
using RegenTrainer.Screens;
using RegenTrainer.Session;
using RegenTrainer.Session.Tests;
using Terminal.Gui.Drawing;
using Terminal.Gui.Input;
using Glyphs = RegenTrainer.Drawing.Glyphs;

namespace RegenTrainer.Tests.Screens;

[Collection(OneTerminal.Name)]
public sealed class BenchScreenTests : IDisposable
{
    private static readonly Theme _colour = Theme.Choose(_ => null);

    private readonly LiveStage _live = new(new MadeUpStage((60, true)), new Setting(1e6, 40));
    private readonly BenchScreen _screen;
    private readonly HeadlessTerminal _terminal;

    public BenchScreenTests()
    {
        _screen = new BenchScreen(new Bench(_live), Glyphs.Braille, _colour);
        _terminal = new HeadlessTerminal(_screen, _colour);
    }

    public void Dispose()
    {
        _terminal.Dispose();
        _screen.Dispose();
    }

    [Fact]
    public void Ten_rights_move_the_travel_by_five_percent_exactly()
    {
        _terminal.Press([.. Enumerable.Repeat(Key.CursorRight, 10)]);
        Assert.Equal(45.0, _live.Setting.TravelPercent);
        Assert.StartsWith(" 45.00 % ", _terminal.Rows[23], StringComparison.Ordinal);
    }

    public static TheoryData<string, double> TravelKeys => new()
    {
        { "Right", 40.5 },
        { "Left", 39.5 },
        { "Shift+Right", 40.05 },
        { "Shift+Left", 39.95 },
        { "Ctrl+Right", 45 },
        { "Ctrl+Left", 35 },
        { "Home", 0 },
        { "End", 100 },
        { "n", 39.95 },
        { "m", 40.05 },
        { "N", 35 },
        { "M", 45 },
        { "t", 57.96 },
    };

    [Theory]
    [MemberData(nameof(TravelKeys))]
    public void Keys_of_the_travel(string name, double expected)
    {
        _terminal.Press(name switch
        {
            "Right" => Key.CursorRight,
            "Left" => Key.CursorLeft,
            "Shift+Right" => Key.CursorRight.WithShift,
            "Shift+Left" => Key.CursorLeft.WithShift,
            "Ctrl+Right" => Key.CursorRight.WithCtrl,
            "Ctrl+Left" => Key.CursorLeft.WithCtrl,
            "Home" => Key.Home,
            "End" => Key.End,
            _ => (Key)name[0],
        });
        Assert.Equal(expected, _live.Setting.TravelPercent);
    }

    [Theory]
    [InlineData(".", 1010e3, 1010e3)]
    [InlineData(",", 990e3, 990e3)]
    [InlineData(">>", 1002e3, 1002e3)]
    [InlineData("<", 999e3, 999e3)]
    [InlineData("]", 1000e3, 1010e3)]
    [InlineData("[", 1000e3, 990e3)]
    [InlineData("}}}", 1000e3, 1003e3)]
    [InlineData("{.", 1010e3, 999e3)]
    [InlineData("{.=", 1010e3, 1010e3)]
    public void Keys_of_dial_and_station(string keys, double dialHz, double stationHz)
    {
        _terminal.Type(keys);
        Assert.Equal((dialHz, stationHz), (_live.Reading.Setting.DialHz, _live.Reading.Setting.StationHz));
    }

    [Fact]
    public void Keys_of_supply_temperature_grade_and_lock()
    {
        _terminal.Type("vvVcCCCdl");
        Setting setting = _live.Setting;
        Assert.Equal(
            (2.9, 22.0, Grade.Strong, DialMode.Locked),
            (setting.SupplyVolt, setting.TemperatureCelsius, setting.Grade, setting.DialMode));
        Assert.Contains("dial 1000 kHz locked", _terminal.Rows[0], StringComparison.Ordinal);
        Assert.Contains("BC547B strong 2.9 V 22 \u00b0C", _terminal.Rows[0], StringComparison.Ordinal);
    }

    [Fact]
    public void Question_mark_opens_the_keys_and_closes_them()
    {
        string page = _terminal.Text;
        _terminal.Type("?");
        Assert.Contains("0.3 dB below tip-over", _terminal.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("response", _terminal.Text, StringComparison.Ordinal);
        _terminal.Type("?");
        Assert.Equal(page, _terminal.Text);
    }

    [Fact]
    public void Esc_closes_what_is_open_and_never_quits()
    {
        string page = _terminal.Text;
        _terminal.Type("?");
        _terminal.Press(Key.Esc);
        Assert.Equal(page, _terminal.Text);
        _terminal.Press(Key.Esc, Key.Esc);
        Assert.False(_screen.StopRequested);
        Assert.Equal(page, _terminal.Text);
    }

    [Fact]
    public void The_strip_and_its_keys_stay_while_the_keys_are_open()
    {
        _terminal.Type("?");
        _terminal.Press(Key.CursorRight);
        Assert.StartsWith(" 40.50 % ", _terminal.Rows[23], StringComparison.Ordinal);
    }

    [Fact]
    public void Only_q_quits()
    {
        _terminal.Press(Key.C.WithCtrl, Key.Q.WithCtrl, Key.F10, Key.Tab, Key.Enter, Key.Q.WithShift, Key.D5);
        Assert.False(_screen.StopRequested);
        _terminal.Type("q");
        Assert.True(_screen.StopRequested);
    }

    [Fact]
    public void Wheel_and_drag_work_on_the_strip_alone()
    {
        _terminal.Move(10, 21, MouseFlags.WheeledUp);
        Assert.Equal(40.5, _live.Setting.TravelPercent);
        _terminal.Move(10, 10, MouseFlags.WheeledUp);
        _terminal.Move(10, 10, MouseFlags.LeftButtonPressed);
        _terminal.Move(10, 10, MouseFlags.LeftButtonReleased);
        Assert.Equal(40.5, _live.Setting.TravelPercent);
        _terminal.Move(0, 21, MouseFlags.LeftButtonPressed);
        Assert.Equal(0, _live.Setting.TravelPercent);
        _terminal.Move(79, 3, MouseFlags.LeftButtonPressed | MouseFlags.PositionReport);
        Assert.Equal(100, _live.Setting.TravelPercent);
        _terminal.Move(40, 3, MouseFlags.LeftButtonReleased);
        _terminal.Move(20, 3, MouseFlags.PositionReport);
        Assert.Equal(100, _live.Setting.TravelPercent);
    }

    [Fact]
    public void A_click_puts_the_marker_where_it_was()
    {
        for (int column = 0; column < 80; column += 13)
        {
            _terminal.Move(column, 21, MouseFlags.LeftButtonPressed);
            _terminal.Move(column, 21, MouseFlags.LeftButtonReleased);
            Assert.Equal("\u25b2", _terminal.CellAt(column, 22).Grapheme);
        }
    }

    [Fact]
    public void The_page_follows_the_size_of_the_terminal()
    {
        _terminal.Resize(140, 45);
        Assert.StartsWith(" at 40.00 % ", _terminal.Rows[44], StringComparison.Ordinal);
        _terminal.Resize(40, 10);
        Assert.Equal("needs 80x24, has 40x10", _terminal.Text.Trim());
        _terminal.Resize(80, 24);
        Assert.StartsWith(" 40.00 % ", _terminal.Rows[23], StringComparison.Ordinal);
    }

    [Fact]
    public void A_failed_solve_keeps_the_screen_alive()
    {
        var live = new LiveStage(new MadeUpStage((60, true)) { Failure = "no operating point: it did not settle" }, new Setting(1e6, 40));
        using var screen = new BenchScreen(new Bench(live), Glyphs.Braille, _colour);
        using var terminal = new HeadlessTerminal(screen, _colour);
        terminal.Type("t.vdl]=");
        terminal.Press(Key.CursorRight);
        Assert.Contains("no operating point", terminal.Text, StringComparison.Ordinal);
        Assert.StartsWith(" 40.50 % ", terminal.Rows[23], StringComparison.Ordinal);
    }

    [Fact]
    public void Colour_says_what_glyphs_say()
    {
        // Okabe and Ito's set: sky blue 56b4e9, bluish green 009e73, yellow f0e442, vermillion d55e00.
        Assert.Equal(new Color("#56b4e9"), ColourOf("working"));
        Assert.Equal(new Color("#d55e00"), ColourOf("oscillating"));
        Assert.Contains(AllCells(_terminal), cell => cell.Attribute!.Value.Foreground == new Color("#009e73"));
    }

    [Fact]
    public void NO_COLOR_carries_no_colour()
    {
        Theme mono = Theme.Choose(name => name == "NO_COLOR" ? "1" : null);
        using var screen = new BenchScreen(new Bench(_live), Glyphs.Braille, mono);
        using var terminal = new HeadlessTerminal(screen, mono);
        Assert.All(AllCells(terminal), cell => Assert.Equal((Color.None, Color.None), (cell.Attribute!.Value.Foreground, cell.Attribute.Value.Background)));
        Assert.Equal(_terminal.Text, terminal.Text);
    }

    private static IEnumerable<Cell> AllCells(HeadlessTerminal terminal) =>
        from row in Enumerable.Range(0, 24) from column in Enumerable.Range(0, 80) select terminal.CellAt(column, row);

    private Color ColourOf(string word) =>
        _terminal.CellAt(_terminal.Rows[21].IndexOf(word, StringComparison.Ordinal), 21).Attribute!.Value.Foreground;
}
