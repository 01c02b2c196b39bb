using System.Text.Json;

namespace RegenTrainer.EndToEnd.Tests;

/// <summary>Every command by the real program. A start costs part of a second: each test starts few and asserts much.</summary>
public sealed class CommandTests
{
    private const string Stage = "tapped-coil-npn";

    [Fact]
    public async Task Every_command_answers_in_lines_of_eighty_columns()
    {
        string[][] lines =
        [
            ["reading", Stage, "--travel", "61", "--station", "953k", "--audio", "400,1k,3000,10k"],
            ["dial", Stage, "--locked"],
            ["sidebands", Stage],
            ["bias", Stage, "--supply", "2.4", "--temperature", "-10"],
            ["coil", Stage],
            ["coil", "--form", "50mm", "--wire", "AWG 26", "--pitch", "0.6mm", "--turns", "84", "--taps", "4,24", "--at", "999k"],
            ["check", Stage],
            ["presets"],
            ["--travel", "30"],
            ["--help"],
        ];
        ProgramRun[] runs = await Task.WhenAll(lines.Select(ProgramRun.With));
        Assert.All(runs.Zip(lines), pair =>
        {
            (ProgramRun run, string[] line) = pair;
            Assert.Equal("", run.Messages);
            Assert.Equal(0, run.ExitCode);
            Assert.EndsWith("\n", run.Text, StringComparison.Ordinal);
            int widest = run.Text.Split('\n').Max(text => text.Length);
            Assert.True(line[0] == "--help" || widest <= 80, $"{string.Join(' ', line)} is {widest} wide");
        });
        Assert.Contains("no faults", runs[6].Text, StringComparison.Ordinal);
        Assert.Contains(Stage, runs[7].Text, StringComparison.Ordinal);
        Assert.Contains("start regentrainer in one", runs[8].Text, StringComparison.Ordinal);
        Assert.All(
            ["reading", "dial", "sidebands", "bias", "coil", "check", "presets"],
            command => Assert.Contains($"\n  {command} ", runs[9].Text, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Equal_runs_are_equal_bytes_and_a_dial_row_equals_the_reading_there()
    {
        string[] options = ["--travel", "40", "--supply", "2.4", "--grade", "weak", "--json"];
        ProgramRun[] runs = await Task.WhenAll(
            ProgramRun.With(["reading", Stage, "--dial", "1.2M", .. options]),
            ProgramRun.In(AppContext.BaseDirectory, ["reading", Stage, "--dial", "1200 kHz", .. options]),
            ProgramRun.With(["dial", Stage, .. options]));
        Assert.All(runs, run => Assert.Equal(0, run.ExitCode));
        Assert.Equal(runs[0].Results, runs[1].Results);

        JsonElement reading = runs[0].Json;
        JsonElement setting = reading.GetProperty("setting");
        Assert.Equal(1.2e6, setting.GetProperty("dial_hz").GetDouble());
        Assert.Equal(40, setting.GetProperty("travel_percent").GetDouble());
        Assert.Equal(2.4, setting.GetProperty("supply_volt").GetDouble());
        Assert.Equal("weak", setting.GetProperty("grade").GetString());

        JsonElement row = runs[2].Json.GetProperty("points").EnumerateArray()
            .Single(point => Math.Abs(point.GetProperty("dial_hz").GetDouble() - 1.2e6) < 1);
        foreach (JsonProperty figure in row.EnumerateObject().Where(figure => figure.Name != "dial_hz"))
        {
            JsonElement there = reading.GetProperty(figure.Name);
            if (figure.Value.ValueKind == JsonValueKind.Number)
            {
                double expected = there.GetDouble();
                Assert.Equal(expected, figure.Value.GetDouble(), 1e-9 * Math.Abs(expected));
            }
            else
            {
                Assert.Equal(there.ToString(), figure.Value.ToString());
            }
        }
    }

    [Fact]
    public async Task A_locked_capacitor_and_a_device_reach_the_setting()
    {
        ProgramRun[] runs = await Task.WhenAll(
            ProgramRun.With("reading", Stage, "--capacitor", "143p", "--travel", "20", "--json"),
            ProgramRun.With("reading", Stage, "--device", "BC547B", "--audio", "250", "--json"));
        Assert.All(runs, run => Assert.Equal(0, run.ExitCode));
        Assert.Equal(1.43e-10, runs[0].Json.GetProperty("tuning_farad").GetDouble());
        Assert.Equal("locked", runs[0].Json.GetProperty("dial_mode").GetString());
        Assert.Equal("BC547B", runs[1].Json.GetProperty("setting").GetProperty("device").GetString());
        Assert.Equal(250, Assert.Single(runs[1].Json.GetProperty("sidebands").EnumerateArray()).GetProperty("audio_hz").GetDouble());
    }
}
