using System.Numerics;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>Reads how regeneration, dial and station act on each other.</summary>
public static class InteractionReader
{
    /// <summary>The stretch below tip-over that is looked at, in % of travel.</summary>
    private const double ApproachPercent = 10;

    /// <summary>What a hand sets on a plain knob, in degrees: common practice.</summary>
    private const double HandDegrees = 0.5;

    /// <summary>The interaction at a setting, with the audio frequencies that are shown where none are asked for.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    public static Interaction Read(StageWorkspace ws, Setting setting) => Read(ws, setting, StageReader.DefaultAudioHz);

    /// <summary>The interaction at a setting.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    /// <param name="audioHz">Audio frequencies in Hz, above 0; those not below the station are left out.</param>
    /// <returns>The interaction; where a solve fails its figures are null and a caution says why.</returns>
    public static Interaction Read(StageWorkspace ws, Setting setting, IReadOnlyList<double> audioHz)
    {
        Position position = Position.Solve(ws, setting, TankHint.None);
        if (!position.State.Found)
        {
            return new Interaction { Cautions = [Failure.Describe(ws.Model, position.State)] };
        }

        if (!position.Reachable)
        {
            return new Interaction { Cautions = [StageReader.OutOfReach(ws, position)] };
        }

        TankState state = position.State;
        var interaction = new Interaction { HandShiftHz = TuningScale.HandShiftHz(ws, state.Mode), Cautions = [] };
        if (TankFamily.FastestGrowing(ws, position.Query.DialHz, state).Real < 0)
        {
            double? degrees = Bandwidth.TryFind(ws, state.Mode.Hz, state.Mode.Hz / (2 * state.Mode.Q)) is { } edges
                ? TuningScale.DialDegrees(ws, state.Mode, edges.Upper - edges.Lower)
                : null;
            interaction = interaction with
            {
                BandwidthDialDegrees = degrees,
                VernierRatio = degrees is { } d ? Math.Max(1, HandDegrees / d) : null,
                Station = Fit(ws, state.Mode.Hz, setting.StationHz ?? position.DialHz, audioHz),
            };
        }

        if (ws.Model.ControlLaw is not { } law)
        {
            return interaction;
        }

        TipOver? tipOver = TipOverSolver.TryFind(ws, position.Query, law, TankHint.None, out _);
        if (tipOver is null)
        {
            return interaction with
            {
                Cautions = [new Caution("tip-over-unsolved", "the tip-over could not be followed along the whole travel")],
            };
        }

        return interaction with { Approach = tipOver.First is { } first ? Approach(ws, position.Query, law, first) : null };
    }

    private static StationFit Fit(StageWorkspace ws, double tankHz, double stationHz, IReadOnlyList<double> audioHz)
    {
        var station = new SidebandResponse(ws, stationHz);
        double onTune = Complex.Abs(new Transfer(ws).At(tankHz));
        return new StationFit(
            stationHz - tankHz,
            Decibel.FromRatio(Complex.Abs(station.Carrier) / onTune),
            [.. audioHz.Where(hz => hz < stationHz).Select(hz =>
            {
                Sideband band = station.At(hz);
                return new OffTuneAudio(hz, band.UpperDb - band.LowerDb, 100 * station.SecondHarmonic(hz, SidebandResponse.TestDepth));
            })]);
    }

    /// <summary>The capacitor stands as at tip-over; null where the beginning cannot be solved.</summary>
    private static ApproachToTipOver? Approach(StageWorkspace ws, in TankQuery query, IControlLaw law, in Crossing tip)
    {
        double from = Math.Max(0, tip.TravelPercent - ApproachPercent);
        TankQuery held = query with
        {
            Mode = DialMode.Locked,
            LockedFarad = tip.TuningFarad,
            DialHz = tip.FrequencyHz,
            ControlValue = law.ValueAt(from),
        };
        TankState before = TankSolver.Solve(ws, held, TankHint.None);
        TankState peaked = TankSolver.Solve(ws, held with { Mode = DialMode.Follows }, TankHint.From(before));
        if (!before.Found || !peaked.Found)
        {
            return null;
        }

        VariableCapacitor capacitor = ws.Model.Circuit.Dial.Capacitor;
        return new ApproachToTipOver(
            from,
            tip.TravelPercent,
            tip.TravelPercent < ApproachPercent,
            tip.FrequencyHz - before.Mode.Hz,
            tip.TuningFarad - peaked.Mode.TuningFarad,
            capacitor.DegreesAt(tip.TuningFarad) - capacitor.DegreesAt(peaked.Mode.TuningFarad));
    }
}
