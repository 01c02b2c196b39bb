using System.Text;
using RegenTrainer.Files;
using RegenTrainer.Session.Keeping;

namespace RegenTrainer.Session.Tests;

public sealed class WorkbenchFileTests : IDisposable
{
    private readonly Workplace _place = new();

    public void Dispose() => _place.Dispose();

    [Fact]
    public void A_save_changes_the_one_line_that_differs()
    {
        string path = _place.PutPreset();
        Workbench bench = _place.Open(path);
        Assert.True(bench.TryType("coil.turns", "80", out _));
        FileAnswer answer = bench.Save();
        Assert.Equal((FileOutcome.Done, $"saved as {path}"), (answer.Outcome, answer.Words));
        string[] before = Presets.Text(Presets.Default).Split('\n'), after = File.ReadAllText(path).Split('\n');
        Assert.Equal(before.Length, after.Length);
        (string Before, string After)[] differing = [.. before.Zip(after).Where(l => l.First != l.Second)];
        Assert.Equal([("turns = 84", "turns = 80")], differing.Select(l => (l.Before.Split('#')[0].Trim(), l.After.Split('#')[0].Trim())));
        Assert.False(bench.IsChanged);
        Assert.Equal(after, bench.Document.Text.Split('\n'));
        Assert.True(bench.Undo());
        Assert.True(bench.IsChanged);
        Assert.Equal(FileOutcome.Done, bench.Save().Outcome);
        Assert.Equal(Presets.Text(Presets.Default), File.ReadAllText(path));
        Assert.Equal([path], Directory.GetFiles(_place.Folder));
    }

    [Fact]
    public void A_preset_needs_a_path_and_is_a_file_of_its_own_then()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType("coil.turns", "80", out _));
        Assert.Equal(FileOutcome.NeedsPath, bench.Save().Outcome);
        FileAnswer answer = bench.SaveAs("~/mine.toml");
        Assert.Equal(FileOutcome.Done, answer.Outcome);
        Assert.Equal((_place.At("mine.toml"), "mine.toml"), (bench.Document.Path, bench.Document.Name));
        Assert.True(bench.TryType("coil.turns", "81", out _));
        Assert.Equal(FileOutcome.Done, bench.Save().Outcome);
        Assert.Equal(81, StageFiles.Open(_place.At("mine.toml"), _place.Places).Design!.Number("coil.turns"));
    }

    [Fact]
    public void A_file_that_is_there_is_replaced_only_when_asked()
    {
        string other = _place.Put("other.toml", "mine\n");
        Workbench bench = _place.Open();
        Assert.Equal(FileOutcome.Exists, bench.SaveAs(other).Outcome);
        Assert.Equal("mine\n", File.ReadAllText(other));
        Assert.Equal(FileOutcome.Done, bench.SaveAs(other, replace: true).Outcome);
        Assert.Equal(Presets.Text(Presets.Default), File.ReadAllText(other));
    }

    [Theory]
    [InlineData("", "expected the path of a file")]
    [InlineData("  ", "expected the path of a file")]
    [InlineData("config-x/", "is a folder")]
    [InlineData("no/such/folder/a.toml", "its folder is not there; make the folder or choose another")]
    [InlineData("nul\0l", "the path is none the system knows")]
    [InlineData("..", "is a folder")]
    public void A_path_that_cannot_be_is_refused_in_plain_words(string name, string expected)
    {
        Workbench bench = _place.Open();
        FileAnswer answer = bench.SaveAs(name.Trim().Length == 0 || name.Contains('\0', StringComparison.Ordinal) ? name : _place.Folder + "/" + name);
        Assert.Equal(FileOutcome.Refused, answer.Outcome);
        Assert.Contains(expected, answer.Words, StringComparison.Ordinal);
        Assert.Null(bench.Document.Path);
        Assert.Empty(Directory.GetFiles(_place.Folder));
    }

    [Fact]
    public void Files_of_the_system_are_no_place()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "These folders are of Unix.");
        Assert.Equal(FileOutcome.Refused, _place.Open().SaveAs("/dev/null", replace: true).Outcome);
    }

    [Fact]
    public void A_file_changed_since_is_not_written_over_unasked()
    {
        string path = _place.PutPreset();
        DateTime written = File.GetLastWriteTimeUtc(path);
        Workbench bench = _place.Open(path);
        Assert.True(bench.TryType("coil.turns", "80", out _));
        string theirs = Presets.Text(Presets.Default).Replace("= 84", "= 85", StringComparison.Ordinal);
        File.WriteAllText(path, theirs);
        File.SetLastWriteTimeUtc(path, written);   // same length, same time: the content alone tells
        FileAnswer answer = bench.Save();
        Assert.Equal(FileOutcome.ChangedOnDisk, answer.Outcome);
        Assert.Contains("was changed by another program", answer.Words, StringComparison.Ordinal);
        Assert.Equal(theirs, File.ReadAllText(path));
        Assert.True(bench.IsChanged);
        Assert.Equal(FileOutcome.Done, bench.Save(evenIfChanged: true).Outcome);
        Assert.Contains("turns = 80", File.ReadAllText(path), StringComparison.Ordinal);
        Assert.Equal(FileOutcome.Done, bench.Save().Outcome);
    }

    [Fact]
    public void A_file_written_again_as_it_was_is_no_change()
    {
        string path = _place.PutPreset();
        Workbench bench = _place.Open(path);
        Assert.True(bench.TryType("coil.turns", "80", out _));
        File.WriteAllText(path, Presets.Text(Presets.Default));
        File.SetLastWriteTimeUtc(path, new DateTime(2030, 1, 1, 0, 0, 0, DateTimeKind.Utc));
        _place.Second(bench);
        Assert.Empty(bench.Notice);
        Assert.Equal(FileOutcome.Done, bench.Save().Outcome);
    }

    [Fact]
    public void A_file_or_folder_that_is_gone_is_told_and_nothing_lost()
    {
        Directory.CreateDirectory(_place.At("below"));
        string path = _place.PutPreset("below/stage.toml");
        Workbench bench = _place.Open(path);
        Assert.True(bench.TryType("coil.turns", "80", out _));
        File.Delete(path);
        Assert.Equal(FileOutcome.ChangedOnDisk, bench.Save().Outcome);
        Directory.Delete(_place.At("below"));
        FileAnswer answer = bench.Save();
        Assert.Equal(FileOutcome.Refused, answer.Outcome);
        Assert.Equal($"{path} is not written: its folder is not there; make the folder or choose another", answer.Words);
        Assert.True(bench.IsChanged);
        Directory.CreateDirectory(_place.At("below"));
        Assert.Equal(FileOutcome.Done, bench.Save(evenIfChanged: true).Outcome);
        Assert.True(File.Exists(path));
    }

    [Fact]
    public void The_disk_is_watched_once_a_second()
    {
        string path = _place.PutPreset();
        Workbench bench = _place.Open(path);
        _place.Second(bench);
        Assert.Empty(bench.Notice);
        File.AppendAllText(path, "# theirs\n");
        bench.Tick();
        Assert.Empty(bench.Notice);
        _place.Clock.Go(1);
        Workplace.Until(bench, () => bench.Notice.Length > 0);
        Assert.Equal($"{path} was changed by another program; saving will ask first", bench.Notice);
        File.WriteAllText(path, Presets.Text(Presets.Default));
        _place.Clock.Go(1);
        Workplace.Until(bench, () => bench.Notice.Length == 0);
        File.Delete(path);
        _place.Clock.Go(1);
        Workplace.Until(bench, () => bench.Notice.EndsWith("is no longer there; saving writes it anew", StringComparison.Ordinal));
    }

    [Fact]
    public void A_byte_order_mark_and_line_ends_stay()
    {
        string text = Presets.Text(Presets.Default).ReplaceLineEndings("\r\n");
        string path = _place.At("marked.toml");
        File.WriteAllText(path, text, new UTF8Encoding(encoderShouldEmitUTF8Identifier: true));
        Workbench bench = _place.Open(path);
        Assert.True(bench.TryType("coil.turns", "80", out _));
        Assert.Equal(FileOutcome.Done, bench.Save().Outcome);
        byte[] bytes = File.ReadAllBytes(path);
        Assert.Equal([.. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(text.Replace("= 84", "= 80", StringComparison.Ordinal))], bytes);
    }

    [Fact]
    public void Another_stage_is_opened_in_its_place()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType("coil.turns", "80", out _));
        string path = _place.Put("short.toml", Presets.Text("plain-tank").Replace("530k", "5M", StringComparison.Ordinal)
            .Replace("1700k", "7M", StringComparison.Ordinal).Replace("240u", "4u", StringComparison.Ordinal));
        FileAnswer answer = bench.Open(path);
        Assert.Equal((FileOutcome.Done, "opened short.toml"), (answer.Outcome, answer.Words));
        Assert.Equal("plain-tank", bench.Design.Family.Name);
        Assert.Equal((0, 0, false), (bench.UndoCount, bench.RedoCount, bench.IsChanged));
        Assert.InRange(bench.Stage.Setting.DialHz, 5e6, 7e6);   // the old dial is out of this band
        Assert.Equal(50, bench.Stage.Setting.TravelPercent);
        Workplace.Until(bench, () => bench.LastUsed.Count > 0);
        Assert.Equal([path], bench.LastUsed);
    }

    [Fact]
    public void What_cannot_be_opened_leaves_everything_as_it_was()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType("coil.turns", "80", out _));
        FileAnswer none = bench.Open("no-such");
        Assert.Equal(FileOutcome.Refused, none.Outcome);
        Assert.Contains("there is no such file; presets are", none.Words, StringComparison.Ordinal);
        string bad = _place.Put("bad.toml", Presets.Text(Presets.Default).Replace("= 84", "= 8.4", StringComparison.Ordinal).Replace("680", "6,8", StringComparison.Ordinal));
        FileAnswer faults = bench.Open(bad);
        Assert.Equal(FileOutcome.Refused, faults.Outcome);
        Assert.Contains(":", faults.Words, StringComparison.Ordinal);
        Assert.EndsWith("(and 1 more)", faults.Words, StringComparison.Ordinal);
        Assert.Equal((1, true, 80), (bench.UndoCount, bench.IsChanged, bench.Design.Number("coil.turns")));
    }

    [Fact]
    public void A_device_that_is_not_beside_the_copy_is_told()
    {
        Directory.CreateDirectory(_place.At("a"));
        Directory.CreateDirectory(_place.At("b"));
        File.WriteAllText(_place.At("a/own1.toml"), Device("OWN1"));
        string path = _place.Put("a/stage.toml", Presets.Text(Presets.Default).Replace("main = \"BC547B\"", "main = \"OWN1\"", StringComparison.Ordinal));
        Workbench bench = _place.Open(path);
        Assert.Contains("own1", bench.Devices("devices.main"), StringComparer.OrdinalIgnoreCase);
        FileAnswer answer = bench.SaveAs(_place.At("b/stage.toml"));
        Assert.Equal(FileOutcome.Done, answer.Outcome);
        Assert.Contains("opened there it has a fault: stage.toml:", answer.Words, StringComparison.Ordinal);
        Assert.Contains("OWN1", answer.Words, StringComparison.Ordinal);
        Assert.True(bench.TryStep("coil.turns", up: true, out string refusal), refusal);   // the device in the socket stays
        Assert.Equal(FileOutcome.Done, bench.Save().Outcome);
    }

    [Fact]
    public void A_file_open_in_another_running_program_is_told_and_saving_still_looks()
    {
        Assert.SkipUnless(ProcessMark.Of(1) is not null, "The first process cannot be seen here.");
        string path = _place.PutPreset();
        Workbench theirs = _place.Open(path, ProcessMark.Of(1));
        Workplace.Until(theirs, () => theirs.LastUsed.Count > 0);
        Workbench mine = _place.Open(path);
        Assert.Equal($"{path} is open in another running program: the last to save is asked first", mine.Notice);
        Assert.Equal(FileOutcome.OpenElsewhere, mine.Open(path).Outcome);
        Assert.True(theirs.TryType("coil.turns", "80", out _));
        Assert.Equal(FileOutcome.Done, theirs.Save().Outcome);
        Assert.True(mine.TryType("coil.turns", "81", out _));
        Assert.Equal(FileOutcome.ChangedOnDisk, mine.Save().Outcome);
        theirs.Dispose();
        Assert.Equal(FileOutcome.Done, mine.Open(path).Outcome);
    }

    [Fact]
    public void A_record_of_an_ended_program_counts_for_nothing()
    {
        string path = _place.PutPreset();
        Workbench theirs = _place.Open(path, Workplace.Ended);
        Workplace.Until(theirs, () => theirs.LastUsed.Count > 0);
        Assert.Single(Directory.GetFiles(_place.Places.State!, "*.open"));
        Assert.Empty(_place.Open(path).Notice);
    }

    private static string Device(string name) => Presets.Text("devices/bc547b").Replace("BC547B", name, StringComparison.Ordinal);
}
