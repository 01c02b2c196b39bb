namespace RegenTrainer.Core.Devices;

/// <summary>What the exponential of a junction needs inside a solver.</summary>
internal static class JunctionCurve
{
    /// <summary>Above this exponent the exponentials go on as straight lines, so that nothing overflows.</summary>
    public const double LargestExponent = 60;

    /// <summary>exp(x) and its slope, a straight line above <see cref="LargestExponent"/>.</summary>
    public static double Exponential(double x, out double slope)
    {
        if (x < LargestExponent)
        {
            return slope = Math.Exp(x);
        }

        slope = Math.Exp(LargestExponent);
        return slope * (1 + x - LargestExponent);
    }

    /// <summary>The voltage where a junction's exponential bends most sharply against a straight line, in volt.</summary>
    /// <param name="thermalVolt">Thermal voltage times emission coefficient in volt.</param>
    /// <param name="saturationAmpere">Saturation current in ampere.</param>
    public static double CriticalVolt(double thermalVolt, double saturationAmpere) =>
        thermalVolt * Math.Log(thermalVolt / (Math.Sqrt(2) * saturationAmpere));

    /// <summary>
    /// Above the voltage where the exponential bends most sharply against a straight line, a step takes the new current as
    /// the linearised one rather than the exponential of the new voltage (logarithmic damping of junction steps).
    /// </summary>
    public static double Limit(double before, double after, double thermalVolt, double criticalVolt)
    {
        if (after <= criticalVolt || Math.Abs(after - before) <= 2 * thermalVolt)
        {
            return after;
        }

        if (before <= 0)
        {
            return criticalVolt;
        }

        double argument = 1 + ((after - before) / thermalVolt);
        return argument > 0 ? before + (thermalVolt * Math.Log(argument)) : criticalVolt;
    }
}
