using RegenTrainer.Core.Antennas;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Readings;

namespace RegenTrainer.Core.Tests.Stages;

/// <summary>Antennas and cores of the tapped coil: what they expand to, and what they refuse.</summary>
public sealed class AntennaKindTests
{
    private static StageDesign LongWire => Changed(
        DefaultStage.Design, ("antenna.capacitance", null), ("antenna.kind", "long-wire"), ("antenna.wire.length", 25.0), ("antenna.wire.height", 8.0));

    private static StageDesign Rod => Changed(
        DefaultStage.Design,
        ("antenna.capacitance", null),
        ("antenna.earth_resistance", null),
        ("antenna.coupling", null),
        ("antenna.kind", "rod"),
        ("antenna.rod.diameter", 0.01),
        ("antenna.rod.permeability", 90.0),
        ("coil.core", "rod"),
        ("coil.form_diameter", null),
        ("coil.wire_diameter", null),
        ("coil.pitch", null),
        ("coil.form_loss_q", null),
        ("coil.inductance_factor", 55e-9),
        ("coil.turns", 66.0),
        ("coil.taps.emitter", 3.0),
        ("coil.taps.base", 18.0),
        ("coil.q.value", 200.0),
        ("coil.q.at", 1e6));

    private static StageDesign Loop => Changed(
        DefaultStage.Design,
        ("antenna.capacitance", null),
        ("antenna.earth_resistance", null),
        ("antenna.coupling", null),
        ("antenna.kind", "loop"));

    [Fact]
    public void A_long_wire_stands_for_itself_behind_its_resistances()
    {
        IReadOnlyList<Part> parts = Sound(LongWire).Parts;
        WireOverGround wire = Assert.IsType<WireOverGround>(parts.OfType<Antenna>().Single().Wire);
        Assert.Equal(2e-3, wire.DiameterMetre);
        Assert.Equal(50, Named<Resistor>(parts, "earth resistance").Ohm);
        Assert.Equal(wire.RadiationOhm(Math.Sqrt(530e3 * 1700e3)), Named<Resistor>(parts, "radiation resistance").Ohm);
        Assert.Equal(wire.BranchHenry, Named<Inductor>(parts, "antenna inductance").Henry);
        Assert.Equal("tank top", Named<Capacitor>(parts, "antenna coupling").To);

        // Left out, the coupling capacitor is a wire.
        parts = Sound(Changed(LongWire, ("antenna.coupling", null))).Parts;
        Assert.Equal("tank top", Named<Capacitor>(parts, "antenna capacitance").To);
        Assert.DoesNotContain(parts, part => part.Name == "antenna coupling");
    }

    // 40 m is a quarter wave at 1.87 MHz, 50 m at 1.5 MHz: c/4l.
    [Theory]
    [InlineData(40, 1.6e6, false)]
    [InlineData(50, 1.6e6, true)]
    public void A_reading_says_where_the_long_wire_is_too_long(double length, double hz, bool caution)
    {
        Reading reading = new StageUnderTest(LongWire.With("antenna.wire.length", FieldValue.Of(length))).Read(hz, 10);
        Assert.Equal(caution, reading.Cautions.Any(c => c.Code == "long-wire-too-long"));
    }

    [Fact]
    public void A_loop_is_the_coil_with_its_electromotive_force_by_turns()
    {
        StageCircuit circuit = Sound(Loop);
        Windings coil = circuit.Parts.OfType<Windings>().Single();
        Assert.Equal([4.0 / 84, 20.0 / 84, 60.0 / 84], coil.PickUp!.Shares);
        Assert.DoesNotContain(circuit.Parts, part => part is Antenna || part.Name.StartsWith("antenna", StringComparison.Ordinal));

        // 84 turns of a circle of 25.22 mm to the wire's centre at 1 MHz: 84 pi 0.02522^2 x 2 pi/299.792 = 3.5178 mm.
        Assert.Equal(3.5178e-3, coil.EffectiveHeightMetre(1e6)!.Value, 0.001e-3);
        Assert.Equal(3.5178e-3, CoilReader.TryRead(circuit.Parts, 1e6, 20)!.EffectiveHeightMetre!.Value, 0.001e-3);
        Assert.Null(CoilReader.TryRead(Sound(DefaultStage.Design).Parts, 1e6, 20)!.EffectiveHeightMetre);
    }

    // 66 turns of a rod of 10 mm and an effective permeability of 90 at 1 MHz: 2 pi N A mu/lambda = 9.7777 mm.
    [Fact]
    public void A_rod_multiplies_the_field()
    {
        Windings coil = Sound(Rod).Parts.OfType<Windings>().Single();
        Assert.Equal(9.7777e-3, coil.EffectiveHeightMetre(1e6)!.Value, 0.001e-3);
        CoredCoil core = Assert.IsType<CoredCoil>(coil.Model);
        Assert.Equal(0.90, core.SectionCoupling);
        Assert.Equal([3, 15, 48], core.SectionTurns);
        Assert.NotNull(new StageUnderTest(Rod).Read(1e6, 10).StageGainDb);
    }

    [Fact]
    public void A_ring_is_closer_coupled_and_its_wire_counts_where_it_is_described()
    {
        StageDesign ring = Changed(
            Rod,
            ("coil.core", "ring"),
            ("antenna.kind", "dummy"),
            ("antenna.rod.diameter", null),
            ("antenna.rod.permeability", null),
            ("antenna.coupling", 5e-12),
            ("coil.wire_diameter", 0.3e-3),
            ("coil.turn_length", 0.04),
            ("coil.self_capacitance", 6e-12));
        CoredCoil core = Assert.IsType<CoredCoil>(Sound(ring).Parts.OfType<Windings>().Single().Model);
        Assert.Equal(0.99, core.SectionCoupling);
        Assert.Equal([6e-12], core.SelfCapacitanceFarad);
        Assert.True(core.DcOhm(0, 20) > 0);

        Refuses(Changed(ring, ("coil.turn_length", null)), "coil.turn_length", "nothing", "diameter and turn length of the wire together, or neither");
        // 2 pi 1 MHz x 239.58 uH = 1505.3 ohm over 2.64 m of 0.0707 mm^2 copper, 0.6439 ohm: 2338.
        Refuses(Changed(ring, ("coil.q.value", 5e4)), "coil.q.value", "50000", "less than 2340, what the resistance of the wire alone leaves");
    }

    [Fact]
    public void What_does_not_belong_together_is_refused_at_its_key()
    {
        Refuses(Rod.With("coil.pitch", FieldValue.Of(1e-3)), "coil.pitch", "coil.pitch with coil.core = \"rod\"", "it with coil.core = \"air\" alone");
        Refuses(
            DefaultStage.With("coil.inductance_factor", 55e-9),
            "coil.inductance_factor",
            "coil.inductance_factor with coil.core = \"air\"",
            "it with coil.core = \"rod\" or \"ring\" alone");
        Refuses(
            Changed(Rod, ("antenna.kind", "loop"), ("antenna.rod.diameter", null), ("antenna.rod.permeability", null)),
            "antenna.kind",
            "\"loop\" with coil.core = \"rod\"",
            "coil.core = \"air\" with it: the coil itself is the antenna");
        Refuses(
            Loop.With("antenna.coupling", FieldValue.Of(5e-12)),
            "antenna.coupling",
            "antenna.coupling with antenna.kind = \"loop\"",
            "it with antenna.kind = \"short-wire\" or \"dummy\" or \"long-wire\" alone");
        Refuses(LongWire.With("antenna.wire.height", FieldValue.Of(30)), "antenna.wire.height", "30 m", "at most 25 m, the length of the wire that leads up to it");
    }

    [Fact]
    public void What_a_choice_asks_for_must_be_given()
    {
        Refuses(
            Changed(Rod, ("coil.q.value", null)),
            "coil.q.value",
            "no coil.q.value",
            "measured Q of the coil; that of an air-cored one is computed where not given, 1 to 100000, with coil.core = \"rod\"");
        Refuses(
            Changed(DefaultStage.Design, ("antenna.coupling", null)),
            "antenna.coupling",
            "no antenna.coupling",
            "capacitor from the antenna to the tank; a long wire goes straight to it where not given, 0.1 pF to 1000 µF, with antenna.kind = \"short-wire\"");
        Refuses(
            Changed(LongWire, ("antenna.wire.length", null)),
            "antenna.wire.length",
            "no antenna.wire.length",
            "length of a long wire, from the earth to its far end, 500 mm to 300 m, with antenna.kind = \"long-wire\"");
    }

    private static StageDesign Changed(StageDesign design, params (string Key, object? Value)[] changes)
    {
        foreach ((string key, object? value) in changes)
        {
            design = value switch
            {
                null => design with { Values = design.Values.Remove(key) },
                string word => design.With(key, FieldValue.Of(word)),
                _ => design.With(key, FieldValue.Of((double)value)),
            };
        }

        return design;
    }

    private static StageCircuit Sound(StageDesign design)
    {
        Assert.Empty(design.Family.Check(design));
        return design.Family.Expand(design);
    }

    private static void Refuses(StageDesign design, string key, string found, string expected) =>
        Assert.Equal(new FieldFault(key, found, expected), Assert.Single(design.Family.Check(design)));

    private static T Named<T>(IReadOnlyList<Part> parts, string name)
        where T : Part => parts.OfType<T>().Single(part => part.Name == name);
}
