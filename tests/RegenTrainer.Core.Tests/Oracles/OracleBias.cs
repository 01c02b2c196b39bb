using MathNet.Numerics.LinearAlgebra;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// The operating point of a stage: Newton's method while the supplies rise from nothing in small steps, capacitors open and
/// windings as their resistance; and the devices' slopes there, by differences of the law, not by the law's own derivatives.
/// </summary>
internal sealed class OracleBias
{
    /// <summary>Holds nodes that only capacitors reach at a definite voltage, far below any current that matters.</summary>
    private const double PinSiemens = 1e-15;

    /// <summary>Parts the current of ideal branches in parallel.</summary>
    private const double PinOhm = 1e-9;

    private const double LargestStepVolt = 0.1;

    private readonly OracleCircuit _circuit;
    private readonly double[,] _direct;
    private readonly double[] _sources;

    internal OracleBias(OracleCircuit circuit)
    {
        _circuit = circuit;
        _direct = circuit.DirectMatrix();
        for (int i = 0; i < circuit.Size; i++)
        {
            _direct[i, i] += circuit.IsBranch(i) ? -PinOhm : PinSiemens;
        }

        _sources = circuit.DirectSources();
        double[] x = new double[circuit.Size];
        double share = 0;
        double rise = 0.05;
        while (share < 1)
        {
            double next = Math.Min(1, share + rise);
            double[] trial = [.. x];
            if (Newton(trial, next))
            {
                (x, share, rise) = (trial, next, Math.Min(0.2, rise * 2));
            }
            else if ((rise /= 4) < 1e-6)
            {
                throw new InvalidOperationException($"no operating point beyond {share:P2} of the supply");
            }
        }

        Unknowns = x;
    }

    /// <summary>Node voltages in volt and branch currents in ampere.</summary>
    internal double[] Unknowns { get; }

    /// <summary>The two port voltages of a device.</summary>
    internal (double Control, double Output) Ports(OracleDevicePlace place) => Ports(Unknowns, place);

    /// <summary>Slopes of currents and charges at the operating point by five-point differences.</summary>
    internal (double[,] Siemens, double[,] Farad) Slopes(OracleDevicePlace place)
    {
        (double v1, double v2) = Ports(place);
        double[,] siemens = new double[2, 2];
        double[,] farad = new double[2, 2];
        IDeviceLaw law = place.Device.Law;
        for (int port = 0; port < 2; port++)
        {
            double step = Math.Max(1e-4, 1e-5 * Math.Abs(port == 0 ? v1 : v2));
            foreach ((double offset, double weight) in new[] { (-2.0, 1.0), (-1.0, -8.0), (1.0, 8.0), (2.0, -1.0) })
            {
                TwoPortPoint p = port == 0 ? law.Evaluate(v1 + (offset * step), v2) : law.Evaluate(v1, v2 + (offset * step));
                double factor = weight / (12 * step);
                siemens[0, port] += factor * p.I1;
                siemens[1, port] += factor * p.I2;
                farad[0, port] += factor * p.Q1;
                farad[1, port] += factor * p.Q2;
            }
        }

        return (siemens, farad);
    }

    private static (double Control, double Output) Ports(double[] x, OracleDevicePlace place)
    {
        double common = At(x, place.Common);
        return (At(x, place.Control) - common, At(x, place.Output) - common);
    }

    private static double At(double[] x, int unknown) => unknown < 0 ? 0 : x[unknown];

    private bool Newton(double[] x, double share)
    {
        double before = double.PositiveInfinity;
        for (int iteration = 0; iteration < 200; iteration++)
        {
            Matrix<double> jacobian = Matrix<double>.Build.DenseOfArray(_direct);
            Vector<double> residual = (jacobian * Vector<double>.Build.Dense(x)) - (share * Vector<double>.Build.Dense(_sources));
            foreach (OracleDevicePlace place in _circuit.Devices)
            {
                AddDevice(jacobian, residual, x, place);
            }

            Vector<double> step = jacobian.LU().Solve(residual);
            double largestPort = 0;
            double largest = 0;
            double[] moved = [.. step];
            foreach (OracleDevicePlace place in _circuit.Devices)
            {
                (double d1, double d2) = Ports(moved, place);
                largestPort = Math.Max(largestPort, Math.Max(Math.Abs(d1), Math.Abs(d2 - d1)));
            }

            double factor = largestPort > LargestStepVolt ? LargestStepVolt / largestPort : 1;
            for (int i = 0; i < x.Length; i++)
            {
                x[i] -= factor * moved[i];
                largest = Math.Max(largest, Math.Abs(moved[i]) / (1 + Math.Abs(x[i])));
            }

            if (!double.IsFinite(largest))
            {
                return false;
            }

            if (largest < 1e-12 || (largest < 1e-9 && largest > before / 2))
            {
                return true;   // rounding leaves no more to gain
            }

            before = largest;
        }

        return false;
    }

    private static void AddDevice(Matrix<double> jacobian, Vector<double> residual, double[] x, OracleDevicePlace place)
    {
        (double v1, double v2) = Ports(x, place);
        TwoPortPoint p = place.Device.Law.Evaluate(v1, v2);
        int[] terminals = [place.Control, place.Output, place.Common];
        double[] current = [p.I1, p.I2, -p.I1 - p.I2];
        double[,] slope =
        {
            { p.G11, p.G12, -p.G11 - p.G12 },
            { p.G21, p.G22, -p.G21 - p.G22 },
            { -p.G11 - p.G21, -p.G12 - p.G22, p.G11 + p.G12 + p.G21 + p.G22 },
        };
        for (int i = 0; i < 3; i++)
        {
            if (terminals[i] < 0)
            {
                continue;
            }

            residual[terminals[i]] += current[i];
            for (int j = 0; j < 3; j++)
            {
                if (terminals[j] >= 0)
                {
                    jacobian[terminals[i], terminals[j]] += slope[i, j];
                }
            }
        }
    }
}
