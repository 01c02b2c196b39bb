using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Puts values into a text that had none for their keys.</summary>
/// <param name="edits">Where the changes go.</param>
/// <param name="text">The text.</param>
/// <param name="root">Its tables.</param>
internal sealed class Addition(TextEdits edits, string text, TomlTable root)
{
    private readonly Dictionary<string, List<string>> _tables = new(StringComparer.Ordinal);
    private readonly HashSet<TomlTable> _filled = new(ReferenceEqualityComparer.Instance);

    /// <summary>Puts a value into the innermost table of its path that the text has, or notes it for a table behind everything.</summary>
    public void Add(string key, string value)
    {
        string[] pieces = key.Split('.');
        (TomlTable home, int depth) = (root, 0);
        TomlTable table = root;
        for (int k = 0; k < pieces.Length - 1 && table.Find(pieces[k])?.Value is TomlTable inner; k++)
        {
            table = inner;
            if (inner.IsInline || inner.Body is not null)
            {
                (home, depth) = (inner, k + 1);
            }
        }

        string line = $"{string.Join('.', pieces[depth..])} = {value}";
        if (home.IsInline)
        {
            AddInBraces(home, line);
        }
        else if (depth > 0 || root.Find(pieces[0])?.Value is TomlTable { IsDotted: true })
        {
            edits.InsertLineBehind(home.Body!.Value.End, line);
        }
        else
        {
            if (!_tables.TryGetValue(pieces[0], out List<string>? lines))
            {
                _tables.Add(pieces[0], lines = []);
            }

            lines.Add($"{string.Join('.', pieces[1..])} = {value}");
        }
    }

    /// <summary>Puts the tables that are still missing behind everything.</summary>
    public void AddTables()
    {
        string newLine = edits.NewLine;
        string gap = text.Length == 0 || text.EndsWith('\n') ? "" : newLine;
        foreach ((string table, List<string> lines) in _tables)
        {
            edits.Insert(text.Length, $"{gap}{newLine}[{table}]{newLine}{string.Concat(lines.Select(l => l + newLine))}");
            gap = "";
        }
    }

    private void AddInBraces(TomlTable table, string line)
    {
        if (table.Entries.Count > 0)
        {
            edits.Insert(table.Written[^1].Entry.Line.End, ", " + line);
        }
        else
        {
            edits.Insert(table.Span.Offset + 1, _filled.Add(table) ? $" {line} " : $", {line} ");
        }
    }
}
