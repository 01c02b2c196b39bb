namespace RegenTrainer.Files.Toml;

/// <summary>Finds the characters of a string's value in the string as it is written, quotes and escapes included.</summary>
internal static class QuotedText
{
    /// <summary>The offset, within the written string, of a character of its value.</summary>
    /// <param name="written">The string with its quotes.</param>
    /// <param name="index">Characters of the value before the wanted one; its length for the closing quote.</param>
    public static int OffsetOf(ReadOnlySpan<char> written, int index)
    {
        if (written.Length < 2)
        {
            return 0;
        }

        char quote = written[0];
        bool tall = written.Length >= 6 && written[1] == quote && written[2] == quote;
        int at = tall ? 3 : 1;
        int end = written.Length - at;
        if (tall)
        {
            at += written[at..].StartsWith("\r\n") ? 2 : written[at] == '\n' ? 1 : 0;
        }

        for (int left = index; left > 0 && at < end;)
        {
            (int taken, int made) = quote == '"' && written[at] == '\\' ? Escape(written[at..end]) : (1, 1);
            if (made > left)
            {
                break;
            }

            left -= made;
            at += taken;
        }

        return Math.Min(at, end);
    }

    /// <summary>How many characters an escape takes in the text and makes in the value.</summary>
    private static (int Taken, int Made) Escape(ReadOnlySpan<char> at)
    {
        switch (at.Length > 1 ? at[1] : ' ')
        {
            case 'x':
                return (4, 1);
            case 'u':
                return (6, 1);
            case 'U':
                // Beyond the first 65,536 characters a value holds two halves.
                return (10, at.Length >= 10 && at[2..6].SequenceEqual("0000") ? 1 : 2);
            case ' ' or '\t' or '\r' or '\n':
                return (at.Length - at[1..].TrimStart(" \t\r\n").Length, 0);
            default:
                return (2, 1);
        }
    }
}
