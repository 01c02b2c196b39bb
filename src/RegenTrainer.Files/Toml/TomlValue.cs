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
    public TomlPlace PlaceOf(int offset) => At.Behind(Written.AsSpan(0, QuotedText.OffsetOf(Written, offset)));
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

    /// <summary>
    /// What is written in the table itself, by place, with the keys from here on: an entry under dotted keys stands here, one
    /// under a header or in braces of its own does not.
    /// </summary>
    public IReadOnlyList<(string Key, TomlEntry Entry)> Written => [.. Flat("").OrderBy(e => e.Entry.Line.Offset)];

    public TomlEntry? Find(string key) => _byKey.GetValueOrDefault(key);

    private IEnumerable<(string Key, TomlEntry Entry)> Flat(string path)
    {
        foreach (TomlEntry entry in Entries)
        {
            IEnumerable<(string, TomlEntry)> here = entry.Value switch
            {
                TomlTable { IsDotted: true } dotted => dotted.Flat($"{path}{entry.Key}."),
                TomlTable { IsInline: false } or TomlTables => [],
                _ => [(path + entry.Key, entry)],
            };
            foreach ((string, TomlEntry) one in here)
            {
                yield return one;
            }
        }
    }

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
