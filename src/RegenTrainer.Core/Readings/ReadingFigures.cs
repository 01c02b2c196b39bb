using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>Fills a reading whose tank was found.</summary>
internal static class ReadingFigures
{
    /// <summary>A sideband of this size against the carrier distorts the envelope.</summary>
    private const double DistortingRatio = 0.7;

    public static Reading Complete(
        Reading reading, StageWorkspace ws, in Position position, Setting setting, IReadOnlyList<double> audioHz, List<Caution> cautions)
    {
        TankState state = position.State;
        ModeResult mode = state.Mode;
        (bool decays, double growth) = (mode.S.Real < 0, mode.S.Real);
        ws.Keep();
        Complex fastest = TankFamily.FastestGrowing(ws, position.Query.DialHz, state);
        if (decays && fastest.Real > 0)
        {
            (decays, growth) = (false, fastest.Real);
            cautions.Add(new Caution(
                "other-circuit-oscillates",
                $"another tuned circuit oscillates at {QuantityText.Write(fastest.Imaginary / (2 * Math.PI), Unit.Hertz, 4)}"));
        }

        reading = reading with
        {
            TuningFarad = mode.TuningFarad,
            TankHz = mode.Hz,
            GrowthPerSecond = growth,
            EffectiveQ = decays ? mode.Q : null,
            RingTimeSeconds = decays ? -1 / mode.S.Real : null,
            HandShiftHz = TuningScale.HandShiftHz(ws, mode),
        };
        if (decays)
        {
            reading = WithResponse(reading, ws, mode, audioHz, cautions);
        }

        reading = StrayReader.WithStrays(reading, ws, position, cautions);
        ws.Recall(position.Query, state);
        double? deviceMargin = DeviceMargin.TryFind(ws, position.Query, state);
        ws.Recall(position.Query, state);
        double? qOff = Pull.QRemoved(ws, position);
        ws.Recall(position.Query, state);
        double? pulled = Pull.HzAgainstRemoved(ws, position);
        ws.Recall(position.Query, state);
        reading = reading with
        {
            DeviceMarginDb = deviceMargin,
            QRegenerationOff = qOff,
            PulledHz = pulled,
            MarginDb = decays && qOff is { } off ? Margin.LoopGainDb(mode.Q, off) : null,
            Regime = qOff is { } q ? Margin.RegimeOf(growth, mode.Q, q) : null,
        };
        reading = WithControl(reading, ws, position, setting, cautions);
        AddCautions(reading, ws, cautions);
        return reading;
    }

    private static Reading WithResponse(
        Reading reading, StageWorkspace ws, in ModeResult mode, IReadOnlyList<double> audioHz, List<Caution> cautions)
    {
        var sidebands = new SidebandResponse(ws, reading.Setting.StationHz);
        (double Lower, double Upper)? edges = Bandwidth.TryFind(ws, mode.Hz, mode.Hz / (2 * mode.Q));
        double? bandwidth = edges is { } e ? e.Upper - e.Lower : null;
        double? worstHarmonic = null;
        foreach (double hz in audioHz)
        {
            if (SidebandResponse.TestDepth * sidebands.LargestRatio(hz) > DistortingRatio)
            {
                worstHarmonic = Math.Max(worstHarmonic ?? 0, sidebands.SecondHarmonic(hz, SidebandResponse.TestDepth));
            }
        }

        if (worstHarmonic is { } harmonic)
        {
            cautions.Add(new Caution(
                "sideband-stands-out",
                $"a sideband stands above the carrier: at 30 % depth an envelope detector adds {100 * harmonic:0} % second harmonic"));
        }

        if (edges is null)
        {
            cautions.Add(new Caution("no-bandwidth", "the response does not fall by 3 dB on both sides of its peak"));
        }

        double?[] down = sidebands.AudioDownHz([3, 6, 10]);
        return reading with
        {
            StageGainDb = Decibel.FromRatio(Complex.Abs(sidebands.Carrier)),
            BandEdgesHz = edges,
            BandwidthHz = bandwidth,
            BandwidthDialDegrees = bandwidth is { } b ? TuningScale.DialDegrees(ws, mode, b) : null,
            Sidebands = [.. audioHz.Where(hz => hz < reading.Setting.StationHz).Select(sidebands.At)],
            AudioDownHz = (down[0], down[1], down[2]),
            SpeechIndex = SpeechIndex.Of(hz => sidebands.At(hz).AudioDb),
        };
    }

    private static Reading WithControl(
        Reading reading, StageWorkspace ws, in Position position, Setting setting, List<Caution> cautions)
    {
        if (ws.Model.ControlLaw is not { } law)
        {
            return reading with { QAtIdleStop = reading.EffectiveQ };
        }

        TankHint hint = TankHint.From(position.State);
        TankState idle = TankSolver.Solve(ws, position.Query with { ControlValue = law.ValueAtStart }, hint);
        TipOver? tipOver = TipOverSolver.TryFind(ws, position.Query, law, TankHint.From(idle), out _);
        if (tipOver is null)
        {
            cautions.Add(new Caution("tip-over-unsolved", "the tip-over could not be followed along the whole travel"));
        }

        double? next = null;
        foreach (Crossing crossing in tipOver?.Crossings ?? [])
        {
            if (crossing.Upward && crossing.TravelPercent >= setting.TravelPercent)
            {
                next = crossing.TravelPercent;
                break;
            }
        }

        return reading with
        {
            QAtIdleStop = idle.Found && idle.Mode.S.Real < 0 ? idle.Mode.Q : null,
            TipOver = tipOver,
            MarginPercent = next is { } travel ? travel - setting.TravelPercent : null,
            MarginDegrees = next is { } there ? law.DegreesAt(there) - law.DegreesAt(setting.TravelPercent) : null,
        };
    }

    private static void AddCautions(Reading reading, StageWorkspace ws, List<Caution> cautions)
    {
        foreach (Part part in ws.Model.Network.Parts)
        {
            cautions.AddRange(part.CautionsAt(reading.TankHz ?? reading.Setting.DialHz));
        }

        if (reading.Regime == Regime.Oscillating)
        {
            cautions.Add(new Caution("oscillating", "oscillating: the stage radiates through its antenna; turn the control back"));
        }
    }
}
