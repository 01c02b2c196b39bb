using System.Numerics;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Factorization;

namespace RegenTrainer.Core.Circuits;

/// <summary>One natural frequency of a spectrum with its right vector.</summary>
/// <param name="S">The natural frequency in 1/s; of a complex pair the one with positive imaginary part.</param>
/// <param name="Shape">The right vector.</param>
public sealed record SpectralMode(Complex S, Complex[] Shape);

/// <summary>
/// All natural frequencies of the pencil by a real shift: T = (G + sigma C)^-1 C has the eigenvalues mu = 1/(sigma - s)
/// [Saad 2011, spectral transformation].
/// </summary>
public static class ModeSpectrum
{
    /// <summary>Natural frequencies above this many 1/s are artefacts of a lumped model and left out (2 pi times 5 GHz).</summary>
    private const double LargestRate = 2 * Math.PI * 5e9;

    /// <summary>An eigenvalue of T below this fraction of the largest stands for an infinite natural frequency.</summary>
    private const double InfiniteFraction = 1e-13;

    /// <summary>Finds all finite natural frequencies of the present pencil.</summary>
    /// <param name="w">Workspace with the pencil set.</param>
    /// <param name="shiftRadians">The real shift in 1/s, of the size of the frequencies of interest.</param>
    /// <returns>The modes with Im s at least 0, or null where the shifted pencil is singular or the eigenvalues do not converge.</returns>
    public static IReadOnlyList<SpectralMode>? TryFind(Workspace w, double shiftRadians)
    {
        int n = w.Network.Size;
        int[] rows = w.Network.Rows, columns = w.Network.Columns;
        double[] shifted = new double[rows.Length];
        for (int k = 0; k < shifted.Length; k++)
        {
            shifted[k] = w.Values.G[k] + (shiftRadians * w.Values.C[k]);
        }

        var lu = new SparseLu<double>(n, rows, columns);
        if (!lu.TryFactor(shifted, out _))
        {
            return null;
        }

        Matrix<double> t = Matrix<double>.Build.Dense(n, n);
        double[] right = new double[n];
        for (int column = 0; column < n; column++)
        {
            Array.Clear(right);
            bool any = false;
            foreach (int k in w.Network.CapacitiveEntries)
            {
                if (columns[k] == column)
                {
                    right[rows[k]] += w.Values.C[k];
                    any = true;
                }
            }

            if (any)
            {
                lu.Solve(right);
                t.SetColumn(column, right);
            }
        }

        return LinearAlgebra.TryEigen(t, out Evd<double>? evd) ? Collect(evd!, n, shiftRadians) : null;
    }

    private static List<SpectralMode> Collect(Evd<double> evd, int n, double shift)
    {
        double largest = 0;
        foreach (Complex mu in evd.EigenValues)
        {
            largest = Math.Max(largest, mu.Magnitude);
        }

        var modes = new List<SpectralMode>();
        for (int k = 0; k < n; k++)
        {
            Complex mu = evd.EigenValues[k];
            if (mu.Magnitude <= InfiniteFraction * largest)
            {
                continue;
            }

            Complex s = shift - (1 / mu);
            if (s.Magnitude > LargestRate || s.Imaginary < 0)
            {
                continue;
            }

            // A complex pair shares two columns, real and imaginary part; the second value of the pair is the conjugate.
            bool paired = mu.Imaginary != 0;
            int first = paired && mu.Imaginary < 0 ? k - 1 : k;
            Complex[] shape = new Complex[n];
            for (int i = 0; i < n; i++)
            {
                double imaginary = paired ? evd.EigenVectors[i, first + 1] : 0;
                shape[i] = new Complex(evd.EigenVectors[i, first], mu.Imaginary < 0 ? -imaginary : imaginary);
            }

            modes.Add(new SpectralMode(s, shape));
        }

        return modes;
    }
}
