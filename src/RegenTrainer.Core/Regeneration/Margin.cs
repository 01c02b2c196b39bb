namespace RegenTrainer.Core.Regeneration;

/// <summary>How far below tip-over a stage stands.</summary>
public static class Margin
{
    /// <summary>Below this factor of the Q with regeneration off the device damps the tank.</summary>
    public const double DampedBelow = 0.95;

    /// <summary>Below this factor of the Q with regeneration off the stage idles.</summary>
    public const double IdleBelow = 2;

    /// <summary>Below this margin in dB the stage stands at the edge.</summary>
    public const double EdgeBelowDb = 1;

    /// <summary>The classical loop gain still missing, -20 log10(1 - Qoff/Qeff) in dB [Landon and Jarvis 1925].</summary>
    /// <param name="qEffective">Effective Q, above 0.</param>
    /// <param name="qOff">Q with regeneration off, above 0.</param>
    /// <returns>The margin, or null where the effective Q does not exceed the Q with regeneration off.</returns>
    public static double? LoopGainDb(double qEffective, double qOff) =>
        qEffective > qOff ? -20 * Math.Log10(1 - (qOff / qEffective)) : null;

    /// <summary>What the stage does.</summary>
    /// <param name="growthPerSecond">Real part of the tank mode in 1/s.</param>
    /// <param name="qEffective">Effective Q; ignored where the tank grows.</param>
    /// <param name="qOff">Q with regeneration off, above 0.</param>
    public static Regime RegimeOf(double growthPerSecond, double qEffective, double qOff)
    {
        if (growthPerSecond > 0)
        {
            return Regime.Oscillating;
        }

        if (qEffective < DampedBelow * qOff)
        {
            return Regime.Damped;
        }

        if (qEffective < IdleBelow * qOff)
        {
            return Regime.Idle;
        }

        return LoopGainDb(qEffective, qOff) is { } db && db < EdgeBelowDb ? Regime.Edge : Regime.Working;
    }
}
