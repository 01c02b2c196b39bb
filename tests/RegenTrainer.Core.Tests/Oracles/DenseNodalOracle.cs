using System.Numerics;
using MathNet.Numerics.LinearAlgebra;
using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// Alternating-current analysis written apart from the program's own: plain nodal admittances (an inductor is 1/(R + j w L), an
/// electromotive force its Norton equivalent behind a resistance), dense, solved by the reference library.
/// </summary>
internal sealed class DenseNodalOracle
{
    private readonly Dictionary<string, int> _nodes = new(StringComparer.Ordinal);
    private readonly Matrix<Complex> _admittance;

    public DenseNodalOracle(IReadOnlyList<Part> parts, double hz)
    {
        foreach (string node in parts.SelectMany(p => p.Nodes).Where(n => n != Part.Earth).Distinct())
        {
            _nodes.Add(node, _nodes.Count);
        }

        _admittance = Matrix<Complex>.Build.Dense(_nodes.Count, _nodes.Count);
        double omega = 2 * Math.PI * hz;
        foreach (Part part in parts)
        {
            Complex y = part switch
            {
                Resistor r => 1 / r.Ohm,
                Capacitor c => new Complex(c.Q is { } q ? omega * c.Farad / q : 0, omega * c.Farad),
                Inductor l => 1 / new Complex(l.SeriesOhm + (l.Q is { } q ? omega * l.Henry / q : 0), omega * l.Henry),
                Bead b => (1 / b.Ohm) + (1 / new Complex(0, omega * b.Henry)) + new Complex(0, omega * b.Farad),
                _ => throw new NotSupportedException(part.GetType().Name),
            };
            var two = (TwoTerminalPart)part;
            Add(two.From, two.From, y);
            Add(two.To, two.To, y);
            Add(two.From, two.To, -y);
            Add(two.To, two.From, -y);
        }
    }

    /// <summary>The voltage at one node for one ampere into another.</summary>
    public Complex TransferImpedance(string into, string at)
    {
        var right = MathNet.Numerics.LinearAlgebra.Vector<Complex>.Build.Dense(_nodes.Count);
        right[_nodes[into]] = 1;
        return _admittance.Solve(right)[_nodes[at]];
    }

    private void Add(string row, string column, Complex y)
    {
        if (row != Part.Earth && column != Part.Earth)
        {
            _admittance[_nodes[row], _nodes[column]] += y;
        }
    }
}
