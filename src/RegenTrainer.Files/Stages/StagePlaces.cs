using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Where the keys and parts of a stage file stand, so that a fault found later can be told with its place.</summary>
internal sealed class StagePlaces
{
    private const string PartKey = "part:";

    private readonly Dictionary<string, TomlPlace> _keys = new(StringComparer.Ordinal);
    private readonly Dictionary<string, TomlTable> _parts = new(StringComparer.Ordinal);

    /// <summary>Where a fault of the stage as a whole is told.</summary>
    public TomlPlace Whole { get; set; } = TomlPlace.Start;

    /// <summary>Notes a key.</summary>
    public void Add(string key, TomlPlace at) => _keys[key] = at;

    /// <summary>Whether a key stands in the file.</summary>
    public bool Has(string key) => _keys.ContainsKey(key);

    /// <summary>Notes a part; false where its name is taken.</summary>
    public bool TryAddPart(string name, TomlTable table) => _parts.TryAdd(name, table);

    /// <summary>The place of a fault: of its key, for one that does not stand there of its nearest table.</summary>
    /// <param name="key">The dotted key, or <c>part:NAME</c>.</param>
    /// <param name="found">What the fault says is there: for a part it tells which of its values is meant.</param>
    public TomlPlace Of(string key, string found)
    {
        if (key.StartsWith(PartKey, StringComparison.Ordinal))
        {
            return _parts.TryGetValue(key[PartKey.Length..], out TomlTable? table) ? InPart(table, found) : Whole;
        }

        for (string path = key; path.Length > 0; path = path.Contains('.', StringComparison.Ordinal) ? path[..path.LastIndexOf('.')] : "")
        {
            if (_keys.TryGetValue(path, out TomlPlace at))
            {
                return at;
            }
        }

        return key == "part" ? Whole : TomlPlace.Start;
    }

    private static TomlPlace InPart(TomlTable table, string found)
    {
        if (found.Contains("the role ", StringComparison.Ordinal) && table.Find("role") is { } role)
        {
            return role.Value.At;
        }

        TomlText? node = TextsOf(table).FirstOrDefault(t => found.StartsWith($"node \"{t.Text}\"", StringComparison.Ordinal));
        return node?.At ?? table.Find("name")?.Value.At ?? table.At;
    }

    /// <summary>The texts of the tables and lists in a part, where its nodes are named.</summary>
    private static IEnumerable<TomlText> TextsOf(TomlTable table)
    {
        Stack<TomlValue> left = new(table.Entries.Select(e => e.Value).Where(v => v is TomlTable or TomlList or TomlTables).Reverse());
        while (left.TryPop(out TomlValue? value))
        {
            IEnumerable<TomlValue> inside = value switch
            {
                TomlTable inner => inner.Entries.Select(e => e.Value),
                TomlList list => list.Items,
                TomlTables tables => tables.Tables,
                _ => [],
            };
            if (value is TomlText text)
            {
                yield return text;
            }

            foreach (TomlValue next in inside.Reverse())
            {
                left.Push(next);
            }
        }
    }
}
