namespace RegenTrainer.Core.Quantities;

/// <summary>American wire gauge after ASTM B258: No. 36 is 0.005 in, No. 0000 is 0.46 in, the sizes between in geometric steps.</summary>
public static class WireGauge
{
    /// <summary>The lowest number: -3 stands for 0000, -2 for 000, -1 for 00.</summary>
    public const int Lowest = -3;

    /// <summary>The highest number read and written here.</summary>
    public const int Highest = 40;

    private const double MetrePerInch = 0.0254;

    /// <summary>Diameter of the bare wire in metre: 0.005 in x 92^((36 - n)/39), unrounded.</summary>
    /// <param name="number">Gauge number, -3 (0000) to 40.</param>
    /// <exception cref="ArgumentOutOfRangeException">The number lies outside that range.</exception>
    public static double Diameter(int number)
    {
        int gauge = Guard.InRange(number, Lowest, Highest, nameof(number));
        return 0.005 * MetrePerInch * Math.Pow(92.0, (36 - gauge) / 39.0);
    }
}
