using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>The figures of one dial point, without those that only a full reading shows.</summary>
internal static class DialRun
{
    public static DialPoint At(StageWorkspace ws, Setting setting)
    {
        Position position = Position.Solve(ws, setting, TankHint.None);
        if (!position.State.Found || !position.Reachable)
        {
            return new DialPoint(position.DialHz, position.Reachable && position.State.Found);
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

        double? pulled = Pull.HzAgainstRemoved(ws, position);
        ws.Recall(position.Query, state);
        TipOver? tipOver = ws.Model.ControlLaw is { } law
            ? TipOverSolver.TryFind(ws, position.Query, law, TankHint.From(state), out _)
            : null;
        return point with { PulledHz = pulled, TipOver = tipOver };
    }
}
