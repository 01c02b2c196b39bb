using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session.Tests;

public sealed class WorkbenchEditTests : IDisposable
{
    private readonly Workplace _place = new();

    public void Dispose() => _place.Dispose();

    [Fact]
    public void A_value_changes_the_reading_and_the_hands_stay()
    {
        Workbench bench = _place.Open();
        Setting before = bench.Stage.Setting;
        double? q = bench.Stage.Reading.EffectiveQ;
        Assert.True(bench.TryChange("coil.turns", FieldValue.Of(80), out string refusal), refusal);
        Assert.Equal(before, bench.Stage.Setting);
        Assert.NotEqual(q, bench.Stage.Reading.EffectiveQ);
        Assert.Equal(80, bench.Design.Number("coil.turns"));
        Assert.Equal(80, bench.Model.Design.Number("coil.turns"));
        Assert.True(bench.IsChanged);
        Assert.Equal((1, 0), (bench.UndoCount, bench.RedoCount));
    }

    [Theory]
    [InlineData("coil.turns", 0, "found 0, expected 1 to 5000")]
    [InlineData("coil.turns", 80.5, "found 80.5, expected a whole number")]
    [InlineData("coil.turns", double.NaN, "found —, expected a whole number")]
    [InlineData("coil.turns", 20, "coil.taps.base: found a tap at 24 turns, expected 1 to 19 turns")]
    [InlineData("bias.collector_resistor", 1e9, "found 1 GΩ, expected 0.1 Ω to 100 MΩ")]
    [InlineData("coil.pitch", 0.1e-3, "found 0.1 mm, expected at least 0.44 mm")]
    [InlineData("coil.length", 1, "found the key \"coil.length\"")]
    public void What_cannot_be_is_refused_and_nothing_changes(string key, double number, string expected)
    {
        Workbench bench = _place.Open();
        StageDesign design = bench.Design;
        Assert.False(bench.TryChange(key, FieldValue.Of(number), out string refusal));
        Assert.StartsWith(expected, refusal, StringComparison.Ordinal);
        Assert.Same(design, bench.Design);
        Assert.Equal((0, false), (bench.UndoCount, bench.IsChanged));
    }

    [Fact]
    public void Nothing_is_the_default_again_and_refused_where_a_value_must_be()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryChange("dial.stray", null, out _));
        Assert.False(bench.Design.Gives("dial.stray"));
        Assert.Equal(6e-12, bench.Design.Number("dial.stray"));   // the default of the documented key table
        Assert.False(bench.TryChange("coil.turns", null, out string refusal));
        Assert.Contains("found nothing, expected turns of the whole coil", refusal, StringComparison.Ordinal);
        Assert.False(bench.TryType("devices.main", " ", out _));
    }

    [Fact]
    public void The_value_there_already_is_no_step()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType("bias.collector_resistor", "0.68k", out _));
        Assert.True(bench.TryType("devices.main", "bc547b", out _));
        Assert.Equal((0, false), (bench.UndoCount, bench.IsChanged));
    }

    [Theory]
    [InlineData("bias.collector_resistor", "4k7", 4700, null)]
    [InlineData("bias.collector_resistor", " 4.7 kΩ 2 %", 4700, 2.0)]
    [InlineData("bias.collector_resistor", "4k7 ±1%", 4700, 1.0)]
    [InlineData("bias.decoupling", "47u", 47e-6, null)]
    [InlineData("regeneration.potentiometer.mid", "12 %", 12, null)]
    [InlineData("coil.wire_diameter", "AWG 30", 0.2546e-3, null)]   // ASTM B258: 0.2546 mm
    [InlineData("coil.turns", "90", 90, null)]
    public void Values_are_typed_as_the_trade_writes_them(string key, string text, double expected, double? tolerance)
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType(key, text, out string refusal), refusal);
        Assert.Equal(expected, bench.Design.Number(key), expected * 1e-3);
        Assert.Equal(tolerance, bench.Design.Values[key].TolerancePercent);
        string typed = bench.Typed(key);
        Assert.True(bench.TryType(key, typed, out refusal), refusal);
        Assert.Equal(1, bench.UndoCount);
    }

    [Theory]
    [InlineData("bias.collector_resistor", "4,7k", "at character 2: found a comma, expected a point (write 4.7k or 4k7)")]
    [InlineData("bias.collector_resistor", "4k7 5x%", "at character 6: found `x`")]
    [InlineData("bias.collector_resistor", "12G", "at character 1: found \"12G\", expected 0.1 Ω to 100 MΩ")]
    [InlineData("coil.turns", "80.5", "at character 1: found 80.5, expected a whole number from 1 to 5000")]
    [InlineData("coil.turns", "many", "at character 1: found `m`")]
    [InlineData("output.kind", "ear", "at character 1: found \"ear\", expected one of \"follower\", \"load\"")]
    [InlineData("devices.main", "ZZ1", "at character 1: found \"ZZ1\", expected a bipolar device, one of ")]
    [InlineData("devices.main", "../x", "at character 1: found \"../x\", expected the name of a device, not a path")]
    [InlineData("dial.capacitor.table", "0, 1", "at character 2: found a comma")]
    [InlineData("dial.capacitor.table", "0.5", "at character 1: found 0.5, expected a list of pairs")]
    [InlineData("dial.capacitor.table", "[[0, 1e-12], [5]]", "at character 14: found a list, expected a pair")]
    [InlineData("dial.capacitor.table", "[[0, 1e-12], [x, 2]]", "at character 15: ")]
    [InlineData("coil.q.value", "180", "coil.q.at: found nothing, expected a measured Q together with its frequency")]
    [InlineData("coil.q.value", "180 at x", "behind \"at\", at character 1: found `x`")]
    [InlineData("bias.collector_resistor", "\u001b[2J", "at character 1: found the character U+001B")]
    public void What_cannot_be_read_is_refused_at_its_place(string key, string text, string expected)
    {
        Workbench bench = _place.Open();
        Assert.False(bench.TryType(key, text, out string refusal));
        Assert.StartsWith(expected, refusal, StringComparison.Ordinal);
        Assert.Equal(0, bench.UndoCount);
    }

    [Fact]
    public void A_value_and_its_condition_come_and_go_in_one_step()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType("coil.q.value", "180 at 1M", out string refusal), refusal);
        Assert.Equal((180, 1e6, 1), (bench.Design.Number("coil.q.value"), bench.Design.Number("coil.q.at"), bench.UndoCount));
        Assert.True(bench.TryChange("coil.q.value", null, out refusal), refusal);
        Assert.False(bench.Design.Gives("coil.q.at"));
        Assert.Equal(2, bench.UndoCount);
    }

    [Fact]
    public void A_tolerance_stays_until_another_is_typed()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType("bias.collector_resistor", "680 2%", out _));
        Assert.True(bench.TryType("bias.collector_resistor", "750", out _));
        Assert.True(bench.TryStep("bias.collector_resistor", up: true, out _));
        Assert.Equal((820, 2), (bench.Design.Number("bias.collector_resistor"), bench.Design.Values["bias.collector_resistor"].TolerancePercent));
        Assert.Equal("820R 2%", bench.Typed("bias.collector_resistor"));
    }

    /// <summary>E24 and E12 of IEC 60063, table 1.</summary>
    [Theory]
    [InlineData("bias.collector_resistor", true, new[] { 750.0, 820, 910, 1000, 1100 })]
    [InlineData("bias.collector_resistor", false, new[] { 620.0, 560, 510 })]
    [InlineData("bias.decoupling", true, new[] { 120e-9, 150e-9, 180e-9 })]
    [InlineData("coil.turns", true, new[] { 85.0, 86 })]
    [InlineData("coil.form_diameter", true, new[] { 50.5e-3, 51e-3, 51.5e-3, 52e-3, 52.5e-3 })]
    [InlineData("coil.form_diameter", false, new[] { 49.5e-3, 49e-3 })]
    [InlineData("range.temperature.low", false, new[] { -1.0, -2 })]
    [InlineData("layout.lead_inductance", true, new[] { 0.1e-6, 0.101e-6 })]
    [InlineData("bias.supply_resistance", false, new[] { 1.8, 1.6, 1.5, 1.3, 1.2, 1.1, 1.0, 0 })]
    public void Steps_go_along_what_the_trade_offers(string key, bool up, double[] expected)
    {
        Workbench bench = _place.Open();
        foreach (double value in expected)
        {
            Assert.True(bench.TryStep(key, up, out string refusal), refusal);
            Assert.Equal(value, bench.Design.Number(key), Math.Abs(value) * 1e-12);
        }
    }

    [Fact]
    public void Steps_end_with_the_range()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryType("bias.collector_resistor", "R1", out _));
        Assert.False(bench.TryStep("bias.collector_resistor", up: false, out string refusal));
        Assert.Equal("no step below 0.1 Ω within 0.1 Ω to 100 MΩ", refusal);
        Assert.False(bench.TryStep("dial.padder", up: true, out refusal));
        Assert.Equal("nothing is given to step from: type a value", refusal);
        Assert.False(bench.TryStep("dial.capacitor.table", up: true, out _));
        Assert.False(bench.TryStep("no.such", up: true, out _));
        Assert.True(bench.TryType("coil.taps.base", "83", out _));
        Assert.False(bench.TryStep("coil.taps.base", up: true, out refusal));
        Assert.Contains("found a tap at 84 turns", refusal, StringComparison.Ordinal);
    }

    [Fact]
    public void Words_and_devices_step_to_the_next_that_can_stand_there()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryStep("output.kind", up: true, out _));
        Assert.Equal("load", bench.Design.Word("output.kind"));
        Assert.True(bench.TryStep("output.kind", up: true, out _));
        Assert.Equal("follower", bench.Design.Word("output.kind"));

        IReadOnlyList<string> names = bench.Devices("devices.main");
        Assert.Contains("BC547B", names);
        Assert.Contains("2N4401", names);
        Assert.DoesNotContain("BC557B", names);   // a PNP type beside an NPN follower
        Assert.Empty(bench.Devices("coil.turns"));

        List<string> seen = [];
        do
        {
            Assert.True(bench.TryStep("devices.main", up: true, out string refusal), refusal);
            seen.Add(bench.Design.Devices["devices.main"].Name);
        }
        while (seen[^1] != "BC547B");
        Assert.Equal(names.Order(StringComparer.Ordinal), seen.Order(StringComparer.Ordinal));
        Assert.True(bench.TryStep("devices.main", up: true, out _));
        Assert.True(bench.TryStep("devices.main", up: false, out _));
        Assert.Equal("BC547B", bench.Design.Word("devices.main"));
    }

    [Fact]
    public void A_stage_changes_its_polarity_with_both_devices_at_once()
    {
        Workbench bench = _place.Open();
        Assert.False(bench.TryType("devices.main", "BC557B", out _));
        Assert.True(
            bench.TryChangeTogether([("devices.main", FieldValue.Of("BC557B")), ("devices.follower", FieldValue.Of("bc557b"))], out string refusal),
            refusal);
        Assert.Equal(1, bench.UndoCount);
        Assert.True(bench.Undo());
        Assert.Equal("BC547B", bench.Model.RegeneratingType);
    }

    [Fact]
    public void Two_hundred_steps_are_kept_and_an_edit_ends_what_was_undone()
    {
        Workbench bench = _place.Open("plain-tank");
        for (int k = 1; k <= 203; k++)
        {
            Assert.True(bench.TryChange("antenna.coupling", FieldValue.Of(k * 1e-13), out string refusal), refusal);
        }

        Assert.Equal(200, bench.UndoCount);
        while (bench.Undo())
        {
        }

        Assert.Equal(3e-13, bench.Design.Number("antenna.coupling"), 1e-20);
        Assert.Equal(200, bench.RedoCount);
        Assert.True(bench.Redo());
        Assert.True(bench.TryChange("antenna.coupling", FieldValue.Of(9e-12), out _));
        Assert.False(bench.Redo());
        Assert.Equal((2, 0), (bench.UndoCount, bench.RedoCount));
    }

    /// <summary>A thousand random edits, undos and redos; what is left to undo leads back to the start, and forward again to the end.</summary>
    [Fact]
    public void A_thousand_edits_and_undos_end_at_the_start()
    {
        Workbench bench = _place.Open("plain-tank");
        StageDesign start = bench.Design;
        Field[] fields = [.. start.Family.Fields.Where(f => f.Kind is not (FieldKind.Device or FieldKind.Pairs))];
        ulong state = 88172645463325252UL;
        int edits = 0;
        for (int k = 0; k < 1000; k++)
        {
            state ^= state << 13;   // xorshift64 [Marsaglia 2003]
            state ^= state >> 7;
            state ^= state << 17;
            Field field = fields[(int)((state >> 8) % (ulong)fields.Length)];
            switch ((state >> 32) % 8)
            {
                case 0 or 1 or 2 when bench.UndoCount < 200:
                    edits += bench.TryStep(field.Key, (state & 1) == 0, out _) ? 1 : 0;
                    break;
                case 3 when bench.UndoCount < 200:
                    edits += bench.TryChange(field.Key, null, out _) ? 1 : 0;
                    break;
                case 4:
                    bench.Redo();
                    break;
                default:
                    bench.Undo();
                    break;
            }
        }

        Assert.InRange(edits, 200, 1000);
        for (int k = 0; k < 30; k++)
        {
            Assert.True(bench.TryStep("dial.step", up: k < 15, out _));
        }

        StageDesign end = bench.Design;
        while (bench.Undo())
        {
        }

        Assert.Same(start, bench.Design);
        Assert.False(bench.IsChanged);
        while (bench.Redo())
        {
        }

        Assert.Same(end, bench.Design);
    }

    [Fact]
    public void Knob_dial_and_supply_are_not_undone()
    {
        Workbench bench = _place.Open();
        Assert.True(bench.TryStep("coil.turns", up: true, out _));
        bench.Stage.SetTravel(61.9);
        bench.Stage.StepSupply(up: false);
        Setting hands = bench.Stage.Setting;
        Assert.True(bench.Undo());
        Assert.Equal(hands, bench.Stage.Setting);
        Assert.False(bench.IsChanged);
        Assert.False(bench.Undo());
    }
}
