namespace RegenTrainer.Core.Quantities;

/// <summary>Decibels of voltage (or current) ratios: 20 log10 of the ratio (IEC 60027-3).</summary>
public static class Decibel
{
    /// <summary>The level of a voltage ratio in dB.</summary>
    /// <param name="voltageRatio">Ratio of amplitudes, 0 or more; 0 gives negative infinity.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is negative, infinite or not a number.</exception>
    public static double FromRatio(double voltageRatio) =>
        20.0 * Math.Log10(Guard.NotNegative(voltageRatio, nameof(voltageRatio)));

    /// <summary>The voltage ratio of a level in dB; negative infinity gives 0.</summary>
    /// <param name="db">Level in dB, at most 6000.</param>
    /// <exception cref="ArgumentOutOfRangeException">The level is not a number or above 6000 dB.</exception>
    public static double ToRatio(double db) =>
        double.IsNegativeInfinity(db) ? 0.0 : Math.Pow(10.0, Guard.InRange(db, double.MinValue, 6000.0, nameof(db)) / 20.0);
}
