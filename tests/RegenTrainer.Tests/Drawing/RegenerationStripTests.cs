using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Session.Tests;

namespace RegenTrainer.Tests.Drawing;

public sealed class RegenerationStripTests
{
    /// <summary>Columns by hand: the stops are the first and the last, so 1 % is (width - 1)/100 columns.</summary>
    [Theory]
    [InlineData(80, 0, 60, 0, 47)]          // 0.79 x 60 = 47.4
    [InlineData(80, 61.9, 63.4, 49, 50)]    // 48.901, 50.086
    [InlineData(100, 50, 60, 50, 59)]       // 49.5 up, 59.4
    [InlineData(101, 33, 66, 33, 66)]
    [InlineData(140, 100, 99.9, 139, 139)]  // 138.861
    public void Marker_and_tip_over_stand_in_the_exact_column(int width, double travel, double tip, int marker, int bar)
    {
        Canvas canvas = Pages.Draw(new MadeUpStage((tip, true)), travel, width, 30);
        Assert.Equal([marker], Columns(canvas, 28, "\u25b2"));
        Assert.Equal([bar], Columns(canvas, 27, "\u2503"));
    }

    [Theory]
    [InlineData(80)]
    [InlineData(123)]
    public void Column_and_travel_are_inverse(int width)
    {
        for (int column = 0; column < width; column++)
        {
            Assert.Equal(column, RegenerationStrip.ColumnOf(RegenerationStrip.TravelAt(column, width), width));
        }
    }

    [Fact]
    public void Stretches_are_to_scale_and_named_where_the_word_fits()
    {
        string bar = Bar(Pages.Draw(new MadeUpStage((60, true)), 40, 101, 30));
        Assert.Equal(
            " idle " + new string('\u2591', 24) + " working ".PadLeft(10, '\u2592') + new string('\u2592', 20) + "\u2503 oscillating "
            + new string('\u00d7', 27),
            bar);
    }

    [Fact]
    public void Words_without_room_are_left_out()
    {
        string bar = Bar(Pages.Draw(new MadeUpStage((6, true)), 40, 80, 24));
        Assert.DoesNotContain("idle", bar, StringComparison.Ordinal);
        Assert.DoesNotContain("working", bar, StringComparison.Ordinal);
        Assert.Contains(" oscillating ", bar, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(80, "54.00 % 4k65 | tips 60.00 % 4k06 | left 6.00 % 0.92 dB")]
    [InlineData(100, "at 54.00 % \u00b7 162\u00b0 \u00b7 4k65     tips over at 60.00 % \u00b7 180\u00b0 \u00b7 4k06      left 6.00 % \u00b7 18.0\u00b0 \u00b7 0.92 dB")]
    public void Figures_stand_under_the_strip(int width, string expected)
    {
        // An even control from 10k to 100R: 54 % is 10000 - 0.54 x 9900 = 4654 ohm, 60 % is 4060 ohm; 300 degrees of rotation.
        string line = Figures(new MadeUpStage((60, true)), 54, width);
        Assert.Equal(expected, line);
    }

    [Fact]
    public void A_factor_has_its_own_sign()
    {
        var stage = new MadeUpStage((60, true)) { Control = new RegenerationControl(new LinearControl(0, 0.2), Unit.None) };
        Assert.StartsWith("54.00 % k 0.108 | tips 60.00 % k 0.12 | left", Figures(stage, 54, 80), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(TipOverState.Never, 80, "never tips over")]
    [InlineData(TipOverState.Never, 100, "never tips over along the travel")]
    [InlineData(TipOverState.Always, 80, "always oscillates")]
    [InlineData(TipOverState.Always, 140, "oscillates along the whole travel")]
    public void No_crossing_is_said_in_words(TipOverState state, int width, string words) =>
        Assert.Contains(words, Figures(new MadeUpStage { WithoutCrossings = state }, 50, width), StringComparison.Ordinal);

    [Theory]
    [InlineData(80, "tips 20.0 % stops 30.0 % tips 70.0 %")]
    [InlineData(140, "tips over at 20.00 %, stops at 30.00 %, tips over at 70.00 %")]
    public void Several_crossings_are_all_said_and_drawn(int width, string words)
    {
        var stage = new MadeUpStage((20, true), (30, false), (70, true));
        Canvas canvas = Pages.Draw(stage, 50, width, 30);
        Assert.Contains(words, canvas.Rows()[29], StringComparison.Ordinal);
        Assert.Contains("left 20.00 %", canvas.Rows()[29], StringComparison.Ordinal);
        Assert.Equal(3, Columns(canvas, 27, "\u2503").Length);
    }

    [Fact]
    public void A_stage_without_a_control_says_so() =>
        Assert.Contains(
            "this stage has no regeneration control",
            Bar(Pages.Draw(new MadeUpStage { Control = null, WithoutCrossings = null }, 50, 80, 24)),
            StringComparison.Ordinal);

    [Fact]
    public void Always_oscillating_fills_the_bar()
    {
        string bar = Bar(Pages.Draw(new MadeUpStage { WithoutCrossings = TipOverState.Always }, 50, 80, 24));
        Assert.Equal(" oscillating " + new string('\u00d7', 67), bar);
    }

    private static string Bar(Canvas canvas) => canvas.Rows()[canvas.Height - 3];

    private static string Figures(MadeUpStage stage, double travel, int width) => Pages.Draw(stage, travel, width, 30).Rows()[29].Trim();

    private static int[] Columns(Canvas canvas, int row, string glyph) =>
        [.. Enumerable.Range(0, canvas.Width).Where(column => canvas[column, row].Grapheme == glyph)];
}
