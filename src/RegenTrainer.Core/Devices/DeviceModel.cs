namespace RegenTrainer.Core.Devices;

/// <summary>The kinds of device a shelf holds.</summary>
public enum DeviceKind
{
    /// <summary>A bipolar transistor.</summary>
    Bipolar,

    /// <summary>A diode.</summary>
    Diode,
}

/// <summary>A type of device as its device file states it.</summary>
/// <param name="Name">Registered type.</param>
public abstract record DeviceModel(string Name)
{
    /// <summary>The kind of device.</summary>
    public abstract DeviceKind Kind { get; }

    /// <summary>The law of a device of this type.</summary>
    /// <param name="grade">Which device.</param>
    /// <param name="temperatureCelsius">Junction temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside its range.</exception>
    public abstract IDeviceLaw LawAt(Grade grade, double temperatureCelsius);

    /// <summary>The resistance between the control lead and the inner control terminal that the law starts from, in ohm.</summary>
    /// <param name="grade">Which device.</param>
    public abstract double LeadOhm(Grade grade);

    /// <summary>A kind in the words of a message.</summary>
    public static string Phrase(DeviceKind kind) => kind == DeviceKind.Diode ? "a diode" : "a bipolar device";
}
