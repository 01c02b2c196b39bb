using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Selectivity;

/// <summary>The response of the stage in the workspace, as a function of frequency.</summary>
/// <param name="Workspace">Workspace with the pencil of the setting.</param>
internal readonly record struct Transfer(StageWorkspace Workspace)
{
    /// <summary>Output volt per volt of electromotive force; zero where it cannot be solved.</summary>
    public Complex At(double hz) =>
        ResponseSolver.TryAt(Workspace.Circuit, Workspace.Model.OutputIndex, hz, out Complex response) ? response : Complex.Zero;

    /// <summary>Its square of magnitude.</summary>
    public double Power(double hz)
    {
        Complex h = At(hz);
        return (h.Real * h.Real) + (h.Imaginary * h.Imaginary);
    }
}
