using RegenTrainer.Core.Stages;
using RegenTrainer.Screens;
using RegenTrainer.Session;
using RegenTrainer.Session.Tests;
using Terminal.Gui.Input;
using Glyphs = RegenTrainer.Drawing.Glyphs;

namespace RegenTrainer.Tests.Screens;

[Collection(OneTerminal.Name)]
public sealed class DialPageTests : IDisposable
{
    private static readonly Theme _theme = Theme.Choose(_ => null);

    private readonly LiveStage _live = new(new MadeUpStage((60, true)), new Setting(1e6, 40));
    private readonly BenchScreen _screen;
    private readonly HeadlessTerminal _terminal;

    public DialPageTests()
    {
        _screen = new BenchScreen(new Bench(_live), Glyphs.Braille, _theme);
        _terminal = new HeadlessTerminal(_screen, _theme);
        _terminal.Press(Key.D2);
        _terminal.PressUntil(() => _terminal.Text.Contains("tips over", StringComparison.Ordinal) && !_terminal.Text.Contains("...", StringComparison.Ordinal));
    }

    public void Dispose()
    {
        _terminal.Dispose();
        _screen.Dispose();
    }

    [Fact]
    public void Three_grades_are_told_apart_by_word_and_the_ends_out_of_reach_are_marked()
    {
        Assert.Contains(". . weak", _terminal.Text, StringComparison.Ordinal);
        Assert.Contains("─── typical", _terminal.Text, StringComparison.Ordinal);
        Assert.Contains("- - strong", _terminal.Text, StringComparison.Ordinal);
        Assert.Contains("× out of the capacitor's reach", _terminal.Text, StringComparison.Ordinal);
        Assert.Contains("cursor 990 kHz", _terminal.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_cursor_moves_and_enter_sets_the_dial_there()
    {
        _terminal.Press(Key.CursorUp, Key.CursorUp);
        Assert.Equal(1e6, _live.Setting.DialHz);
        _terminal.Press(Key.Enter);
        Assert.InRange(_live.Setting.DialHz, 1.02e6, 1.05e6);
        _terminal.Press(Key.PageDown, Key.PageDown, Key.PageDown, Key.PageDown, Key.PageDown, Key.PageDown, Key.PageDown);
        Assert.Contains("cursor 530 kHz", _terminal.Text, StringComparison.Ordinal);
        Assert.Contains("out of the capacitor's reach", _terminal.Text, StringComparison.Ordinal);
        _terminal.Press(Key.Enter);
        Assert.Equal(530e3, _live.Setting.DialHz, 1e-6);
    }

    [Fact]
    public void Tab_goes_through_the_figures_and_comes_back()
    {
        Assert.Contains("travel at tip-over", _terminal.Text, StringComparison.Ordinal);
        _terminal.Press(Key.Tab);
        Assert.Contains("effective Q at this travel", _terminal.Text, StringComparison.Ordinal);
        _terminal.Press(Key.Tab.WithShift);
        Assert.Contains("travel at tip-over", _terminal.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_strip_and_its_keys_go_on_working()
    {
        _terminal.Press(Key.CursorRight);
        Assert.Equal(40.5, _live.Setting.TravelPercent);
        Assert.Contains("40.50 %", _terminal.Rows[23], StringComparison.Ordinal);
    }

    [Fact]
    public void A_click_puts_the_cursor_there_and_a_second_sets_the_dial()
    {
        _terminal.Move(20, 10, MouseFlags.LeftButtonPressed);
        _terminal.Move(20, 10, MouseFlags.LeftButtonReleased);
        Assert.Equal(1e6, _live.Setting.DialHz);
        _terminal.Move(20, 10, MouseFlags.LeftButtonPressed);
        Assert.InRange(_live.Setting.DialHz, 700e3, 1e6);
        Assert.NotEqual(1e6, _live.Setting.DialHz);
    }

    [Fact]
    public void What_is_pinned_stays_dotted_with_the_differences()
    {
        _terminal.Press((Key)'p', Key.CursorRight, Key.CursorRight);
        _terminal.PressUntil(() => _terminal.Text.Contains("typical against pinned", StringComparison.Ordinal));
        Assert.Contains(". . pinned", _terminal.Text, StringComparison.Ordinal);
        Assert.Contains("pinned: Made-up stage at 40 %, 1000 kHz", _terminal.Rows[1], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(80, 24)]
    [InlineData(100, 30)]
    [InlineData(140, 45)]
    public void Every_figure_fits_every_size(int columns, int rows)
    {
        _terminal.Resize(columns, rows);
        for (int k = 0; k < 6; k++)
        {
            _terminal.Press(Key.Tab);
            Assert.All(_terminal.Rows, row => Assert.True(row.Length <= columns));
            Assert.Contains("1 Stage", _terminal.Rows[1], StringComparison.Ordinal);
        }
    }
}
