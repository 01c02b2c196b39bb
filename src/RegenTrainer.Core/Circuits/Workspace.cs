using System.Numerics;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Circuits;

/// <summary>The buffers of one thread for one network; nothing else of a solve is mutable.</summary>
public sealed class Workspace
{
    /// <summary>Makes room for a network.</summary>
    public Workspace(Network network)
    {
        Network = network;
        Values = new NetworkValues(network);
        int n = network.Size, entries = network.Rows.Length, devices = network.Devices.Count;
        DirectLu = new HeadTailLu(n, network.Rows, network.Columns, network.LateUnknowns);
        PencilLu = new SparseLu<Complex>(n, network.Rows, network.Columns);
        (DirectSample, PencilMatrix, BiasScratch) = (new double[entries], new Complex[entries], new double[n]);
        (Voltages, NextVoltages) = (new double[n], new double[n]);
        (Shape, LeftShape, NextShape, NextLeftShape) = (new Complex[n], new Complex[n], new Complex[n], new Complex[n]);
        (CShape, CLeftShape, Right) = (new Complex[n], new Complex[n], new Complex[n]);
        (StartCShape, StartCLeftShape) = (new Complex[n], new Complex[n]);
        (Points, Linear) = (new TwoPortPoint[devices], new Linearisation[devices]);
        (Port1, Port2) = (new double[devices], new double[devices]);
    }

    /// <summary>The network.</summary>
    public Network Network { get; }

    /// <summary>Its numbers at the present setting.</summary>
    public NetworkValues Values { get; }

    /// <summary>Direct voltages of the last operating point, one per unknown.</summary>
    public double[] Voltages { get; }

    /// <summary>Device currents and derivatives at the last operating point.</summary>
    public TwoPortPoint[] Points { get; }

    /// <summary>Linearisations at the last operating point.</summary>
    public Linearisation[] Linear { get; }

    /// <summary>Right vector of the last mode: voltages and scaled currents, the largest component of the size of 1.</summary>
    public Complex[] Shape { get; }

    /// <summary>Left vector of the last mode.</summary>
    public Complex[] LeftShape { get; }

    internal HeadTailLu DirectLu { get; }

    internal SparseLu<Complex> PencilLu { get; }

    internal double[] DirectSample { get; }

    internal double[] BiasScratch { get; }

    internal Complex[] PencilMatrix { get; }

    internal double[] NextVoltages { get; }

    internal Complex[] NextShape { get; }

    internal Complex[] NextLeftShape { get; }

    internal Complex[] CShape { get; }

    internal Complex[] CLeftShape { get; }

    internal Complex[] StartCShape { get; }

    internal Complex[] StartCLeftShape { get; }

    internal Complex[] Right { get; }

    internal double[] Port1 { get; }

    internal double[] Port2 { get; }

    /// <summary>Factors G + sC of the present pencil.</summary>
    /// <param name="s">The complex frequency in 1/s.</param>
    /// <param name="blamed">The unknown at which a singular matrix fails; -1 otherwise.</param>
    public bool TryFactorPencil(Complex s, out int blamed)
    {
        double[] g = Values.G, c = Values.C;
        Complex[] a = PencilMatrix;
        for (int k = 0; k < a.Length; k++)
        {
            a[k] = new Complex(g[k], 0);
        }

        foreach (int k in Network.CapacitiveEntries)
        {
            a[k] = new Complex(g[k] + (s.Real * c[k]), s.Imaginary * c[k]);
        }

        return PencilLu.TryFactor(a, out blamed);
    }

    /// <summary>C x, or C' x when transposed, of the present pencil.</summary>
    internal void MultiplyC(ReadOnlySpan<Complex> x, Span<Complex> result, bool transposed)
    {
        result.Clear();
        (int[] to, int[] from) = transposed ? (Network.Columns, Network.Rows) : (Network.Rows, Network.Columns);
        double[] c = Values.C;
        Span<Vector128<double>> sum = MemoryMarshal.Cast<Complex, Vector128<double>>(result);
        ReadOnlySpan<Vector128<double>> factor = MemoryMarshal.Cast<Complex, Vector128<double>>(x);
        foreach (int k in Network.CapacitiveEntries)
        {
            sum[to[k]] += c[k] * factor[from[k]];
        }
    }

    /// <summary>x' y without conjugation.</summary>
    internal static Complex Dot(ReadOnlySpan<Complex> x, ReadOnlySpan<Complex> y)
    {
        (double real, double imaginary) = (0, 0);
        for (int k = 0; k < x.Length; k++)
        {
            (Complex a, Complex b) = (x[k], y[k]);
            real += (a.Real * b.Real) - (a.Imaginary * b.Imaginary);
            imaginary += (a.Real * b.Imaginary) + (a.Imaginary * b.Real);
        }

        return new Complex(real, imaginary);
    }

    /// <summary>Copies a vector scaled so that its largest component is of the size of 1; false where it is zero or not finite.</summary>
    /// <param name="x">The vector.</param>
    /// <param name="scaled">Receives it.</param>
    /// <param name="scale">The factor applied.</param>
    internal static bool TryScale(ReadOnlySpan<Complex> x, Span<Complex> scaled, out double scale)
    {
        double largest = 0;
        foreach (Complex component in x)
        {
            largest = Math.Max(largest, Math.Max(Math.Abs(component.Real), Math.Abs(component.Imaginary)));   // a NaN stays
        }

        scale = 1 / largest;
        if (!(largest > 0) || !double.IsFinite(largest) || !double.IsFinite(scale))
        {
            return false;
        }

        ReadOnlySpan<Vector128<double>> from = MemoryMarshal.Cast<Complex, Vector128<double>>(x);
        Span<Vector128<double>> to = MemoryMarshal.Cast<Complex, Vector128<double>>(scaled);
        for (int k = 0; k < from.Length; k++)
        {
            to[k] = from[k] * scale;
        }

        return true;
    }
}
