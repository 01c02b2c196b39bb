using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>All natural frequencies that do not belong to the tuned circuit, each with the losses at its own frequency.</summary>
internal static class StrayReader
{
    private const int LossSteps = 3;

    /// <summary>A growth below this fraction of the dial is the rounding of a mode that stands still, as of coils in parallel.</summary>
    private const double RealNoise = 1e-7;

    public static Reading WithStrays(Reading reading, StageWorkspace ws, in Position position, List<Caution> cautions)
    {
        Workspace w = ws.Circuit;
        TankQuery query = position.Query;
        TankState state = position.State;
        if (ModeSpectrum.TryFind(w, 2 * Math.PI * query.DialHz) is not { } modes)
        {
            cautions.Add(new Caution("modes-unsolved", "the stray modes could not be solved"));
            return reading;
        }

        var strays = new List<StrayMode>();
        foreach (SpectralMode mode in modes)
        {
            if (TankFamily.Contains(mode.S, query.DialHz) || !(TankFamily.Rings(mode.S) || mode.S.Real > RealNoise * query.DialHz))
            {
                continue;
            }

            Complex s = AtOwnLoss(ws, query, state, mode);
            strays.Add(new StrayMode(s.Imaginary / (2 * Math.PI), -s.Real, s.Real > 0));
        }

        strays.Sort((a, b) => a.FrequencyHz.CompareTo(b.FrequencyHz));
        bool parasitic = strays.Exists(m => m.Grows);
        foreach (StrayMode stray in strays.Where(m => m.Grows))
        {
            cautions.Add(new Caution("parasitic", stray.FrequencyHz > 0
                ? $"a parasitic oscillation grows at {QuantityText.Write(stray.FrequencyHz, Unit.Hertz)}"
                : "the operating point is not stable: the stage may latch"));
        }

        return reading with { StrayModes = strays, Parasitic = parasitic };
    }

    private static Complex AtOwnLoss(StageWorkspace ws, in TankQuery query, in TankState state, SpectralMode mode)
    {
        Workspace w = ws.Circuit;
        mode.Shape.CopyTo(w.Shape, 0);
        mode.Shape.CopyTo(w.LeftShape, 0);
        Complex s = mode.S;
        for (int step = 0; step < LossSteps && s.Imaginary > 0; step++)
        {
            w.Values.SetConditions(query.ConditionsAt(s.Imaginary / (2 * Math.PI)));
            w.Values.SetPencil(state.Mode.TuningFarad, query.ControlValue, w.Linear, 1);
            ModeResult polished = ModeSolver.Polish(w, s, state.Mode.TuningFarad, null);
            if (!polished.Found || polished.S.Imaginary <= 0)
            {
                break;
            }

            s = polished.S;
        }

        return s;
    }
}
