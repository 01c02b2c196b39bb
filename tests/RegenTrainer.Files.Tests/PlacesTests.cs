namespace RegenTrainer.Files.Tests;

/// <summary>The folders of the XDG Base Directory Specification 0.8 and, on Windows, those of the known folders.</summary>
public sealed class PlacesTests
{
    [Theory]
    [InlineData("/c", "/s", "/home/u", "/c/regentrainer", "/s/regentrainer")]
    [InlineData(null, null, "/home/u", "/home/u/.config/regentrainer", "/home/u/.local/state/regentrainer")]
    [InlineData("", "relative/s", "/home/u", "/home/u/.config/regentrainer", "/home/u/.local/state/regentrainer")]
    [InlineData(null, "/s", "", null, "/s/regentrainer")]
    [InlineData(null, null, "", null, null)]
    public void Variables_that_are_missing_or_relative_count_as_none(string? config, string? state, string home, string? settings, string? kept)
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "Paths of Unix.");
        Places places = Places.From(name => name switch { "XDG_CONFIG_HOME" => config, "XDG_STATE_HOME" => state, _ => null }, home, windows: false);
        Assert.Equal((settings, kept), (places.Settings, places.State));
        Assert.Equal(settings is null ? null : settings + "/devices", places.Devices);
        Assert.Equal(home.Length == 0 ? null : home, places.Home);
    }

    [Fact]
    public void Windows_has_folders_of_its_own()
    {
        string root = OperatingSystem.IsWindows() ? @"C:\" : "/";
        Places places = Places.From(
            name => name switch { "APPDATA" => root + "roaming", "LOCALAPPDATA" => root + "local", _ => "/x" }, root + "u", windows: true);
        Assert.Equal((Path.Combine(root + "roaming", "regentrainer"), Path.Combine(root + "local", "regentrainer")), (places.Settings, places.State));
    }
}
