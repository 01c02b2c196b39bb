using System.Text;

namespace RegenTrainer.Core.Quantities;

/// <summary>Looks at places of a typed text without its outer blanks; offsets are those of the whole text.</summary>
internal sealed class TypedText(string text)
{
    /// <summary>Offset of the first character that is no blank.</summary>
    public int Start { get; } = text.Length - text.TrimStart().Length;

    /// <summary>Offset behind the last character that is no blank.</summary>
    public int End { get; } = text.TrimEnd().Length;

    /// <summary>The character at an offset; NUL at the end and behind it.</summary>
    public char At(int at) => at < End ? text[at] : '\0';

    /// <summary>What was typed from an offset to the end.</summary>
    public ReadOnlySpan<char> From(int at) => text.AsSpan(at, End - at);

    /// <summary>The run of decimal digits at an offset; may be empty.</summary>
    public string Digits(int at)
    {
        int end = at;
        while (char.IsAsciiDigit(At(end)))
        {
            end++;
        }

        return text[at..end];
    }

    /// <summary>The first offset from this one on that holds no blank.</summary>
    public int SkipBlanks(int at)
    {
        int next = at;
        while (next < End && char.IsWhiteSpace(text[next]))
        {
            next++;
        }

        return next;
    }

    /// <summary>The run of characters at an offset that are neither blank nor digit; may be empty.</summary>
    public string Word(int at)
    {
        int end = at;
        while (end < End && !char.IsWhiteSpace(text[end]) && !char.IsAsciiDigit(text[end]))
        {
            end++;
        }

        return at < end ? text[at..end] : "";
    }

    /// <summary>A phrase, fit to be shown, for what stands at an offset.</summary>
    public string Describe(int at)
    {
        if (at >= End)
        {
            return text.AsSpan(0, End).IsWhiteSpace() ? "nothing" : "the end";
        }

        if (text[at] == ',')
        {
            return "a comma";
        }

        if (char.IsWhiteSpace(text[at]))
        {
            return "a blank";
        }

        string shown = Rune.TryGetRuneAt(text, at, out Rune rune) ? rune.ToString() : text[at].ToString();
        bool hidden = Printable.Text(shown) != shown;
        return hidden ? $"the character U+{(rune == default ? text[at] : rune.Value):X4}" : $"`{shown}`";
    }
}
