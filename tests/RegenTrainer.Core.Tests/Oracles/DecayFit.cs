using System.Numerics;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// Growth rate and frequency of one ringing mode in equally spaced samples: quadrature demodulation under a window, one value a
/// cycle, then least squares on the logarithm of envelope and on phase. Exact for a lone mode, whatever the window.
/// </summary>
internal static class DecayFit
{
    /// <summary>Length of the window, in cycles of the reference frequency.</summary>
    internal const int WindowCycles = 32;

    /// <summary>Kaiser's window with this parameter holds slow modes and the mirror frequency below 1e-8.</summary>
    private const double Kaiser = 20;

    /// <summary>
    /// Weights that turn the samples of <see cref="WindowCycles"/> cycles into one complex amplitude about the reference frequency
    /// [Kaiser 1974, window].
    /// </summary>
    internal static Complex[] Weights(int stepsPerCycle)
    {
        int length = WindowCycles * stepsPerCycle;
        var weights = new Complex[length];
        for (int i = 0; i < length; i++)
        {
            double x = (2 * (i + 0.5) / length) - 1;
            double window = Bessel(Kaiser * Math.Sqrt(1 - (x * x))) / Bessel(Kaiser);
            weights[i] = window * Complex.FromPolarCoordinates(1, -2 * Math.PI * (i % stepsPerCycle) / stepsPerCycle);
        }

        return weights;
    }

    /// <summary>Fits a series of samples.</summary>
    /// <param name="samples">Samples, more than <see cref="WindowCycles"/> cycles of them.</param>
    /// <param name="referenceHz">A frequency within a third of the mode's.</param>
    /// <param name="stepsPerCycle">Samples in a cycle of the reference frequency.</param>
    internal static DecayReading Fit(ReadOnlySpan<double> samples, double referenceHz, int stepsPerCycle)
    {
        Complex[] weights = Weights(stepsPerCycle);
        var amplitudes = new List<Complex>();
        for (int start = 0; start + weights.Length <= samples.Length; start += stepsPerCycle)
        {
            Complex sum = Complex.Zero;
            for (int i = 0; i < weights.Length; i++)
            {
                sum += weights[i] * samples[start + i];
            }

            amplitudes.Add(sum);
        }

        return FitAmplitudes([.. amplitudes], referenceHz, stepsPerCycle);
    }

    /// <summary>Fits complex amplitudes taken one reference cycle apart.</summary>
    internal static DecayReading FitAmplitudes(ReadOnlySpan<Complex> amplitudes, double referenceHz, int stepsPerCycle)
    {
        int count = amplitudes.Length;
        if (count < 3)
        {
            throw new ArgumentException($"{count} cycles beside the window's are too few for a fit; 3 or more are needed", nameof(amplitudes));
        }

        var logs = new Complex[count];
        logs[0] = Complex.Zero;
        for (int k = 1; k < count; k++)
        {
            Complex ratio = amplitudes[k] / amplitudes[k - 1];
            if (!Complex.IsFinite(ratio) || ratio == Complex.Zero)
            {
                throw new InvalidOperationException("the ring left the range of numbers: fewer cycles are wanted");
            }

            logs[k] = logs[k - 1] + Complex.Log(ratio);
        }

        double middle = (count - 1) / 2.0;
        Complex mean = logs.Aggregate(Complex.Zero, (a, b) => a + b) / count;
        Complex slope = Complex.Zero;
        double spread = 0;
        for (int k = 0; k < count; k++)
        {
            slope += (k - middle) * (logs[k] - mean);
            spread += (k - middle) * (k - middle);
        }

        slope /= spread;
        double worst = 0;
        for (int k = 0; k < count; k++)
        {
            worst = Math.Max(worst, (logs[k] - mean - ((k - middle) * slope)).Magnitude);
        }

        double omega = 2 * Math.PI * referenceHz;
        Complex sampled = (slope * referenceHz) + new Complex(0, omega);
        return new DecayReading(sampled, 1 / (referenceHz * stepsPerCycle), worst);
    }

    private static double Bessel(double x)
    {
        double sum = 1;
        double term = 1;
        for (int k = 1; term > 1e-17 * sum; k++)
        {
            term *= x * x / (4.0 * k * k);
            sum += term;
        }

        return sum;
    }
}

/// <summary>A mode as read from samples.</summary>
/// <param name="Sampled">Complex rate of the samples in 1/s: growth and angular frequency.</param>
/// <param name="StepSeconds">Distance of the samples in seconds.</param>
/// <param name="WorstDeviation">Largest departure from a lone mode, in nepers and radians; small where the figures can be trusted.</param>
internal readonly record struct DecayReading(Complex Sampled, double StepSeconds, double WorstDeviation)
{
    /// <summary>
    /// The complex rate of the continuous circuit: the trapezoidal rule takes exp(s h) to (1 + s h/2)/(1 - s h/2), so
    /// s = (2/h) tanh(s_sampled h/2), exactly.
    /// </summary>
    internal Complex Unwarped => 2 / StepSeconds * Complex.Tanh(Sampled * StepSeconds / 2);

    /// <summary>Growth rate of the continuous circuit in 1/s, negative for a decay.</summary>
    internal double GrowthPerS => Unwarped.Real;

    /// <summary>Frequency of the continuous circuit in Hz.</summary>
    internal double Hz => Unwarped.Imaginary / (2 * Math.PI);
}
