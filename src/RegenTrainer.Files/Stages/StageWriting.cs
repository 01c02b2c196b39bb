using System.Globalization;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>One writing of a design into a stage file's text: collects changes by place, then applies them from the end.</summary>
internal sealed class StageWriting
{
    private readonly string _text;
    private readonly StageReading _reading;
    private readonly List<(int Offset, int Length, string Insert)> _changes = [];
    private readonly Dictionary<string, List<string>> _newTables = new(StringComparer.Ordinal);

    public StageWriting(string text, StageDesign design, DeviceShelf shelf)
    {
        _text = text;
        _reading = new StageReading("stage", text, shelf);
        StageDesign old = _reading.Design ?? throw new ArgumentException($"the text has faults: {_reading.Faults[0]}", nameof(text));
        if (!ReferenceEquals(old.Family, design.Family) || old.OutputNode != design.OutputNode || !old.ExtraParts.SequenceEqual(design.ExtraParts, PartComparer.Instance))
        {
            throw new ArgumentException("a text takes values; its family, parts and output node stay as they are", nameof(design));
        }

        WriteWord("title", old.Title, design.Title);
        WriteWord("note", old.Note, design.Note);
        foreach (Field field in design.Family.Fields)
        {
            WriteField(field, old.Values.GetValueOrDefault(field.Key), design.Values.GetValueOrDefault(field.Key));
        }

        Text = Apply();
    }

    /// <summary>The text with the design in it.</summary>
    public string Text { get; }

    private string NewLine => _text.Contains("\r\n", StringComparison.Ordinal) ? "\r\n" : "\n";

    private void WriteWord(string key, string old, string now)
    {
        if (old == now)
        {
            return;
        }

        if (_reading.Root!.Find(key) is { } entry)
        {
            Replace(entry.Value.Span, Notation.Quoted(now));
        }
        else
        {
            // Behind the title, which every stage has.
            Insert(EndOfLine(_reading.Root.Find("title")!.Line.End), $"{key} = {Notation.Quoted(now)}{NewLine}");
        }
    }

    private void WriteField(Field field, FieldValue? old, FieldValue? now)
    {
        if (Same(old, now))
        {
            return;
        }

        if (now is null)
        {
            Remove(_reading.Entries[field.Key], field.Key);
        }
        else if (_reading.Entries.TryGetValue(field.Key, out TomlEntry? entry))
        {
            bool onlyNumber = entry.Value is TomlTable && now.TolerancePercent == old!.TolerancePercent;
            TomlValue target = onlyNumber ? ((TomlTable)entry.Value).Find("value")!.Value : entry.Value;
            Replace(target.Span, onlyNumber ? Plain(field, now, target) : Written(field, now, target));
        }
        else
        {
            Add(field.Key, Written(field, now, null));
        }
    }

    private static bool Same(FieldValue? a, FieldValue? b) =>
        a is null || b is null
            ? a is null && b is null
            : a.Number == b.Number && a.Text == b.Text && a.TolerancePercent == b.TolerancePercent && a.Pairs.SequenceEqual(b.Pairs);

    private static string Written(Field field, FieldValue value, TomlValue? old)
    {
        string plain = Plain(field, value, old is TomlTable table ? table.Find("value")?.Value : old);
        return value.TolerancePercent is { } tolerance
            ? $"{{ value = {plain}, tolerance = \"{tolerance.ToString("R", CultureInfo.InvariantCulture)}%\" }}"
            : plain;
    }

    private static string Plain(Field field, FieldValue value, TomlValue? old) => field.Kind switch
    {
        FieldKind.Quantity => old is TomlNumber ? Notation.Number(value.Number!.Value) : Notation.Trade(value.Number!.Value, field.Unit, (old as TomlText)?.Text),
        FieldKind.Count => ((int)value.Number!.Value).ToString(CultureInfo.InvariantCulture),
        FieldKind.Pairs => "[" + string.Join(", ", value.Pairs.Select(p => $"[{Notation.Number(p.First)}, {Notation.Number(p.Second)}]")) + "]",
        _ => Notation.Quoted(value.Text!),
    };

    private void Replace(TomlSpan span, string now) => _changes.Add((span.Offset, span.Length, now));

    private void Insert(int offset, string text) => _changes.Add((offset, 0, text));

    /// <summary>Puts a value into the innermost table of its path that stands in the text, or into a table behind everything.</summary>
    private void Add(string key, string value)
    {
        TomlTable table = _reading.Root!;
        int used = 0;
        string[] pieces = key.Split('.');
        while (used < pieces.Length - 1 && table.Find(pieces[used]) is { Value: TomlTable inner })
        {
            (table, used) = (inner, used + 1);
        }

        string rest = string.Join('.', pieces[used..]);
        if (used == 0)
        {
            if (!_newTables.TryGetValue(pieces[0], out List<string>? lines))
            {
                _newTables.Add(pieces[0], lines = []);
            }

            lines.Add($"{string.Join('.', pieces[1..])} = {value}");
        }
        else if (table.IsInline)
        {
            int end = table.Entries.Count > 0 ? table.Entries[^1].Line.End : table.Span.Offset + 1;
            Insert(end, table.Entries.Count > 0 ? $", {rest} = {value}" : $" {rest} = {value} ");
        }
        else
        {
            int last = table.Entries.Count > 0 ? table.Entries.Max(e => e.Line.End) : table.Span.End;
            int end = EndOfLine(last);
            Insert(end, (end > 0 && _text[end - 1] != '\n' ? NewLine : "") + $"{rest} = {value}{NewLine}");
        }
    }

    private void Remove(TomlEntry entry, string key)
    {
        TomlTable table = _reading.Root!;
        foreach (string piece in key.Split('.')[..^1])
        {
            table = table.Find(piece)?.Value as TomlTable ?? table;
        }

        if (!table.IsInline)
        {
            int start = _text.LastIndexOf('\n', Math.Max(0, entry.Line.Offset - 1)) + 1;
            _changes.Add((start, EndOfLine(entry.Line.End) - start, ""));
            return;
        }

        // With the comma that parts it from a neighbour.
        int at = table.Entries.IndexOf(entry);
        (int from, int to) = at + 1 < table.Entries.Count
            ? (entry.Line.Offset, table.Entries[at + 1].Line.Offset)
            : at > 0 ? (table.Entries[at - 1].Line.End, entry.Line.End) : (entry.Line.Offset, entry.Line.End);
        _changes.Add((from, to - from, ""));
    }

    private int EndOfLine(int offset)
    {
        int end = _text.IndexOf('\n', Math.Min(offset, _text.Length));
        return end < 0 ? _text.Length : end + 1;
    }

    private string Apply()
    {
        string result = _text;
        foreach ((int offset, int length, string insert) in _changes.AsEnumerable().Reverse().OrderByDescending(c => c.Offset))
        {
            result = string.Concat(result.AsSpan(0, offset), insert, result.AsSpan(offset + length));
        }

        foreach ((string table, List<string> lines) in _newTables)
        {
            string gap = result.Length == 0 || result.EndsWith('\n') ? "" : NewLine;
            result += $"{gap}{NewLine}[{table}]{NewLine}{string.Concat(lines.Select(l => l + NewLine))}";
        }

        return result;
    }
}
