using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;

namespace RegenTrainer.Files.Reports;

/// <summary>A reading as JSON, schema <c>regentrainer.reading/1</c>.</summary>
public static class ReadingJson
{
    /// <summary>Writes a reading as UTF-8 text.</summary>
    /// <param name="stage">The stage's title.</param>
    /// <param name="reading">The reading.</param>
    public static byte[] Write(string stage, Reading reading) =>
        Report.Write("reading", stage, SettingKeys.Of(reading.Setting), reading.Cautions, writer => Figures(writer, reading));

    private static void Figures(FigureWriter writer, Reading reading)
    {
        writer.Number("effective_q", reading.EffectiveQ);
        writer.Number("q_regeneration_off", reading.QRegenerationOff);
        writer.Number("q_at_idle_stop", reading.QAtIdleStop);
        writer.Number("bandwidth_hz", reading.BandwidthHz);
        writer.Number("tank_hz", reading.TankHz);
        writer.Number("growth_per_s", reading.GrowthPerSecond);
        writer.Number("stage_gain_db", reading.StageGainDb);
        writer.Number("ring_time_s", reading.RingTimeSeconds);
        writer.Number("tuning_farad", reading.TuningFarad);
        Control(writer, reading);
        writer.Number("margin_db", reading.MarginDb);
        writer.Number("margin_percent", reading.MarginPercent);
        writer.Number("margin_degrees", reading.MarginDegrees);
        writer.Number("device_margin_db", reading.DeviceMarginDb);
        writer.Word("regime", CommonKeys.Word(reading.Regime));
        writer.Word("dial_mode", reading.Setting.DialMode == Core.Stages.DialMode.Locked ? "locked" : "follows");
        writer.Flag("reachable", reading.Reachable);
        writer.Number("pulled_hz", reading.PulledHz);
        writer.Number("speech_index", reading.SpeechIndex);
        CommonKeys.AudioDown(writer, reading);
        writer.Number("bandwidth_dial_degrees", reading.BandwidthDialDegrees);
        writer.Number("hand_shift_hz", reading.HandShiftHz);
        CommonKeys.Sidebands(writer, reading);
        writer.List("stray_modes", reading.StrayModes, (w, mode) =>
        {
            w.Number("frequency_hz", mode.FrequencyHz);
            w.Number("decay_per_s", mode.DecayPerSecond);
            w.Flag("grows", mode.Grows);
        });
        writer.Flag("parasitic", reading.Parasitic);
    }

    private static void Control(FigureWriter writer, Reading reading)
    {
        // A stage without a control has the keys of a rheostat, all null.
        string suffix = CommonKeys.ControlSuffix(reading.ControlValue is null ? Unit.Ohm : reading.ControlUnit);
        Crossing? first = reading.TipOver?.First;
        writer.Number("control_" + suffix, reading.ControlValue);
        writer.Number("travel_percent", reading.Setting.TravelPercent);
        writer.Word("tip_over_state", CommonKeys.Word(reading.TipOver?.State));
        writer.Number("tip_over_percent", first?.TravelPercent);
        writer.Number("tip_over_" + suffix, first?.Value);
        writer.List("tip_overs", reading.TipOver?.Crossings ?? [], (w, crossing) =>
        {
            w.Number("travel_percent", crossing.TravelPercent);
            w.Number("degrees", crossing.Degrees);
            w.Number(suffix, crossing.Value);
            w.Flag("upward", crossing.Upward);
            w.Number("frequency_hz", crossing.FrequencyHz);
            w.Number("tuning_farad", crossing.TuningFarad);
        });
    }
}
