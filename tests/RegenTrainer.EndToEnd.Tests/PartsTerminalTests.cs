namespace RegenTrainer.EndToEnd.Tests;

/// <summary>Working on a stage in a real terminal. Skipped, with a word, where tmux is absent.</summary>
public sealed class PartsTerminalTests
{
    private const string Keyboard = "Enter edits";

    [Fact]
    public void The_kept_screens_of_the_parts_are_what_the_program_shows()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        using var terminal = new Tmux(80, 24, "tapped-coil-npn --dial 1M --travel 55");
        GoToTurns(terminal);
        terminal.Type("----");
        terminal.WaitFor("= 80");
        foreach ((int columns, int rows) in new[] { (80, 24), (100, 30), (140, 45) })
        {
            terminal.Resize(columns, rows);
            Thread.Sleep(700);
            terminal.WaitFor("tips over at");
            Assert.All(terminal.Lines, line => Assert.True(RegenTrainer.Core.Quantities.Printable.Width(line) <= columns, line));
            string screen = string.Join('\n', terminal.Lines);
            Kept.Check(screen, "docs", "screens", $"parts-{columns}x{rows}.txt");
            if (columns == 100)
            {
                Kept.CheckInside(screen, "parts", "docs", "guide.md");
            }
        }
    }

    [Fact]
    public void Edited_and_undone_the_screen_is_as_it_was_and_saving_changes_one_line()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        using var stage = new TemporaryStage(Files.Presets.Text(Files.Presets.Default));
        using var terminal = new Tmux(100, 30, stage.Path);
        terminal.WaitFor("effective Q");
        Thread.Sleep(300);
        string before = terminal.Screen;
        GoToTurns(terminal);
        terminal.Keys("Enter");
        terminal.WaitFor("Enter takes it");
        terminal.Type("80");
        terminal.Keys("Enter");
        terminal.WaitFor("= 80");
        terminal.Type("u");
        terminal.WaitFor("undone: coil.turns is 84, was 80");
        terminal.Type("e");
        terminal.WaitFor("regeneration off");
        terminal.Keys("Escape");
        Thread.Sleep(500);
        Assert.Equal(before, terminal.Screen);

        terminal.Type("r");
        terminal.WaitFor("redone: coil.turns is 80");
        terminal.Type("w");
        terminal.WaitFor("saved as");
        string[] was = Files.Presets.Text(Files.Presets.Default).Split('\n'), now = File.ReadAllText(stage.Path).Split('\n');
        Assert.Equal(was.Length, now.Length);
        Assert.Equal(("turns = 84", "turns = 80"), Assert.Single(was.Zip(now), pair => pair.First != pair.Second));
        terminal.Type("q");
        terminal.WaitFor("ENDED=0");
        Assert.True(terminal.IsRestored);
    }

    [Fact]
    public void What_was_cut_off_is_offered_at_the_next_start_and_the_file_is_untouched()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        using var stage = new TemporaryStage(Files.Presets.Text(Files.Presets.Default));
        string state = Path.Combine(stage.Folder, "state", "regentrainer");
        using (var terminal = new Tmux(80, 24, stage.Path, home: stage.Folder))
        {
            GoToTurns(terminal);
            terminal.Type("----");
            terminal.WaitFor("= 80");
            Assert.True(SpinWait.SpinUntil(() => Kept(state, "turns = 80"), TimeSpan.FromSeconds(20)), "it was never kept");
            using var kill = System.Diagnostics.Process.Start("kill", ["-9", terminal.ProgramProcess.ToString(System.Globalization.CultureInfo.InvariantCulture)]);
            kill.WaitForExit();
            terminal.WaitFor("ENDED=137");
        }

        Assert.Equal(Files.Presets.Text(Files.Presets.Default), File.ReadAllText(stage.Path));
        using (var terminal = new Tmux(80, 24, stage.Path, home: stage.Folder))
        {
            terminal.WaitFor("take up unsaved work?");
            terminal.Type("t");
            terminal.WaitFor("the edits are back");
            Assert.Contains("Tern Point preselector *", terminal.Screen, StringComparison.Ordinal);
            Assert.Equal(Files.Presets.Text(Files.Presets.Default), File.ReadAllText(stage.Path));
            terminal.Type("w");
            terminal.WaitFor("saved as");
            terminal.Type("q");
            terminal.WaitFor("ENDED=0");
        }

        Assert.Contains("turns = 80", File.ReadAllText(stage.Path), StringComparison.Ordinal);
        Assert.False(Kept(state, "turns = 80"));

        static bool Kept(string state, string text) =>
            Directory.Exists(state) && Directory.EnumerateFiles(state, "recovery-*").Any(file => File.ReadAllText(file).Contains(text, StringComparison.Ordinal));
    }

    [Fact]
    public void A_signal_asks_nothing_and_keeps_what_was_not_saved()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");
        using var stage = new TemporaryStage(Files.Presets.Text(Files.Presets.Default));
        using (var terminal = new Tmux(80, 24, stage.Path, home: stage.Folder))
        {
            GoToTurns(terminal);
            terminal.Type("-");
            terminal.WaitFor("= 83");
            using var kill = System.Diagnostics.Process.Start("kill", ["-TERM", terminal.ProgramProcess.ToString(System.Globalization.CultureInfo.InvariantCulture)]);
            kill.WaitForExit();
            terminal.WaitFor("ENDED=143");
            Assert.True(terminal.IsRestored);
        }

        using var again = new Tmux(80, 24, stage.Path, home: stage.Folder);
        again.WaitFor("take up unsaved work?");
    }

    [Fact]
    public void A_home_and_a_folder_that_cannot_be_written_lose_nothing()
    {
        Assert.SkipWhen(Tmux.Missing is not null, Tmux.Missing ?? "");

        // No user, not even the one of a container, can make folders below /proc.
        using var terminal = new Tmux(80, 24, "tapped-coil-npn", home: "/proc");
        GoToTurns(terminal);
        terminal.Type("----");
        terminal.WaitFor("= 80");
        terminal.WaitFor("not kept for recovery");
        terminal.Type("w");
        terminal.WaitFor("has no file yet");
        terminal.Type("/proc/own.toml");
        terminal.Keys("Enter");
        terminal.WaitFor("/proc/own.toml is no place for files");
        terminal.Keys("Escape");
        terminal.WaitFor("= 80");
        terminal.Type("q");
        terminal.WaitFor("quit?");
        terminal.Type("l");
        terminal.WaitFor("ENDED=0");
    }

    private static void GoToTurns(Tmux terminal)
    {
        terminal.WaitFor("effective Q");
        terminal.Type("e");
        terminal.WaitFor(Keyboard);
        terminal.Keys("Tab");
        terminal.WaitFor("   turns  ");
        foreach (Core.Stages.Field field in Files.Presets.Read(Files.Presets.Default).Family.Fields.SkipWhile(f => !f.Key.StartsWith("coil.", StringComparison.Ordinal)))
        {
            if (field.Key == "coil.turns")
            {
                break;
            }

            terminal.Keys("Down");
        }

        terminal.WaitFor("turns of the whole coil");
    }
}
