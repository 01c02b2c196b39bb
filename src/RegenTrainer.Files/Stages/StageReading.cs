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

    private readonly string _file;
    private readonly DeviceShelf _shelf;
    private readonly ImmutableSortedDictionary<string, FieldValue>.Builder _values = ImmutableSortedDictionary.CreateBuilder<string, FieldValue>(StringComparer.Ordinal);
    private readonly ImmutableSortedDictionary<string, BipolarModel>.Builder _devices = ImmutableSortedDictionary.CreateBuilder<string, BipolarModel>(StringComparer.Ordinal);
    private readonly Dictionary<string, TomlPlace> _places = new(StringComparer.Ordinal);

    public StageReading(string file, string text, DeviceShelf shelf)
    {
        (_file, _shelf) = (file, shelf);
        Root = TomlReader.TryRead(file, text, Faults);
        if (Root is not null)
        {
            Design = Read(new TableReader(file, Root, Faults));
        }

        Faults.Sort((a, b) => (a.Line, a.Column).CompareTo((b.Line, b.Column)));
    }

    /// <summary>The tables; null where the text is no TOML.</summary>
    public TomlTable? Root { get; }

    public List<FileFault> Faults { get; } = [];

    /// <summary>The design; null where there are faults.</summary>
    public StageDesign? Design { get; }

    /// <summary>The entry of each value given, by dotted key.</summary>
    public Dictionary<string, TomlEntry> Entries { get; } = new(StringComparer.Ordinal);

    private StageDesign? Read(TableReader root)
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

        bool free = ReferenceEquals(family, PartsCircuit.Instance);
        foreach (TomlEntry entry in root.Table.Entries)
        {
            if (entry.Key is not ("format" or "title" or "note" or "circuit" or "part") && !(free && entry.Key == "output"))
            {
                Walk(root, family, entry, entry.Key);
            }
        }

        IReadOnlyList<Part> parts = Parts(root);
        string? output = free ? Output(root) : null;
        Require(root, family);
        if (Faults.Count > 0)
        {
            return null;
        }

        var design = new StageDesign(family, title, note, _values.ToImmutable(), _devices.ToImmutable(), [.. parts], output);
        foreach (FieldFault fault in family.Check(design))
        {
            root.Refuse(PlaceOf(fault.Key), fault.Found, fault.Expected);
        }

        return Faults.Count == 0 ? design : null;
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

    private void Walk(TableReader root, Family family, TomlEntry entry, string path)
    {
        if (family.FieldFor(path) is { } field)
        {
            Take(root, field, entry);
        }
        else if (entry.Value is TomlTable table && family.Fields.Any(f => f.Key.StartsWith(path + ".", StringComparison.Ordinal)))
        {
            _places[path] = table.IsInline ? entry.KeyAt : table.At;
            foreach (TomlEntry inner in table.Entries)
            {
                Walk(root, family, inner, $"{path}.{inner.Key}");
            }
        }
        else if (family.Fields.Any(f => f.Key.StartsWith(path + ".", StringComparison.Ordinal)))
        {
            root.Refuse(entry.Value.At, entry.Value.Phrase, $"a table of {path}: {Below(family, path)}");
        }
        else
        {
            string parent = path.Contains('.', StringComparison.Ordinal) ? path[..path.LastIndexOf('.')] : "";
            root.Refuse(entry.KeyAt, $"the unknown key \"{entry.Key}\"", Nearest.Words(entry.Key, Pieces(family, parent)));
        }
    }

    /// <summary>The keys that may stand in the table of a path.</summary>
    private static IEnumerable<string> Pieces(Family family, string parent)
    {
        int skip = parent.Length == 0 ? 0 : parent.Length + 1;
        return family.Fields.Where(f => parent.Length == 0 || f.Key.StartsWith(parent + ".", StringComparison.Ordinal))
            .Select(f => f.Key[skip..].Split('.')[0]).Distinct(StringComparer.Ordinal);
    }

    private static string Below(Family family, string path) => string.Join(", ", Pieces(family, path));

    private void Take(TableReader root, Field field, TomlEntry entry)
    {
        _places[field.Key] = entry.Value.At;
        Entries[field.Key] = entry;
        switch (field.Kind)
        {
            case FieldKind.Quantity:
                TakeQuantity(root, field, entry);
                break;
            case FieldKind.Count:
                if (root.Whole(entry.Value, (int)field.Minimum, (int)field.Maximum) is { } count)
                {
                    _values[field.Key] = FieldValue.Of(count);
                }

                break;
            case FieldKind.Choice:
                if (entry.Value is TomlText word && field.Choices.Contains(word.Text, StringComparer.Ordinal))
                {
                    _values[field.Key] = FieldValue.Of(word.Text);
                }
                else
                {
                    root.Refuse(entry.Value.At, entry.Value.Phrase, TableReader.Words(field.Choices));
                }

                break;
            case FieldKind.Device:
                TakeDevice(root, field, entry.Value);
                break;
            default:
                TakePairs(root, field, entry.Value);
                break;
        }
    }

    private void TakeQuantity(TableReader root, Field field, TomlEntry entry)
    {
        TomlValue value = entry.Value;
        double? tolerance = null;
        if (value is TomlTable table)
        {
            var inner = new TableReader(_file, table, Faults);
            value = inner.Value("value", required: true, $"value = {QuantityValues.Expected(field.Unit, field.Minimum, field.Maximum)}") ?? value;
            if (inner.Text("tolerance", required: true, "a tolerance such as \"5%\"") is { } text)
            {
                if (Core.Quantities.QuantityText.TryReadTolerance(text, out double percent, out Core.Quantities.QuantityFault fault))
                {
                    tolerance = percent;
                }
                else
                {
                    var at = (TomlText)table.Find("tolerance")!.Value;
                    root.Refuse(at.PlaceOf(fault.Offset), fault.Found, fault.Expected);
                }
            }

            inner.Finish();
            if (value is TomlTable)
            {
                return;
            }
        }

        if (QuantityValues.Read(root, value, field.Unit, field.Minimum, field.Maximum) is { } number)
        {
            _values[field.Key] = new FieldValue(number, null, tolerance);
        }
    }

    private void TakeDevice(TableReader root, Field field, TomlValue value)
    {
        if (value is not TomlText text)
        {
            root.Refuse(value.At, value.Phrase, "the name of a device in quotes");
            return;
        }

        if (DeviceNames.TryFind(root, _shelf, text, out BipolarModel? model))
        {
            _values[field.Key] = FieldValue.Of(text.Text);
            _devices[field.Key] = model!;
        }
    }

    private void TakePairs(TableReader root, Field field, TomlValue value)
    {
        List<(double, double)> pairs = [];
        if (value is TomlList list)
        {
            foreach (TomlValue item in list.Items)
            {
                if (item is TomlList { Items: [TomlNumber first, TomlNumber second] })
                {
                    pairs.Add((first.Number, second.Number));
                }
                else
                {
                    root.Refuse(item.At, item.Phrase, "a pair of numbers [a, b]");
                }
            }

            _values[field.Key] = new FieldValue(null, null, null) { Pairs = pairs };
        }
        else
        {
            root.Refuse(value.At, value.Phrase, "a list of pairs [[a, b], ...]");
        }
    }

    private IReadOnlyList<Part> Parts(TableReader root)
    {
        switch (root.Value("part", required: false, ""))
        {
            case TomlTables tables when tables.Tables.Count > PartTable.MostParts:
                root.Refuse(tables.Tables[PartTable.MostParts].At, $"{tables.Tables.Count} parts", $"at most {PartTable.MostParts}");
                return [];
            case TomlTables tables:
                List<Part> parts = [];
                foreach (TomlTable table in tables.Tables)
                {
                    if (PartTable.Read(new TableReader(_file, table, Faults), _shelf) is { } part)
                    {
                        parts.Add(part);
                        _places.TryAdd("part:" + part.Name, table.At);
                    }
                }

                return parts;
            case { } other:
                root.Refuse(other.At, other.Phrase, "parts under [[part]]");
                return [];
            default:
                return [];
        }
    }

    private string? Output(TableReader root)
    {
        if (root.Inner("output", required: true, "a table [output] with node = \"..\"") is not { } inner)
        {
            return null;
        }

        string? node = inner.Text("node", required: true, "the name of the output node");
        _places["output.node"] = inner.Table.Find("node")?.Value.At ?? inner.Table.At;
        inner.Finish();
        return node;
    }

    private void Require(TableReader root, Family family)
    {
        foreach (Field field in family.Fields.Where(f => f.Required && !_places.ContainsKey(f.Key)))
        {
            string expected = field.Kind == FieldKind.Quantity
                ? $"{field.Meaning}, {QuantityValues.Expected(field.Unit, field.Minimum, field.Maximum)}"
                : field.Meaning;
            root.Refuse(PlaceOf(field.Key), $"no {field.Key}", expected);
        }
    }

    /// <summary>Where a key stands; for one that does not, its nearest table.</summary>
    private TomlPlace PlaceOf(string key)
    {
        for (string path = key; path.Length > 0; path = path.Contains('.', StringComparison.Ordinal) ? path[..path.LastIndexOf('.')] : "")
        {
            if (_places.TryGetValue(path, out TomlPlace at))
            {
                return at;
            }
        }

        return TomlPlace.Start;
    }
}
