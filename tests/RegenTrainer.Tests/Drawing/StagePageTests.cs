using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Session;
using RegenTrainer.Session.Tests;

namespace RegenTrainer.Tests.Drawing;

public sealed class StagePageTests
{
    private static readonly MadeUpStage _once = new((60, true));

    public static TheoryData<int, int> Sizes => Pages.Sizes;

    public static TheoryData<string> Kinds => ["working", "edge", "oscillating", "never", "always", "several", "out of reach", "failed", "no control", "keys", "long"];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void No_line_is_beyond_the_width_and_every_column_is_filled(string kind)
    {
        foreach (Glyphs glyphs in new[] { Glyphs.Braille, Glyphs.Blocks, Glyphs.Ascii })
        {
            foreach ((int width, int height) in new[] { (80, 24), (81, 25), (100, 30), (140, 45), (250, 80) })
            {
                Canvas canvas = Draw(kind, width, height, glyphs);
                Assert.Equal(height, canvas.Rows().Count);
                Assert.All(canvas.Rows(), row => Assert.InRange(Printable.Width(row), 0, width));
            }
        }
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Ascii_glyphs_are_ASCII_alone(string kind)
    {
        Canvas canvas = Draw(kind, 100, 30, Glyphs.Ascii);
        Assert.DoesNotContain(Pages.Text(canvas), c => !char.IsAscii(c));
    }

    [Fact]
    public void Blocks_have_no_braille()
    {
        string text = Pages.Text(Pages.Draw(_once, 40, 100, 30, Glyphs.Blocks));
        Assert.DoesNotContain(text, c => c is >= '\u2800' and <= '\u28ff');
        Assert.Contains(text, c => c is '\u2580' or '\u2584' or '\u2588');
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void The_page_shows_what_was_read(int width, int height)
    {
        // Loop gain 54/60: Q 100/(1 - 0.9) = 1000, 1 kHz at 1 MHz, margin -20 log10 0.9 = 0.92 dB.
        string text = Pages.Text(Pages.Draw(_once, 54, width, height));
        foreach (string expected in new[]
        {
            "Made-up stage", "dial 1000 kHz", "BC547B", "3.0 V", "20 \u00b0C", "? keys", "\u25b81 Stage", "response, \u00b120 kHz around the station",
            "1 000", "1 kHz", "+31.2 dB", "\u22128.6 dB", "\u221217.5 dB", "0.59", "\u22121.2 kHz", "1000.00 kHz", "100 pF",
            "\u221210 kHz \u221228.4 dB, +10 kHz \u221228.1 dB", "edge: less than 1 dB to tip-over", "54.00 %", "60.00 %", "6.00 %", "0.92 dB",
        })
        {
            Assert.Contains(expected, text, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData(10, "idle")]
    [InlineData(40, "working")]
    [InlineData(57, "edge: less than 1 dB to tip-over")]
    [InlineData(70, "oscillating: it radiates; turn the control back")]
    public void The_regime_stands_in_words_on_its_line(double travel, string words) =>
        Assert.StartsWith(" " + words, Pages.Draw(_once, travel, 80, 24).Rows()[19], StringComparison.Ordinal);

    [Fact]
    public void Above_tip_over_no_response_is_drawn_and_figures_are_dashes()
    {
        Canvas canvas = Pages.Draw(_once, 70, 100, 30);
        string text = Pages.Text(canvas);
        Assert.DoesNotContain(text, c => c is > '\u2800' and <= '\u28ff');
        Assert.Contains("no response is drawn: the stage oscillates", text, StringComparison.Ordinal);
        Assert.Matches("effective Q +\u2014", text);
        Assert.Contains("past by 10.00 %", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Where_another_circuit_oscillates_its_frequency_is_said_in_place_of_the_tank_s()
    {
        var stage = new MadeUpStage((60, true)) { Cautions = [new Caution("other-circuit-oscillates", "another tuned circuit oscillates at 1.07 MHz")] };
        IReadOnlyList<string> rows = Pages.Draw(stage, 70, 100, 30).Rows();
        Assert.Contains(rows, row => row.StartsWith(" another tuned circuit oscillates at 1.07 MHz", StringComparison.Ordinal));
        Assert.DoesNotContain(rows, row => row.Contains("as it begins", StringComparison.Ordinal));
    }

    [Fact]
    public void Out_of_reach_is_said_where_the_figures_stood()
    {
        string text = Pages.Text(Pages.Draw(_once, 40, 80, 24, dialHz: 1600e3));
        Assert.Contains("no response: the dial is out of the capacitor's", text, StringComparison.Ordinal);
        Assert.Contains("the capacitor reaches", text, StringComparison.Ordinal);
        Assert.DoesNotContain("effective Q", text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_failed_solve_is_said_where_the_figures_stood()
    {
        string text = Pages.Text(Draw("failed", 80, 24, Glyphs.Braille));
        Assert.Contains("no operating point: it did", text, StringComparison.Ordinal);
        Assert.Contains("no figures", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Cautions_stand_on_the_line_of_the_regime_a_parasitic_first()
    {
        var stage = new MadeUpStage((60, true))
        {
            Cautions = [new Caution("coil-short", "the coil is short"), new Caution("parasitic", "grows at 7.5 MHz")],
        };
        Assert.Equal(" working. (1 of 2) grows at 7.5 MHz", Pages.Draw(stage, 40, 80, 24).Rows()[19]);
    }

    [Fact]
    public void A_small_terminal_says_what_is_needed()
    {
        Assert.Contains("needs 80x24, has 79x24", Pages.Text(Pages.Draw(_once, 40, 79, 24)), StringComparison.Ordinal);
        Assert.Equal("needs", Pages.Draw(_once, 40, 5, 1).Rows()[0].Replace("\u2026", "s", StringComparison.Ordinal));
        Assert.Single(Pages.Draw(_once, 40, 1, 1).Rows());
    }

    [Fact]
    public void Text_of_a_file_cannot_steer_the_terminal()
    {
        Canvas canvas = Pages.Draw(new MadeUpStage((60, true)) { Title = "a\u001b[31mb\u202ec\u0007\u7f16" }, 40, 100, 30);
        Assert.DoesNotContain(Pages.Text(canvas), c => c != '\n' && (char.IsControl(c) || c == '\u202e'));
        Assert.StartsWith(" a?[31mb?c?", canvas.Rows()[0], StringComparison.Ordinal);
    }

    [Fact]
    public void Hands_that_moved_show_in_the_title_even_at_80_columns()
    {
        var live = new LiveStage(_once, new Setting(1e6, 40) { Grade = Core.Devices.Grade.Weak });
        live.ToggleLock();
        live.MoveStationBy(3000);
        live.StepSupply(up: false);
        live.StepTemperature(up: true);
        string title = Pages.Draw(live, 80, 24).Rows()[0];
        foreach (string part in new[] { "dial 1000 kHz locked", "station 1003 kHz", "BC547B weak 2.9 V 21 \u00b0C" })
        {
            Assert.Contains(part, title, StringComparison.Ordinal);
        }
    }

    /// <summary>The peak of a tuned tank stands in the middle, both sides are mirrored, the programme's ends are equally far from it.</summary>
    [Theory]
    [MemberData(nameof(Sizes))]
    public void A_tuned_response_is_even_about_its_station(int width, int height)
    {
        Canvas canvas = Pages.Draw(_once, 30, width, height);
        int bottom = Enumerable.Range(0, height).Last(row => Shaded(canvas, row).Length > 0);
        int[] shaded = Shaded(canvas, bottom);
        int middle = (shaded[0] + shaded[^1]) / 2;
        Assert.Equal(0, (shaded[0] + shaded[^1]) % 2);
        Assert.Equal(Ink.Response, canvas[middle, 5].Ink);
        int[] marks = [.. Enumerable.Range(0, width).Where(c => Enumerable.Range(5, height - 10).Any(r => canvas[c, r] is { Grapheme: "o", Ink: Ink.Text }))];
        Assert.True(marks.Contains(middle - (2 * (shaded[^1] - middle))), "a neighbour is one channel away, the shade ends at half of it");
    }

    private static int[] Shaded(Canvas canvas, int row) =>
        [.. Enumerable.Range(0, canvas.Width).Where(column => canvas[column, row].Ink == Ink.Sidebands)];

    private static Canvas Draw(string kind, int width, int height, Glyphs glyphs) => kind switch
    {
        "edge" => Pages.Draw(_once, 57, width, height, glyphs),
        "oscillating" => Pages.Draw(_once, 70, width, height, glyphs),
        "never" => Pages.Draw(new MadeUpStage(), 50, width, height, glyphs),
        "always" => Pages.Draw(new MadeUpStage { WithoutCrossings = TipOverState.Always }, 50, width, height, glyphs),
        "several" => Pages.Draw(new MadeUpStage((20, true), (30, false), (70, true)), 50, width, height, glyphs),
        "out of reach" => Pages.Draw(_once, 40, width, height, glyphs, dialHz: 1600e3),
        "failed" => Pages.Draw(new MadeUpStage((60, true)) { Failure = "no operating point: it did not settle, \u03a9 \u00b5 \u7f16" }, 40, width, height, glyphs),
        "no control" => Pages.Draw(new MadeUpStage { Control = null, WithoutCrossings = null }, 40, width, height, glyphs),
        "keys" => Pages.Draw(new LiveStage(_once, new Setting(1e6, 40)), width, height, glyphs, keysOpen: true),
        "long" => Pages.Draw(new MadeUpStage((60, true)) { Title = string.Concat(Enumerable.Repeat("\u7f16e\u0301\ud83d\ude00", 60)) }, 40, width, height, glyphs),
        _ => Pages.Draw(_once, 40, width, height, glyphs),
    };
}
