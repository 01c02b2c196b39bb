namespace RegenTrainer.Core.Circuits;

/// <summary>Outcome of a search for the operating point; the voltages stand in the workspace.</summary>
/// <param name="Stop">Why the search stopped.</param>
/// <param name="Iterations">Newton steps taken.</param>
/// <param name="ResidualAmpere">Largest current left over at a node, in ampere.</param>
/// <param name="BlamedUnknown">The unknown at which it failed; -1 where it did not.</param>
public readonly record struct OperatingPoint(SolveStop Stop, int Iterations, double ResidualAmpere, int BlamedUnknown)
{
    /// <summary>Whether the operating point was found.</summary>
    public bool Found => Stop == SolveStop.Converged;
}
