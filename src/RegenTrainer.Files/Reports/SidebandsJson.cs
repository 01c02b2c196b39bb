using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;

namespace RegenTrainer.Files.Reports;

/// <summary>What the selectivity leaves of a programme as JSON, schema <c>regentrainer.sidebands/1</c>.</summary>
public static class SidebandsJson
{
    /// <summary>Writes sidebands, neighbours and response as UTF-8 text.</summary>
    /// <param name="stage">The stage's title.</param>
    /// <param name="reading">The reading whose figures about selectivity are repeated.</param>
    /// <param name="neighbours">The neighbour channels.</param>
    /// <param name="response">The response around the station.</param>
    public static byte[] Write(
        string stage, Reading reading, IReadOnlyList<Neighbour> neighbours, IReadOnlyList<ResponsePoint> response) =>
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
            writer.List("response", response, (w, point) =>
            {
                w.Number("frequency_hz", point.FrequencyHz);
                w.Number("gain_db", point.GainDb);
                w.Number("phase_degrees", point.PhaseDegrees);
            });
        });
}
