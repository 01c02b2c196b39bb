using System.Numerics;

namespace RegenTrainer.Core.Circuits;

/// <summary>Complex response from the antenna's electromotive force to a node, of the present pencil.</summary>
public static class ResponseSolver
{
    /// <summary>Solves the pencil at one frequency.</summary>
    /// <param name="w">Workspace with the pencil set.</param>
    /// <param name="outputIndex">Unknown of the output node; -1 for earth.</param>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    /// <param name="response">Output volt per volt of electromotive force.</param>
    /// <returns>Whether the system could be solved; it cannot exactly at an undamped natural frequency.</returns>
    public static bool TryAt(Workspace w, int outputIndex, double hz, out Complex response)
    {
        response = Complex.Zero;
        if (!w.TryFactorPencil(new Complex(0, 2 * Math.PI * hz), out _))
        {
            return false;
        }

        Array.Clear(w.Right);
        foreach (BranchStamp branch in w.Network.Branches)
        {
            if (branch.Emf != 0)
            {
                w.Right[branch.Unknown] = branch.Emf / Network.CurrentScaleOhm;
            }
        }

        w.PencilLu.Solve(w.Right);
        response = outputIndex < 0 ? Complex.Zero : w.Right[outputIndex];
        return double.IsFinite(response.Real) && double.IsFinite(response.Imaginary);
    }

    /// <summary>The impedance the network shows between two unknowns at one frequency, in ohm.</summary>
    /// <param name="w">Workspace with the pencil set.</param>
    /// <param name="from">Unknown of the first node; -1 for earth.</param>
    /// <param name="to">Unknown of the second node; -1 for earth.</param>
    /// <param name="s">Complex frequency in 1/s.</param>
    /// <param name="impedance">The impedance.</param>
    /// <returns>Whether the system could be solved.</returns>
    public static bool TryImpedance(Workspace w, int from, int to, Complex s, out Complex impedance)
    {
        impedance = Complex.Zero;
        if (!w.TryFactorPencil(s, out _))
        {
            return false;
        }

        Array.Clear(w.Right);
        if (from >= 0)
        {
            w.Right[from] += 1;
        }

        if (to >= 0)
        {
            w.Right[to] -= 1;
        }

        w.PencilLu.Solve(w.Right);
        impedance = NetworkValues.Across(w.Right, from, to);
        return true;
    }
}
