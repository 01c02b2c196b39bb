using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Readings;

/// <summary>What a device does at the operating point.</summary>
/// <param name="Name">The part's name.</param>
/// <param name="Type">The registered type.</param>
/// <param name="CollectorAmpere">Collector current in ampere, in the device's forward direction.</param>
/// <param name="BaseAmpere">Base current in ampere.</param>
/// <param name="BaseEmitterVolt">Base to emitter in volt, forward positive.</param>
/// <param name="CollectorEmitterVolt">Collector to emitter in volt, forward positive.</param>
/// <param name="TransconductanceSiemens">Transconductance in siemens.</param>
/// <param name="CurrentGain">Collector over base current.</param>
/// <param name="DissipationWatt">Dissipation in watt.</param>
/// <param name="Saturated">Whether the collector junction conducts.</param>
public sealed record DeviceBias(
    string Name,
    string Type,
    double CollectorAmpere,
    double BaseAmpere,
    double BaseEmitterVolt,
    double CollectorEmitterVolt,
    double TransconductanceSiemens,
    double CurrentGain,
    double DissipationWatt,
    bool Saturated);

/// <summary>The operating point in the builder's terms.</summary>
/// <param name="Setting">The setting in force.</param>
/// <param name="Cautions">Warnings.</param>
/// <param name="Devices">Each transistor.</param>
/// <param name="NodeVolts">Voltage of every named node to earth.</param>
/// <param name="SupplyAmpere">Current out of the supply in ampere; null where there is none.</param>
/// <param name="ResidualAmpere">Largest current left over at a node, in ampere.</param>
public sealed record BiasReading(
    SettingInForce Setting,
    IReadOnlyList<Caution> Cautions,
    IReadOnlyList<DeviceBias> Devices,
    IReadOnlyList<(string Node, double Volt)> NodeVolts,
    double? SupplyAmpere,
    double ResidualAmpere)
{
    /// <summary>Each diode.</summary>
    public IReadOnlyList<DiodeBias> Diodes { get; init; } = [];

    /// <summary>What the supply gives from fresh to tired; null where the stage has none.</summary>
    public BatteryLife? Battery { get; init; }

    /// <summary>What a rise of one kelvin does; null where the tank cannot be solved.</summary>
    public BiasDrift? PerKelvin { get; init; }

    /// <summary>What a supply higher by 0.1 V does; null where the tank cannot be solved or there is no supply.</summary>
    public BiasDrift? PerTenthVolt { get; init; }
}

/// <summary>What a stage draws while its battery goes from fresh to tired.</summary>
/// <param name="FreshVolt">Supply when fresh, in volt.</param>
/// <param name="TiredVolt">Supply at the end of its life, in volt.</param>
/// <param name="FreshAmpere">Current when fresh, in ampere.</param>
/// <param name="TiredAmpere">Current at the end, in ampere.</param>
/// <param name="LifeSeconds">
/// Time between in seconds, the voltage falling evenly with the charge drawn (common practice); null where the capacity is not given.
/// </param>
public sealed record BatteryLife(double FreshVolt, double TiredVolt, double FreshAmpere, double TiredAmpere, double? LifeSeconds);

/// <summary>Changes of a stage whose knobs and tuning capacitor nobody touches; null where a figure does not exist.</summary>
/// <param name="CollectorAmpere">Collector current of the regenerating device, in ampere.</param>
/// <param name="TipOverPercent">Tip-over in % of travel.</param>
/// <param name="EffectiveQ">Effective Q.</param>
/// <param name="TankHz">Frequency of the tank in Hz.</param>
public sealed record BiasDrift(double? CollectorAmpere, double? TipOverPercent, double? EffectiveQ, double? TankHz);
