using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Tuning;

/// <summary>A setting turned into element values, with the tank that results.</summary>
/// <param name="Query">The tank's query in force.</param>
/// <param name="State">Operating point and tank mode; what was found stands in the workspace.</param>
/// <param name="DialHz">The dial in force, in Hz: for a given locked capacitor the tank's frequency at the idle stop.</param>
/// <param name="Reachable">Whether the capacitor is within its reach.</param>
public readonly record struct Position(TankQuery Query, TankState State, double DialHz, bool Reachable)
{
    /// <summary>A capacitor solved this fraction outside its stops still counts as at the stop.</summary>
    private const double ReachTolerance = 1e-9;

    /// <summary>Solves the position of a setting.</summary>
    /// <param name="ws">Workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    /// <param name="hint">A tank nearby whose shapes stand in the workspace; changes no result.</param>
    public static Position Solve(StageWorkspace ws, Setting setting, in TankHint hint)
    {
        IControlLaw? law = ws.Model.ControlLaw;
        TankQuery query = QueryOf(setting, law?.ValueAt(setting.TravelPercent) ?? 0);
        double dialHz = setting.DialHz;
        TankHint start = hint;
        if (setting.DialMode == DialMode.Locked)
        {
            double idle = law?.ValueAtStart ?? 0;
            TankQuery atIdle = query with { ControlValue = idle, Mode = DialMode.Follows };
            if (setting.LockedFarad is { } farad)
            {
                atIdle = atIdle with { Mode = DialMode.Locked, LockedFarad = farad };
            }

            TankState idleState = TankSolver.Solve(ws, atIdle, hint);
            if (!idleState.Found)
            {
                return new Position(query with { LockedFarad = double.NaN }, idleState, dialHz, Reachable: true);
            }

            start = TankHint.From(idleState);
            query = query with { Mode = DialMode.Locked, LockedFarad = idleState.Mode.TuningFarad };
            if (setting.LockedFarad is not null)
            {
                dialHz = idleState.Mode.Hz;
                query = query with { DialHz = dialHz };
            }
        }

        TankState state = TankSolver.Solve(ws, query, start);
        return new Position(query, state, dialHz, !state.Found || InReach(ws, state.Mode.TuningFarad));
    }

    /// <summary>The query of a setting at a control value, dial not yet locked.</summary>
    internal static TankQuery QueryOf(Setting setting, double controlValue) => new(
        setting.DialHz, DialMode.Follows, 0, controlValue, setting.TemperatureCelsius, setting.Grade, setting.SupplyVolt, setting.Device);

    /// <summary>Whether the tuning capacitor reaches a value.</summary>
    internal static bool InReach(StageWorkspace ws, double farad)
    {
        VariableCapacitor capacitor = ws.Model.Circuit.Dial.Capacitor;
        return farad >= capacitor.MinimumFarad * (1 - ReachTolerance) && farad <= capacitor.MaximumFarad * (1 + ReachTolerance);
    }

    /// <summary>The tank's frequency in Hz with the capacitor at a stop and the rest of the position as it is; null where it is not found.</summary>
    internal double? HzAt(StageWorkspace ws, double farad)
    {
        TankState atStop = TankSolver.Solve(ws, Query with { Mode = DialMode.Locked, LockedFarad = farad }, TankHint.None);
        return atStop.Found ? atStop.Mode.Hz : null;
    }
}
