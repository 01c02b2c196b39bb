using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// Newton's method on the direct currents: windings as their resistance, capacitors open, junction steps limited; where it
/// fails from a standing start the supply is raised in steps (source stepping).
/// </summary>
public static class OperatingPointSolver
{
    /// <summary>A Newton step below this many volt leaves an error of half its square over the thermal voltage: below 1e-12 V.</summary>
    private const double VoltTolerance = 2e-7;

    private const int StepLimit = 200;

    private const int RampSteps = 20;

    /// <summary>Finds the operating point for the values set by <see cref="NetworkValues.SetDirect"/>.</summary>
    /// <param name="workspace">Receives voltages, device points and linearisations.</param>
    /// <param name="regeneratingRemoved">Whether the regenerating devices are out of their sockets.</param>
    /// <param name="fromVoltages">Whether the workspace's voltages are a good start; the result does not depend on it.</param>
    public static OperatingPoint Solve(Workspace workspace, bool regeneratingRemoved, bool fromVoltages)
    {
        OperatingPoint result = default;
        if (fromVoltages)
        {
            result = Newton(workspace, regeneratingRemoved, 1, HintStepLimit);
            if (result.Found)
            {
                return result;
            }
        }

        Array.Clear(workspace.Voltages);
        result = Newton(workspace, regeneratingRemoved, 1, StepLimit);
        if (result.Found || result.Stop == SolveStop.Singular)
        {
            return result;
        }

        Array.Clear(workspace.Voltages);
        for (int step = 1; step <= RampSteps; step++)
        {
            result = Newton(workspace, regeneratingRemoved, step / (double)RampSteps, StepLimit);
            if (!result.Found)
            {
                return result;
            }
        }

        return result;
    }

    private const int HintStepLimit = 30;

    private static OperatingPoint Newton(Workspace w, bool removed, double supplyShare, int stepLimit)
    {
        Network network = w.Network;
        for (int d = 0; d < w.Port1.Length; d++)
        {
            (w.Port1[d], w.Port2[d]) = Ports(network.Devices[d], w.Voltages);
        }

        if (!TryHead(w, removed, supplyShare, out int blamed))
        {
            return new OperatingPoint(SolveStop.Singular, 0, double.NaN, blamed);
        }

        bool replanned = false;
        for (int iteration = 1; iteration <= stepLimit; iteration++)
        {
            Span<double> right = w.NextVoltages;
            Span<double> matrix = w.DirectLu.BeginTail(right);
            for (int d = 0; d < network.Devices.Count; d++)
            {
                StampDevice(w, d, removed, matrix, right);
            }

            if (!w.DirectLu.TryTail(right, out blamed))
            {
                // The pivots were chosen for other currents: choose once more for these, then believe it.
                w.DirectLu.Forget();
                if (replanned || !TryHead(w, removed, supplyShare, out blamed))
                {
                    return new OperatingPoint(SolveStop.Singular, iteration, double.NaN, blamed);
                }

                replanned = true;
                continue;
            }

            double largest = 0;
            for (int i = 0; i < right.Length; i++)
            {
                largest = Math.Max(largest, Math.Abs(right[i] - w.Voltages[i]));
                w.Voltages[i] = right[i];
            }

            if (!double.IsFinite(largest))
            {
                return new OperatingPoint(SolveStop.NotFinite, iteration, double.NaN, -1);
            }

            bool limited = false;
            for (int d = 0; d < network.Devices.Count; d++)
            {
                (double v1, double v2) = Ports(network.Devices[d], w.Voltages);
                if (!(removed && network.Devices[d].Regenerating))
                {
                    limited |= w.Values.Law(d).LimitStep(w.Port1[d], w.Port2[d], ref v1, ref v2);
                }

                (w.Port1[d], w.Port2[d]) = (v1, v2);
            }

            if (!limited && largest < VoltTolerance)
            {
                return Finish(w, removed, supplyShare, iteration);
            }
        }

        return new OperatingPoint(SolveStop.StepLimit, stepLimit, Residual(w, removed, supplyShare), -1);
    }

    /// <summary>Eliminates everything linear once; the devices come in step by step.</summary>
    private static bool TryHead(Workspace w, bool removed, double supplyShare, out int blamed)
    {
        for (int i = 0; i < w.NextVoltages.Length; i++)
        {
            w.NextVoltages[i] = w.Values.DirectRight[i] * supplyShare;
        }

        if (w.DirectLu.HasPlan)
        {
            return w.DirectLu.TryHead(w.Values.Direct, w.Values.Direct, w.NextVoltages, out blamed);
        }

        w.Values.Direct.CopyTo(w.DirectSample, 0);
        Span<double> unused = w.BiasScratch;
        for (int d = 0; d < w.Network.Devices.Count; d++)
        {
            StampDevice(w, d, removed, w.DirectSample, unused);
        }

        return w.DirectLu.TryHead(w.Values.Direct, w.DirectSample, w.NextVoltages, out blamed);
    }

    private static OperatingPoint Finish(Workspace w, bool removed, double supplyShare, int iterations)
    {
        for (int d = 0; d < w.Points.Length; d++)
        {
            DeviceStamp device = w.Network.Devices[d];
            w.Points[d] = removed && device.Regenerating ? default : w.Values.Law(d).Evaluate(w.Port1[d], w.Port2[d]);
            w.Linear[d] = Linearisation.From(w.Points[d]);
        }

        double residual = Residual(w, removed, supplyShare);
        return new OperatingPoint(SolveStop.Converged, iterations, residual, -1);
    }

    /// <summary>The largest current left over at a node by Kirchhoff's law, in ampere, with the device currents of <see cref="Workspace.Points"/>.</summary>
    private static double Residual(Workspace w, bool removed, double supplyShare)
    {
        Span<double> sum = w.NextVoltages;
        for (int i = 0; i < sum.Length; i++)
        {
            sum[i] = -w.Values.DirectRight[i] * supplyShare;
        }

        int[] rows = w.Network.Rows, columns = w.Network.Columns;
        for (int k = 0; k < rows.Length; k++)
        {
            sum[rows[k]] += w.Values.Direct[k] * w.Voltages[columns[k]];
        }

        for (int d = 0; d < w.Points.Length; d++)
        {
            DeviceStamp device = w.Network.Devices[d];
            if (!(removed && device.Regenerating))
            {
                Add(sum, device.Control, w.Points[d].I1);
                Add(sum, device.Output, w.Points[d].I2);
                Add(sum, device.Common, -w.Points[d].I1 - w.Points[d].I2);
            }
        }

        double largest = 0;
        foreach (double value in sum)
        {
            largest = Math.Max(largest, Math.Abs(value));
        }

        return largest;
    }

    private static void StampDevice(Workspace w, int d, bool removed, Span<double> matrix, Span<double> right)
    {
        DeviceStamp device = w.Network.Devices[d];
        if (removed && device.Regenerating)
        {
            return;
        }

        ConductionPoint p = w.Values.Law(d).Conduct(w.Port1[d], w.Port2[d]);
        NetworkValues.Add9(device.Entries, matrix, p.G11, p.G12, p.G21, p.G22);
        double i1 = p.I1 - (p.G11 * w.Port1[d]) - (p.G12 * w.Port2[d]);
        double i2 = p.I2 - (p.G21 * w.Port1[d]) - (p.G22 * w.Port2[d]);
        Add(right, device.Control, -i1);
        Add(right, device.Output, -i2);
        Add(right, device.Common, i1 + i2);
    }

    private static (double V1, double V2) Ports(DeviceStamp device, double[] v)
    {
        double common = device.Common < 0 ? 0 : v[device.Common];
        return (v[device.Control] - common, (device.Output < 0 ? 0 : v[device.Output]) - common);
    }

    private static void Add(Span<double> values, int unknown, double value)
    {
        if (unknown >= 0)
        {
            values[unknown] += value;
        }
    }
}
