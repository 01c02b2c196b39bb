using RegenTrainer.Core.Regeneration;

namespace RegenTrainer.Core.Readings;

/// <summary>One row of the run along the dial; the figures equal those of a <see cref="Reading"/> there.</summary>
/// <param name="DialHz">Dial in Hz.</param>
/// <param name="Reachable">Whether the capacitor reaches it.</param>
public sealed record DialPoint(double DialHz, bool Reachable)
{
    /// <summary>Tuning capacitor in farad.</summary>
    public double? TuningFarad { get; init; }

    /// <summary>Where the tank tips over.</summary>
    public TipOver? TipOver { get; init; }

    /// <summary>Effective Q at the travel set; null above tip-over.</summary>
    public double? EffectiveQ { get; init; }

    /// <summary>Bandwidth at the travel set, in Hz.</summary>
    public double? BandwidthHz { get; init; }

    /// <summary>Stage gain at the travel set, in dB.</summary>
    public double? StageGainDb { get; init; }

    /// <summary>Pull against the device removed, in Hz.</summary>
    public double? PulledHz { get; init; }
}

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
    IReadOnlyList<Quantities.Caution> Cautions,
    IReadOnlyList<DeviceBias> Devices,
    IReadOnlyList<(string Node, double Volt)> NodeVolts,
    double? SupplyAmpere,
    double ResidualAmpere)
{
    /// <summary>Each diode.</summary>
    public IReadOnlyList<DiodeBias> Diodes { get; init; } = [];
}
