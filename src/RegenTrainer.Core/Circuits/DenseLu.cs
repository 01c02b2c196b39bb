using System.Numerics;
using System.Runtime.InteropServices;

namespace RegenTrainer.Core.Circuits;

/// <summary>Gaussian elimination of a full real matrix with row exchange [Dahlquist and Bjorck 2008], in place.</summary>
public static class DenseLu
{
    /// <summary>Solves a x = b; both are overwritten, the right side by the solution.</summary>
    /// <param name="a">The matrix row by row.</param>
    /// <param name="b">The right side.</param>
    /// <returns>Whether the matrix was regular and finite.</returns>
    public static bool TrySolve(Span<double> a, Span<double> b)
    {
        int n = b.Length;
        for (int k = 0; k < n; k++)
        {
            int pivot = k;
            for (int i = k + 1; i < n; i++)
            {
                pivot = Math.Abs(a[(i * n) + k]) > Math.Abs(a[(pivot * n) + k]) ? i : pivot;
            }

            double top = a[(pivot * n) + k];
            if (top == 0 || !double.IsFinite(top))
            {
                return false;
            }

            Span<double> row = a.Slice(k * n, n);
            if (pivot != k)
            {
                Exchange(row, a.Slice(pivot * n, n));
                (b[k], b[pivot]) = (b[pivot], b[k]);
            }

            for (int i = k + 1; i < n; i++)
            {
                double factor = a[(i * n) + k] / top;
                if (factor != 0)
                {
                    Subtract(a.Slice((i * n) + k, n - k), factor, row[k..]);
                    b[i] -= factor * b[k];
                }
            }
        }

        for (int i = n - 1; i >= 0; i--)
        {
            double sum = b[i];
            for (int j = i + 1; j < n; j++)
            {
                sum -= a[(i * n) + j] * b[j];
            }

            b[i] = sum / a[(i * n) + i];
        }

        return true;
    }

    private static void Exchange(Span<double> a, Span<double> b)
    {
        for (int j = 0; j < a.Length; j++)
        {
            (a[j], b[j]) = (b[j], a[j]);
        }
    }

    private static void Subtract(Span<double> from, double factor, ReadOnlySpan<double> row)
    {
        Span<Vector<double>> wide = MemoryMarshal.Cast<double, Vector<double>>(from);
        ReadOnlySpan<Vector<double>> wideRow = MemoryMarshal.Cast<double, Vector<double>>(row);
        for (int j = 0; j < wide.Length; j++)
        {
            wide[j] -= factor * wideRow[j];
        }

        for (int j = wide.Length * Vector<double>.Count; j < from.Length; j++)
        {
            from[j] -= factor * row[j];
        }
    }
}
