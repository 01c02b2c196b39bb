using System.Diagnostics;
using RegenTrainer.Files;
using RegenTrainer.Session.Keeping;

namespace RegenTrainer.Session.Tests;

public sealed class RecoveryTests : IDisposable
{
    private readonly Workplace _place = new();

    public void Dispose() => _place.Dispose();

    [Fact]
    public void Unsaved_work_is_kept_within_a_second_and_for_the_user_alone()
    {
        string path = _place.PutPreset();
        Workbench bench = _place.Open(path);
        Assert.True(bench.TryType("coil.turns", "80", out _));
        _place.Clock.Go(0.95);
        Workplace.Until(bench, () => _place.Recoveries().Count == 1);
        string kept = _place.Recoveries()[0];
        StageFilesOpen(kept);
        if (!OperatingSystem.IsWindows())
        {
            Assert.Equal(UnixFileMode.UserRead | UnixFileMode.UserWrite, File.GetUnixFileMode(kept));
            Assert.Equal(UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute, File.GetUnixFileMode(_place.Places.State!));
        }

        Assert.Equal(Presets.Text(Presets.Default), File.ReadAllText(path));
        Assert.Empty(bench.Notice);

        // It opens as a stage file by itself, too.
        void StageFilesOpen(string file) => Assert.Equal(80, StageFiles.Open(file, _place.Places).Design!.Number("coil.turns"));
    }

    [Fact]
    public void A_save_an_undo_to_the_start_and_a_clean_end_remove_it()
    {
        string path = _place.PutPreset();
        Workbench bench = _place.Open(path);
        Edit(bench, "80");
        Assert.Equal(FileOutcome.Done, bench.Save().Outcome);
        _place.Clock.Go(1);
        Workplace.Until(bench, () => _place.Recoveries().Count == 0);
        Edit(bench, "81");
        Assert.True(bench.Undo());
        _place.Clock.Go(1);
        Workplace.Until(bench, () => _place.Recoveries().Count == 0);
        Edit(bench, "82");
        bench.Dispose();
        Assert.Empty(_place.Recoveries());
        Assert.Empty(Directory.GetFiles(_place.Places.State!));
    }

    [Fact]
    public void Work_of_a_program_that_was_killed_is_found_and_taken()
    {
        string path = _place.PutPreset();
        Edit(_place.Open(path, Workplace.Ended), "80");
        Workbench next = _place.Open();
        Recovery found = Assert.IsType<Recovery>(next.Found);
        Assert.Equal(("stage.toml", path), (found.Name, found.Path));
        Assert.Equal(ManualClock.Start, found.At, TimeSpan.FromSeconds(2));
        next.TakeRecovery();
        Assert.Null(next.Found);
        Assert.Equal(80, next.Design.Number("coil.turns"));
        Assert.Equal((path, true, 0), (next.Document.Path, next.IsChanged, next.UndoCount));
        Workplace.Until(next, () => !File.Exists(found.StoredIn));
        Assert.Single(_place.Recoveries());   // now under the name of this session
        Assert.Equal(FileOutcome.Done, next.Save().Outcome);
        Assert.Equal(Presets.Text(Presets.Default).Replace("= 84", "= 80", StringComparison.Ordinal), File.ReadAllText(path));
        _place.Clock.Go(1);
        Workplace.Until(next, () => _place.Recoveries().Count == 0);
    }

    [Fact]
    public void Work_of_a_preset_that_was_killed_is_unsaved_and_needs_a_path()
    {
        Edit(_place.Open("plain-tank", Workplace.Ended), "6p", "antenna.coupling");
        Workbench next = _place.Open();
        next.TakeRecovery();
        Assert.Equal((null, "plain-tank", true), (next.Document.Path, next.Document.Name, next.IsChanged));
        Assert.Equal(FileOutcome.NeedsPath, next.Save().Outcome);
        Assert.Equal(FileOutcome.Done, next.SaveAs(_place.At("a.toml")).Outcome);
        Assert.False(next.IsChanged);
    }

    [Fact]
    public void A_file_changed_since_the_work_was_kept_is_not_written_over_unasked()
    {
        string path = _place.PutPreset();
        Edit(_place.Open(path, Workplace.Ended), "80");
        File.AppendAllText(path, "# later\n");
        Workbench next = _place.Open(path);
        next.TakeRecovery();
        Assert.Equal(FileOutcome.ChangedOnDisk, next.Save().Outcome);
        Assert.Equal(FileOutcome.Done, next.Save(evenIfChanged: true).Outcome);
    }

    [Fact]
    public void Work_of_a_running_program_is_left_alone()
    {
        Workbench first = _place.Open();
        Edit(first, "80");
        Assert.Null(_place.Open().Found);
    }

    [Fact]
    public void Work_that_was_saved_after_all_is_not_found()
    {
        string path = _place.PutPreset();
        Edit(_place.Open(path, Workplace.Ended), "80");
        File.WriteAllText(path, Presets.Text(Presets.Default).Replace("= 84", "= 80", StringComparison.Ordinal));
        Assert.Null(_place.Open().Found);
        Assert.Empty(_place.Recoveries());
    }

    [Fact]
    public void Work_that_cannot_be_read_is_told_and_its_file_stays()
    {
        Edit(_place.Open(process: Workplace.Ended), "80");
        string file = _place.Recoveries()[0];
        string text = File.ReadAllText(file).Replace("BC547B", "GONE1", StringComparison.Ordinal);
        File.WriteAllText(file, text);
        Workbench next = _place.Open();
        next.TakeRecovery();
        Assert.Null(next.Found);
        Assert.Contains("cannot be read (tapped-coil-npn:", next.Notice, StringComparison.Ordinal);
        Assert.Contains(file, next.Notice, StringComparison.Ordinal);
        Assert.Equal(84, next.Design.Number("coil.turns"));
        next.Dispose();
        Assert.Equal(text, File.ReadAllText(file));
    }

    [Theory]
    [InlineData("")]
    [InlineData("# name: 7\n# at: never\n# process: me\nno stage")]
    [InlineData("\0\u001b[2J")]
    public void A_recovery_that_is_none_harms_nothing(string text)
    {
        Directory.CreateDirectory(_place.Places.State!);
        string file = Path.Combine(_place.Places.State!, "recovery-1-1.toml");
        File.WriteAllText(file, text);
        Workbench bench = _place.Open();
        Assert.Equal("recovery-1-1.toml", bench.Found!.Name);
        bench.TakeRecovery();
        Assert.Contains("stays in", bench.Notice, StringComparison.Ordinal);
        Assert.True(File.Exists(file));
    }

    [Fact]
    public void Several_are_found_newest_first_and_dropped_one_by_one()
    {
        Edit(_place.Open(process: Workplace.Ended), "80");
        _place.Clock.Go(60);
        Edit(_place.Open(process: Workplace.Ended), "81");
        Workbench next = _place.Open();
        DateTimeOffset newest = next.Found!.At;
        next.DropRecovery();
        Assert.True(next.Found!.At < newest);
        next.TakeRecovery();
        Assert.Equal(80, next.Design.Number("coil.turns"));
        Workplace.Until(next, () => _place.Recoveries().Count == 1);
        next.DropRecovery();
        next.TakeRecovery();   // nothing found: nothing happens
        Assert.Equal(80, next.Design.Number("coil.turns"));
    }

    [Fact]
    public void An_end_nobody_asked_for_leaves_the_work()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType("coil.turns", "80", out _));
        bench.LeaveRecovery();
        bench.Dispose();
        Assert.Single(_place.Recoveries());
    }

    [Fact]
    public void Names_with_line_ends_and_quotes_come_back_as_they_were()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "Windows has no such names.");
        string path = _place.PutPreset("a \"b\"\n# at: é.toml");
        Edit(_place.Open(path, Workplace.Ended), "80");
        Workbench next = _place.Open();
        Assert.Equal(path, next.Found!.Path);
        next.TakeRecovery();
        Assert.Equal(path, next.Document.Path);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void A_home_that_cannot_be_written_is_a_notice_and_all_else_works(bool none)
    {
        string file = _place.Put("file", "");
        using var place = new Workplace { Places = none ? Places.None : new Places(Path.Combine(file, "c"), Path.Combine(file, "s")) };
        string path = place.PutPreset();
        Workbench bench = place.Open(path);
        Workplace.Until(bench, () => bench.Notice.Length > 0);
        Assert.Contains("kept", bench.Notice, StringComparison.Ordinal);
        Assert.True(bench.TryType("coil.turns", "80", out _));
        place.Second(bench);
        Assert.Equal(FileOutcome.Done, bench.Save().Outcome);
        Assert.Contains("= 80", File.ReadAllText(path), StringComparison.Ordinal);
    }

    [Fact]
    public void A_process_is_told_from_a_later_one_of_its_number()
    {
        Assert.True(ProcessMark.Own.IsRunning);
        Assert.False((ProcessMark.Own with { StartSecond = ProcessMark.Own.StartSecond - 60 }).IsRunning);
        Assert.False(Workplace.Ended.IsRunning);
        Assert.Equal(ProcessMark.Own, ProcessMark.Parse(ProcessMark.Own.ToString()));
        Assert.Null(ProcessMark.Parse("12 x"));
        Assert.Null(ProcessMark.Parse(""));
        using Process child = Process.Start(new ProcessStartInfo(Environment.ProcessPath!, "--help") { RedirectStandardOutput = true, UseShellExecute = false })!;
        ProcessMark? mark = ProcessMark.Of(child.Id);
        child.StandardOutput.ReadToEnd();
        child.WaitForExit();
        Assert.False(mark is { IsRunning: true });
    }

    private void Edit(Workbench bench, string text, string key = "coil.turns")
    {
        Assert.True(bench.TryType(key, text, out string refusal), refusal);
        _place.Clock.Go(1);
        int before = _place.Recoveries().Count;
        DateTime last = before == 0 ? default : _place.Recoveries().Max(File.GetLastWriteTimeUtc);
        Workplace.Until(bench, () => _place.Recoveries().Count > before || (before > 0 && _place.Recoveries().Max(File.GetLastWriteTimeUtc) > last));
    }
}
