using System.Numerics;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// What the linearised network does to the ports of its devices, at direct current and at the harmonics of one frequency. Ports are
/// counted two to a device: control, then output, both against common.
/// </summary>
internal sealed class PortResponses
{
    private PortResponses(int ports, int harmonics)
    {
        Impedance = new Complex[harmonics + 1][];
        (FromAntenna, TankFromPort, OutputFromPort) = (new Complex[ports], new Complex[ports], new Complex[ports]);
        for (int k = 0; k <= harmonics; k++)
        {
            Impedance[k] = new Complex[ports * ports];
        }
    }

    /// <summary>Impedances from port to port row by row in ohm, at each harmonic from 0.</summary>
    public Complex[][] Impedance { get; }

    /// <summary>Port volt per volt of the antenna's electromotive force, at the fundamental.</summary>
    public Complex[] FromAntenna { get; }

    /// <summary>Volt across the tuning capacitor per volt of electromotive force.</summary>
    public Complex TankFromAntenna { get; private set; }

    /// <summary>Output volt per volt of electromotive force.</summary>
    public Complex OutputFromAntenna { get; private set; }

    /// <summary>Volt across the tuning capacitor per ampere into each port, at the fundamental.</summary>
    public Complex[] TankFromPort { get; }

    /// <summary>Output volt per ampere into each port, at the fundamental.</summary>
    public Complex[] OutputFromPort { get; }

    /// <summary>Solves the network; null where it is singular at a harmonic.</summary>
    /// <param name="w">Workspace with pencil and operating point of the setting, the latter as its last Newton step left it.</param>
    /// <param name="outputIndex">Unknown of the output; -1 for earth.</param>
    /// <param name="hz">The fundamental in Hz, above 0.</param>
    /// <param name="harmonics">The highest harmonic, 1 or more.</param>
    public static PortResponses? TryFind(Workspace w, int outputIndex, double hz, int harmonics)
    {
        int ports = 2 * w.Network.Devices.Count;
        var responses = new PortResponses(ports, harmonics);
        double[] direct = new double[w.Network.Size];
        for (int q = 0; q < ports; q++)
        {
            Array.Clear(direct);
            (int plus, int minus) = Port(w.Network, q);
            Inject(direct, plus, minus, 1.0);
            w.DirectLu.Solve(direct);
            for (int p = 0; p < ports; p++)
            {
                (int from, int to) = Port(w.Network, p);
                responses.Impedance[0][(p * ports) + q] = (from < 0 ? 0 : direct[from]) - (to < 0 ? 0 : direct[to]);
            }
        }

        for (int k = 1; k <= harmonics; k++)
        {
            if (!w.TryFactorPencil(new Complex(0, 2 * Math.PI * hz * k), out _))
            {
                return null;
            }

            responses.SolveHarmonic(w, outputIndex, k);
        }

        return responses.FromAntenna.All(Complex.IsFinite) && responses.Impedance.All(m => m.All(Complex.IsFinite)) ? responses : null;
    }

    private void SolveHarmonic(Workspace w, int outputIndex, int k)
    {
        int ports = FromAntenna.Length;
        for (int q = 0; q < ports; q++)
        {
            Array.Clear(w.Right);
            (int plus, int minus) = Port(w.Network, q);
            Inject(w.Right, plus, minus, Complex.One);
            w.PencilLu.Solve(w.Right);
            for (int p = 0; p < ports; p++)
            {
                (int from, int to) = Port(w.Network, p);
                Impedance[k][(p * ports) + q] = NetworkValues.Across(w.Right, from, to);
            }

            if (k == 1)
            {
                (TankFromPort[q], OutputFromPort[q]) = (Tank(w), NetworkValues.Across(w.Right, outputIndex, -1));
            }
        }

        if (k == 1)
        {
            Array.Clear(w.Right);
            foreach (BranchStamp branch in w.Network.Branches.Where(b => b.Emf != 0))
            {
                w.Right[branch.Unknown] = branch.Emf / Network.CurrentScaleOhm;
            }

            w.PencilLu.Solve(w.Right);
            (TankFromAntenna, OutputFromAntenna) = (Tank(w), NetworkValues.Across(w.Right, outputIndex, -1));
            for (int p = 0; p < ports; p++)
            {
                (int from, int to) = Port(w.Network, p);
                FromAntenna[p] = NetworkValues.Across(w.Right, from, to);
            }
        }
    }

    private static Complex Tank(Workspace w) =>
        w.Network.Tuning is { } tuning ? NetworkValues.Across(w.Right, tuning.Pair.From, tuning.Pair.To) : Complex.Zero;

    private static (int Plus, int Minus) Port(Network network, int port)
    {
        DeviceStamp device = network.Devices[port / 2];
        return (port % 2 == 0 ? device.Control : device.Output, device.Common);
    }

    private static void Inject<T>(T[] right, int plus, int minus, T ampere)
        where T : INumberBase<T>
    {
        if (plus >= 0)
        {
            right[plus] += ampere;
        }

        if (minus >= 0)
        {
            right[minus] -= ampere;
        }
    }
}
