using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads windings, by geometry or by inductance and coupling.</summary>
internal static class WindingsTable
{
    public static Part? Read(TableReader table, string name) => table.Has("sections") ? BySections(table, name) : ByGeometry(table, name);

    private static Part? ByGeometry(TableReader table, string name)
    {
        int before = table.Faults.Count;
        double? form = table.Quantity("form_diameter", Unit.Metre, 1e-4, 10, required: !table.Has("radius"));
        double? radius = table.Quantity("radius", Unit.Metre, 1e-4, 10, required: false);
        double? formLoss = table.Quantity("form_loss_q", Unit.None, 1, 1e9, required: false);
        (double, double)? measured = null;
        if (table.Inner("q", required: false, "q = { value = .., at = .. }") is { } q)
        {
            measured = (q.Quantity("value", Unit.None, 1, 1e6, required: true) ?? 1, q.Quantity("at", Unit.Hertz, 1e3, 1e9, required: true) ?? 1);
            q.Finish();
        }

        Wire? wire = Wire(table, null);
        List<Winding> windings = [];
        List<(string, string)> nodes = [];
        Add(table, form, radius, wire, windings, nodes);
        foreach (TomlValue item in table.List("winding", required: false, "a list of windings { turns = .., nodes = [..], start = .. }"))
        {
            if (item is TomlTable inner)
            {
                var reader = new TableReader(table.File, inner, table.Faults);
                Add(reader, form, reader.Quantity("radius", Unit.Metre, 1e-4, 10, required: false) ?? radius, Wire(reader, wire), windings, nodes);
                reader.Finish();
            }
            else
            {
                table.Refuse(item.At, item.Phrase, "a winding { turns = .., nodes = [..] }");
            }
        }

        return table.Faults.Count > before ? null : new Windings(name, nodes, new Coil(windings, formLoss, measured));
    }

    private static Wire? Wire(TableReader table, Wire? inherited)
    {
        double? bare = table.Quantity("wire_diameter", Unit.Metre, 1e-6, 0.1, required: inherited is null);
        double? over = table.Quantity("wire_over_insulation", Unit.Metre, 1e-6, 0.2, required: false);
        return bare is { } diameter ? new Wire(diameter, over) : inherited;
    }

    private static void Add(
        TableReader table, double? form, double? radius, Wire? wire, List<Winding> windings, List<(string From, string To)> nodes)
    {
        int before = table.Faults.Count;
        int? turns = table.Count("turns", 1, Winding.MostTurns, required: true);
        double? pitch = table.Quantity("pitch", Unit.Metre, 1e-6, 1, required: false);
        double start = table.Quantity("start", Unit.Metre, -10, 10, required: false) ?? 0;
        List<int> taps = [];
        foreach (TomlValue item in table.List("taps", required: false, "a list of turn numbers"))
        {
            if (turns is { } all && all > 1 && table.Whole(item, 1, all - 1) is { } tap)
            {
                taps.Add(tap);
            }
        }

        if (taps.Count > Winding.MostTaps)
        {
            table.Refuse(table.Table.At, $"{taps.Count} taps", $"at most {Winding.MostTaps}");
        }

        string[] names = [.. table.List("nodes", required: true, "a list of nodes: start, taps in order, end").OfType<TomlText>().Select(t => t.Text)];
        if (table.Faults.Count == before && names.Length != taps.Count + 2)
        {
            table.Refuse(table.Table.Find("nodes")?.Value.At ?? table.Table.At, $"{names.Length} nodes", $"{taps.Count + 2}: start, taps in order, end");
        }

        if (table.Faults.Count > before || wire is null || (form is null && radius is null))
        {
            return;
        }

        double spacing = pitch ?? wire.OverInsulationMetre;
        windings.Add(radius is { } r
            ? new Winding(r, turns!.Value, spacing, wire, taps, start)
            : Winding.OnForm(form!.Value, wire, turns!.Value, pitch, taps, start));
        for (int k = 1; k < names.Length; k++)
        {
            nodes.Add((names[k - 1], names[k]));
        }
    }

    private static Part? BySections(TableReader table, string name)
    {
        int before = table.Faults.Count;
        List<InductiveSection> sections = [];
        List<(string, string)> nodes = [];
        foreach (TomlValue item in table.List("sections", required: true, "a list of sections { between = [..], inductance = .. }"))
        {
            if (item is not TomlTable inner)
            {
                table.Refuse(item.At, item.Phrase, "a section { between = [..], inductance = .. }");
                continue;
            }

            var reader = new TableReader(table.File, inner, table.Faults);
            (string From, string To)? between = PartTable.Pair(reader, "between");
            double? henry = reader.Quantity("inductance", Unit.Henry, 1e-12, 1e3, required: true);
            double? q = reader.Quantity("q", Unit.None, 0.1, 1e9, required: false);
            double ohm = reader.Quantity("resistance", Unit.Ohm, 0, 1e9, required: false) ?? 0;
            reader.Finish();
            if (between is { } ends && henry is { } value)
            {
                sections.Add(new InductiveSection(value, q, ohm));
                nodes.Add(ends);
            }
        }

        List<SectionCoupling> couplings = [];
        foreach (TomlValue item in table.List("coupling", required: false, "a list of couplings [first, second, factor]"))
        {
            if (item is TomlList { Items: [TomlNumber first, TomlNumber second, TomlNumber factor] }
                && table.Whole(first, 1, sections.Count) is { } i && table.Whole(second, 1, sections.Count) is { } j)
            {
                couplings.Add(new SectionCoupling(i - 1, j - 1, factor.Number));
            }
            else
            {
                table.Refuse(item.At, item.Phrase, $"[section, section, factor] with sections 1 to {sections.Count}");
            }
        }

        return table.Faults.Count > before ? null : new Windings(name, nodes, new CoupledSections(sections, couplings));
    }
}
