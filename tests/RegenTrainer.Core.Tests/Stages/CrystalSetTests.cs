using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Devices;
using RegenTrainer.Core.Tests.Readings;

namespace RegenTrainer.Core.Tests.Stages;

/// <summary>The crystal detector as the output of a family.</summary>
public sealed class CrystalSetTests
{
    private static readonly DiodeModel _diode = TestDiodes.Plain(1e-6, 1.3, farad: 1e-12, ohm: 70);

    private static readonly string[] _taps = ["top", "base", "emitter"];

    [Fact]
    public void The_detector_is_wired_as_drawn()
    {
        StageDesign design = Crystal(DefaultStage.Design);
        Assert.Empty(design.Family.Check(design));
        StageCircuit circuit = design.Family.Expand(design);
        string[] drawn =
        [
            "detector wiring: base tap, earth",
            "detector: base tap, detector load",
            "detector bypass: detector load, earth",
            "load: detector load, earth",
            "load capacitance: detector load, earth",
        ];
        Assert.Equal(drawn, Drawn(circuit).TakeLast(drawn.Length));
        Assert.Equal("base tap", circuit.OutputNode);
        Assert.Single(circuit.Parts.OfType<Bipolar>());
        Assert.DoesNotContain("output", circuit.Parts.SelectMany(p => p.Nodes));
    }

    [Theory]
    [InlineData("emitter", "emitter tap")]
    [InlineData("base", "base tap")]
    [InlineData("top", "tank top")]
    public void It_is_fed_from_the_tap_of_choice(string word, string node)
    {
        StageDesign design = Crystal(DefaultStage.Design).With("output.tap", FieldValue.Of(word));
        StageCircuit circuit = design.Family.Expand(design);
        Assert.Equal(node, Assert.Single(circuit.Parts.OfType<Diode>()).Anode);
        Assert.Equal(node, circuit.OutputNode);
    }

    /// <summary>The bias runs from the supply over load node, diode and coil to earth, forward whatever the polarity of the rail.</summary>
    [Theory]
    [InlineData(Polarity.Npn)]
    [InlineData(Polarity.Pnp)]
    public void A_bias_resistor_passes_its_current_forward(Polarity polarity)
    {
        BipolarModel main = DefaultStage.Bc547b with { Polarity = polarity };
        StageDesign design = Crystal(DefaultStage.Design).With("output.bias_resistor", FieldValue.Of(470e3));
        design = design with { Devices = design.Devices.SetItem("devices.main", main).SetItem("devices.follower", main) };
        BiasReading bias = BiasReader.Read(new StageUnderTest(design).Workspace, new Setting(1e6, 50));
        DiodeBias diode = Assert.Single(bias.Diodes);
        Assert.Equal(("detector", "plain"), (diode.Name, diode.Type));

        // About 3 V over 470 kohm (Ohm's law); what the 10 kohm load takes away is the diode's forward voltage over it.
        double load = 10e3, expected = ((3 - diode.ForwardVolt) / 470e3) - (diode.ForwardVolt / load);
        Assert.Equal(expected, diode.ForwardAmpere, 0.02e-6);
        Assert.InRange(diode.ForwardAmpere, 0.3e-6, 6e-6);
        Assert.InRange(diode.JunctionOhm, 1e3, 30e3);
        Assert.Single(bias.Devices);
    }

    [Fact]
    public void A_lower_tap_loads_the_tank_less()
    {
        double[] q = [.. _taps.Select(tap =>
            new StageUnderTest(Crystal(DefaultStage.Design).With("output.tap", FieldValue.Of(tap))).Read(1e6, 10).QRegenerationOff!.Value)];
        double bare = new StageUnderTest(DefaultStage.With("output.kind", "load")).Read(1e6, 10).QRegenerationOff!.Value;
        Assert.True(q[0] < q[1] && q[1] < q[2] && q[2] < bare, string.Join(", ", q.Append(bare)));
        Assert.True(q[0] < 0.3 * bare && q[2] > 0.97 * bare, string.Join(", ", q.Append(bare)));
    }

    // A plain tank of 250 uH and Q 100 at 1 MHz: w L = 1 570.796 ohm, dynamic resistance 157 080 ohm (Terman). At 25 °C a diode of
    // 1 uA has 25 692.6 ohm (any textbook), behind it the load bypassed for radio frequency: together 22 081 ohm, Q 14.057. What the
    // antenna adds is small: it takes the Q of the bare tank as it is read.
    [Fact]
    public void On_a_plain_tank_it_damps_by_its_resistance_at_zero_bias()
    {
        StageDesign bare = PlainStage.Design, crystal = Crystal(bare) with
        {
            Devices = bare.Devices.SetItem("devices.detector", TestDiodes.Plain(1e-6)),
        };
        var setting = new Setting(1e6, 0) { TemperatureCelsius = 25 };
        double without = new StageUnderTest(bare.With("output.coupling", FieldValue.Of(0.1e-12))).Read(setting).EffectiveQ!.Value;
        double with = new StageUnderTest(crystal.With("output.bypass", FieldValue.Of(100e-9))).Read(setting).EffectiveQ!.Value;
        double diodeQ = 25692.579 / 1570.796;
        Assert.Equal(1 / ((1 / without) + (1 / diodeQ)), with, 0.005 * with);
        Assert.InRange(with, 13.5, 14.1);
    }

    [Fact]
    public void A_detector_without_a_diode_is_a_fault()
    {
        foreach (StageDesign start in new[] { DefaultStage.Design, PlainStage.Design })
        {
            StageDesign design = start.With("output.kind", FieldValue.Of("crystal-set"));
            FieldFault fault = Assert.Single(design.Family.Check(design));
            Assert.Equal(("devices.detector", "nothing"), (fault.Key, fault.Found));
        }
    }

    [Fact]
    public void A_device_of_another_kind_is_a_fault()
    {
        StageDesign transistor = Crystal(DefaultStage.Design) with
        {
            Devices = DefaultStage.Design.Devices.SetItem("devices.detector", DefaultStage.Bc547b),
        };
        Assert.Equal(
            [new FieldFault("devices.detector", "BC547B, a bipolar device", "a diode")], transistor.Family.Check(transistor));
        StageDesign diode = DefaultStage.Design with { Devices = DefaultStage.Design.Devices.SetItem("devices.main", _diode) };
        Assert.Equal([new FieldFault("devices.main", "plain, a diode", "a bipolar device")], diode.Family.Check(diode));
    }

    [Fact]
    public void A_diode_cannot_be_the_regenerating_device()
    {
        StageDesign design = DefaultStage.Design with
        {
            ExtraParts = [new Diode("x", "collector", Part.Earth, _diode) { Role = PartRole.Regenerating }],
        };
        Assert.Equal(
            [new FieldFault("part:x", "the role \"regenerating\" on a diode", "a bipolar device or a feedback element")],
            design.Family.Check(design));
    }

    [Fact]
    public void A_rating_exceeded_is_said()
    {
        DiodeModel small = _diode with { Rating = new DiodeRating(2, 1e-3) };
        StageDesign design = DefaultStage.Design with
        {
            ExtraParts = [new Diode("backward", Part.Earth, "supply rail", small), new Diode("forward", "supply rail", "x", small), new Resistor("x", "x", Part.Earth, 100)],
        };
        BiasReading bias = BiasReader.Read(new StageUnderTest(design).Workspace, new Setting(1e6, 50));
        Assert.Equal(2, bias.Cautions.Count(c => c.Code == "rating"));
        Assert.Contains(bias.Cautions, c => c.Text.StartsWith("backward: reverse voltage", StringComparison.Ordinal));
        Assert.Contains(bias.Cautions, c => c.Text.StartsWith("forward: forward current", StringComparison.Ordinal));
    }

    private static StageDesign Crystal(StageDesign design) =>
        (design with { Devices = design.Devices.SetItem("devices.detector", _diode) }).With("output.kind", FieldValue.Of("crystal-set"));

    private static IEnumerable<string> Drawn(StageCircuit circuit) => circuit.Parts.Select(p => $"{p.Name}: {string.Join(", ", p.Nodes)}");
}
