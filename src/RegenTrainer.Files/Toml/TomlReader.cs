using System.Text;
using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace RegenTrainer.Files.Toml;

/// <summary>Reads TOML into tables whose every key and value knows its place, with the limits of our files.</summary>
internal sealed class TomlReader
{
    /// <summary>Largest file in bytes of UTF-8.</summary>
    public const int MostBytes = 1_000_000;

    private const int MostLines = 20_000;
    private const int DeepestNesting = 32;

    private readonly string _file;
    private readonly string _text;
    private readonly List<FileFault> _faults;

    private TomlReader(string file, string text, List<FileFault> faults) => (_file, _text, _faults) = (file, text, faults);

    /// <summary>Reads a text; null where it is no TOML or beyond a limit, with the reason added to the faults.</summary>
    public static TomlTable? TryRead(string file, string text, List<FileFault> faults)
    {
        var reader = new TomlReader(file, text, faults);
        return reader.WithinLimits() ? reader.Read() : null;
    }

    /// <summary>Checks size, lines and nesting on the bare characters, before anything is built of them.</summary>
    private bool WithinLimits()
    {
        if (_text.Length > MostBytes || Encoding.UTF8.GetByteCount(_text) > MostBytes)
        {
            return Refuse(TomlPlace.Start, "a file of more than 1 MB", "at most 1 MB");
        }

        var scan = new BracketScan(_text);
        while (scan.MoveNext())
        {
            if (scan.Line > MostLines)
            {
                return Refuse(new TomlPlace(scan.Line, 1), $"more than {MostLines} lines", $"at most {MostLines} lines");
            }

            if (scan.Depth > DeepestNesting)
            {
                return Refuse(scan.At, $"brackets nested {scan.Depth} deep", $"at most {DeepestNesting}");
            }

            if (scan.Unclosed is { } quote)
            {
                return Refuse(quote, "a text that does not end on its line", "a closing quote");
            }
        }

        return true;
    }

    private bool Refuse(TomlPlace at, string found, string expected)
    {
        _faults.Add(new FileFault(_file, at.Line, at.Column, found, expected));
        return false;
    }

    private TomlTable? Read()
    {
        // Keys and tables given twice are found below, all of them, beside what else is wrong.
        DocumentSyntax document = SyntaxParser.Parse(_text, _file, validate: false);
        if (document.HasErrors)
        {
            // What follows the first fault is mostly its echo.
            DiagnosticMessage first = document.Diagnostics.First(d => d.Kind == DiagnosticMessageKind.Error);
            (int offset, string found, string expected) = SyntaxWording.Of(_text, first.Span.Start.Offset, first.Message);
            Refuse(TomlPlace.Start.Behind(_text.AsSpan(0, offset)), found, expected);
            return null;
        }

        var root = new TomlTable(TomlPlace.Start, default);
        Fill(root, document.KeyValues, 0);
        root.Body = new TomlSpan(0, EndOf(document.KeyValues) ?? 0);
        foreach (TableSyntaxBase table in document.Tables)
        {
            if (table.Name is not { } name || Open(root, name, table is TableArraySyntax) is not { } target)
            {
                continue;
            }

            Fill(target, table.Items, 0);
            int start = table.Span.Start.Offset;
            target.Body = new TomlSpan(start, (EndOf(table.Items) ?? name.Span.End.Offset + 1) - start);
        }

        return root;
    }

    private TomlTable? Open(TomlTable root, KeySyntax name, bool repeated)
    {
        List<(string Key, TomlPlace At)> path = Path(name);
        if (path.Count > DeepestNesting)
        {
            Refuse(path[0].At, $"a name of {path.Count} pieces", $"at most {DeepestNesting}");
            return null;
        }

        TomlTable table = root;
        for (int k = 0; k < path.Count; k++)
        {
            (string key, TomlPlace at) = path[k];
            bool last = k == path.Count - 1;
            TomlEntry? entry = table.Find(key);
            if (entry is null)
            {
                var made = new TomlTable(at, Span(name.Span)) { IsImplied = !last };
                TomlValue value = last && repeated ? new TomlTables(at, Span(name.Span), [made]) : made;
                table.TryAdd(new TomlEntry(key, at, value, Span(name.Span)));
                table = made;
            }
            else if (entry.Value is TomlTables tables)
            {
                if (last && repeated)
                {
                    tables.Tables.Add(new TomlTable(at, Span(name.Span)));
                }

                table = tables.Tables[^1];
            }
            else if (entry.Value is TomlTable { IsInline: false } there && (!last || (there.IsImplied && !there.IsDotted && !repeated)))
            {
                there.IsImplied = there.IsImplied && !last;
                table = there;
            }
            else
            {
                Twice(at, entry);
                return null;
            }
        }

        return table;
    }

    private void Fill(TomlTable table, IEnumerable<KeyValueSyntax> items, int depth)
    {
        foreach (KeyValueSyntax item in items)
        {
            if (item.Key is not { } key || item.Value is not { } value)
            {
                continue;
            }

            List<(string Key, TomlPlace At)> path = Path(key);
            if (path.Count + depth > DeepestNesting)
            {
                Refuse(path[0].At, $"a key of {path.Count} pieces", $"at most {DeepestNesting}");
                continue;
            }

            bool clash = false;
            TomlTable target = table;
            for (int k = 0; k < path.Count - 1; k++)
            {
                if (target.Find(path[k].Key) is not { } entry)
                {
                    var made = new TomlTable(path[k].At, Span(key.Span)) { IsImplied = true, IsDotted = true };
                    target.TryAdd(new TomlEntry(path[k].Key, path[k].At, made, Span(item.Span)));
                    target = made;
                }
                else if (entry.Value is TomlTable { IsInline: false } there)
                {
                    target = there;
                }
                else
                {
                    Twice(path[k].At, entry);
                    clash = true;
                    break;
                }
            }

            if (clash)
            {
                continue;
            }

            var line = new TomlSpan(key.Span.Start.Offset, value.Span.End.Offset + 1 - key.Span.Start.Offset);
            if (!target.TryAdd(new TomlEntry(path[^1].Key, path[^1].At, Value(value, depth + 1), line)))
            {
                Twice(path[^1].At, target.Find(path[^1].Key)!);
            }
        }
    }

    private void Twice(TomlPlace at, TomlEntry first) =>
        Refuse(at, $"\"{first.Key}\" a second time", $"each key and table once; the first is in line {first.KeyAt.Line}");

    private static int? EndOf(IEnumerable<KeyValueSyntax> items) =>
        items.LastOrDefault(i => i.Value is not null) is { } last ? last.Value!.Span.End.Offset + 1 : null;

    private TomlValue Value(ValueSyntax value, int depth)
    {
        (TomlPlace at, TomlSpan span) = (Place(value.Span), Span(value.Span));
        switch (value)
        {
            case StringValueSyntax s:
                return new TomlText(at, span, s.Value ?? "", _text.Substring(span.Offset, span.Length));
            case IntegerValueSyntax i:
                return new TomlNumber(at, span, i.Value, true, Written(span));
            case FloatValueSyntax f when double.IsFinite(f.Value):
                return new TomlNumber(at, span, f.Value, false, Written(span));
            case ArraySyntax a:
                return new TomlList(at, span, [.. a.Items.Where(i => i.Value is not null).Select(i => Value(i.Value!, depth + 1))]);
            case InlineTableSyntax t:
                var table = new TomlTable(at, span) { IsInline = true };
                Fill(table, t.Items.Where(i => i.KeyValue is not null).Select(i => i.KeyValue!), depth + 1);
                return table;
            default:
                return new TomlOther(at, span, Written(span));
        }
    }

    private static List<(string Key, TomlPlace At)> Path(KeySyntax key)
    {
        List<(string, TomlPlace)> path = [(Name(key.Key), Place(key.Key!.Span))];
        foreach (DottedKeyItemSyntax dotted in key.DotKeys)
        {
            path.Add((Name(dotted.Key), Place(dotted.Key!.Span)));
        }

        return path;
    }

    private static string Name(BareKeyOrStringValueSyntax? key) => key switch
    {
        StringValueSyntax s => s.Value ?? "",
        BareKeySyntax b => b.Key?.Text ?? "",
        _ => "",
    };

    private string Written(TomlSpan span) => _text.Substring(span.Offset, Math.Min(span.Length, 40));

    private static TomlPlace Place(SourceSpan span) => new(span.Start.Line + 1, span.Start.Column + 1);

    private static TomlSpan Span(SourceSpan span) => new(span.Start.Offset, span.End.Offset + 1 - span.Start.Offset);
}
