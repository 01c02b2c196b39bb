using System.Collections.Immutable;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Families;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>One reading of a stage file: walks the family's fields over the tables and notes every fault with its place.</summary>
internal sealed class StageReading
{
    /// <summary>The format this program reads.</summary>
    public const string Format = "regentrainer.stage/1";

    private const int LongestTitle = 200;
    private const int LongestNote = 5000;
    private const string PartsKey = "part";

    private readonly IDeviceSource _source;
    private readonly ImmutableSortedDictionary<string, FieldValue>.Builder _values = ImmutableSortedDictionary.CreateBuilder<string, FieldValue>(StringComparer.Ordinal);
    private readonly ImmutableSortedDictionary<string, DeviceModel>.Builder _devices = ImmutableSortedDictionary.CreateBuilder<string, DeviceModel>(StringComparer.Ordinal);
    private readonly StagePlaces _places = new();
    private readonly HashSet<string> _wrongTables = new(StringComparer.Ordinal);
    private readonly HashSet<string> _spoiled = new(StringComparer.Ordinal);

    /// <summary>Reads a text.</summary>
    /// <param name="file">Its name for messages.</param>
    /// <param name="text">The text.</param>
    /// <param name="source">Where its devices come from.</param>
    /// <param name="check">Whether the values are checked against each other, beside each for itself.</param>
    public StageReading(string file, string text, IDeviceSource source, bool check)
    {
        _source = source;
        Root = TomlReader.TryRead(file, text, Faults);
        if (Root is not null)
        {
            StageDesign? design = Read(new TableReader(file, Root, Faults), check);
            Design = Faults.Count == 0 ? design : null;
        }

        // The faults of a device's own file stand behind those of the stage.
        Faults.Sort((a, b) => (a.File != file, a.Line, a.Column).CompareTo((b.File != file, b.Line, b.Column)));
    }

    /// <summary>The tables; null where the text is no TOML.</summary>
    public TomlTable? Root { get; }

    /// <summary>What is wrong, by position.</summary>
    public List<FileFault> Faults { get; } = [];

    /// <summary>The design; null where there are faults.</summary>
    public StageDesign? Design { get; }

    /// <summary>The entry of each value given, by dotted key.</summary>
    public Dictionary<string, TomlEntry> Entries { get; } = new(StringComparer.Ordinal);

    /// <summary>The tables of the stage's own parts, by name.</summary>
    public Dictionary<string, TomlTable> PartTables { get; } = new(StringComparer.Ordinal);

    private StageDesign? Read(TableReader root, bool check)
    {
        if (root.Choice("format", [Format], required: true) is null)
        {
            return null;   // a file of another format is refused, never half-read
        }

        string title = Limited(root, "title", LongestTitle, required: true), note = Limited(root, "note", LongestNote, required: false);
        string? circuit = root.Choice("circuit", [.. FamilyList.All.Select(f => f.Name)], required: true);
        if (circuit is null || FamilyList.ByName(circuit) is not { } family)
        {
            return null;
        }

        _places.Whole = root.Table.Find("circuit")!.Value.At;
        bool free = ReferenceEquals(family, PartsCircuit.Instance);
        FieldReader fields = new(root, _source);
        foreach (TomlEntry entry in root.Table.Entries)
        {
            if (entry.Key is not ("format" or "title" or "note" or "circuit" or PartsKey) && !(free && entry.Key == "output"))
            {
                Walk(root, fields, family, entry, entry.Key);
            }
        }

        ImmutableArray<Part> parts = Parts(root);
        string? output = free ? Output(root) : null;
        Require(root, family);
        var design = new StageDesign(family, title, note, _values.ToImmutable(), _devices.ToImmutable(), parts, output);
        if (check)
        {
            bool complete = family.Fields.All(f => !f.IsRequired(Word(family)) || _values.ContainsKey(f.Key));
            Check(root, complete ? family.Check(design) : Family.CheckChoices(design).Where(f => _values.ContainsKey(f.Key)));
        }

        return design;
    }

    /// <summary>The faults of the values together, but for those that a value already refused may have brought about.</summary>
    private void Check(TableReader root, IEnumerable<FieldFault> found)
    {
        foreach (FieldFault fault in found)
        {
            bool ofParts = fault.Key is PartsKey or "output.node" || fault.Key.StartsWith("part:", StringComparison.Ordinal);
            if (!_spoiled.Contains(ofParts ? PartsKey : Parent(fault.Key)))
            {
                root.Refuse(_places.Of(fault.Key, fault.Found), fault.Found, fault.Expected);
            }
        }
    }

    private static string Limited(TableReader root, string key, int most, bool required)
    {
        string text = root.Text(key, required, $"a {key} of up to {most} characters") ?? "";
        if (text.Length > most)
        {
            root.Refuse(root.Table.Find(key)!.Value.At, $"a {key} of {text.Length} characters", $"at most {most}");
        }

        return text;
    }

    private void Walk(TableReader root, FieldReader fields, Family family, TomlEntry entry, string path)
    {
        if (family.FieldFor(path) is { } field)
        {
            Take(fields, field, entry);
        }
        else if (Pieces(family, path) is not { Count: > 0 } below)
        {
            string parent = Parent(path);
            IReadOnlyList<string> known = Pieces(family, parent);
            root.Refuse(
                entry.KeyAt,
                $"the unknown key \"{entry.Key}\"",
                Nearest.Words(entry.Key, parent.Length > 0 ? known : [.. known, "title", "note", "circuit", PartsKey]));
        }
        else if (entry.Value is TomlTable table)
        {
            _places.Add(path, table.IsInline ? entry.KeyAt : table.At);
            foreach (TomlEntry inner in table.Entries)
            {
                Walk(root, fields, family, inner, $"{path}.{inner.Key}");
            }
        }
        else
        {
            root.Refuse(entry.Value.At, entry.Value.Phrase, $"a table of {path}: {string.Join(", ", below)}");
            _places.Add(path, entry.Value.At);
            _spoiled.Add(path);
            _wrongTables.Add(path);
        }
    }

    private void Take(FieldReader fields, Field field, TomlEntry entry)
    {
        _places.Add(field.Key, entry.Value.At);
        Entries[field.Key] = entry;
        if (fields.Read(field, entry.Value, out DeviceModel? model) is { } value)
        {
            _values[field.Key] = value;
        }
        else
        {
            _spoiled.Add(Parent(field.Key));
        }

        if (model is not null)
        {
            _devices[field.Key] = model;
        }
    }

    private ImmutableArray<Part> Parts(TableReader root)
    {
        int before = Faults.Count;
        List<Part> parts = [];
        switch (root.Value(PartsKey, required: false, ""))
        {
            case TomlTables tables when tables.Tables.Count > PartTable.MostParts:
                root.Refuse(tables.Tables[PartTable.MostParts].At, $"{tables.Tables.Count} parts", $"at most {PartTable.MostParts}");
                break;
            case TomlTables tables:
                foreach (TomlTable table in tables.Tables)
                {
                    if (PartTable.Read(root.Into(table), _source) is { } part)
                    {
                        parts.Add(part);
                        Note(root, part.Name, table);
                    }
                }

                break;
            case { } other:
                root.Refuse(other.At, other.Phrase, "parts under [[part]]");
                break;
            default:
                break;
        }

        if (Faults.Count > before)
        {
            _spoiled.Add(PartsKey);
        }

        return [.. parts];
    }

    private void Note(TableReader root, string name, TomlTable table)
    {
        if (_places.TryAddPart(name, table))
        {
            PartTables.Add(name, table);
        }
        else
        {
            root.Refuse(table.Find("name")!.Value.At, $"a second part named \"{name}\"", "a name of its own for every part");
        }
    }

    private string? Output(TableReader root)
    {
        if (root.Inner("output", required: true, "a table [output] with node = \"..\"") is not { } inner)
        {
            _spoiled.Add(PartsKey);
            return null;
        }

        string? node = inner.Text("node", required: true, "the name of the output node");
        if (inner.Table.Find("node") is { } entry)
        {
            Entries["output.node"] = entry;
            _places.Add("output.node", entry.Value.At);
        }

        if (node is null)
        {
            _spoiled.Add(PartsKey);
        }

        inner.Finish();
        return node;
    }

    private void Require(TableReader root, Family family)
    {
        Func<string, string?> word = Word(family);
        foreach (Field field in family.Fields.Where(f => f.IsRequired(word) && !_places.Has(f.Key) && !_wrongTables.Contains(Parent(f.Key))))
        {
            root.Refuse(_places.Of(field.Key, ""), $"no {field.Key}", field.ExpectedWith(word));
        }
    }

    /// <summary>The word in force for a key; null where the one given was refused.</summary>
    private Func<string, string?> Word(Family family) =>
        key => _values.TryGetValue(key, out FieldValue? value) ? value.Text : _places.Has(key) ? null : family.FieldFor(key)?.DefaultText;

    private static string Parent(string path) => path.Contains('.', StringComparison.Ordinal) ? path[..path.LastIndexOf('.')] : "";

    /// <summary>The keys that may stand in the table of a path; none where it is no table.</summary>
    private static IReadOnlyList<string> Pieces(Family family, string path)
    {
        string start = path.Length == 0 ? "" : path + ".";
        return
        [
            .. family.Fields.Where(f => f.Key.StartsWith(start, StringComparison.Ordinal))
                .Select(f => f.Key[start.Length..].Split('.')[0]).Distinct(StringComparer.Ordinal),
        ];
    }
}
