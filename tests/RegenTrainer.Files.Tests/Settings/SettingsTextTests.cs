using RegenTrainer.Files.Settings;

namespace RegenTrainer.Files.Tests.Settings;

public sealed class SettingsTextTests
{
    private const string Head = "format = \"regentrainer.settings/1\"\n";

    [Fact]
    public void A_first_file_reads_back()
    {
        var settings = new UserSettings(["/a b/\"c\".toml", "/d\n.toml"]);
        string text = SettingsText.Write("", settings);
        Assert.Equal(settings.LastUsed, SettingsText.Read(text, "s").Settings!.LastUsed);
        Assert.Equal(text, SettingsText.Write(text, settings));
        Assert.Empty(SettingsText.Read(SettingsText.Write(text, UserSettings.Empty), "s").Settings!.LastUsed);
    }

    [Fact]
    public void The_list_alone_is_written_and_all_else_stays()
    {
        const string text = "# mine\n" + Head + "last_used = [ \"a\" ] # since May\n# end";
        Assert.Equal("# mine\n" + Head + "last_used = [\n  \"b\",\n  \"a\",\n] # since May\n# end", SettingsText.Write(text, new UserSettings(["b", "a"])));
        Assert.Equal(text, SettingsText.Write(text, new UserSettings(["a"])));
    }

    [Theory]
    [InlineData("", "settings.toml:1:1: found no format, expected \"regentrainer.settings/1\"")]
    [InlineData(Head + "last_used = [7]\n", "settings.toml:2:14: found 7, expected a list of paths in quotes")]
    [InlineData(Head + "last = []\n", "settings.toml:2:1: found the unknown key \"last\"")]
    public void What_is_wrong_is_told_at_its_place(string text, string expected)
    {
        SettingsReadResult result = SettingsText.Read(text, "settings.toml");
        Assert.Null(result.Settings);
        Assert.StartsWith(expected, result.Faults[0].ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_used_again_comes_to_the_front()
    {
        UserSettings settings = UserSettings.Empty;
        foreach (int k in Enumerable.Range(0, 12))
        {
            settings = settings.Using($"f{k}");
        }

        Assert.Equal(["f5", "f11", "f10", "f9", "f8", "f7", "f6", "f4", "f3", "f2"], settings.Using("f5").LastUsed);
    }
}
