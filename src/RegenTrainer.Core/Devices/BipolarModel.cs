namespace RegenTrainer.Core.Devices;

/// <summary>A type of bipolar transistor as its device file states it; figures hold at 25 °C.</summary>
/// <param name="Name">Registered type.</param>
/// <param name="Polarity">NPN or PNP.</param>
/// <param name="CurrentGain">Direct current gain at a collector current in ampere.</param>
/// <param name="TransitionFrequency">Frequency in Hz at which the current gain is 1, at a collector current in ampere.</param>
/// <param name="OutputCapacitance">Collector to base in farad at a reverse voltage in volt.</param>
/// <param name="InputCapacitance">Emitter to base in farad at a reverse voltage in volt.</param>
/// <param name="SaturationCurrent">Saturation current of the transport law in ampere.</param>
/// <param name="EarlyVoltage">Early voltage in volt.</param>
/// <param name="BaseResistance">Base resistance in ohm.</param>
public sealed record BipolarModel(
    string Name,
    Polarity Polarity,
    DeviceFigure CurrentGain,
    DeviceFigure TransitionFrequency,
    DeviceFigure OutputCapacitance,
    DeviceFigure InputCapacitance,
    DeviceFigure SaturationCurrent,
    DeviceFigure EarlyVoltage,
    DeviceFigure BaseResistance) : DeviceModel(Name)
{
    /// <summary>Gain at a second, lower current; null where the data sheet has none and the gain is taken as constant below.</summary>
    public DeviceFigure? CurrentGainLow { get; init; }

    /// <summary>Limits; null where none are stated.</summary>
    public DeviceRating? Rating { get; init; }

    /// <inheritdoc/>
    public override DeviceKind Kind => DeviceKind.Bipolar;

    /// <inheritdoc/>
    public override BipolarLaw LawAt(Grade grade, double temperatureCelsius) => new(this, grade, temperatureCelsius);

    /// <summary>The resistance between base lead and inner base, in ohm.</summary>
    public double BaseOhm(Grade grade) => BaseResistance.FallingWith(grade);

    /// <inheritdoc/>
    public override double LeadOhm(Grade grade) => BaseOhm(grade);
}
