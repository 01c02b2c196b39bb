using System.Diagnostics;
using System.Text.RegularExpressions;

namespace RegenTrainer.EndToEnd.Tests;

public sealed class ExitCodeTests
{
    private const string Stage = "tapped-coil-npn";

    [Fact]
    public async Task A_wrong_command_line_is_one_line_and_exit_code_2()
    {
        (string[] Line, string Says)[] cases =
        [
            (["reading"], "STAGE"),
            (["reading", Stage, "--dail", "1M"], "--dail"),
            (["reading", Stage, "--travel", "140"], "--travel: found 140 %, expected 0 % to 100 %"),
            (["reading", Stage, "--dial", "1,2M"], "found a comma"),
            (["reading", Stage, "--dial", "1k5F"], "--dial"),
            (["reading", Stage, "--grade", "middling"], "weak or typical or strong"),
            (["reading", Stage, "--dial", "1M", "--capacitor", "143p"], "expected one of the two"),
            (["reading", Stage, "--device", "1N34A"], "--device: found \"1N34A\", a diode, expected an NPN type"),
            (["reading", Stage, "--device", "no such type\u001b[31m"], "--device"),
            (["--json", "reading", Stage], "before the command"),
            (["coil", Stage, "--turns", "84"], "--turns"),
            (["coil", "--form", "50mm", "--wire", "0.4mm", "--pitch", "0.2mm", "--turns", "84"], "--pitch"),
            (["check", Stage, "--parts", "--json"], "--parts"),
        ];
        ProgramRun[] runs = await Task.WhenAll(cases.Select(c => ProgramRun.With(c.Line)));
        Assert.All(runs.Zip(cases), pair => OneLine(pair.First, 2, pair.Second.Says));
    }

    [Fact]
    public async Task A_faulty_stage_is_told_with_its_place_and_exit_code_1()
    {
        using var faulty = new TemporaryStage("format = \"regentrainer.stage/1\"\ncolour = \"red\"\ntitle = \"T\"\ncircuit = \"plain-tank\"\n");
        ProgramRun[] runs = await Task.WhenAll(
            ProgramRun.With("reading", Path.Combine(faulty.Folder, "missing.toml")),
            ProgramRun.In(faulty.Folder, "check", "stage.toml"),
            ProgramRun.In(faulty.Folder, "check", "stage.toml", "--json"),
            ProgramRun.In(faulty.Folder, "reading", "stage.toml", "--json"));
        Assert.All(runs, run => Assert.Equal(1, run.ExitCode));
        OneLine(runs[0], 1, "missing.toml");
        Assert.All(
            runs[1].Messages.TrimEnd('\n').Split('\n'),
            line => Assert.Matches(@"^stage\.toml:\d+:\d+: found .+, expected .+$", line));
        Assert.Contains("colour", runs[1].Messages, StringComparison.Ordinal);
        Assert.Equal(runs[1].Messages, runs[3].Messages);
        Assert.Equal("", runs[1].Text);
        Assert.Equal("", runs[2].Messages);
        Assert.Equal(2, runs[2].Json.GetProperty("faults").EnumerateArray()
            .First(fault => fault.GetProperty("found").GetString()!.Contains("colour", StringComparison.Ordinal))
            .GetProperty("line").GetInt32());
    }

    [Fact]
    public async Task A_reader_that_stops_reading_is_no_fault()
    {
        using Process process = ProgramRun.Start(null, "dial", Stage);
        process.StandardOutput.Close();
        string messages = await process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        Assert.Equal("", messages);
        Assert.Equal(0, process.ExitCode);
    }

    [Theory]
    [InlineData("INT", 130)]
    [InlineData("TERM", 143)]
    public async Task A_signal_ends_a_long_answer_at_once(string signal, int exitCode)
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "this system has no such signals");
        ProgramRun preset = await ProgramRun.With("check", Stage, "--parts");
        string text = Regex.Replace(preset.Text, "(?m)^step *=.*$", "step = \"700\"", RegexOptions.None, TimeSpan.FromSeconds(1));
        Assert.Contains("step = \"700\"", text, StringComparison.Ordinal);
        using var fine = new TemporaryStage(text);
        using Process process = ProgramRun.Start(null, "dial", fine.Path);
        await Task.Delay(TimeSpan.FromMilliseconds(500), TestContext.Current.CancellationToken);
        var watch = Stopwatch.StartNew();
        using (Process kill = Process.Start("kill", ["-" + signal, $"{process.Id}"]))
        {
            await kill.WaitForExitAsync(TestContext.Current.CancellationToken);
        }

        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        watch.Stop();
        Assert.Equal(exitCode, process.ExitCode);
        Assert.InRange(watch.ElapsedMilliseconds, 0, 1000);
    }

    private static void OneLine(ProgramRun run, int exitCode, string says)
    {
        Assert.Equal(exitCode, run.ExitCode);
        Assert.Equal("", run.Text);
        Assert.Equal(1, run.Messages.Count(c => c == '\n'));
        Assert.Contains(says, run.Messages, StringComparison.Ordinal);
        Assert.DoesNotContain('\u001b', run.Messages);
        Assert.DoesNotContain("Exception", run.Messages, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", run.Messages, StringComparison.Ordinal);
    }
}
