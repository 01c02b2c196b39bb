using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>How the current fills the section of a round wire.</summary>
public enum CurrentDistribution
{
    /// <summary>On the surface, as at radio frequency.</summary>
    Surface,

    /// <summary>Evenly over the section, as at low frequency.</summary>
    Uniform,
}

/// <summary>Inductance of circular loops on one axis.</summary>
public static class CoaxialLoops
{
    /// <summary>
    /// Mutual inductance in H of two thin circular loops on one axis [Maxwell 1873, art. 701]. Maxwell's
    /// (2/k - k) K - (2/k) E loses its digits for loops far apart; the same arithmetic-geometric mean gives the
    /// difference as a sum of positive terms [Abramowitz and Stegun 1964, 17.6.3 and 17.6.4], good to rounding at any distance.
    /// </summary>
    /// <param name="firstRadiusMetre">Radius of one loop in m, above 0.</param>
    /// <param name="secondRadiusMetre">Radius of the other loop in m, above 0.</param>
    /// <param name="distanceMetre">Distance of the two planes in m, either sign; not 0 for equal radii.</param>
    /// <exception cref="ArgumentOutOfRangeException">A radius is not above 0, the distance is not finite, or the loops coincide.</exception>
    public static double MutualHenry(double firstRadiusMetre, double secondRadiusMetre, double distanceMetre)
    {
        double first = Guard.Positive(firstRadiusMetre, nameof(firstRadiusMetre));
        double second = Guard.Positive(secondRadiusMetre, nameof(secondRadiusMetre));
        double distance = Guard.Finite(distanceMetre, nameof(distanceMetre));
        double sum = first + second;
        double difference = first - second;
        double square = distance * distance;
        double farthest = Math.Sqrt((sum * sum) + square);
        double nearest = Math.Sqrt((difference * difference) + square);
        if (nearest == 0.0)
        {
            throw new ArgumentOutOfRangeException(nameof(distanceMetre), "Two loops in the same place have no finite mutual inductance.");
        }

        double c = 2.0 * first * second / (farthest + nearest);
        double a = 0.5 * (farthest + nearest);
        double b = Math.Sqrt(farthest * nearest);
        double weight = 2.0;
        double total = weight * c * c;
        while (c > 1e-9 * a)
        {
            double mean = 0.5 * (a + b);
            c = c * c / (4.0 * mean);
            b = Math.Sqrt(a * b);
            a = mean;
            weight *= 2.0;
            total += weight * c * c;
        }

        return PhysicalConstants.VacuumPermeability * Math.PI / (4.0 * a) * total;
    }

    /// <summary>
    /// Self-inductance in H of one turn of round wire, mu0 a (ln(8a/rho) - Y), with Y = 2 for current on the surface and 7/4 for
    /// current spread evenly [Rosa and Grover 1912].
    /// </summary>
    /// <param name="radiusMetre">Radius of the turn to the wire's centre in m, above the wire's radius.</param>
    /// <param name="wireRadiusMetre">Radius of the wire in m, above 0.</param>
    /// <param name="distribution">How the current fills the wire.</param>
    /// <exception cref="ArgumentOutOfRangeException">A radius lies outside its range.</exception>
    public static double SelfHenry(double radiusMetre, double wireRadiusMetre, CurrentDistribution distribution)
    {
        double wire = Guard.Positive(wireRadiusMetre, nameof(wireRadiusMetre));
        double radius = Guard.InRange(radiusMetre, wire, double.MaxValue, nameof(radiusMetre));
        double inner = distribution == CurrentDistribution.Surface ? 2.0 : 1.75;
        return PhysicalConstants.VacuumPermeability * radius * (Math.Log(8.0 * radius / wire) - inner);
    }
}
