using RegenTrainer.Files;

namespace RegenTrainer.Session.Tests;

public sealed class SettingsTests : IDisposable
{
    private readonly Workplace _place = new();

    public void Dispose() => _place.Dispose();

    private string File => Path.Combine(_place.Places.Settings!, "settings.toml");

    [Fact]
    public void Ten_files_are_remembered_the_last_one_first()
    {
        Workbench bench = _place.Open();
        for (int k = 1; k <= 12; k++)
        {
            Assert.Equal(FileOutcome.Done, bench.Open(_place.PutPreset($"s{k}.toml", "plain-tank")).Outcome);
        }

        Workplace.Until(bench, () => bench.LastUsed.Count == 10 && bench.LastUsed[0] == _place.At("s12.toml"));
        Assert.Equal(FileOutcome.Done, bench.Open(_place.At("s7.toml")).Outcome);
        string[] expected = ["s7", "s12", "s11", "s10", "s9", "s8", "s6", "s5", "s4", "s3"];
        Workplace.Until(bench, () => bench.LastUsed[0] == _place.At("s7.toml"));
        Assert.Equal(expected.Select(n => _place.At(n + ".toml")), bench.LastUsed);
        Assert.Equal(bench.LastUsed, _place.Open().LastUsed);
    }

    [Theory]
    [InlineData("format = \"regentrainer.settings/9\"\n")]
    [InlineData("format = \"regentrainer.settings/1\"\nlast_used = 3\n")]
    [InlineData("format = \"regentrainer.settings/1\"\nlast_used = [\"a\", 3]\n")]
    [InlineData("format = \"regentrainer.settings/1\"\nkolour = \"red\"\n")]
    [InlineData("= broken [")]
    public void Settings_that_cannot_be_understood_are_told_and_never_written_over(string text)
    {
        Directory.CreateDirectory(_place.Places.Settings!);
        System.IO.File.WriteAllText(File, text);
        Workbench bench = _place.Open(_place.PutPreset());
        Assert.StartsWith("the settings are left alone: " + File, bench.Notice, StringComparison.Ordinal);
        Assert.Empty(bench.LastUsed);
        _place.Second(bench);
        Assert.Equal(FileOutcome.Done, bench.SaveAs(_place.At("other.toml")).Outcome);
        bench.Dispose();
        Assert.Equal(text, System.IO.File.ReadAllText(File));
    }

    [Fact]
    public void Comments_of_the_user_stay()
    {
        Directory.CreateDirectory(_place.Places.Settings!);
        System.IO.File.WriteAllText(File, "# mine\nformat = \"regentrainer.settings/1\"   # as it was\n");
        Workbench bench = _place.Open(_place.PutPreset());
        Workplace.Until(bench, () => bench.LastUsed.Count > 0);
        Assert.Equal(
            $"# mine\nformat = \"regentrainer.settings/1\"   # as it was\nlast_used = [\n  \"{_place.At("stage.toml")}\",\n]\n",
            System.IO.File.ReadAllText(File));
    }

    [Fact]
    public void A_device_in_the_users_folder_is_on_the_shelf()
    {
        Directory.CreateDirectory(_place.Places.Devices!);
        System.IO.File.WriteAllText(
            Path.Combine(_place.Places.Devices!, "own2.toml"), Presets.Text("devices/bc547b").Replace("BC547B", "OWN2", StringComparison.Ordinal));
        Workbench bench = _place.Open();
        Assert.Contains("own2", bench.Devices("devices.main"), StringComparer.OrdinalIgnoreCase);
        Assert.True(bench.TryType("devices.main", "own2", out string refusal), refusal);
        Assert.Equal("OWN2", bench.Design.Word("devices.main"));
    }
}
