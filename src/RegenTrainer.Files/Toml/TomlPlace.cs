namespace RegenTrainer.Files.Toml;

/// <summary>A place in a text.</summary>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column in characters, from 1.</param>
internal readonly record struct TomlPlace(int Line, int Column)
{
    public static readonly TomlPlace Start = new(1, 1);

    /// <summary>The place behind some text that begins here; both halves of a character count once.</summary>
    public TomlPlace Behind(ReadOnlySpan<char> text)
    {
        int lines = text.Count('\n');
        int column = lines == 0 ? Column : 1;
        foreach (char c in text[(text.LastIndexOf('\n') + 1)..])
        {
            column += char.IsLowSurrogate(c) ? 0 : 1;
        }

        return new TomlPlace(Line + lines, column);
    }
}

/// <summary>A span of a text by character offsets.</summary>
/// <param name="Offset">First character, from 0.</param>
/// <param name="Length">Number of characters.</param>
internal readonly record struct TomlSpan(int Offset, int Length)
{
    public int End => Offset + Length;
}
