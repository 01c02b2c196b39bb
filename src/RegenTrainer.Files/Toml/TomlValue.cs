namespace RegenTrainer.Files.Toml;

/// <summary>A value with its place.</summary>
internal abstract record TomlValue(TomlPlace At, TomlSpan Span)
{
    /// <summary>The kind of value, as a phrase for a message.</summary>
    public abstract string Phrase { get; }
}

/// <summary>A string: its value, and how it is written with quotes and escapes.</summary>
internal sealed record TomlText(TomlPlace At, TomlSpan Span, string Text, string Written) : TomlValue(At, Span)
{
    private const int LongestQuote = 40;

    public override string Phrase => Text.Length == 0 ? "an empty text"
        : Text.Length <= LongestQuote ? $"\"{Text}\"" : $"\"{Text[..LongestQuote]}...\"";

    /// <summary>The place of a character of the string.</summary>
    public TomlPlace PlaceOf(int offset)
    {
        ReadOnlySpan<char> before = Written.AsSpan(0, QuotedText.OffsetOf(Written, offset));
        int lines = before.Count('\n');
        return lines == 0
            ? At with { Column = At.Column + before.Length }
            : new TomlPlace(At.Line + lines, before.Length - before.LastIndexOf('\n'));
    }
}

/// <summary>A number.</summary>
internal sealed record TomlNumber(TomlPlace At, TomlSpan Span, double Number, bool IsWhole, string Written) : TomlValue(At, Span)
{
    public override string Phrase => Written;
}

/// <summary>True, false, a date: nothing a stage has a use for.</summary>
internal sealed record TomlOther(TomlPlace At, TomlSpan Span, string Written) : TomlValue(At, Span)
{
    public override string Phrase => Written;
}

/// <summary>A list of values.</summary>
internal sealed record TomlList(TomlPlace At, TomlSpan Span, IReadOnlyList<TomlValue> Items) : TomlValue(At, Span)
{
    public override string Phrase => "a list";
}

/// <summary>A table, inline or under a header.</summary>
internal sealed record TomlTable(TomlPlace At, TomlSpan Span) : TomlValue(At, Span)
{
    private readonly Dictionary<string, TomlEntry> _byKey = new(StringComparer.Ordinal);

    /// <summary>The entries in order.</summary>
    public List<TomlEntry> Entries { get; } = [];

    /// <summary>Whether it is written in braces on one line.</summary>
    public bool IsInline { get; init; }

    /// <summary>Whether it came about by dots in a key or header only.</summary>
    public bool IsImplied { get; set; }

    /// <summary>Whether it came about by dots in a key, so that no header of its own may follow.</summary>
    public bool IsDotted { get; init; }

    /// <summary>From the header's bracket to the end of the last value below it; null for a table without a header.</summary>
    public TomlSpan? Body { get; set; }

    public override string Phrase => "a table";

    public TomlEntry? Find(string key) => _byKey.GetValueOrDefault(key);

    /// <summary>Adds an entry; false where the key is there already.</summary>
    public bool TryAdd(TomlEntry entry)
    {
        if (!_byKey.TryAdd(entry.Key, entry))
        {
            return false;
        }

        Entries.Add(entry);
        return true;
    }
}

/// <summary>The tables of one name under double-bracketed headers.</summary>
internal sealed record TomlTables(TomlPlace At, TomlSpan Span, List<TomlTable> Tables) : TomlValue(At, Span)
{
    public override string Phrase => "tables under [[ ]]";
}

/// <summary>A key with its value.</summary>
/// <param name="Key">The key, one piece without dots.</param>
/// <param name="KeyAt">Where the key stands.</param>
/// <param name="Value">The value.</param>
/// <param name="Line">The span of the whole entry, key to value.</param>
internal sealed record TomlEntry(string Key, TomlPlace KeyAt, TomlValue Value, TomlSpan Line);
