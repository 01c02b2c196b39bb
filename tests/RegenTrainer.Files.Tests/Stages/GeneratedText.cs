using System.Globalization;
using System.Text;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>
/// Writes a design as a stage file in a layout drawn at random: tables under headers, by dots or in braces, in any order, with
/// comments, blank lines, spacing and line ends, and values in several notations of the same number.
/// </summary>
/// <param name="seed">Equal seeds give equal texts; not 0.</param>
internal sealed class GeneratedText(ulong seed)
{
    private static readonly string[] _comments = ["# as built", "#", "# \"quoted\" = [1, {", "#\u00e9\u20ac\ud83d\ude00", "  # [coil]"];

    private readonly StringBuilder _text = new();
    private ulong _state = seed;

    /// <summary>The text.</summary>
    public string Of(StageDesign design)
    {
        Line($"format{Equal()}\"regentrainer.stage/1\"");
        foreach (string head in Shuffled([$"title{Equal()}'{design.Title}'", $"circuit{Equal()}\"{design.Family.Name}\""]))
        {
            Line(head);
        }

        Node root = Tree(design);
        List<Node> headed = [];
        foreach (Node table in Shuffled([.. root.Below]))
        {
            switch (Draw(3))
            {
                case 0:
                    Line($"{Key(table.Name)}{Equal()}{Braces(table)}");
                    break;
                case 1:
                    Dots(table, table.Name);
                    break;
                default:
                    headed.Add(table);
                    break;
            }
        }

        headed.ForEach(t => Headed(t, t.Name));
        string all = _text.ToString();
        all = Draw(3) == 0 ? all.TrimEnd('\n') : all;
        return Draw(4) == 0 ? all.ReplaceLineEndings("\r\n") : all;
    }

    private Node Tree(StageDesign design)
    {
        var root = new Node("");
        foreach ((string key, FieldValue value) in design.Values)
        {
            Node at = root;
            foreach (string piece in key.Split('.'))
            {
                at = at.Into(piece);
            }

            at.Value = Written(design.Family.FieldFor(key)!, value);
        }

        return root;
    }

    private string Written(Field field, FieldValue value)
    {
        string plain = field.Kind switch
        {
            FieldKind.Quantity when Draw(2) == 0 => Number(value.Number!.Value),
            FieldKind.Quantity => $"{Quote(TypedValue.Write(field, value with { TolerancePercent = null }))}",
            FieldKind.Count => value.Number!.Value.ToString("0", CultureInfo.InvariantCulture),
            FieldKind.Pairs => $"[{string.Join(", ", value.Pairs.Select(p => $"[{Number(p.First)},{Space()}{Number(p.Second)}]"))}{(Draw(2) == 0 ? "," : "")}]",
            _ => Quote(value.Text!),
        };
        return value.TolerancePercent is { } percent ? $"{{{Space()}value{Equal()}{plain},{Space()}tolerance = \"{Number(percent)}%\"{Space()}}}" : plain;
    }

    private void Headed(Node table, string path)
    {
        List<Node> headed = [], here = [];
        foreach (Node inner in Shuffled([.. table.Below]))
        {
            (inner.Value is null && Draw(2) == 0 ? headed : here).Add(inner);
        }

        Line($"[{Space()}{string.Join(Space() + "." + Space(), path.Split('.').Select(Key))}{Space()}]");
        foreach (Node inner in here)
        {
            if (inner.Value is null && Draw(2) == 0)
            {
                Dots(inner, inner.Name);
            }
            else
            {
                Line($"{Space()}{Key(inner.Name)}{Equal()}{inner.Value ?? Braces(inner)}");
            }
        }

        headed.ForEach(t => Headed(t, $"{path}.{t.Name}"));
    }

    private void Dots(Node table, string path)
    {
        foreach (Node inner in Shuffled([.. table.Below]))
        {
            string key = $"{path}.{inner.Name}";
            if (inner.Value is null && Draw(2) == 0)
            {
                Dots(inner, key);
            }
            else
            {
                Line($"{string.Join(Draw(6) == 0 ? " . " : ".", key.Split('.').Select(Key))}{Equal()}{inner.Value ?? Braces(inner)}");
            }
        }
    }

    private string Braces(Node table)
    {
        List<string> pieces = [];
        foreach (Node inner in Shuffled([.. table.Below]))
        {
            if (inner.Value is null && Draw(2) == 0)
            {
                pieces.AddRange(Shuffled([.. inner.Leaves("").Select(l => $"{inner.Name}.{l.Key}{Equal()}{l.Value}")]));
            }
            else
            {
                pieces.Add($"{Key(inner.Name)}{Equal()}{inner.Value ?? Braces(inner)}");
            }
        }

        return $"{{{Space()}{string.Join(Space() + "," + Space(), pieces)}{Space()}}}";
    }

    private void Line(string line)
    {
        for (int before = Draw(4); before > 2; before--)
        {
            _text.Append(Draw(2) == 0 ? "" : _comments[Draw(_comments.Length)]).Append('\n');
        }

        _text.Append(line).Append(Draw(4) == 0 ? Space() + " " + _comments[Draw(_comments.Length)].TrimStart() : Draw(4) == 0 ? "  \t" : "").Append('\n');
    }

    private string Quote(string text) => Draw(2) == 0 ? $"'{text}'" : $"\"{text}\"";

    private string Key(string key) => Draw(8) == 0 ? $"\"{key}\"" : key;

    private string Equal() => Draw(4) switch { 0 => "=", 1 => "  =\t", _ => " = " };

    private string Space() => Draw(3) switch { 0 => "", 1 => " ", _ => " \t" };

    private static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    private List<T> Shuffled<T>(List<T> items)
    {
        for (int k = items.Count - 1; k > 0; k--)
        {
            int other = Draw(k + 1);   // [Fisher and Yates 1938]
            (items[k], items[other]) = (items[other], items[k]);
        }

        return items;
    }

    private int Draw(int below)
    {
        _state ^= _state << 13;   // xorshift64 [Marsaglia 2003]
        _state ^= _state >> 7;
        _state ^= _state << 17;
        return (int)((_state >> 11) % (ulong)below);
    }

    private sealed class Node(string name)
    {
        public string Name => name;

        public string? Value { get; set; }

        public List<Node> Below { get; } = [];

        public Node Into(string piece)
        {
            Node? there = Below.Find(n => n.Name == piece);
            if (there is null)
            {
                Below.Add(there = new Node(piece));
            }

            return there;
        }

        public IEnumerable<(string Key, string Value)> Leaves(string path) =>
            Value is { } value ? [(path[..^1], value)] : Below.SelectMany(b => b.Leaves($"{path}{b.Name}."));
    }
}
