using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Readings;

/// <summary>What ends the range in which a device amplifies.</summary>
public enum DeviceLimit
{
    /// <summary>Once in a cycle the collector current falls to a twentieth of what it is at rest.</summary>
    CutOff,

    /// <summary>Once in a cycle the collector comes within 0.2 V of the emitter.</summary>
    Saturation,
}

/// <summary>The drive at which a device reaches a limit, as amplitudes (peak values) of a steady unmodulated carrier at the station.</summary>
/// <param name="AntennaVolt">Antenna electromotive force in volt.</param>
/// <param name="TankVolt">Across the tuning capacitor in volt.</param>
/// <param name="OutputVolt">At the output in volt.</param>
public readonly record struct LimitLevel(double AntennaVolt, double TankVolt, double OutputVolt);

/// <summary>The headroom of one device; a limit is null where it is not reached within four times the drive of the stage's first one.</summary>
/// <param name="Name">The part's name.</param>
/// <param name="CutOff">Where its current runs out.</param>
/// <param name="Saturation">Where its voltage runs out; zero where it is saturated at rest.</param>
public sealed record DeviceHeadroom(string Name, LimitLevel? CutOff, LimitLevel? Saturation);

/// <summary>The limit a stage reaches first.</summary>
/// <param name="Device">Name of the device.</param>
/// <param name="Limit">What runs out.</param>
/// <param name="Level">The drive.</param>
public sealed record FirstLimit(string Device, DeviceLimit Limit, LimitLevel Level);

/// <summary>How far a stage can be driven at one setting below tip-over.</summary>
/// <param name="Devices">Each device; empty above tip-over, out of reach or unsolved.</param>
/// <param name="First">The limit that is reached first; null where none is known.</param>
/// <param name="Cautions">What could not be computed.</param>
public sealed record HeadroomReading(
    IReadOnlyList<DeviceHeadroom> Devices, FirstLimit? First, IReadOnlyList<Caution> Cautions);
