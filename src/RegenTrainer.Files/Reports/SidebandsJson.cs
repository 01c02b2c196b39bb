using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;

namespace RegenTrainer.Files.Reports;

/// <summary>What the selectivity leaves of a programme as JSON, schema <c>regentrainer.sidebands/1</c>.</summary>
public static class SidebandsJson
{
    /// <summary>Writes sidebands, neighbours and response as UTF-8 text.</summary>
    /// <param name="stage">The stage's title.</param>
    /// <param name="reading">The reading whose figures about selectivity are repeated.</param>
    /// <param name="interaction">How regeneration, dial and station act on each other.</param>
    /// <param name="neighbours">The neighbour channels.</param>
    /// <param name="response">The response around the station.</param>
    public static byte[] Write(
        string stage,
        Reading reading,
        Interaction interaction,
        IReadOnlyList<Neighbour> neighbours,
        IReadOnlyList<ResponsePoint> response) =>
        Report.Write("sidebands", stage, SettingKeys.Of(reading.Setting), reading.Cautions, writer =>
        {
            writer.Number("effective_q", reading.EffectiveQ);
            writer.Number("bandwidth_hz", reading.BandwidthHz);
            writer.Number("tank_hz", reading.TankHz);
            writer.Number("stage_gain_db", reading.StageGainDb);
            writer.Word("regime", CommonKeys.Word(reading.Regime));
            writer.Flag("reachable", reading.Reachable);
            writer.Number("speech_index", reading.SpeechIndex);
            CommonKeys.AudioDown(writer, reading);
            CommonKeys.Sidebands(writer, reading);
            CommonKeys.Neighbours(writer, neighbours);
            Together(writer, interaction);
            writer.List("response", response, (w, point) =>
            {
                w.Number("frequency_hz", point.FrequencyHz);
                w.Number("gain_db", point.GainDb);
                w.Number("phase_degrees", point.PhaseDegrees);
            });
        });

    private static void Together(FigureWriter writer, Interaction interaction)
    {
        ApproachToTipOver? approach = interaction.Approach;
        writer.Number("approach_from_percent", approach?.FromPercent);
        writer.Number("approach_to_percent", approach?.ToPercent);
        writer.Flag("approach_from_stop", approach?.FromStop ?? false);
        writer.Number("approach_pull_hz", approach?.PullHz);
        writer.Number("repeak_farad", approach?.RepeakFarad);
        writer.Number("repeak_degrees", approach?.RepeakDegrees);
        writer.Number("bandwidth_dial_degrees", interaction.BandwidthDialDegrees);
        writer.Number("vernier_ratio", interaction.VernierRatio);
        writer.Number("hand_shift_hz", interaction.HandShiftHz);
        writer.Number("station_offset_hz", interaction.Station?.OffsetHz);
        writer.Number("carrier_loss_db", interaction.Station?.CarrierLossDb);
        writer.List("off_tune", interaction.Station?.Audio ?? [], (w, audio) =>
        {
            w.Number("audio_hz", audio.AudioHz);
            w.Number("asymmetry_db", audio.AsymmetryDb);
            w.Number("second_harmonic_percent", audio.SecondHarmonicPercent);
        });
    }
}
