using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>Says in words why a solve failed.</summary>
internal static class Failure
{
    /// <summary>The reason as a caution that names the place.</summary>
    public static Caution Describe(StageModel model, in TankState state)
    {
        if (!state.Bias.Found)
        {
            return new Caution("no-operating-point", state.Bias.Stop switch
            {
                SolveStop.Singular => $"no operating point: the direct currents are undetermined at {Name(model, state.Bias.BlamedUnknown)}",
                SolveStop.NotFinite => "no operating point: the currents grow beyond all bounds",
                _ => "no operating point: the search did not settle",
            });
        }

        return new Caution("no-tank-mode", state.Mode.Stop switch
        {
            SolveStop.ModeLost => "no lightly damped mode (Q above 5) belongs to the tuning capacitor here",
            SolveStop.Singular => "the tank mode cannot be solved: the circuit is singular",
            _ => "the tank mode did not settle",
        });
    }

    private static string Name(StageModel model, int unknown) => unknown < 0 ? "an unknown place" : model.Network.UnknownNames[unknown];
}
