using RegenTrainer.Drawing;
using RegenTrainer.Screens;

namespace RegenTrainer.Tests.Screens;

public sealed class GlyphChoiceTests
{
    [Theory]
    [InlineData("LANG=C.UTF-8 TERM=xterm-256color", "Braille")]
    [InlineData("LANG=de_DE.utf8 TERM=screen", "Braille")]
    [InlineData("LANG=C.UTF-8 TERM=linux", "Blocks")]
    [InlineData("LANG=C TERM=xterm", "Ascii")]
    [InlineData("TERM=xterm", "Ascii")]
    [InlineData("LANG=en_US.UTF-8 LC_ALL=C TERM=xterm", "Ascii")]
    [InlineData("LANG=C LC_CTYPE=C.UTF-8 TERM=xterm", "Braille")]
    [InlineData("LANG=C.UTF-8 LC_ALL= TERM=xterm", "Braille")]
    [InlineData("LANG=en_US.ISO-8859-1 TERM=linux", "Ascii")]
    public void Locale_and_terminal_choose(string environment, string expected)
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "terminals there are UTF-8 whatever the environment");
        Assert.Equal(expected, GlyphChoice.Choose(null, Variables(environment)).ToString());
    }

    [Fact]
    public void What_is_asked_for_is_taken() =>
        Assert.Equal(GlyphSet.Braille, GlyphChoice.Choose(GlyphSet.Braille, Variables("LANG=C TERM=linux")));

    private static Func<string, string?> Variables(string environment)
    {
        var set = environment.Split(' ').Select(pair => pair.Split('=')).ToDictionary(pair => pair[0], pair => pair[1]);
        return name => set.GetValueOrDefault(name);
    }
}
