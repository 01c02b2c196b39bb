using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads windings: by their geometry, one or several on one axis, by the core they are on, or by the inductance of their sections.</summary>
internal static class WindingsTable
{
    private const int MostWindings = 16;
    private const double LeastLength = 1e-6;
    private const double MostRadius = 10;

    // As the winding itself takes it: a pitch worked out from the wire's diameter may differ from it by rounding.
    private const double PitchSlack = 1e-9;

    /// <summary>The part; null with its faults noted.</summary>
    public static Part? Read(TableReader table, string name)
    {
        Windings? windings = table.Has("sections") ? SectionsTable.Read(table, name)
            : table.Has("inductance_factor") ? CoredTable.Read(table, name)
            : ByGeometry(table, name);
        return PickUpTable.WithPickUp(table, windings);
    }

    /// <summary>The measured Q with its frequency; null where it is not given.</summary>
    public static (double Q, double AtHz)? MeasuredQ(TableReader table, bool required)
    {
        if (table.Inner("q", required, "q = { value = .., at = .. }") is not { } q)
        {
            return null;
        }

        (double, double) measured =
            (q.Quantity("value", Unit.None, 1, 1e6, required: true) ?? 1, q.Quantity("at", Unit.Hertz, 1e3, 1e9, required: true) ?? 1);
        q.Finish();
        return measured;
    }

    /// <summary>The nodes of one winding, start, taps and end; a fault where their number does not fit the taps.</summary>
    public static IReadOnlyList<string> Nodes(TableReader table, IReadOnlyList<int> taps)
    {
        int before = table.Faults.Count;
        List<string> names = Nodes(table);
        if (table.Faults.Count == before && names.Count != taps.Count + 2)
        {
            table.Refuse(table.Table.Find("nodes")!.Value.At, $"{names.Count} nodes", $"{taps.Count + 2}: start, taps in order, end");
        }

        return names;
    }

    /// <summary>The ends of each section between neighbouring nodes.</summary>
    public static IReadOnlyList<(string From, string To)> Between(IReadOnlyList<string> nodes) => [.. nodes.Zip(nodes.Skip(1))];

    private static Windings? ByGeometry(TableReader table, string name)
    {
        int before = table.Faults.Count;
        double? formLoss = table.Quantity("form_loss_q", Unit.None, 1, 1e6, required: false);
        (double, double)? measured = MeasuredQ(table, required: false);
        Turns first = new(Form(table), Radius(table), Wire(table, null));
        List<Winding> windings = [];
        List<(string, string)> nodes = [];
        Add(table, first, windings, nodes);
        IReadOnlyList<TomlValue> more = table.List("winding", required: false, "a list of windings { turns = .., nodes = [..], start = .. }");
        if (more.Count >= MostWindings)
        {
            table.Refuse(more[MostWindings - 1].At, $"{more.Count + 1} windings", $"at most {MostWindings}");
            return null;
        }

        foreach (TomlValue item in more)
        {
            if (item is TomlTable inner)
            {
                TableReader reader = table.Into(inner);
                double? radius = Radius(reader);
                Add(reader, new Turns(radius is null ? first.Form : null, radius ?? first.Radius, Wire(reader, first.Wire)), windings, nodes);
                reader.Finish();
            }
            else
            {
                table.Refuse(item.At, item.Phrase, "a winding { turns = .., nodes = [..] }");
            }
        }

        if (table.Faults.Count > before)
        {
            return null;
        }

        try
        {
            return new Windings(name, nodes, new Coil(windings, formLoss, measured));
        }
        catch (ArgumentException)
        {
            // Every value is within its range: what the coil still refuses is turns in one place.
            table.Refuse(more.Count > 0 ? more[0].At : table.Table.At, "two windings with turns in the same place", "windings beside or around each other");
            return null;
        }
    }

    private static double? Form(TableReader table)
    {
        double? form = table.Quantity("form_diameter", Unit.Metre, 1e-4, 2 * MostRadius, required: !table.Has("radius"));
        if (form is not null && table.Table.Find("radius") is { } radius)
        {
            table.Refuse(radius.KeyAt, "a radius beside a form diameter", "one of the two");
        }

        return form;
    }

    private static double? Radius(TableReader table) => table.Quantity("radius", Unit.Metre, LeastLength, MostRadius, required: false);

    private static Wire? Wire(TableReader table, Wire? inherited)
    {
        double? bare = table.Quantity("wire_diameter", Unit.Metre, LeastLength, 0.02, required: inherited is null);
        double? over = table.Quantity("wire_over_insulation", Unit.Metre, LeastLength, 0.1, required: false);
        if ((bare ?? inherited?.BareDiameterMetre) is not { } diameter)
        {
            return null;
        }

        if (over < diameter)
        {
            TomlValue there = table.Table.Find("wire_over_insulation")!.Value;
            table.Refuse(there.At, there.Phrase, $"at least {QuantityText.Write(diameter, Unit.Metre)}, the bare copper");
            return null;
        }

        return bare is null && over is null ? inherited : new Wire(diameter, over);
    }

    private static void Add(TableReader table, Turns laid, List<Winding> windings, List<(string From, string To)> nodes)
    {
        int before = table.Faults.Count;
        int? turns = table.Count("turns", 1, Winding.MostTurns, required: true);
        double? pitch = Pitch(table, laid.Wire);
        double start = table.Quantity("start", Unit.Metre, -10, 10, required: false) ?? 0;
        List<int> taps = turns is { } all ? Taps(table, all) : [];
        IReadOnlyList<string> names = table.Faults.Count == before ? Nodes(table, taps) : Nodes(table);
        if (laid is { Wire: { } own, Radius: { } given } && given < 0.5 * own.OverInsulationMetre)
        {
            table.Refuse(table.Table.Find("radius")?.Value.At ?? table.Table.At, QuantityText.Write(given, Unit.Metre), "at least half the wire over its insulation");
        }

        if (table.Faults.Count > before || laid.Wire is not { } wire || (laid.Form is null && laid.Radius is null))
        {
            return;
        }

        windings.Add(laid.Radius is { } radius
            ? new Winding(radius, turns!.Value, pitch ?? wire.OverInsulationMetre, wire, taps, start)
            : Winding.OnForm(laid.Form!.Value, wire, turns!.Value, pitch, taps, start));
        nodes.AddRange(Between(names));
    }

    private static double? Pitch(TableReader table, Wire? wire)
    {
        double? pitch = table.Quantity("pitch", Unit.Metre, LeastLength, 1, required: false);
        if (pitch < wire?.OverInsulationMetre * (1 - PitchSlack))
        {
            TomlValue there = table.Table.Find("pitch")!.Value;
            table.Refuse(there.At, there.Phrase, $"at least {QuantityText.Write(wire!.OverInsulationMetre, Unit.Metre)}, the wire over its insulation");
        }

        return pitch;
    }

    /// <summary>The taps of a winding, as turns from its start.</summary>
    public static List<int> Taps(TableReader table, int turns)
    {
        List<int> taps = [];
        IReadOnlyList<TomlValue> items = table.List("taps", required: false, "a list of turns, counted from the start");
        if (items.Count > Winding.MostTaps)
        {
            table.Refuse(items[Winding.MostTaps].At, $"{items.Count} taps", $"at most {Winding.MostTaps}");
            return [];
        }

        foreach (TomlValue item in items)
        {
            if (turns < 2)
            {
                table.Refuse(item.At, "a tap on a single turn", "a winding of at least 2 turns");
            }
            else if (table.Whole(item, 1, turns - 1) is { } tap)
            {
                if (taps.Count > 0 && tap <= taps[^1])
                {
                    table.Refuse(item.At, $"a tap at {tap} behind one at {taps[^1]}", "taps in rising order");
                }

                taps.Add(tap);
            }
        }

        return taps;
    }

    private static List<string> Nodes(TableReader table)
    {
        List<string> names = [];
        foreach (TomlValue item in table.List("nodes", required: true, "a list of nodes: start, taps in order, end"))
        {
            if (item is not TomlText text)
            {
                table.Refuse(item.At, item.Phrase, "the name of a node in quotes");
            }
            else if (PartTable.Fits(table, text))
            {
                names.Add(text.Text);
            }
        }

        return names;
    }

    /// <summary>What turns are laid on and of which wire: a form, or a radius to the wire's centre.</summary>
    private sealed record Turns(double? Form, double? Radius, Wire? Wire);
}
