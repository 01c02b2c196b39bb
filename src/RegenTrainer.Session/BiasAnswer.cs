using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Session;

/// <summary>The operating point with everything said about it.</summary>
/// <param name="Bias">The operating point.</param>
/// <param name="Headroom">How far the stage can be driven there.</param>
/// <param name="Hints">What the trade would remark.</param>
public sealed record BiasAnswer(BiasReading Bias, HeadroomReading Headroom, IReadOnlyList<Caution> Hints)
{
    /// <summary>Works it out with a solver of its own.</summary>
    public static BiasAnswer Of(StageRequest request)
    {
        IStageSolver solver = request.Solver.Fork();
        BiasReading bias = solver.Bias(request.Setting);
        HeadroomReading headroom = solver.Headroom(request.Setting);
        return new BiasAnswer(bias, headroom, BiasHints.Of(bias, headroom));
    }
}
