using System.Collections.Immutable;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Families;

namespace RegenTrainer.Core.Tests.Stages;

/// <summary>The stage most tests start from: medium wave, two cells, regeneration by a rheostat in the emitter.</summary>
internal static class DefaultStage
{
    /// <summary>The device of both sockets.</summary>
    public static BipolarModel Bc547b { get; } = TestDevices.Bc547b;

    /// <summary>The stage as its builder would write it down.</summary>
    public static StageDesign Design { get; } = new(
        TappedCoil.Instance,
        "Tern Point preselector",
        "Medium wave, two cells, regeneration by a rheostat in the emitter.",
        Values(),
        ImmutableSortedDictionary<string, DeviceModel>.Empty.Add("devices.main", Bc547b).Add("devices.follower", Bc547b),
        []);

    /// <summary>The stage with one number changed.</summary>
    public static StageDesign With(string key, double number) => Design.With(key, FieldValue.Of(number));

    /// <summary>The stage with one word changed.</summary>
    public static StageDesign With(string key, string word) => Design.With(key, FieldValue.Of(word));

    /// <summary>The stage without a value: the field's default holds, where there is one.</summary>
    public static StageDesign Without(string key) => Design with { Values = Design.Values.Remove(key) };

    private static ImmutableSortedDictionary<string, FieldValue> Values()
    {
        ImmutableSortedDictionary<string, FieldValue>.Builder values = ImmutableSortedDictionary.CreateBuilder<string, FieldValue>(StringComparer.Ordinal);
        foreach ((string key, double number) in Numbers)
        {
            values.Add(key, FieldValue.Of(number));
        }

        foreach ((string key, string word) in Words)
        {
            values.Add(key, FieldValue.Of(word));
        }

        return values.ToImmutable();
    }

    private static IEnumerable<(string Key, double Number)> Numbers =>
    [
        ("dial.low", 530e3),
        ("dial.high", 1700e3),
        ("dial.step", 10e3),
        ("dial.capacitor.min", 12e-12),
        ("dial.capacitor.max", 365e-12),
        ("dial.capacitor.q", 1500),
        ("dial.trimmer", 8e-12),
        ("dial.stray", 6e-12),
        ("coil.form_diameter", 50e-3),
        ("coil.wire_diameter", 0.4e-3),
        ("coil.pitch", 0.6e-3),
        ("coil.turns", 84),
        ("coil.taps.emitter", 4),
        ("coil.taps.base", 24),
        ("coil.form_loss_q", 400),
        ("bias.supply", 3.0),
        ("bias.supply_resistance", 2),
        ("bias.decoupling", 100e-9),
        ("bias.collector_resistor", 680),
        ("bias.base_resistor", 1e6),
        ("bias.base_coupling", 220e-12),
        ("bias.base_stopper", 1e3),
        ("regeneration.potentiometer.total", 10e3),
        ("regeneration.potentiometer.mid", 15),
        ("regeneration.potentiometer.rotation.mechanical", 300),
        ("regeneration.potentiometer.rotation.electrical", 270),
        ("regeneration.potentiometer.end", 20),
        ("regeneration.potentiometer.tolerance", 20),
        ("regeneration.series.value", 220),
        ("antenna.capacitance", 60e-12),
        ("antenna.earth_resistance", 50),
        ("antenna.coupling", 5e-12),
        ("output.emitter_resistor", 2.2e3),
        ("output.coupling", 10e-9),
        ("output.load.resistance", 10e3),
        ("output.load.capacitance", 30e-12),
        ("layout.control_lead", 8e-12),
        ("layout.tap_lead", 3e-12),
        ("layout.base_lead", 2e-12),
        ("range.supply.fresh", 3.2),
        ("range.supply.tired", 2.2),
        ("range.temperature.low", 0),
        ("range.temperature.high", 40),
        ("tolerance.resistor", 5),
        ("tolerance.coil_q", 10),
    ];

    private static IEnumerable<(string Key, string Word)> Words =>
    [
        ("dial.capacitor.law", "straight-line-capacitance"),
        ("devices.main", "BC547B"),
        ("devices.follower", "BC547B"),
        ("regeneration.control", "emitter-rheostat"),
        ("regeneration.potentiometer.taper", "reverse-log"),
        ("regeneration.series.at", "device"),
        ("antenna.kind", "short-wire"),
        ("output.kind", "follower"),
    ];
}
