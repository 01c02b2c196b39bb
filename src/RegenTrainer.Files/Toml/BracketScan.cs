namespace RegenTrainer.Files.Toml;

/// <summary>Walks the bare characters of a TOML text and keeps count of lines, brackets and quotes, building nothing.</summary>
/// <param name="text">The text.</param>
internal ref struct BracketScan(string text)
{
    private int _next;
    private int _column;
    private char _quote;
    private bool _long;
    private bool _comment;
    private TomlPlace _opened;

    /// <summary>The present line, from 1.</summary>
    public int Line { get; private set; } = 1;

    /// <summary>How many brackets are open.</summary>
    public int Depth { get; private set; }

    /// <summary>Where a text begins that its line leaves open; null where there is none.</summary>
    public TomlPlace? Unclosed { get; private set; }

    /// <summary>The present place.</summary>
    public readonly TomlPlace At => new(Line, _column);

    /// <summary>Takes in the next character; false at the end.</summary>
    public bool MoveNext()
    {
        if (_next >= text.Length)
        {
            return false;
        }

        char c = text[_next++];
        if (!char.IsLowSurrogate(c))
        {
            _column++;   // both halves of a character beyond the first 65,536 stand in one column
        }

        if (c == '\n')
        {
            Unclosed = _quote != '\0' && !_long ? _opened : null;
            (Line, _column, _comment) = (Line + 1, 0, false);
        }
        else if (_quote != '\0')
        {
            Inside(c);
        }
        else if (!_comment)
        {
            Outside(c);
        }

        return true;
    }

    private void Inside(char c)
    {
        if (c == '\\' && _quote == '"' && _next < text.Length && text[_next] != '\n')
        {
            Skip(1);   // an escaped character closes nothing
        }
        else if (c == _quote && (!_long || Triple()))
        {
            Skip(_long ? 2 + QuotesBeforeTheLastThree() : 0);
            _quote = '\0';
        }
    }

    private void Outside(char c)
    {
        switch (c)
        {
            case '#':
                _comment = true;
                break;
            case '"' or '\'':
                (_quote, _opened) = (c, At);
                _long = Triple();
                Skip(_long ? 2 : 0);
                break;
            case '[' or '{':
                Depth++;
                break;
            case ']' or '}':
                Depth = Math.Max(0, Depth - 1);
                break;
            default:
                break;
        }
    }

    /// <summary>Whether the character just taken is the first of three quotes.</summary>
    private readonly bool Triple() => _next + 1 < text.Length && text[_next] == text[_next - 1] && text[_next + 1] == text[_next - 1];

    /// <summary>Quotes of the text itself, one or two, may stand right before the three that close it [TOML 1.0].</summary>
    private readonly int QuotesBeforeTheLastThree()
    {
        int quotes = 0;
        while (quotes < 2 && _next + 2 + quotes < text.Length && text[_next + 2 + quotes] == _quote)
        {
            quotes++;
        }

        return quotes;
    }

    private void Skip(int characters)
    {
        _next += characters;
        _column += characters;
    }
}
