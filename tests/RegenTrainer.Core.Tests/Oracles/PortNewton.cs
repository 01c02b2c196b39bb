namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>Newton's method with steps held back, for the port voltages of all devices at one instant.</summary>
internal static class PortNewton
{
    private const double LargestStepVolt = 0.1;
    private const double ToleranceVolt = 1e-13;

    /// <summary>Solves u + Z flow(u) = drive, starting from the u handed in.</summary>
    /// <exception cref="InvalidOperationException">The method does not settle.</exception>
    internal static void Solve(PortExcess[] devices, double[] response, double[] drive, double[] u)
    {
        int m = u.Length;
        Span<double> matrix = stackalloc double[m * m];
        Span<double> step = stackalloc double[m];
        double before = double.PositiveInfinity;
        for (int iteration = 0; iteration < 400; iteration++)
        {
            for (int d = 0; d < devices.Length; d++)
            {
                devices[d].Evaluate(u[2 * d], u[(2 * d) + 1]);
            }

            for (int p = 0; p < m; p++)
            {
                step[p] = u[p] - drive[p];
                for (int q = 0; q < m; q++)
                {
                    double z = response[(p * m) + q];
                    step[p] += z * devices[q / 2].Flow(q % 2);
                    matrix[(p * m) + q] = p == q ? 1 : 0;
                }

                for (int q = 0; q < m; q++)
                {
                    int first = q / 2 * 2;
                    matrix[(p * m) + q] += (response[(p * m) + first] * devices[q / 2].Slope(0, q % 2))
                        + (response[(p * m) + first + 1] * devices[q / 2].Slope(1, q % 2));
                }
            }

            Eliminate(matrix, step);
            double largest = 0;
            double fastest = 0;
            for (int d = 0; d < devices.Length; d++)
            {
                (double d1, double d2) = (Math.Abs(step[2 * d]), Math.Abs(step[(2 * d) + 1]));
                fastest = Math.Max(fastest, Math.Max(d1, Math.Abs(step[(2 * d) + 1] - step[2 * d])));
                largest = Math.Max(largest, Math.Max(d1 / (1 + Math.Abs(u[2 * d])), d2 / (1 + Math.Abs(u[(2 * d) + 1]))));
            }

            double factor = fastest > LargestStepVolt ? LargestStepVolt / fastest : 1;
            for (int p = 0; p < m; p++)
            {
                u[p] -= factor * step[p];
            }

            // A step that shrank a thousandfold leaves an error that much smaller again.
            if (largest < ToleranceVolt || (largest < 1e-9 && largest < before / 1000) || (largest < 1e-10 && largest > before / 2))
            {
                for (int d = 0; d < devices.Length; d++)
                {
                    devices[d].Evaluate(u[2 * d], u[(2 * d) + 1]);
                }

                return;
            }

            before = largest;
        }

        throw new InvalidOperationException("the device law could not be met within a step");
    }

    /// <summary>Gaussian elimination with row exchange; the right side becomes the solution.</summary>
    private static void Eliminate(Span<double> matrix, Span<double> right)
    {
        int m = right.Length;
        for (int k = 0; k < m; k++)
        {
            int pivot = k;
            for (int i = k + 1; i < m; i++)
            {
                pivot = Math.Abs(matrix[(i * m) + k]) > Math.Abs(matrix[(pivot * m) + k]) ? i : pivot;
            }

            for (int j = 0; j < m && pivot != k; j++)
            {
                (matrix[(k * m) + j], matrix[(pivot * m) + j]) = (matrix[(pivot * m) + j], matrix[(k * m) + j]);
            }

            (right[k], right[pivot]) = (right[pivot], right[k]);
            for (int i = k + 1; i < m; i++)
            {
                double factor = matrix[(i * m) + k] / matrix[(k * m) + k];
                for (int j = k; j < m; j++)
                {
                    matrix[(i * m) + j] -= factor * matrix[(k * m) + j];
                }

                right[i] -= factor * right[k];
            }
        }

        for (int k = m - 1; k >= 0; k--)
        {
            for (int j = k + 1; j < m; j++)
            {
                right[k] -= matrix[(k * m) + j] * right[j];
            }

            right[k] /= matrix[(k * m) + k];
        }
    }
}
