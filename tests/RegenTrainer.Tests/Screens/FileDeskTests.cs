using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Session;
using RegenTrainer.Session.Keeping;
using Terminal.Gui.Input;

namespace RegenTrainer.Tests.Screens;

[Collection(OneTerminal.Name)]
public sealed class FileDeskTests
{
    private const string Turns = "coil.turns";

    [Fact]
    public void Saving_changes_one_line_and_takes_the_star_away()
    {
        using var work = new WorkedStage();
        string[] before = File.ReadAllLines(work.File);
        Change(work, "80");
        work.Terminal.Type("w");
        Assert.Contains("saved as", work.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("*", work.Terminal.Rows[0], StringComparison.Ordinal);
        string[] after = File.ReadAllLines(work.File);
        (string Was, string Is) changed = Assert.Single(before.Zip(after), pair => pair.First != pair.Second);
        Assert.Equal(("turns = 84", "turns = 80"), changed);
        work.Terminal.Press(Key.CursorRight);
        Assert.DoesNotContain("saved", work.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_preset_asks_for_a_path_and_has_a_file_of_its_own_then()
    {
        using var work = new WorkedStage(preset: true);
        Change(work, "80");
        work.Terminal.Type("w");
        Assert.Contains("tapped-coil-npn has no file yet", work.Text, StringComparison.Ordinal);
        Assert.Contains("tapped-coil-npn.toml", work.Text, StringComparison.Ordinal);
        string path = Path.Combine(work.Folder, "own.toml");
        work.Terminal.Type(path);
        work.Terminal.Press(Key.Enter);
        Assert.Equal((false, path), (work.Workbench.IsChanged, work.Workbench.Document.Path));
        Assert.Contains("turns = 80", File.ReadAllText(path), StringComparison.Ordinal);
    }

    [Fact]
    public void A_path_that_cannot_be_written_is_refused_where_it_was_typed()
    {
        using var work = new WorkedStage();
        Change(work, "80");
        work.Terminal.Type("W");
        Assert.Contains(work.File[..20], work.Text, StringComparison.Ordinal);
        work.Terminal.Type("/dev/null/own.toml");
        work.Terminal.Press(Key.Enter);
        Assert.Contains("save as", work.Text, StringComparison.Ordinal);
        Assert.Contains("/dev/null/own.toml", string.Join(' ', work.Terminal.Rows.Skip(9)), StringComparison.Ordinal);
        work.Terminal.Press(Key.Esc);
        Assert.True(work.Workbench.IsChanged);
        Assert.Equal(Presets.Text(Presets.Default), File.ReadAllText(work.File));
    }

    [Theory]
    [InlineData("r", "turns = 80")]
    [InlineData("Esc", "someone's own")]
    public void A_file_that_is_there_is_replaced_only_if_asked(string answer, string expected)
    {
        using var work = new WorkedStage();
        string path = Path.Combine(work.Folder, "there.toml");
        File.WriteAllText(path, "someone's own");
        Change(work, "80");
        work.Terminal.Type("W");
        work.Terminal.Type(path);
        work.Terminal.Press(Key.Enter);
        Assert.Contains("replace it?", work.Text, StringComparison.Ordinal);
        Answer(work, answer);
        Assert.Contains("response", work.Text, StringComparison.Ordinal);
        Assert.Contains(expected, File.ReadAllText(path), StringComparison.Ordinal);
    }

    [Fact]
    public void Another_name_can_be_given_in_place_of_a_file_that_is_there()
    {
        using var work = new WorkedStage();
        string path = Path.Combine(work.Folder, "there.toml");
        File.WriteAllText(path, "someone's own");
        work.Terminal.Type("W");
        work.Terminal.Type(path);
        work.Terminal.Press(Key.Enter, Key.Enter, Key.End);
        Assert.Contains("there.toml", work.Text, StringComparison.Ordinal);
        work.Terminal.Type("2");
        work.Terminal.Press(Key.Enter);
        Assert.Equal(path + "2", work.Workbench.Document.Path);
        Assert.Equal("someone's own", File.ReadAllText(path));
    }

    [Theory]
    [InlineData("o", "turns = 80")]
    [InlineData("Esc", "title = \"edited elsewhere\"")]
    public void What_another_program_wrote_is_written_over_only_if_asked(string answer, string expected)
    {
        using var work = new WorkedStage();
        Change(work, "80");
        File.AppendAllText(work.File, "# title = \"edited elsewhere\"\n");
        work.Terminal.Type("w");
        Assert.Contains("write over it?", work.Text, StringComparison.Ordinal);
        Answer(work, answer);
        Assert.Contains(expected, File.ReadAllText(work.File), StringComparison.Ordinal);
        Assert.Equal(answer == "Esc", work.Workbench.IsChanged);
    }

    [Fact]
    public void A_save_that_fails_offers_another_name_and_loses_nothing()
    {
        using var work = new WorkedStage();
        string inner = Directory.CreateDirectory(Path.Combine(work.Folder, "inner")).FullName;
        string path = Path.Combine(inner, "own.toml");
        Assert.Equal(FileOutcome.Done, work.Workbench.SaveAs(path).Outcome);
        Change(work, "80");
        Directory.Delete(inner, recursive: true);
        work.Terminal.Type("w");
        Assert.Contains("it is not saved", work.Text, StringComparison.Ordinal);
        work.Terminal.Type("a");
        work.Terminal.Type(Path.Combine(work.Folder, "rescued.toml"));
        work.Terminal.Press(Key.Enter);
        Assert.False(work.Workbench.IsChanged);
        Assert.Contains("turns = 80", File.ReadAllText(Path.Combine(work.Folder, "rescued.toml")), StringComparison.Ordinal);
    }

    [Fact]
    public void Quitting_asks_only_where_something_is_unsaved()
    {
        using var work = new WorkedStage();
        Change(work, "80");
        work.Terminal.Type("q");
        Assert.Contains("quit?", work.Text, StringComparison.Ordinal);
        work.Terminal.Type("q1t.");
        Assert.Equal((false, 1e6), (work.IsStopped, work.Bench.Stage.Setting.DialHz));
        work.Terminal.Press(Key.Esc);
        Assert.Contains("response", work.Text, StringComparison.Ordinal);
        work.Terminal.Type("ql");
        Assert.True(work.IsStopped);
        Assert.Equal(Presets.Text(Presets.Default), File.ReadAllText(work.File));

        using var other = new WorkedStage();
        other.Terminal.Type("q");
        Assert.True(other.IsStopped);
    }

    [Fact]
    public void Quitting_can_save_first_through_any_question()
    {
        using var work = new WorkedStage(preset: true);
        Change(work, "80");
        work.Terminal.Type("q");
        work.Terminal.Press(Key.Enter);
        Assert.False(work.IsStopped);
        work.Terminal.Type(work.File);
        work.Terminal.Press(Key.Enter);
        Assert.Contains("replace it?", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.CursorDown, Key.Enter);
        Assert.True(work.IsStopped);
        Assert.Contains("turns = 80", File.ReadAllText(work.File), StringComparison.Ordinal);
    }

    [Fact]
    public void A_stage_is_opened_from_the_list_or_by_its_path()
    {
        using var work = new WorkedStage();
        work.Terminal.Type("e");
        work.Terminal.Type("o");
        Assert.Contains("open a stage", work.Text, StringComparison.Ordinal);
        while (!work.Text.Contains("\u25b8 preset     plain-tank", StringComparison.Ordinal))
        {
            work.Terminal.Press(Key.CursorDown);
        }

        work.Terminal.Press(Key.Enter);
        Assert.Equal("plain-tank", work.Workbench.Document.Name);
        Assert.Contains("Tern Point plain tank", work.Terminal.Rows[0], StringComparison.Ordinal);
        Assert.Contains("response", work.Text, StringComparison.Ordinal);
        Assert.Null(work.Bench.Before);
        work.Terminal.Type("o" + work.File);
        work.Terminal.Press(Key.Enter);
        Assert.Equal(work.File, work.Workbench.Document.Path);
    }

    [Fact]
    public void What_cannot_be_opened_says_why_and_the_stage_stays()
    {
        using var work = new WorkedStage();
        work.Terminal.Type("o/no/such/stage.toml");
        work.Terminal.Press(Key.Enter);
        Assert.Contains("there is no such file", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.Esc);
        Assert.Equal(work.File, work.Workbench.Document.Path);
    }

    [Fact]
    public void Opening_with_unsaved_edits_asks_first()
    {
        using var work = new WorkedStage();
        Change(work, "80");
        work.Terminal.Type("o");
        Assert.Contains("open another stage?", work.Text, StringComparison.Ordinal);
        work.Terminal.Type("splain-tank");
        work.Terminal.Press(Key.Enter);
        Assert.Equal("plain-tank", work.Workbench.Document.Name);
        Assert.Contains("turns = 80", File.ReadAllText(work.File), StringComparison.Ordinal);
    }

    [Fact]
    public void A_click_answers_too()
    {
        using var work = new WorkedStage();
        Change(work, "80");
        work.Terminal.Type("q");
        int row = work.Terminal.Rows.ToList().FindIndex(r => r.Contains("leave them unsaved", StringComparison.Ordinal));
        work.Terminal.Move(8, row, MouseFlags.LeftButtonPressed);
        Assert.False(work.IsStopped);
        work.Terminal.Move(8, row, MouseFlags.LeftButtonPressed);
        Assert.True(work.IsStopped);
    }

    [Theory]
    [InlineData("t", true, false)]
    [InlineData("d", false, false)]
    [InlineData("Esc", false, true)]
    public void Unsaved_work_of_a_session_that_was_cut_off_is_offered(string answer, bool taken, bool offeredAgain)
    {
        string folder = CutOff(out string file);
        using (var work = new WorkedStage(folder: folder))
        {
            Assert.Contains("take up unsaved work?", work.Text, StringComparison.Ordinal);
            Answer(work, answer);
            Assert.Equal((taken, taken ? 77 : 84), (work.Workbench.IsChanged, (int)work.Workbench.Design.Number(Turns)));
            Assert.Equal(Presets.Text(Presets.Default), File.ReadAllText(file));
            Assert.Equal(offeredAgain, Directory.EnumerateFiles(Path.Combine(folder, "state"), "recovery-2147483647-*").Any());
        }
    }

    [Fact]
    public void A_home_that_cannot_be_written_is_a_notice_and_stops_nothing()
    {
        string folder = Directory.CreateTempSubdirectory("regentrainer-home-").FullName;
        File.WriteAllText(Path.Combine(folder, "state"), "in the way");
        using var work = new WorkedStage(folder: folder);
        Change(work, "80");
        work.Terminal.PressUntil(() => work.Text.Contains("recovery", StringComparison.Ordinal));
        work.Terminal.Press(Key.Esc);
        Assert.DoesNotContain("recovery", work.Text, StringComparison.Ordinal);
        work.Terminal.Type("w");
        Assert.Contains("turns = 80", File.ReadAllText(work.File), StringComparison.Ordinal);
    }

    /// <summary>A folder in which a session with 77 turns was cut off.</summary>
    private static string CutOff(out string file)
    {
        string folder = Directory.CreateTempSubdirectory("regentrainer-cut-").FullName;
        file = Path.Combine(folder, "stage.toml");
        File.WriteAllText(file, Presets.Text(Presets.Default));
        var gone = new Surroundings(new Places(Path.Combine(folder, "config"), Path.Combine(folder, "state")), TimeProvider.System, new ProcessMark(2147483647, 0));
        using var workbench = new Workbench(StageDocument.Of(file, StageFiles.Open(file)), new Setting(1e6, 50), StageReader.DefaultAudioHz, gone);
        Assert.True(workbench.TryType(Turns, "77", out string refusal), refusal);
        workbench.LeaveRecovery();
        return folder;
    }

    private static void Change(WorkedStage work, string turns)
    {
        Assert.True(work.Workbench.TryType(Turns, turns, out string refusal), refusal);
        work.Terminal.Press(Key.Tab);
        Assert.Contains("*", work.Terminal.Rows[0], StringComparison.Ordinal);
    }

    private static void Answer(WorkedStage work, string answer) => work.Terminal.Press(answer == "Esc" ? Key.Esc : (Key)answer[0]);
}
