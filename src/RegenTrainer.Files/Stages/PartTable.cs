using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads one [[part]] table.</summary>
internal static class PartTable
{
    public const int MostParts = 500;

    /// <summary>The kinds of part this program knows.</summary>
    public static readonly IReadOnlyList<string> Kinds =
        ["resistor", "capacitor", "inductor", "bead", "windings", "bipolar", "diode", "supply", "antenna", "feedback"];

    private const int LongestName = 100;
    private const double LeastQ = 0.01;
    private const double MostQ = 1e9;

    /// <summary>The part, or null with its faults noted.</summary>
    public static Part? Read(TableReader table, IDeviceSource source)
    {
        int before = table.Faults.Count;
        string? kind = table.Choice("kind", Kinds, required: true);
        string name = Name(table, "name", "a name for the part", required: kind is not null) ?? "";
        Part? part = kind switch
        {
            "resistor" => Resistor(table, name),
            "capacitor" => Capacitor(table, name),
            "inductor" => Two(table, (a, b) => new Inductor(
                name, a, b, Value(table, "value", Unit.Henry), table.Quantity("resistance", Unit.Ohm, 0, MostOf(Unit.Ohm), false) ?? 0,
                table.Quantity("q", Unit.None, LeastQ, MostQ, false))),
            "bead" => Two(table, (a, b) => new Bead(
                name, a, b, Value(table, "resistance", Unit.Ohm), Value(table, "inductance", Unit.Henry),
                table.Quantity("capacitance", Unit.Farad, 0, MostOf(Unit.Farad), false) ?? 0)),
            "supply" => Two(table, (a, b) => new Supply(
                name, a, b, table.Quantity("voltage", Unit.Volt, -1000, 1000, true) ?? 0,
                table.Quantity("resistance", Unit.Ohm, 0, MostOf(Unit.Ohm), false) ?? 0)),
            "antenna" => Two(table, (a, b) => PickUpTable.WithWire(table, new Antenna(name, a, b))),
            "bipolar" => Bipolar(table, name, source),
            "diode" => Diode(table, name, source),
            "feedback" => Feedback(table, name),
            "windings" => WindingsTable.Read(table, name),
            _ => null,
        };
        if (kind is null)
        {
            return null;
        }

        string? role = table.Choice("role", ["tuning", "regeneration", "regenerating"], required: false);
        table.Finish();
        if (table.Faults.Count > before || part is null)
        {
            return null;
        }

        return part with
        {
            Role = role switch
            {
                "tuning" => PartRole.Tuning,
                "regeneration" => PartRole.Regeneration,
                "regenerating" => PartRole.Regenerating,
                _ => PartRole.None,
            },
        };
    }

    /// <summary>Whether a text can be the name of a part or node; a fault where it cannot.</summary>
    public static bool Fits(TableReader table, TomlText name)
    {
        if (name.Text.Length is > 0 and <= LongestName)
        {
            return true;
        }

        table.Refuse(name.At, name.Text.Length == 0 ? name.Phrase : $"a name of {name.Text.Length} characters", $"a name of 1 to {LongestName} characters");
        return false;
    }

    /// <summary>Two node names under a key.</summary>
    public static (string From, string To)? Pair(TableReader table, string key)
    {
        IReadOnlyList<TomlValue> items = table.List(key, required: true, $"{key} = [\"one node\", \"another\"]");
        if (items is [TomlText from, TomlText to])
        {
            return Fits(table, from) & Fits(table, to) ? (from.Text, to.Text) : null;
        }

        if (table.Table.Find(key) is { Value: TomlList list })
        {
            table.Refuse(list.At, items.Count switch { 1 => "one entry", 2 => "a list of other things than texts", int n => $"{n} entries" }, "two node names in quotes");
        }

        return null;
    }

    private static string? Name(TableReader table, string key, string meaning, bool required)
    {
        string? name = table.Text(key, required, meaning);
        return name is null || Fits(table, (TomlText)table.Table.Find(key)!.Value) ? name : null;
    }

    private static double Value(TableReader table, string key, Unit unit) => table.Quantity(key, unit, LeastOf(unit), MostOf(unit), true) ?? 1;

    private static double LeastOf(Unit unit) => unit == Unit.Ohm ? 1e-6 : 1e-15;

    private static double MostOf(Unit unit) => unit == Unit.Ohm ? 1e12 : 1000;

    private static Part? Two(TableReader table, Func<string, string, Part> make) =>
        Pair(table, "between") is { } nodes ? make(nodes.From, nodes.To) : null;

    private static Part? Resistor(TableReader table, string name)
    {
        bool controlled = table.Table.Find("role")?.Value is TomlText { Text: "regeneration" };
        double ohm = table.Quantity("value", Unit.Ohm, LeastOf(Unit.Ohm), MostOf(Unit.Ohm), required: !controlled) ?? 1;
        return Two(table, (a, b) => new Resistor(name, a, b, ohm));
    }

    private static Part? Capacitor(TableReader table, string name)
    {
        bool tuned = table.Table.Find("role")?.Value is TomlText { Text: "tuning" };
        double farad = table.Quantity("value", Unit.Farad, LeastOf(Unit.Farad), MostOf(Unit.Farad), required: !tuned) ?? 1e-12;
        double? q = table.Quantity("q", Unit.None, LeastQ, MostQ, required: false);
        return Two(table, (a, b) => new Capacitor(name, a, b, farad, q));
    }

    private static Part? Bipolar(TableReader table, string name, IDeviceSource source)
    {
        DeviceModel? model = Device(table, source, DeviceKind.Bipolar);
        return Leads(table, "base", "collector", "emitter") is [{ } basis, { } collector, { } emitter] && model is BipolarModel bipolar
            ? new Bipolar(name, basis, collector, emitter, bipolar)
            : null;
    }

    private static Part? Diode(TableReader table, string name, IDeviceSource source)
    {
        DeviceModel? model = Device(table, source, DeviceKind.Diode);
        return Leads(table, "anode", "cathode") is [{ } anode, { } cathode] && model is DiodeModel diode
            ? new Diode(name, anode, cathode, diode)
            : null;
    }

    private static DeviceModel? Device(TableReader table, IDeviceSource source, DeviceKind wanted)
    {
        TomlValue? device = table.Value("device", required: true, "the name of a device");
        if (device is not null and not TomlText)
        {
            table.Refuse(device.At, device.Phrase, "the name of a device in quotes");
        }

        return device is TomlText text && DeviceNames.TryFind(table, source, text, wanted, out DeviceModel? model) ? model : null;
    }

    /// <summary>The nodes of a device's leads; null for each that is missing.</summary>
    private static IReadOnlyList<string?> Leads(TableReader table, params IReadOnlyList<string> keys)
    {
        TableReader? nodes = table.Inner("nodes", required: true, $"nodes = {{ {string.Join(", ", keys.Select(k => $"{k} = \"..\""))} }}");
        IReadOnlyList<string?> names = [.. keys.Select(k => nodes is null ? null : Name(nodes, k, $"the node of the {k}", required: true))];
        nodes?.Finish();
        return names;
    }

    private static Part? Feedback(TableReader table, string name)
    {
        (string From, string To)? sense = Pair(table, "sense"), drive = Pair(table, "drive");
        double siemens = table.Quantity("transconductance", Unit.Siemens, -1e3, 1e3, required: true) ?? 0;
        bool controlled = table.Table.Find("role")?.Value is TomlText { Text: "regeneration" };
        double factor = table.Quantity("factor", Unit.None, -1e6, 1e6, required: !controlled) ?? 1;
        return sense is { } s && drive is { } d ? new Feedback(name, s.From, s.To, d.From, d.To, siemens, factor) : null;
    }
}
