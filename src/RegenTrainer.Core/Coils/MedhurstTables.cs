using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>
/// Tables of [Medhurst 1947] for single-layer coils of many turns of round wire: the proximity factor Phi and the self-capacitance.
/// The entries are from memory; the column of the endless coil and the rows of thin wire agree with independent field computations.
/// </summary>
public static class MedhurstTables
{
    /// <summary>Smallest wire diameter over pitch in the table of Phi.</summary>
    public const double LeastWireOverPitch = 0.1;

    /// <summary>Shortest coil, length over diameter, in the table of self-capacitance.</summary>
    public const double ShortestForCapacitance = 0.1;

    /// <summary>Longest coil, length over diameter, in the table of self-capacitance.</summary>
    public const double LongestForCapacitance = 50.0;

    /// <summary>Fewest turns Phi was given for.</summary>
    public const int FewestTurns = 30;

    /// <summary>Wire diameter over skin depth below which Phi, a high-frequency limit, is used outside its intent.</summary>
    public const double LeastWireOverSkinDepth = 4.0;

    private static readonly double[] _phiLengths = [0.0, 0.2, 0.4, 0.6, 0.8, 1.0, 2.0, 4.0, 6.0, 8.0, 10.0];

    // Rows d/s = 0.1, 0.2 ... 1.0; the last column is the endless coil.
    private static readonly double[][] _phi =
    [
        [1.02, 1.02, 1.03, 1.03, 1.03, 1.03, 1.04, 1.04, 1.04, 1.04, 1.04, 1.05],
        [1.07, 1.08, 1.08, 1.10, 1.10, 1.10, 1.13, 1.15, 1.16, 1.16, 1.17, 1.19],
        [1.16, 1.19, 1.21, 1.22, 1.23, 1.24, 1.28, 1.32, 1.34, 1.34, 1.35, 1.40],
        [1.26, 1.29, 1.33, 1.38, 1.42, 1.45, 1.50, 1.54, 1.56, 1.57, 1.58, 1.65],
        [1.44, 1.48, 1.54, 1.60, 1.64, 1.67, 1.74, 1.78, 1.80, 1.81, 1.83, 1.93],
        [1.74, 1.77, 1.83, 1.89, 1.92, 1.94, 1.98, 2.01, 2.03, 2.08, 2.10, 2.22],
        [2.12, 2.20, 2.28, 2.38, 2.44, 2.47, 2.32, 2.27, 2.29, 2.34, 2.37, 2.51],
        [2.74, 2.83, 2.97, 3.10, 3.20, 3.17, 2.74, 2.60, 2.60, 2.62, 2.65, 2.81],
        [3.73, 3.84, 3.99, 4.11, 4.17, 4.10, 3.36, 3.05, 2.92, 2.90, 2.93, 3.11],
        [5.31, 5.45, 5.65, 5.80, 5.80, 5.55, 4.10, 3.54, 3.31, 3.20, 3.23, 3.41],
    ];

    private static readonly double[] _capacitanceLengths =
    [
        0.10, 0.15, 0.20, 0.25, 0.30, 0.35, 0.40, 0.45, 0.50, 0.60, 0.70, 0.80, 0.90, 1.0, 1.5, 2.0, 2.5,
        3.0, 3.5, 4.0, 4.5, 5.0, 6.0, 7.0, 8.0, 9.0, 10.0, 15.0, 20.0, 25.0, 30.0, 40.0, 50.0,
    ];

    private static readonly double[] _capacitance =
    [
        0.96, 0.79, 0.70, 0.64, 0.60, 0.57, 0.54, 0.52, 0.50, 0.48, 0.47, 0.46, 0.46, 0.46, 0.47, 0.50, 0.56,
        0.61, 0.67, 0.72, 0.77, 0.81, 0.92, 1.01, 1.12, 1.22, 1.32, 1.86, 2.36, 2.90, 3.40, 4.60, 5.80,
    ];

    /// <summary>
    /// Proximity factor Phi: resistance of the coil over that of its wire stretched out, at high frequency. Linear between the
    /// entries, as is customary, and linear in diameter over length from 10 to the endless coil.
    /// </summary>
    /// <param name="wireOverPitch">Bare wire diameter over pitch, above 0 to 1; below 0.1 the value at 0.1.</param>
    /// <param name="lengthOverDiameter">Length over mean diameter, 0 or more; positive infinity is allowed.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside its range.</exception>
    public static double ProximityFactor(double wireOverPitch, double lengthOverDiameter)
    {
        double spacing = Guard.InRange(wireOverPitch, double.Epsilon, 1.0, nameof(wireOverPitch));
        double length = double.IsPositiveInfinity(lengthOverDiameter)
            ? lengthOverDiameter
            : Guard.NotNegative(lengthOverDiameter, nameof(lengthOverDiameter));
        double place = Math.Max(0.0, (10.0 * spacing) - 1.0);
        int row = Math.Min((int)place, _phi.Length - 2);
        double below = AlongRow(_phi[row], length);
        double above = AlongRow(_phi[row + 1], length);
        return below + ((above - below) * (place - row));
    }

    /// <summary>Self-capacitance in F of a single-layer coil with one end earthed: H(l/D) in pF for each cm of diameter.</summary>
    /// <param name="lengthOverDiameter">Length over mean diameter, above 0; outside 0.1 to 50 the value at the edge.</param>
    /// <param name="diameterMetre">Mean diameter in m, above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above 0.</exception>
    public static double SelfCapacitanceFarad(double lengthOverDiameter, double diameterMetre)
    {
        double length = Guard.Positive(lengthOverDiameter, nameof(lengthOverDiameter));
        double centimetre = 100.0 * Guard.Positive(diameterMetre, nameof(diameterMetre));
        double picofarad = Interpolated(_capacitanceLengths, _capacitance, length) * centimetre;
        return 1e-12 * picofarad;
    }

    private static double AlongRow(double[] row, double length)
    {
        double longest = _phiLengths[^1];
        return length > longest
            ? row[^1] + ((row[^2] - row[^1]) * longest / length)
            : Interpolated(_phiLengths, row, length);
    }

    private static double Interpolated(double[] places, double[] values, double place)
    {
        double inside = Math.Clamp(place, places[0], places[^1]);
        int next = 1;
        while (places[next] < inside)
        {
            next++;
        }

        double share = (inside - places[next - 1]) / (places[next] - places[next - 1]);
        return values[next - 1] + ((values[next] - values[next - 1]) * share);
    }
}
