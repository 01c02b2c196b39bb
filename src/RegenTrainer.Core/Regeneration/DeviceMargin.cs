using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Regeneration;

/// <summary>
/// By how much the regenerating device would have to be stronger to tip the stage where it stands: the factor on its
/// collector current's derivatives (for a feedback element on its transconductance), with its input admittance unchanged.
/// </summary>
public static class DeviceMargin
{
    /// <summary>A factor beyond this (40 dB) is no device any more.</summary>
    private const double LargestFactor = 100;

    private const double ScanRatio = 1.5;

    private const int RefineLimit = 50;

    private const double LogTolerance = 1e-11;

    /// <summary>The factor in dB; negative above tip-over; null where no factor up to 40 dB tips the stage.</summary>
    /// <param name="ws">Workspace holding the state; its pencil and shapes are left at the last factor tried.</param>
    /// <param name="query">The query the state belongs to.</param>
    /// <param name="state">The state in the workspace.</param>
    public static double? TryFind(StageWorkspace ws, in TankQuery query, in TankState state)
    {
        bool down = state.Mode.S.Real > 0;
        (double log, double growth) = (0, state.Mode.S.Real);
        ModeResult mode = state.Mode;
        double limit = Math.Log(LargestFactor), step = down ? -Math.Log(ScanRatio) : Math.Log(ScanRatio);
        while (Math.Abs(log) < limit)
        {
            ModeResult next = At(ws, query, mode, log + step);
            if (!next.Found)
            {
                return null;
            }

            if (next.S.Real * growth <= 0)
            {
                return 20 / Math.Log(10) * Refine(ws, query, next, log, growth, log + step, next.S.Real);
            }

            (mode, log, growth) = (next, log + step, next.S.Real);
        }

        return null;
    }

    private static double Refine(StageWorkspace ws, in TankQuery query, ModeResult mode, double a, double fa, double b, double fb)
    {
        // Regula falsi with Illinois weights [Dowell and Jarratt 1971]: bracketed and without slopes.
        double u = b;
        for (int step = 0; step < RefineLimit && Math.Abs(b - a) > LogTolerance; step++)
        {
            double next = b - (fb * (b - a) / (fb - fa));
            mode = At(ws, query, mode, next);
            if (!mode.Found)
            {
                return double.NaN;
            }

            double moved = Math.Abs(next - u);
            u = next;
            double f = mode.S.Real;
            if (f * fb < 0)
            {
                (a, fa) = (b, fb);
            }
            else
            {
                fa /= 2;
            }

            (b, fb) = (next, f);
            if (moved < LogTolerance)
            {
                break;
            }
        }

        return u;
    }

    private static ModeResult At(StageWorkspace ws, in TankQuery query, in ModeResult from, double logFactor)
    {
        Workspace w = ws.Circuit;
        double factor = Math.Exp(logFactor);
        for (int d = 0; d < ws.Scaled.Length; d++)
        {
            Linearisation y = w.Linear[d];
            ws.Scaled[d] = w.Network.Devices[d].Regenerating
                ? y with { G21 = factor * y.G21, G22 = factor * y.G22 }
                : y;
        }

        w.Values.SetPencil(from.TuningFarad, query.ControlValue, ws.Scaled, 1, factor);
        return ModeSolver.Polish(w, from.S, from.TuningFarad, query.FollowRadians);
    }
}
