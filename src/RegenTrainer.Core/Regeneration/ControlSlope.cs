using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Regeneration;

/// <summary>
/// How the tank mode moves with the controlled element: directly, and through the operating point where the control carries
/// direct current. The derivative of an eigenvalue is w' (dA/dp) x over w' C x [Lancaster 1964].
/// </summary>
public static class ControlSlope
{
    /// <summary>The device derivatives are differenced over this change of the larger port voltage, in volt.</summary>
    private const double PortStepVolt = 1e-5;

    /// <summary>ds/dp in 1/s per unit of the element, with capacitor and dial held, at the state in the workspace.</summary>
    public static Complex Total(StageWorkspace ws, in TankState state, double controlValue)
    {
        Workspace w = ws.Circuit;
        double coefficient = w.Values.ControlCoefficient(controlValue);
        Complex sum = coefficient * w.Values.ControlBilinear(w.LeftShape, w.Shape);
        if (SolveBiasSlope(ws, coefficient))
        {
            for (int d = 0; d < w.Network.Devices.Count; d++)
            {
                sum += DeviceChange(ws, d, state.Mode.S);
            }
        }

        w.MultiplyC(w.Shape, w.CShape, transposed: false);
        return -sum / Workspace.Dot(w.LeftShape, w.CShape);
    }

    /// <summary>dV/dp by the Jacobian the operating point's last step has factored; false where the control carries no direct current.</summary>
    private static bool SolveBiasSlope(StageWorkspace ws, double coefficient)
    {
        Workspace w = ws.Circuit;
        if (w.Network.Control?.Pair is not { } pair || w.Network.Devices.Count == 0)
        {
            return false;
        }

        double volt = (pair.From < 0 ? 0 : w.Voltages[pair.From]) - (pair.To < 0 ? 0 : w.Voltages[pair.To]);
        if (volt == 0)
        {
            return false;
        }

        double[] slope = ws.BiasSlope;
        Array.Clear(slope);
        if (pair.From >= 0)
        {
            slope[pair.From] = -coefficient * volt;
        }

        if (pair.To >= 0)
        {
            slope[pair.To] = coefficient * volt;
        }

        w.DirectLu.Solve(slope);
        return true;
    }

    private static Complex DeviceChange(StageWorkspace ws, int d, Complex s)
    {
        Workspace w = ws.Circuit;
        DeviceStamp device = w.Network.Devices[d];
        double common = At(ws.BiasSlope, device.Common);
        (double d1, double d2) = (At(ws.BiasSlope, device.Control) - common, At(ws.BiasSlope, device.Output) - common);
        double size = Math.Max(Math.Abs(d1), Math.Abs(d2));
        if (size == 0)
        {
            return Complex.Zero;
        }

        double step = PortStepVolt / size;
        TwoPortPoint ahead = w.Values.Law(d).Evaluate(w.Port1[d] + (step * d1), w.Port2[d] + (step * d2));
        TwoPortPoint behind = w.Values.Law(d).Evaluate(w.Port1[d] - (step * d1), w.Port2[d] - (step * d2));
        Complex x0 = At(w.Shape, device.Common), w0 = At(w.LeftShape, device.Common);
        (Complex x1, Complex x2) = (At(w.Shape, device.Control) - x0, At(w.Shape, device.Output) - x0);
        (Complex w1, Complex w2) = (At(w.LeftShape, device.Control) - w0, At(w.LeftShape, device.Output) - w0);
        return ((w1 * x1 * Difference(ahead.G11, behind.G11, ahead.C11, behind.C11, s))
            + (w1 * x2 * Difference(ahead.G12, behind.G12, ahead.C12, behind.C12, s))
            + (w2 * x1 * Difference(ahead.G21, behind.G21, ahead.C21, behind.C21, s))
            + (w2 * x2 * Difference(ahead.G22, behind.G22, ahead.C22, behind.C22, s))) / (2 * step);
    }

    private static Complex Difference(double g1, double g0, double c1, double c0, Complex s) => (g1 - g0) + (s * (c1 - c0));

    private static double At(double[] v, int unknown) => unknown < 0 ? 0 : v[unknown];

    private static Complex At(Complex[] v, int unknown) => unknown < 0 ? Complex.Zero : v[unknown];
}
