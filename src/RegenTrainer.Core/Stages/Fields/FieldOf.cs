using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>The usual shapes of fields, so that parts of one kind have one range and one preferred series everywhere.</summary>
internal static class FieldOf
{
    /// <summary>A resistor of 0.1 ohm to 100 Mohm, offered in E24.</summary>
    public static Field Resistance(string key, string meaning) =>
        new(key, meaning, FieldKind.Quantity, Unit.Ohm, 0.1, 100e6)
        {
            Tolerance = ToleranceKind.Resistor,
            Series = PreferredSeries.E24,
        };

    /// <summary>A resistor in series with something; 0 is a wire in its place.</summary>
    public static Field SeriesResistance(string key, string meaning) => Resistance(key, meaning) with { Minimum = 0 };

    /// <summary>A capacitor of 0.1 pF to 1 mF, offered in E12.</summary>
    public static Field Capacitance(string key, string meaning) =>
        new(key, meaning, FieldKind.Quantity, Unit.Farad, 0.1e-12, 1e-3)
        {
            Tolerance = ToleranceKind.Capacitor,
            Series = PreferredSeries.E12,
        };

    /// <summary>A capacitance that comes with the wiring, 0 (left out) to 1 nF.</summary>
    public static Field Stray(string key, string meaning, double defaultFarad) =>
        new(key, meaning, FieldKind.Quantity, Unit.Farad, 0, 1e-9) { Default = defaultFarad };

    /// <summary>A frequency of 10 kHz to 30 MHz.</summary>
    public static Field Frequency(string key, string meaning) =>
        new(key, meaning, FieldKind.Quantity, Unit.Hertz, 10e3, 30e6);

    /// <summary>A length of a coil, in metre.</summary>
    public static Field Length(string key, string meaning, double minimumMetre, double maximumMetre) =>
        new(key, meaning, FieldKind.Quantity, Unit.Metre, minimumMetre, maximumMetre) { Tolerance = ToleranceKind.Coil };

    /// <summary>A Q, a pure number of 1 to 100,000.</summary>
    public static Field Quality(string key, string meaning) =>
        new(key, meaning, FieldKind.Quantity, Unit.None, 1, 1e5);

    /// <summary>A whole number of turns, 1 to 5,000.</summary>
    public static Field Turns(string key, string meaning) =>
        new(key, meaning, FieldKind.Count, Unit.None, 1, 5000) { Required = true };

    /// <summary>A share in percent.</summary>
    public static Field Percent(string key, string meaning, double minimum, double maximum) =>
        new(key, meaning, FieldKind.Quantity, Unit.Percent, minimum, maximum);

    /// <summary>A rotation in degrees of up to ten turns of a shaft.</summary>
    public static Field Rotation(string key, string meaning, double defaultDegrees) =>
        new(key, meaning, FieldKind.Quantity, Unit.Degree, 10, 3600) { Default = defaultDegrees };

    /// <summary>A direct voltage of 0.5 V to 1 kV.</summary>
    public static Field Voltage(string key, string meaning) =>
        new(key, meaning, FieldKind.Quantity, Unit.Volt, 0.5, 1000);

    /// <summary>A temperature of -40 to 85 °C.</summary>
    public static Field Temperature(string key, string meaning, double defaultCelsius) =>
        new(key, meaning, FieldKind.Quantity, Unit.Celsius, -40, 85) { Default = defaultCelsius };

    /// <summary>One word out of a list.</summary>
    public static Field Choice(string key, string meaning, string defaultWord, params string[] words) =>
        new(key, meaning, FieldKind.Choice, Unit.None, 0, 0) { DefaultText = defaultWord, Choices = words };

    /// <summary>The name of a device on the shelf.</summary>
    public static Field Device(string key, string meaning, DeviceKind kind) =>
        new(key, meaning, FieldKind.Device, Unit.None, 0, 0) { Socket = kind };

    /// <summary>Measured pairs; the range is that of every number in it.</summary>
    public static Field Pairs(string key, string meaning, double minimum, double maximum) =>
        new(key, meaning, FieldKind.Pairs, Unit.None, minimum, maximum);
}
