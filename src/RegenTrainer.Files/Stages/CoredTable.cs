using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads a winding on a core, stated by the core's inductance factor.</summary>
internal static class CoredTable
{
    private const double MostCoupling = 0.999;

    /// <summary>The part; null with its faults noted.</summary>
    public static Windings? Read(TableReader table, string name)
    {
        int before = table.Faults.Count;
        double? factor = table.Quantity("inductance_factor", Unit.Henry, 1e-12, 1, required: true);
        int? turns = table.Count("turns", 1, Winding.MostTurns, required: true);
        List<int> taps = turns is { } all ? WindingsTable.Taps(table, all) : [];
        IReadOnlyList<string> nodes = WindingsTable.Nodes(table, taps);
        double? coupling = table.Quantity("section_coupling", Unit.None, 0, MostCoupling, required: true);
        (double Q, double AtHz)? measured = WindingsTable.MeasuredQ(table, required: true);
        double capacitance = table.Quantity("self_capacitance", Unit.Farad, 0, 1e-6, required: false) ?? 0;
        double? bare = table.Quantity("wire_diameter", Unit.Metre, 1e-6, 0.02, required: table.Has("turn_length"));
        double? length = table.Quantity("turn_length", Unit.Metre, 1e-4, 100, required: bare is not null);
        if (table.Faults.Count > before)
        {
            return null;
        }

        try
        {
            TurnWire? wire = bare is { } diameter ? new TurnWire(diameter, length!.Value) : null;
            return new Windings(
                name, WindingsTable.Between(nodes), new CoredCoil(factor!.Value, turns!.Value, taps, coupling!.Value, measured!.Value, capacitance, wire));
        }
        catch (ArgumentException)
        {
            // Every value is within its range: what the coil still refuses is a Q that its wire does not allow.
            table.Refuse(table.Table.Find("q")!.Value.At, "a measured Q above what the wire alone leaves", "a lower Q, or thicker wire");
            return null;
        }
    }
}
