namespace RegenTrainer.Files.Toml;

/// <summary>Says in the words of our other messages what keeps a text from being TOML.</summary>
internal static class SyntaxWording
{
    private const int LongestWord = 40;

    // What the parser's own sentence speaks of, and what we say is expected; the first that fits counts.
    private static readonly (string Spoken, string Expected)[] _expected =
    [
        ("expecting a value", "a value"),
        ("Expecting `=`", "= behind a key of letters, digits, - and _"),
        ("closebracketdouble", "]] behind the table's name"),
        ("closebracket", "] behind the table's name"),
        ("closing `]`", "] at the end of the list"),
        ("inline table", "} at the end of the table"),
        ("escape character", "an escape of TOML, such as \\\" \\\\ \\n \\t \\u00B5"),
        ("Invalid control character", "text without control characters"),
        ("Unicode scalar", "the number of a character"),
        ("parse integer", "a whole number of at most 18 digits"),
        ("leading zero", "a number without leading zeros"),
        ("End-Of-File", "the closing quotes"),
        ("underscore", "a digit on both sides of _"),
    ];

    /// <summary>Words a fault of the parser.</summary>
    /// <param name="text">The whole text.</param>
    /// <param name="offset">Where the parser stopped.</param>
    /// <param name="spoken">What the parser says about it.</param>
    /// <returns>The offset of what is wrong, what stands there and what is expected.</returns>
    public static (int Offset, string Found, string Expected) Of(string text, int offset, string spoken)
    {
        int at = Math.Clamp(offset, 0, text.Length);
        bool behindValue = spoken.Contains("expecting token `newline`", StringComparison.Ordinal);
        bool noValue = spoken.EndsWith("for a value", StringComparison.Ordinal);
        if ((behindValue || noValue) && at < text.Length && text[at] != ',' && BareWord(text, at) is { } word)
        {
            return (word.Offset, $"`{word.Word}` without quotes", $"a number, or a text in quotes: \"{word.Word}\"");
        }

        if (behindValue)
        {
            return at < text.Length && text[at] == ',' && at > 0 && char.IsAsciiDigit(text[at - 1])
                ? (at, "a comma", "a point as decimal sign")
                : (at, What(text, at), "the end of the line");
        }

        foreach ((string part, string expected) in _expected)
        {
            if (spoken.Contains(part, StringComparison.Ordinal))
            {
                return (at, What(text, at), expected);
            }
        }

        return (at, What(text, at), "key = value, [table] or # comment");
    }

    /// <summary>A word that starts right behind an equals sign and holds nothing that TOML gives a meaning.</summary>
    private static (int Offset, string Word)? BareWord(string text, int at)
    {
        int start = at;
        while (start > 0 && IsWord(text[start - 1]))
        {
            start--;
        }

        int end = at;
        while (end < text.Length && IsWord(text[end]))
        {
            end++;
        }

        ReadOnlySpan<char> before = text.AsSpan(0, start).TrimEnd(' ');
        return end > start && end - start <= LongestWord && before.EndsWith("=") ? (start, text[start..end]) : null;
    }

    private static bool IsWord(char c) => char.IsLetterOrDigit(c) || c is '.' or '+' or '-' or '_' or '%' or '\u00b5';

    private static string What(string text, int at)
    {
        if (at >= text.Length)
        {
            return "the end of the file";
        }

        return text[at] switch
        {
            '\n' or '\r' => "the end of the line",
            _ when char.IsControl(text[at]) => $"the control character U+{(int)text[at]:X4}",
            _ when char.IsHighSurrogate(text[at]) && at + 1 < text.Length => $"`{text.AsSpan(at, 2)}`",
            _ => $"`{text[at]}`",
        };
    }
}
