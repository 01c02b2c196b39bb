using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Screens;
using RegenTrainer.Session;
using Terminal.Gui.Input;
using Glyphs = RegenTrainer.Drawing.Glyphs;

namespace RegenTrainer.Tests.Screens;

[Collection(OneTerminal.Name)]
public sealed class SidebandsPageTests : IDisposable
{
    private static readonly Theme _theme = Theme.Choose(_ => null);

    private readonly LiveStage _live = new(
        new StageSolver(StageModel.Compile(Presets.Read(Presets.Default)), [400, 1000, 3000]), new Setting(1e6, 55));

    private readonly BenchScreen _screen;
    private readonly HeadlessTerminal _terminal;

    public SidebandsPageTests()
    {
        _screen = new BenchScreen(new Bench(_live), Glyphs.Braille, _theme);
        _terminal = new HeadlessTerminal(_screen, _theme, 100, 30);
        _terminal.Press(Key.D3);
    }

    public void Dispose()
    {
        _terminal.Dispose();
        _screen.Dispose();
    }

    [Fact]
    public void The_table_says_what_the_reading_says()
    {
        string row = _terminal.Rows.First(r => r.Contains("3 kHz  ", StringComparison.Ordinal));
        double heard = _live.Reading.Sidebands[2].AudioDb;
        Assert.EndsWith(heard.ToString("0.0", System.Globalization.CultureInfo.InvariantCulture).Replace('-', '−') + " dB", row, StringComparison.Ordinal);
        foreach (string label in (string[])["3, 6, 10 dB down", "speech index", "neighbours ±10 kHz", "last 10 % of travel pulls", "re-peaking takes", "bandwidth on dial", "hand of 0.1 pF", "station off"])
        {
            Assert.Contains(label, _terminal.Text, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Above_tip_over_it_says_why_there_is_none()
    {
        _terminal.Press(Key.End);
        Assert.Contains("none: the stage oscillates", _terminal.Text, StringComparison.Ordinal);
        Assert.Contains("oscillating: it radiates", _terminal.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_station_off_the_dial_is_told()
    {
        Assert.Contains("worst second harmonic             none", _terminal.Text, StringComparison.Ordinal);
        _terminal.Press((Key)'}', (Key)'}', (Key)'}');
        Assert.Contains("+3 kHz, carrier −", _terminal.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("worst second harmonic             none", _terminal.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(80, 24)]
    [InlineData(140, 45)]
    public void It_fits(int columns, int rows)
    {
        _terminal.Press((Key)'p');
        _terminal.Resize(columns, rows);
        Assert.All(_terminal.Rows, row => Assert.True(row.Length <= columns));
        Assert.Contains("worst second harmonic", _terminal.Text, StringComparison.Ordinal);
        Assert.Contains(". . pinned", _terminal.Text, StringComparison.Ordinal);
    }
}
