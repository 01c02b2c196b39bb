using System.Numerics;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>
/// Resistance of round wire to alternating current, alone and among its neighbours in a coil. With y = radius/skin depth and
/// k = (1 - j) y: R/R_dc = H + (Phi - 1)/2 W, H = Re[k J0(k)/(2 J1(k))] the skin effect, W = -Re[k J1(k)/J0(k)] the loss in a
/// transverse field [Butterworth 1925], joined so that R tends to Phi times that of the straight wire at high frequency, Phi
/// being the proximity factor of [Medhurst 1947].
/// </summary>
public static class WireLoss
{
    /// <summary>Largest radius over skin depth accepted.</summary>
    public const double LargestRatio = 1e6;

    // Above this the growing exponential alone is left to a double (the other is e^(-2y) of it).
    private const double AsymptoticFrom = 20.0;
    private const int AsymptoticTerms = 14;

    /// <summary>Depth in m at which the current density in a conductor has fallen to 1/e [Wheeler 1942].</summary>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    /// <param name="conductivity">Conductivity in S/m, above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above 0.</exception>
    public static double SkinDepthMetre(double hz, double conductivity)
    {
        double frequency = Guard.Positive(hz, nameof(hz));
        double sigma = Guard.Positive(conductivity, nameof(conductivity));
        return 1.0 / Math.Sqrt(Math.PI * frequency * PhysicalConstants.VacuumPermeability * sigma);
    }

    /// <summary>Radius over skin depth of copper wire; 0 at 0 Hz.</summary>
    /// <param name="wireRadiusMetre">Radius of the copper in m, 0 or more.</param>
    /// <param name="hz">Frequency in Hz, 0 or more.</param>
    /// <param name="temperatureCelsius">Temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside its range.</exception>
    public static double RadiusOverSkinDepth(double wireRadiusMetre, double hz, double temperatureCelsius)
    {
        double radius = Guard.NotNegative(wireRadiusMetre, nameof(wireRadiusMetre));
        double frequency = Guard.NotNegative(hz, nameof(hz));
        double sigma = PhysicalConstants.CopperConductivityAt(temperatureCelsius);
        return radius * Math.Sqrt(Math.PI * frequency * PhysicalConstants.VacuumPermeability * sigma);
    }

    /// <summary>Alternating over direct current resistance of a wire in a coil.</summary>
    /// <param name="radiusOverSkinDepth">y, 0 to 1e6.</param>
    /// <param name="proximityFactor">Phi at high frequency, 1 or more; 1 for a straight wire alone.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside its range.</exception>
    public static double Ratio(double radiusOverSkinDepth, double proximityFactor)
    {
        double phi = Guard.InRange(proximityFactor, 1.0, double.MaxValue, nameof(proximityFactor));
        (double skin, double transverse) = Terms(radiusOverSkinDepth);
        return skin + (0.5 * (phi - 1.0) * transverse);
    }

    /// <summary>The two terms H and W.</summary>
    /// <param name="radiusOverSkinDepth">y, 0 to 1e6.</param>
    /// <exception cref="ArgumentOutOfRangeException">The argument lies outside that range.</exception>
    public static (double Skin, double Transverse) Terms(double radiusOverSkinDepth)
    {
        double y = Guard.InRange(radiusOverSkinDepth, 0.0, LargestRatio, nameof(radiusOverSkinDepth));
        (double p, double q) = y < AsymptoticFrom ? ByContinuedFraction(y) : ByAsymptoticSeries(y);

        // t = k J0/J1 = p + jq, and k J1/J0 = k²/t with k² = -2j y².
        return (0.5 * p, 2.0 * y * y * q / ((p * p) + (q * q)));
    }

    /// <summary>
    /// k J0(k)/J1(k) = 2 - k²/(4 - k²/(6 - ...)) [Abramowitz and Stegun 1964, 9.1.73], from the tail upward: with k² = -2j y²
    /// every partial result has two positive parts, so nothing cancels.
    /// </summary>
    private static (double Real, double Imaginary) ByContinuedFraction(double y)
    {
        double square = 2.0 * y * y;
        int depth = 14 + (int)(2.0 * y);
        double p = 2.0 * depth;
        double q = 0.0;
        for (int m = depth - 1; m >= 1; m--)
        {
            double scale = square / ((p * p) + (q * q));
            (p, q) = ((2.0 * m) + (scale * q), scale * p);
        }

        return (p, q);
    }

    /// <summary>Hankel's expansion of the growing exponential [Abramowitz and Stegun 1964, 9.2.7 to 9.2.10].</summary>
    private static (double Real, double Imaginary) ByAsymptoticSeries(double y)
    {
        // J1/J0 = -j S1/S0 with S_n the sum of j^m a_m(n)/k^m; one step multiplies by j (4n² - (2m-1)²)/(8 m k).
        Complex step = Complex.ImaginaryOne / (8.0 * new Complex(y, -y));
        Complex zero = Complex.One;
        Complex one = Complex.One;
        Complex zeroSum = zero;
        Complex oneSum = one;
        for (int m = 1; m <= AsymptoticTerms; m++)
        {
            double odd = (2 * m) - 1;
            zero *= step * (-odd * odd / m);
            one *= step * ((4.0 - (odd * odd)) / m);
            zeroSum += zero;
            oneSum += one;
        }

        // k j = y + jy.
        Complex t = new Complex(y, y) * zeroSum / oneSum;
        return (t.Real, t.Imaginary);
    }
}
