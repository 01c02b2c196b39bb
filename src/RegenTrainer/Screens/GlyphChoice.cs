using RegenTrainer.Drawing;

namespace RegenTrainer.Screens;

/// <summary>Chooses the glyph set a terminal can show.</summary>
internal static class GlyphChoice
{
    /// <summary>The first that is set and not empty decides (POSIX.1-2017, Base Definitions, 8.2).</summary>
    private static readonly string[] _localeVariables = ["LC_ALL", "LC_CTYPE", "LANG"];

    /// <summary>The set asked for, or the one the terminal's environment tells: ASCII where the locale is not UTF-8, blocks on a text console.</summary>
    /// <param name="asked">What the user asked for; null leaves the choice to the environment.</param>
    /// <param name="variable">Reads a variable of the environment; null where it is not set.</param>
    public static GlyphSet Choose(GlyphSet? asked, Func<string, string?> variable)
    {
        if (asked is { } set)
        {
            return set;
        }

        string locale = _localeVariables.Select(variable).FirstOrDefault(value => !string.IsNullOrEmpty(value)) ?? "";
        if (!OperatingSystem.IsWindows() && !IsUtf8(locale))
        {
            return GlyphSet.Ascii;
        }

        return variable("TERM") == "linux" ? GlyphSet.Blocks : GlyphSet.Braille;
    }

    private static bool IsUtf8(string locale) =>
        locale.Contains("utf-8", StringComparison.OrdinalIgnoreCase) || locale.Contains("utf8", StringComparison.OrdinalIgnoreCase);
}
