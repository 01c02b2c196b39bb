using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>The run along the dial, point by point: a page or a batch calls it with a workspace for each thread.</summary>
public static class DialRun
{
    /// <summary>A control is looked at this many times beyond its end before the stage is said never to tip over.</summary>
    private const double BeyondFactor = 100;

    /// <summary>One dial point, without those figures that only a full reading shows.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting with the dial of the point.</param>
    /// <returns>The point; its figures equal those of a reading there.</returns>
    public static DialPoint At(StageWorkspace ws, Setting setting)
    {
        Position position = Position.Solve(ws, setting, TankHint.None);
        if (!position.State.Found || !position.Reachable)
        {
            return new DialPoint(position.DialHz, Reachable: false)
            {
                Dead = position.State.Found ? DeadSpotReason.OutOfReach : DeadSpotReason.Unsolved,
            };
        }

        TankState state = position.State;
        ModeResult mode = state.Mode;
        var point = new DialPoint(position.DialHz, Reachable: true) { TuningFarad = mode.TuningFarad };
        ws.Keep();
        if (TankFamily.FastestGrowing(ws, position.Query.DialHz, state).Real < 0)
        {
            Complex carrier = new Transfer(ws).At(setting.StationHz ?? position.DialHz);
            point = point with
            {
                EffectiveQ = mode.Q,
                StageGainDb = Decibel.FromRatio(Complex.Abs(carrier)),
                BandwidthHz = Bandwidth.TryFind(ws, mode.Hz, mode.Hz / (2 * mode.Q)) is { } b ? b.Upper - b.Lower : null,
            };
        }

        point = point with { PulledHz = Pull.HzAgainstRemoved(ws, position) };
        if (ws.Model.ControlLaw is not { } law)
        {
            return point;
        }

        ws.Recall(position.Query, state);
        TipOver? tipOver = TipOverSolver.TryFind(ws, position.Query, law, TankHint.From(state), out _);
        return point with { TipOver = tipOver, Dead = Reason(ws, position.Query, law, tipOver) };
    }

    /// <summary>The frequencies at which the reach of the tuning capacitor ends at a setting.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting; its dial is only where the search begins.</param>
    /// <returns>Dial in Hz with the capacitor at its closed and at its open stop; null where there is no tank.</returns>
    public static (double? LowHz, double? HighHz) Reach(StageWorkspace ws, Setting setting)
    {
        IControlLaw? law = ws.Model.ControlLaw;

        // A locked dial is marked by the tank at the idle stop.
        double control = law is null ? 0 : setting.DialMode == DialMode.Locked ? law.ValueAtStart : law.ValueAt(setting.TravelPercent);
        var position = new Position(Position.QueryOf(setting, control), default, setting.DialHz, Reachable: true);
        VariableCapacitor capacitor = ws.Model.Circuit.Dial.Capacitor;
        return (position.HzAt(ws, capacitor.MaximumFarad), position.HzAt(ws, capacitor.MinimumFarad));
    }

    private static DeadSpotReason? Reason(StageWorkspace ws, in TankQuery query, IControlLaw law, TipOver? tipOver) => tipOver switch
    {
        null => DeadSpotReason.Unsolved,
        { State: TipOverState.Always } => DeadSpotReason.AlwaysOscillates,
        { State: TipOverState.Never } => TipsOverBeyond(ws, query, law) ? DeadSpotReason.TipsOverBeyondTravel : DeadSpotReason.NeverTipsOver,
        { First: null } => DeadSpotReason.OscillatesAtIdle,
        _ => null,
    };

    private static bool TipsOverBeyond(StageWorkspace ws, in TankQuery query, IControlLaw law)
    {
        double end = law.ValueAtEnd, beyond = end > law.ValueAtStart ? end * BeyondFactor : end / BeyondFactor;
        return end > 0 && TipOverSolver.TryFind(ws, query, new LinearControl(end, beyond), TankHint.None, out _)?.First is not null;
    }
}
