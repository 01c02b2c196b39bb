using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>
/// Complete elliptic integrals by the arithmetic-geometric mean [Gauss 1799; Abramowitz and Stegun 1964, 17.6].
/// The argument is the parameter m = k², not the modulus k.
/// </summary>
public static class EllipticIntegrals
{
    // The mean converges quadratically: from any start a double holds, ten steps leave nothing to gain.
    private const int MostSteps = 40;
    private const double Converged = 1e-17;

    /// <summary>Complete elliptic integral of the first kind K(m).</summary>
    /// <param name="parameter">m = k², 0 to below 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The parameter lies outside that range.</exception>
    public static double FirstKind(double parameter)
    {
        double m = Guard.InRange(parameter, 0.0, Math.BitDecrement(1.0), nameof(parameter));
        return Descend(m).FirstKind;
    }

    /// <summary>Complete elliptic integral of the second kind E(m).</summary>
    /// <param name="parameter">m = k², 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The parameter lies outside that range.</exception>
    public static double SecondKind(double parameter)
    {
        double m = Guard.InRange(parameter, 0.0, 1.0, nameof(parameter));
        if (m == 1.0)
        {
            return 1.0;
        }

        (double firstKind, double squares) = Descend(m);
        return firstKind * (1.0 - squares);
    }

    /// <summary>K(m), and the sum of 2^(n-1) c_n² from n = 0, which is 1 - E(m)/K(m).</summary>
    private static (double FirstKind, double Squares) Descend(double m)
    {
        double a = 1.0;
        double b = Math.Sqrt(1.0 - m);
        double weight = 0.5;
        double squares = weight * m;
        for (int step = 0; step < MostSteps; step++)
        {
            double c = 0.5 * (a - b);
            weight *= 2.0;
            squares += weight * c * c;
            double mean = 0.5 * (a + b);
            b = Math.Sqrt(a * b);
            a = mean;
            if (weight * c * c <= Converged)
            {
                break;
            }
        }

        return (Math.PI / (2.0 * a), squares);
    }
}
