using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Changes to a text, gathered by place in any order. No two may overlap; insertions at one place keep their order.</summary>
/// <param name="text">The text they are counted in.</param>
internal sealed class TextEdits(string text)
{
    private readonly List<(int Offset, int Length, string Now)> _edits = [];

    /// <summary>The line end the text uses.</summary>
    public string NewLine { get; } = text.Contains("\r\n", StringComparison.Ordinal) ? "\r\n" : "\n";

    /// <summary>Puts something in the place of a span.</summary>
    public void Replace(TomlSpan span, string now) => _edits.Add((span.Offset, span.Length, now));

    /// <summary>Puts something between two characters.</summary>
    public void Insert(int offset, string now) => _edits.Add((offset, 0, now));

    /// <summary>Puts a line behind the one a place is in.</summary>
    public void InsertLineBehind(int offset, string line)
    {
        int end = EndOfLine(offset);
        bool open = end > 0 && text[end - 1] != '\n';
        Insert(end, open ? NewLine + line : line + NewLine);
    }

    /// <summary>Takes out the lines a span lies in, whole.</summary>
    public void RemoveLines(TomlSpan span)
    {
        int start = span.Offset == 0 ? 0 : text.LastIndexOf('\n', span.Offset - 1) + 1;
        _edits.Add((start, EndOfLine(span.End) - start, ""));
    }

    /// <summary>The text with all changes.</summary>
    public string Apply()
    {
        string result = text;
        foreach ((int offset, int length, string now) in _edits.AsEnumerable().Reverse().OrderByDescending(e => e.Offset))
        {
            result = string.Concat(result.AsSpan(0, offset), now, result.AsSpan(offset + length));
        }

        return result;
    }

    private int EndOfLine(int offset)
    {
        int end = text.IndexOf('\n', Math.Min(offset, text.Length));
        return end < 0 ? text.Length : end + 1;
    }
}
