namespace RegenTrainer.Core.Regeneration;

/// <summary>What the stage does at a setting.</summary>
public enum Regime
{
    /// <summary>Effective Q below 0.95 of the Q with regeneration off: the device damps the tank.</summary>
    Damped,

    /// <summary>Effective Q below twice the Q with regeneration off.</summary>
    Idle,

    /// <summary>From there down to 1 dB of margin.</summary>
    Working,

    /// <summary>Below 1 dB of margin.</summary>
    Edge,

    /// <summary>The tank mode grows.</summary>
    Oscillating,
}
