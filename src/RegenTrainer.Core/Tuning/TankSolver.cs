using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;

namespace RegenTrainer.Core.Tuning;

/// <summary>
/// Operating point and tank mode at a query. Without a hint the tank is labelled with the regenerating device removed and
/// followed while the device is put in by degrees; with one it is followed from there.
/// </summary>
public static class TankSolver
{
    /// <summary>Below this overlap the mode found counts as another one.</summary>
    private const double SmallestOverlap = 0.5;

    private const double SmallestShare = 1.0 / 256;

    private const int LossSteps = 8;

    /// <summary>A locked tank's losses are taken at its own frequency to this relative accuracy.</summary>
    private const double LossTolerance = 1e-11;

    /// <summary>Solves operating point and tank mode.</summary>
    /// <param name="ws">Workspace of the stage; receives voltages, linearisations, pencil and shapes.</param>
    /// <param name="query">Where.</param>
    /// <param name="hint">A tank nearby whose shapes stand in the workspace; the result does not depend on it.</param>
    public static TankState Solve(StageWorkspace ws, in TankQuery query, in TankHint hint)
    {
        Workspace w = ws.Circuit;
        double lossHz = query.FollowRadians is null && hint.Valid ? hint.S.Imaginary / (2 * Math.PI) : query.DialHz;
        w.Values.SetConditions(query.ConditionsAt(lossHz));
        w.Values.SetDirect(query.ControlValue, query.Removed);
        OperatingPoint bias = OperatingPointSolver.Solve(w, query.Removed, hint.Valid);
        if (!bias.Found)
        {
            return new TankState(bias, default);
        }

        ModeResult mode = hint.Valid ? FromHint(w, query, hint) : default;
        if (!hint.Valid || !mode.Found || mode.Overlap < SmallestOverlap)
        {
            w.Values.SetConditions(query.ConditionsAt(query.DialHz));
            mode = FromScratch(ws, query);
        }

        return new TankState(bias, mode.Found && query.FollowRadians is null ? SettleLoss(w, query, mode) : mode);
    }

    private static double Share(in TankQuery query) => query.Removed ? 0 : 1;

    private static ModeResult FromHint(Workspace w, in TankQuery query, in TankHint hint)
    {
        double farad = query.FollowRadians is null ? query.LockedFarad : hint.TuningFarad;
        w.Values.SetPencil(farad, query.ControlValue, w.Linear, Share(query));
        return ModeSolver.Polish(w, hint.S, farad, query.FollowRadians);
    }

    /// <summary>Takes the losses of a locked tank at the frequency it has: a fixed point that gains several figures a step.</summary>
    private static ModeResult SettleLoss(Workspace w, in TankQuery query, ModeResult mode)
    {
        for (int step = 0; step < LossSteps; step++)
        {
            double before = w.Values.Conditions.LossHz;
            if (Math.Abs(mode.Hz - before) <= LossTolerance * before)
            {
                return mode;
            }

            w.Values.SetConditions(query.ConditionsAt(mode.Hz));
            w.Values.SetPencil(query.LockedFarad, query.ControlValue, w.Linear, Share(query));
            mode = ModeSolver.Polish(w, mode.S, query.LockedFarad, null);
            if (!mode.Found)
            {
                return mode;
            }
        }

        return mode;
    }

    private static ModeResult FromScratch(StageWorkspace ws, in TankQuery query)
    {
        Workspace w = ws.Circuit;
        double farad = query.FollowRadians is null ? query.LockedFarad : FirstGuess(ws.Model.Circuit.Dial.Capacitor);
        w.Values.SetPencil(farad, query.ControlValue, w.Linear, 0);
        if (!TankLabel.TryFind(w, query.DialHz, farad, out System.Numerics.Complex s, out int resonances))
        {
            return new ModeResult(default, farad, SolveStop.ModeLost, 0, double.NaN, 0);
        }

        ws.Resonances = resonances;
        ModeResult mode = ModeSolver.Polish(w, s, farad, query.FollowRadians);
        double share = 0, step = Share(query);
        while (mode.Found && share < Share(query))
        {
            ws.SaveShapes();
            double next = Math.Min(1, share + step);
            w.Values.SetPencil(mode.TuningFarad, query.ControlValue, w.Linear, next);
            ModeResult moved = ModeSolver.Polish(w, mode.S, mode.TuningFarad, query.FollowRadians);
            if (moved.Found && moved.Overlap >= SmallestOverlap)
            {
                (mode, share) = (moved, next);
                continue;
            }

            ws.RestoreShapes();
            step /= 2;
            if (step < SmallestShare)
            {
                return moved with { Stop = SolveStop.ModeLost };
            }
        }

        return mode;
    }

    private static double FirstGuess(VariableCapacitor capacitor) => Math.Sqrt(capacitor.MinimumFarad * capacitor.MaximumFarad);
}
