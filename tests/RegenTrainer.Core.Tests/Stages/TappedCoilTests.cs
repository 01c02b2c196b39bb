using System.Collections.Immutable;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Tests.Stages;

public sealed class TappedCoilTests
{
    [Fact]
    public void The_default_stage_can_be_built() => Assert.Empty(DefaultStage.Design.Family.Check(DefaultStage.Design));

    /// <summary>The circuit diagram of the default stage, written down by hand.</summary>
    [Fact]
    public void The_default_stage_is_wired_as_drawn()
    {
        string[] drawn =
        [
            "coil: earth, emitter tap, base tap, tank top",
            "tuning capacitor: tank top, earth",
            "trimmer: tank top, earth",
            "tank wiring: tank top, earth",
            "emitter tap wiring: emitter tap, earth",
            "base tap wiring: base tap, earth",
            "battery: supply rail, earth",
            "decoupling: supply rail, earth",
            "base coupling: base tap, base feed",
            "base resistor: collector, base feed",
            "base stopper: base feed, base",
            "base wiring: base, earth",
            "main: base, collector, emitter",
            "collector resistor: supply rail, collector",
            "series resistor: emitter, control device end",
            "regeneration control: control device end, emitter tap",
            "control wiring at device: control device end, earth",
            "control wiring at tap: emitter tap, earth",
            "antenna: antenna EMF, earth",
            "earth resistance: antenna EMF, antenna wire",
            "antenna capacitance: antenna wire, antenna",
            "antenna coupling: antenna, tank top",
            "follower: collector, supply rail, follower emitter",
            "follower resistor: follower emitter, earth",
            "output coupling: follower emitter, output",
            "load: output, earth",
            "load capacitance: output, earth",
        ];
        Assert.Equal(drawn, Wiring(Expand(DefaultStage.Design)));
    }

    [Fact]
    public void The_parts_have_the_values_given()
    {
        StageCircuit circuit = Expand(DefaultStage.Design);
        Assert.Equal(1e3, Part<Resistor>(circuit, "base stopper").Ohm);
        Assert.Equal(1e6, Part<Resistor>(circuit, "base resistor").Ohm);
        Assert.Equal(680, Part<Resistor>(circuit, "collector resistor").Ohm);
        Assert.Equal(220, Part<Resistor>(circuit, "series resistor").Ohm);
        Assert.Equal(220e-12, Part<Capacitor>(circuit, "base coupling").Farad);
        Assert.Equal(8e-12, Part<Capacitor>(circuit, "control wiring at tap").Farad);
        Assert.Equal(1500, Part<Capacitor>(circuit, "tuning capacitor").Q);
        Assert.Equal(3.0, Part<Supply>(circuit, "battery").Volt);
        Assert.Equal(2, Part<Supply>(circuit, "battery").SeriesOhm);
        Assert.Equal(3, Part<Windings>(circuit, "coil").Model.SectionCount);
        Assert.Equal(PartRole.Tuning, Part<Capacitor>(circuit, "tuning capacitor").Role);
        Assert.Equal(PartRole.Regenerating, Part<Bipolar>(circuit, "main").Role);
        Assert.Equal(PartRole.None, Part<Bipolar>(circuit, "follower").Role);
        Assert.Equal((530e3, 1700e3, 10e3), (circuit.Dial.LowHz, circuit.Dial.HighHz, circuit.Dial.StepHz));
        Assert.Equal("output", circuit.OutputNode);
        Assert.Equal(3.0, circuit.SupplyVolt);
    }

    /// <summary>Full resistance is least regeneration: the sum of track and end rest of the potentiometer is where travel begins.</summary>
    [Fact]
    public void The_control_begins_at_its_largest_resistance()
    {
        StageCircuit circuit = Expand(DefaultStage.Design);
        Resistor control = Part<Resistor>(circuit, "regeneration control");
        Assert.Equal(PartRole.Regeneration, control.Role);
        Assert.Equal(Unit.Ohm, circuit.Control!.Unit);
        Assert.Equal(10e3, control.Ohm, 20.0);
        Assert.Equal(circuit.Control.Law.ValueAtStart, control.Ohm);
    }

    [Fact]
    public void A_series_resistor_at_the_tap_leaves_the_emitter_on_the_control_lead()
    {
        IReadOnlyList<string> wiring = Wiring(Expand(DefaultStage.With("regeneration.series.at", "tap")));
        Assert.Contains("series resistor: emitter tap, control tap end", wiring);
        Assert.Contains("regeneration control: emitter, control tap end", wiring);
        Assert.Contains("control wiring at device: emitter, earth", wiring);
        Assert.Contains("control wiring at tap: control tap end, earth", wiring);
    }

    [Fact]
    public void Without_a_series_resistor_the_control_joins_emitter_and_tap()
    {
        IReadOnlyList<string> wiring = Wiring(Expand(DefaultStage.Without("regeneration.series.value")));
        Assert.DoesNotContain(wiring, w => w.StartsWith("series", StringComparison.Ordinal));
        Assert.Contains("regeneration control: emitter, emitter tap", wiring);
    }

    [Fact]
    public void Lead_inductance_lies_between_the_stage_and_the_wiring_at_the_control()
    {
        StageCircuit circuit = Expand(DefaultStage.With("layout.lead_inductance", 50e-9));
        IReadOnlyList<string> wiring = Wiring(circuit);
        Assert.Contains("series resistor: emitter, series end", wiring);
        Assert.Contains("control lead at device: series end, control device end", wiring);
        Assert.Contains("control lead at tap: emitter tap, control tap end", wiring);
        Assert.Contains("regeneration control: control device end, control tap end", wiring);
        Assert.Equal(50e-9, Part<Inductor>(circuit, "control lead at tap").Henry);
    }

    /// <summary>10 kohm beside 4.7 kohm are 3197.3 ohm by any table of parallel resistors.</summary>
    [Fact]
    public void A_shunt_lies_across_the_control()
    {
        StageCircuit circuit = Expand(DefaultStage.With("regeneration.potentiometer.shunt", 4.7e3));
        Assert.Equal(3197.3, Part<Resistor>(circuit, "regeneration control").Ohm, 0.1);
    }

    [Fact]
    public void A_padder_lies_between_tank_and_tuning_capacitor()
    {
        IReadOnlyList<string> wiring = Wiring(Expand(DefaultStage.With("dial.padder", 1e-9)));
        Assert.Contains("padder: tank top, tuning plates", wiring);
        Assert.Contains("tuning capacitor: tuning plates, earth", wiring);
        Assert.Contains("trimmer: tank top, earth", wiring);
    }

    [Fact]
    public void Without_a_stopper_the_base_is_at_its_feed()
    {
        IReadOnlyList<string> wiring = Wiring(Expand(DefaultStage.With("bias.base_stopper", 0)));
        Assert.Contains("main: base feed, collector, emitter", wiring);
        Assert.Contains("base wiring: base feed, earth", wiring);
    }

    [Theory]
    [InlineData(24, 4, "coil: earth, base tap, emitter tap, tank top", 3)]
    [InlineData(24, 24, "coil: earth, emitter tap, tank top", 2)]
    [InlineData(1, 83, "coil: earth, emitter tap, base tap, tank top", 3)]
    public void Taps_may_lie_in_any_order(int emitter, int @base, string coil, int sections)
    {
        StageDesign design = DefaultStage.With("coil.taps.emitter", emitter).With("coil.taps.base", FieldValue.Of(@base));
        Assert.Empty(design.Family.Check(design));
        StageCircuit circuit = Expand(design);
        Assert.Contains(coil, Wiring(circuit));
        Windings windings = Part<Windings>(circuit, "coil");
        Assert.Equal(sections, windings.SectionNodes.Count);
        Assert.Equal(sections, windings.Model.SectionCount);
    }

    [Fact]
    public void A_load_straight_on_the_collector_needs_no_follower()
    {
        StageDesign design = DefaultStage.With("output.kind", "load") with
        {
            Devices = DefaultStage.Design.Devices.Remove("devices.follower"),
        };
        Assert.Empty(design.Family.Check(design));
        StageCircuit circuit = Expand(design);
        Assert.Contains("output coupling: collector, output", Wiring(circuit));
        Assert.Single(circuit.Parts.OfType<Bipolar>());
    }

    [Fact]
    public void A_stage_with_pnp_devices_is_the_mirror_of_the_one_with_npn()
    {
        BipolarModel pnp = DefaultStage.Bc547b with { Name = "BC557B", Polarity = Polarity.Pnp };
        StageDesign design = DefaultStage.Design with
        {
            Devices = ImmutableSortedDictionary<string, DeviceModel>.Empty.Add("devices.main", pnp).Add("devices.follower", pnp),
        };
        Assert.Empty(design.Family.Check(design));
        StageCircuit mirrored = Expand(design);
        StageCircuit original = Expand(DefaultStage.Design);
        Assert.Equal(-3.0, Part<Supply>(mirrored, "battery").Volt);
        Assert.Equal(3.0, mirrored.SupplyVolt);
        Assert.Equal(Wiring(original), Wiring(mirrored));
        Assert.Equal(original.Parts.OfType<Resistor>(), mirrored.Parts.OfType<Resistor>());
        Assert.Equal(original.Parts.OfType<Capacitor>(), mirrored.Parts.OfType<Capacitor>());
    }

    [Fact]
    public void Parts_of_the_builders_own_are_added()
    {
        Resistor damper = new("output damper", "collector", RegenTrainer.Core.Circuits.Part.Earth, 10e3);
        StageDesign design = DefaultStage.Design with { ExtraParts = [damper] };
        Assert.Empty(design.Family.Check(design));
        Assert.Same(damper, Expand(design).Parts[^1]);
    }

    [Fact]
    public void A_pitch_of_the_wire_itself_is_close_winding()
    {
        Assert.Empty(DefaultStage.Design.Family.Check(DefaultStage.With("coil.pitch", 0.44e-3)));
        Coil close = CoilOf(DefaultStage.Without("coil.pitch"));
        Assert.Equal(close.TotalHenry, CoilOf(DefaultStage.With("coil.pitch", 0.44e-3)).TotalHenry, 1e-12);
    }

    /// <summary>
    /// The order in which a coil's taps are used changes nothing of the coil; 84 turns at 0.6 mm on 50 mm must come within a few percent of the
    /// formula for a current sheet of that size, 25.22^2 x 84^2/(228.6 x 25.22 + 254 x 50.4) = 241.7 uH with lengths in mm
    /// [Wheeler 1928].
    /// </summary>
    [Fact]
    public void The_coil_has_the_inductance_of_its_size()
    {
        Assert.Equal(241.7e-6, CoilOf(DefaultStage.Design).TotalHenry, 7e-6);
        StageDesign crossed = DefaultStage.With("coil.taps.emitter", 24).With("coil.taps.base", FieldValue.Of(4));
        Assert.Equal(CoilOf(DefaultStage.Design).TotalHenry, CoilOf(crossed).TotalHenry, 1e-15);
    }

    [Fact]
    public void A_measured_Q_overrides_the_computed_one()
    {
        StageDesign design = DefaultStage.With("coil.q.value", 180).With("coil.q.at", FieldValue.Of(1e6));
        Assert.Empty(design.Family.Check(design));
        Assert.Equal(180, CoilOf(design).Q(1e6, 20), 1e-9);
        Assert.True(CoilOf(DefaultStage.Without("coil.form_loss_q")).Q(1e6, 20) > CoilOf(DefaultStage.Design).Q(1e6, 20));
    }

    private static Coil CoilOf(StageDesign design) => Assert.IsType<Coil>(Part<Windings>(Expand(design), "coil").Model);

    private static StageCircuit Expand(StageDesign design) => design.Family.Expand(design);

    private static T Part<T>(StageCircuit circuit, string name)
        where T : Part => Assert.IsType<T>(circuit.Parts.Single(p => p.Name == name));

    private static IReadOnlyList<string> Wiring(StageCircuit circuit) =>
        [.. circuit.Parts.Select(p => $"{p.Name}: {string.Join(", ", p.Nodes)}")];
}
