using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Files.Reports;

/// <summary>A run along the dial as JSON, schema <c>regentrainer.dial/1</c>.</summary>
public static class DialJson
{
    /// <summary>Writes a run along the dial as UTF-8 text.</summary>
    /// <param name="stage">The stage's title.</param>
    /// <param name="setting">The setting that all points share; its dial and station are ignored.</param>
    /// <param name="stationHz">The station of all points in Hz; null where each point has the station at its dial.</param>
    /// <param name="points">The points.</param>
    /// <param name="reach">Where the reach of the tuning capacitor ends, in Hz.</param>
    /// <param name="cautions">Cautions about the run as a whole.</param>
    public static byte[] Write(
        string stage,
        SettingInForce setting,
        double? stationHz,
        IReadOnlyList<DialPoint> points,
        (double? LowHz, double? HighHz) reach,
        IReadOnlyList<Caution> cautions) =>
        Report.Write("dial", stage, SettingKeys.Along(setting, stationHz), cautions, writer =>
        {
            writer.List("points", points, Point);
            writer.Number("reach_low_hz", reach.LowHz);
            writer.Number("reach_high_hz", reach.HighHz);
            writer.List("dead_spots", DeadSpot.Along(points), (w, spot) =>
            {
                w.Number("from_hz", spot.FromHz);
                w.Number("to_hz", spot.ToHz);
                w.Word("reason", Word(spot.Reason));
            });
        });

    private static string Word(DeadSpotReason reason) => reason switch
    {
        DeadSpotReason.OutOfReach => "out-of-reach",
        DeadSpotReason.AlwaysOscillates => "always-oscillates",
        DeadSpotReason.OscillatesAtIdle => "oscillates-at-idle",
        DeadSpotReason.TipsOverBeyondTravel => "tips-over-beyond-travel",
        DeadSpotReason.NeverTipsOver => "never-tips-over",
        _ => "unsolved",
    };

    private static void Point(FigureWriter writer, DialPoint point)
    {
        writer.Number("dial_hz", point.DialHz);
        writer.Flag("reachable", point.Reachable);
        writer.Number("tuning_farad", point.TuningFarad);
        writer.Word("tip_over_state", CommonKeys.Word(point.TipOver?.State));
        writer.Number("tip_over_percent", point.TipOver?.First?.TravelPercent);
        writer.Number("effective_q", point.EffectiveQ);
        writer.Number("bandwidth_hz", point.BandwidthHz);
        writer.Number("stage_gain_db", point.StageGainDb);
        writer.Number("pulled_hz", point.PulledHz);
    }
}
