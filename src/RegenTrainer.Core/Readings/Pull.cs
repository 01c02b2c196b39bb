using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>What the regenerating device does to the tank's frequency and damping.</summary>
internal static class Pull
{
    /// <summary>Tank frequency now minus with the device out of its socket and the same capacitor, in Hz. The position's state stands in the workspace.</summary>
    public static double? HzAgainstRemoved(StageWorkspace ws, in Position position)
    {
        TankQuery removed = position.Query with
        {
            Mode = DialMode.Locked,
            LockedFarad = position.State.Mode.TuningFarad,
            DialHz = position.State.Mode.Hz,
            Removed = true,
        };
        TankState state = TankSolver.Solve(ws, removed, TankHint.From(position.State));
        return state.Found ? position.State.Mode.Hz - state.Mode.Hz : null;
    }

    /// <summary>Q with the device out of its socket, retuned to the frequency the tank has now.</summary>
    public static double? QRemoved(StageWorkspace ws, in Position position)
    {
        TankQuery removed = position.Query with { Mode = DialMode.Follows, DialHz = position.State.Mode.Hz, Removed = true };
        TankState state = TankSolver.Solve(ws, removed, TankHint.From(position.State));
        return state.Found ? state.Mode.Q : null;
    }
}
