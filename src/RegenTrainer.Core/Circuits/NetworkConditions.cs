using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Circuits;

/// <summary>What the fixed parts of a network depend on.</summary>
/// <param name="LossHz">The frequency at which frequency-dependent losses are taken, in Hz, above 0.</param>
/// <param name="TemperatureCelsius">Temperature in °C.</param>
/// <param name="Grade">Grade of the regenerating devices; all others are typical.</param>
/// <param name="SupplyVolt">Magnitude of the supply in volt; null for the parts' own.</param>
/// <param name="ReplacementDevice">The type in the regenerating socket; null for the part's own.</param>
public readonly record struct NetworkConditions(
    double LossHz, double TemperatureCelsius, Grade Grade, double? SupplyVolt, BipolarModel? ReplacementDevice);
