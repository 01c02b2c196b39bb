using System.Collections.Immutable;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Tests.Stages;

public sealed class TappedCoilFaultTests
{
    [Theory]
    [InlineData("coil.taps.base", 84, "a tap at 84 turns", "1 to 83 turns, so that a turn of the coil's 84 stays above the tap")]
    [InlineData("coil.taps.emitter", 90, "a tap at 90 turns", "1 to 83 turns, so that a turn of the coil's 84 stays above the tap")]
    [InlineData("coil.pitch", 0.42e-3, "0.42 mm", "at least 0.44 mm, the wire over its insulation")]
    [InlineData("coil.wire_over_insulation", 0.3e-3, "0.3 mm", "at least 0.4 mm, the bare copper")]
    [InlineData("dial.low", 1700e3, "1.7 MHz", "less than 1.7 MHz, the high end of the band")]
    [InlineData("dial.capacitor.min", 400e-12, "400 pF", "less than 365 pF, the capacitor with its plates in")]
    [InlineData("regeneration.potentiometer.end", 10e3, "10 k\u03a9", "less than 10 k\u03a9, the total resistance")]
    [InlineData("range.supply.tired", 3.5, "3.5 V", "at most 3.2 V, the fresh supply")]
    [InlineData("range.temperature.low", 50, "50 \u00b0C", "less than 40 \u00b0C, the highest temperature")]
    public void A_value_that_clashes_with_another_is_a_fault(string key, double number, string found, string expected)
    {
        FieldFault fault = Assert.Single(Check(DefaultStage.With(key, number)));
        Assert.Equal(new FieldFault(key, found, expected), fault);
    }

    [Fact]
    public void A_rotation_of_the_track_beyond_the_stops_is_a_fault()
    {
        FieldFault fault = Assert.Single(Check(DefaultStage.With("regeneration.potentiometer.rotation.electrical", 310)));
        Assert.Equal("regeneration.potentiometer.rotation.electrical", fault.Key);
    }

    [Fact]
    public void A_coil_of_one_turn_has_no_room_for_a_tap()
    {
        StageDesign design = DefaultStage.With("coil.turns", 1).With("coil.taps.base", FieldValue.Of(1)).With("coil.taps.emitter", FieldValue.Of(1));
        Assert.Equal(["coil.taps.emitter", "coil.taps.base"], Check(design).Select(f => f.Key));
        Assert.All(Check(design), f => Assert.Contains("at least 2 turns", f.Expected, StringComparison.Ordinal));
    }

    [Fact]
    public void A_fresh_supply_below_the_nominal_one_is_a_fault_where_no_tired_one_is_given()
    {
        StageDesign design = DefaultStage.Without("range.supply.tired").With("range.supply.fresh", FieldValue.Of(2.5));
        FieldFault fault = Assert.Single(Check(design));
        Assert.Equal(new FieldFault("range.supply.fresh", "2.5 V", "at least 3 V, the tired supply"), fault);
    }

    [Fact]
    public void All_faults_are_reported_in_one_go()
    {
        StageDesign design = DefaultStage.With("coil.taps.base", 99)
            .With("dial.low", FieldValue.Of(2e6))
            .With("regeneration.potentiometer.end", FieldValue.Of(20e3));
        Assert.Equal(["dial.low", "coil.taps.base", "regeneration.potentiometer.end"], Check(design).Select(f => f.Key));
    }

    [Theory]
    [InlineData("coil.q.value", 180, "coil.q.at")]
    [InlineData("coil.q.at", 1e6, "coil.q.value")]
    public void A_measured_Q_needs_its_frequency(string given, double number, string missing)
    {
        FieldFault fault = Assert.Single(Check(DefaultStage.With(given, number)));
        Assert.Equal((missing, "nothing"), (fault.Key, fault.Found));
    }

    [Fact]
    public void A_missing_device_is_a_fault()
    {
        StageDesign design = DefaultStage.Design with { Devices = ImmutableSortedDictionary<string, DeviceModel>.Empty };
        Assert.Equal(["devices.main", "devices.follower"], Check(design).Select(f => f.Key));
    }

    [Fact]
    public void Devices_of_opposite_polarity_are_a_fault()
    {
        BipolarModel pnp = DefaultStage.Bc547b with { Name = "BC557B", Polarity = Polarity.Pnp };
        StageDesign design = DefaultStage.Design with { Devices = DefaultStage.Design.Devices.SetItem("devices.follower", pnp) };
        FieldFault fault = Assert.Single(Check(design));
        Assert.Equal(new FieldFault("devices.follower", "BC557B, PNP", "a device of the polarity of BC547B, NPN"), fault);
    }

    [Fact]
    public void A_measured_capacitor_needs_a_table_that_rises()
    {
        const string table = "dial.capacitor.table";
        StageDesign measured = DefaultStage.With("dial.capacitor.law", "table");
        Assert.Equal((table, "no table"), Only(Check(measured)));
        Assert.Equal((table, "a table of one pair"), Only(Check(WithPairs(measured, table, (0, 12e-12)))));
        Assert.Equal(
            (table, "20\u00b0 after 30\u00b0 in pair 3"),
            Only(Check(WithPairs(measured, table, (0, 12e-12), (30, 50e-12), (20, 365e-12)))));
        Assert.Equal(
            (table, "50 pF after 50 pF in pair 3"),
            Only(Check(WithPairs(measured, table, (0, 12e-12), (30, 50e-12), (60, 50e-12)))));
        Assert.Equal((table, "a first pair at 5\u00b0"), Only(Check(WithPairs(measured, table, (5, 12e-12), (180, 365e-12)))));
        Assert.Empty(Check(WithPairs(measured, table, (0, 12e-12), (90, 100e-12), (180, 365e-12))));
    }

    [Fact]
    public void Only_a_measured_capacitor_may_leave_out_its_ends()
    {
        StageDesign open = DefaultStage.Without("dial.capacitor.min");
        open = open with { Values = open.Values.Remove("dial.capacitor.max") };
        Assert.Equal(["dial.capacitor.min", "dial.capacitor.max"], Check(open).Select(f => f.Key));
        StageDesign measured = open.With("dial.capacitor.law", FieldValue.Of("table"));
        Assert.Equal(
            ("dial.capacitor.table", "365 \u00b5F"),
            Only(Check(WithPairs(measured, "dial.capacitor.table", (0, 12e-12), (180, 365e-6)))));
        StageDesign sound = WithPairs(measured, "dial.capacitor.table", (0, 14e-12), (180, 380e-12));
        Assert.Empty(Check(sound));
        VariableCapacitor capacitor = sound.Family.Expand(sound).Dial.Capacitor;
        Assert.Equal((14e-12, 380e-12), (capacitor.MinimumFarad, capacitor.MaximumFarad));
    }

    [Fact]
    public void A_measured_taper_needs_a_table_that_rises_all_along()
    {
        const string table = "regeneration.potentiometer.table";
        StageDesign measured = DefaultStage.With("regeneration.potentiometer.taper", "table");
        Assert.Equal((table, "no table"), Only(Check(measured)));
        Assert.Equal(
            (table, "50 % after 50 % in pair 3"), Only(Check(WithPairs(measured, table, (0, 0), (50, 15), (50, 30), (100, 100)))));
        Assert.Equal(
            (table, "10 % after 15 % in pair 3"), Only(Check(WithPairs(measured, table, (0, 0), (50, 15), (60, 10), (100, 100)))));
        Assert.Equal(
            (table, "15 % after 15 % in pair 3"), Only(Check(WithPairs(measured, table, (0, 0), (50, 15), (60, 15), (100, 100)))));
        Assert.Equal((table, "a track from 0 %, 1 % to 100 %, 98 %"), Only(Check(WithPairs(measured, table, (0, 1), (100, 98)))));
        Assert.Empty(Check(WithPairs(measured, table, (0, 0), (50, 15), (100, 100))));
    }

    [Fact]
    public void A_part_at_a_node_without_a_way_to_earth_is_a_fault()
    {
        StageDesign design = WithParts(new Resistor("stray thing", "nowhere", "elsewhere", 1e3));
        Assert.Equal(
            [("part:stray thing", "node \"nowhere\", which no path through parts joins to earth"),
             ("part:stray thing", "node \"elsewhere\", which no path through parts joins to earth")],
            Check(design).Select(f => (f.Key, f.Found)));
    }

    [Fact]
    public void A_part_named_as_one_of_the_family_is_a_fault()
    {
        FieldFault fault = Assert.Single(Check(WithParts(new Resistor("load", "output", Part.Earth, 1e3))));
        Assert.Equal(("part:load", "a second part named \"load\""), (fault.Key, fault.Found));
    }

    [Fact]
    public void A_second_part_of_a_role_is_a_fault()
    {
        StageDesign design = WithParts(
            new Capacitor("other gang", "output", Part.Earth, 1e-12) { Role = PartRole.Tuning },
            new Resistor("other control", "output", Part.Earth, 1e3) { Role = PartRole.Regeneration });
        Assert.Equal(
            [("part:other gang", "a second part with the role \"tuning\""),
             ("part:other control", "a second part with the role \"regeneration\"")],
            Check(design).Select(f => (f.Key, f.Found)));
    }

    [Fact]
    public void Faults_are_phrases_that_finish_a_sentence()
    {
        StageDesign design = DefaultStage.With("coil.taps.base", 99).With("dial.low", FieldValue.Of(2e6));
        Assert.All(Check(design).Concat(Check(WithParts(new Resistor("load", "x", "y", 1)))), fault =>
        {
            Assert.DoesNotMatch("[.]$", fault.Found + fault.Expected);
            Assert.DoesNotMatch("^[A-Z]", fault.Expected);
        });
    }

    private static (string Key, string Found) Only(IReadOnlyList<FieldFault> faults)
    {
        FieldFault fault = Assert.Single(faults);
        return (fault.Key, fault.Found);
    }

    private static StageDesign WithPairs(StageDesign design, string key, params (double First, double Second)[] pairs) =>
        design.With(key, new FieldValue(null, null, null) { Pairs = pairs });

    private static StageDesign WithParts(params Part[] parts) => DefaultStage.Design with { ExtraParts = [.. parts] };

    private static IReadOnlyList<FieldFault> Check(StageDesign design) => design.Family.Check(design);
}
