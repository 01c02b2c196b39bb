using System.Globalization;
using System.Text.Json;
using System.Text.RegularExpressions;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.EndToEnd.Tests;

/// <summary>The program in a real terminal, looked at as its user does. Skipped, with a word, where tmux is absent.</summary>
public sealed partial class TerminalTests
{
    [Fact]
    public async Task The_screen_fits_shows_what_the_commands_say_and_follows_the_keys()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        using var terminal = new Tmux(100, 30, "tapped-coil-npn --dial 1M --travel 40");
        terminal.WaitFor("at 40.00 %");
        Fits(terminal, 100, 30);

        // Ten Rights are exactly 5 %.
        for (int k = 0; k < 10; k++)
        {
            terminal.Keys("Right");
        }

        terminal.WaitFor("at 45.00 %");
        terminal.Keys("S-Right");
        terminal.WaitFor("at 45.05 %");
        terminal.Keys("S-Left", "C-Right");
        terminal.WaitFor("at 50.00 %");

        // What the screen says is what the command says, at five settings.
        (string[] Keys, string Wait, string[] Options)[] settings =
        [
            ([], "at 50.00 %", ["--dial", "1M", "--travel", "50"]),
            (["."], "dial 1010 kHz", ["--dial", "1010k", "--travel", "50"]),
            (["M"], "at 55.00 %", ["--dial", "1010k", "--travel", "55"]),
            (["d"], "strong", ["--dial", "1010k", "--travel", "55", "--grade", "strong"]),
            (["v", "v"], "2.8 V", ["--dial", "1010k", "--travel", "55", "--grade", "strong", "--supply", "2.8"]),
        ];
        foreach ((string[] keys, string wait, string[] options) in settings)
        {
            terminal.Keys(keys);
            string screen = terminal.WaitFor(wait);
            JsonElement reading = (await ProgramRun.With(["reading", "tapped-coil-npn", .. options, "--json"])).Json;
            Says(screen, reading);
        }

        // Sizes: nothing beyond the width, and the kept pictures are up to date.
        foreach ((int columns, int rows) in new[] { (80, 24), (140, 45), (100, 30) })
        {
            terminal.Resize(columns, rows);
            Thread.Sleep(300);
            terminal.WaitFor("Stage");
            Fits(terminal, columns, rows);
        }

        terminal.Keys("?");
        terminal.WaitFor("0.3 dB below tip-over");
        terminal.Keys("Escape");
        terminal.WaitFor("effective Q");
        terminal.Type("\e[<64;50;28M");   // the wheel, over the strip
        terminal.Keys("q");
        terminal.WaitFor("ENDED=0");
        Assert.True(terminal.IsRestored);
    }

    public static TheoryData<string, string, string> Pages => new()
    {
        { "stage", "1", "effective Q" },
        { "dial", "2", "tips over" },
        { "sidebands", "3", "speech index" },
        { "bias", "8", "nothing touched" },
    };

    [Theory]
    [MemberData(nameof(Pages))]
    public void The_kept_screens_are_what_the_program_shows(string name, string key, string shown)
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        using var terminal = new Tmux(80, 24, "tapped-coil-npn --dial 1M --travel 55");
        terminal.WaitFor("1 Stage");
        terminal.Keys(key);
        foreach ((int columns, int rows) in new[] { (80, 24), (100, 30), (140, 45) })
        {
            terminal.Resize(columns, rows);
            terminal.WaitFor(shown);
            Thread.Sleep(300);
            terminal.WaitWithout("...");
            Fits(terminal, columns, rows);
            string screen = string.Join('\n', terminal.Lines);
            Kept.Check(screen, "docs", "screens", $"{name}-{columns}x{rows}.txt");
            if (columns == 100)
            {
                Kept.CheckInside(screen, name, "docs", "guide.md");
                if (name == "stage")
                {
                    Kept.CheckInside(screen, name, "README.md");
                }
            }
        }
    }

    [Fact]
    public void Hostile_settings_in_the_folder_change_nothing()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        string folder = Directory.CreateTempSubdirectory("regentrainer-").FullName;
        Directory.CreateDirectory(Path.Combine(folder, ".tui"));
        File.WriteAllText(Path.Combine(folder, ".tui", "config.json"), """
            { "Theme": "Light", "Driver.ForceDriver": "nonsense", "Key.Separator": "x", "Application.DefaultKeyBindings": { "Quit": [ "CursorRight" ] } }
            """);
        try
        {
            using var terminal = new Tmux(80, 24, "--travel 40", folder: folder);
            terminal.WaitFor("40.00 %");
            terminal.Keys("Right");
            terminal.WaitFor("40.50 %");
            terminal.Keys("q");
            terminal.WaitFor("ENDED=0");
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    [Fact]
    public void Signals_give_the_terminal_back_and_no_colour_means_none()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        using (var terminal = new Tmux(80, 24, "", "NO_COLOR=1"))
        {
            terminal.WaitFor("effective Q");
            Assert.DoesNotMatch(ColourCode(), terminal.ColouredScreen);
            Signal(terminal.ProgramProcess, "TERM");
            terminal.WaitFor("ENDED=143");
            Assert.True(terminal.IsRestored);
        }

        using (var terminal = new Tmux(80, 24, "--glyphs ascii"))
        {
            string screen = terminal.WaitFor("effective Q");
            Assert.DoesNotContain(screen, c => c > '~');
            Signal(terminal.ProgramProcess, "HUP");
            terminal.WaitFor("ENDED=129");
            Assert.True(terminal.IsRestored);
        }
    }

    [Fact]
    public void A_terminal_that_vanishes_takes_the_program_with_it()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        int process;
        using (var terminal = new Tmux(80, 24))
        {
            terminal.WaitFor("effective Q");
            process = terminal.ProgramProcess;
        }

        for (int k = 0; k < 100; k++)
        {
            if (!Directory.Exists($"/proc/{process}"))
            {
                return;
            }

            Thread.Sleep(100);
        }

        Signal(process, "KILL");
        Assert.Fail("the program went on without a terminal");
    }

    /// <summary>Effective Q, tip-over and margin on the screen are the command's to the digits shown.</summary>
    private static void Says(string screen, JsonElement reading)
    {
        double Number(string key) => reading.GetProperty(key).GetDouble();
        Assert.Equal(Number("tip_over_percent"), Shown(screen, TipOver()), 0.005001);
        Assert.Equal(Number("margin_percent"), Shown(screen, Left()), 0.005001);
        Match q = EffectiveQ().Match(screen);
        Assert.True(q.Success, screen);
        double shown = double.Parse(q.Groups[1].Value.Replace(" ", "", StringComparison.Ordinal), CultureInfo.InvariantCulture);
        Assert.Equal(Number("effective_q"), shown, Math.Max(0.5, Number("effective_q") * 0.0005) + 1e-6);
        Assert.Equal(Number("margin_db"), Shown(screen, MarginDb()), 0.005001);
    }

    private static double Shown(string screen, Regex pattern)
    {
        Match match = pattern.Match(screen);
        Assert.True(match.Success, $"{pattern}\n{screen}");
        return double.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture);
    }

    private static void Fits(Tmux terminal, int columns, int rows)
    {
        string[] lines = terminal.Lines;
        Assert.True(lines.Length <= rows, $"{lines.Length} lines of {rows}");
        Assert.All(lines, l => Assert.True(Printable.Width(l) <= columns, $"{columns} columns: {l}"));
        Assert.Contains(lines, l => l.Contains("1 Stage", StringComparison.Ordinal));
        Assert.Contains(lines, l => l.Contains('▲', StringComparison.Ordinal));
    }

    private static void Signal(int process, string name)
    {
        using var kill = System.Diagnostics.Process.Start("kill", [$"-{name}", process.ToString(CultureInfo.InvariantCulture)]);
        kill.WaitForExit();
    }

    [GeneratedRegex(@"tips(?: over at)? +([0-9.]+) %")]
    private static partial Regex TipOver();

    [GeneratedRegex(@"left +([0-9.]+) %")]
    private static partial Regex Left();

    [GeneratedRegex(@"effective Q +([0-9][0-9 ]*)")]
    private static partial Regex EffectiveQ();

    [GeneratedRegex(@"left .*?([0-9.]+) dB")]
    private static partial Regex MarginDb();

    [GeneratedRegex(@"\e\[[0-9;]*(?:3[0-7]|4[0-7]|9[0-7]|10[0-7]|[34]8;)[0-9;]*m")]
    private static partial Regex ColourCode();
}
