using System.Globalization;
using System.Text;

namespace RegenTrainer.Core.Quantities;

/// <summary>
/// Makes text from files, devices, paths, arguments and the environment fit to be shown: no character of it can move the
/// cursor, turn the direction of writing or hide.
/// </summary>
public static class Printable
{
    private const string Ellipsis = "\u2026";

    /// <summary>
    /// The text with every control character (line ends and tabs too), bidirectional control, zero-width or otherwise unseen
    /// character and unpaired surrogate replaced by one <c>?</c> each. Doing it twice changes nothing more.
    /// </summary>
    public static string Text(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        StringBuilder result = new(text.Length);
        int at = 0;
        while (at < text.Length)
        {
            if (!Rune.TryGetRuneAt(text, at, out Rune rune))
            {
                result.Append('?');
                at++;
                continue;
            }

            result.Append(IsUnseen(rune) ? "?" : rune.ToString());
            at += rune.Utf16SequenceLength;
        }

        return result.ToString();
    }

    /// <summary>
    /// Columns the text takes in a terminal once it went through <see cref="Text"/>: two for a wide character of East Asian
    /// writing or an emoji (Unicode UAX #11), one for any other grapheme, none for marks that combine with what stands before.
    /// </summary>
    public static int Width(string text)
    {
        string shown = Text(text);
        int width = 0;
        for (int at = 0, length; at < shown.Length; at += length)
        {
            length = StringInfo.GetNextTextElementLength(shown, at);
            width += ColumnWidth.OfGrapheme(shown.AsSpan(at, length));
        }

        return width;
    }

    /// <summary>
    /// The text made printable and cut, between graphemes, to at most so many columns; where something was cut off it ends in
    /// an ellipsis. It is not padded.
    /// </summary>
    /// <param name="text">Any text.</param>
    /// <param name="columns">Columns there are, 0 or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">The columns are negative.</exception>
    public static string Fit(string text, int columns)
    {
        Guard.NotNegative(columns, nameof(columns));
        string shown = Text(text);
        if (Width(shown) <= columns)
        {
            return shown;
        }

        if (columns == 0)
        {
            return "";
        }

        int at = 0;
        int width = 0;
        while (at < shown.Length)
        {
            int length = StringInfo.GetNextTextElementLength(shown, at);
            int wider = width + ColumnWidth.OfGrapheme(shown.AsSpan(at, length));
            if (wider > columns - 1)
            {
                break;
            }

            width = wider;
            at += length;
        }

        return shown[..at] + Ellipsis;
    }

    private static bool IsUnseen(Rune rune) =>
        Rune.GetUnicodeCategory(rune) is UnicodeCategory.Control or UnicodeCategory.Format
            or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator
        || rune.Value is 0x034F or 0x115F or 0x1160 or 0x17B4 or 0x17B5 or 0x180E or 0x2065 or 0x3164 or 0xFFA0
        || (rune.Value & 0xFFFE) == 0xFFFE;
}
