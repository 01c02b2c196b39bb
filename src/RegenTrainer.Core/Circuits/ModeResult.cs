using System.Numerics;

namespace RegenTrainer.Core.Circuits;

/// <summary>A natural frequency; its right and left shapes stand in the workspace.</summary>
/// <param name="S">The natural frequency in 1/s: real part growth, imaginary part angular frequency.</param>
/// <param name="TuningFarad">The tuning capacitor it belongs to, in farad.</param>
/// <param name="Stop">Why the search stopped.</param>
/// <param name="Iterations">Steps taken.</param>
/// <param name="Residual">Last change of <paramref name="S"/> relative to its size.</param>
/// <param name="Overlap">How much of the followed mode is in the one found, 0 to 1.</param>
public readonly record struct ModeResult(Complex S, double TuningFarad, SolveStop Stop, int Iterations, double Residual, double Overlap)
{
    /// <summary>Whether the mode was found.</summary>
    public bool Found => Stop == SolveStop.Converged;

    /// <summary>Frequency in Hz.</summary>
    public double Hz => S.Imaginary / (2 * Math.PI);

    /// <summary>|s|/(-2 Re s); infinite at the threshold, negative above it.</summary>
    public double Q => Complex.Abs(S) / (-2 * S.Real);
}
