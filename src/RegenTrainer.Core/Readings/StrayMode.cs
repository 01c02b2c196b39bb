namespace RegenTrainer.Core.Readings;

/// <summary>A natural frequency that does not belong to the tuned circuit.</summary>
/// <param name="FrequencyHz">Frequency in Hz, from 0 for a mode that does not ring.</param>
/// <param name="DecayPerSecond">Rate of decay in 1/s; negative where it grows.</param>
/// <param name="Grows">True for a parasitic oscillation.</param>
public readonly record struct StrayMode(double FrequencyHz, double DecayPerSecond, bool Grows);
