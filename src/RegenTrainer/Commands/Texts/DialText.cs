using System.Globalization;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;

namespace RegenTrainer.Commands.Texts;

/// <summary>A run along the dial for the eye.</summary>
internal static class DialText
{
    public static string Of(
        string title,
        SettingInForce setting,
        double? stationHz,
        IReadOnlyList<DialPoint> points,
        (double? LowHz, double? HighHz) reach,
        IReadOnlyList<Caution> cautions)
    {
        var sheet = new Sheet();
        sheet.Line(title);
        sheet.Row("dial", setting.DialMode == Core.Stages.DialMode.Locked ? "locked at each point" : "follows");
        sheet.RowIf("station", stationHz is { } hz ? Say.Quantity(hz, Unit.Hertz, 7) : null);
        sheet.Row("travel", $"{Say.Quantity(setting.TravelPercent, Unit.None)} %");
        ReadingText.Socket(sheet, setting);
        sheet.Row("capacitor reaches", $"{Say.Quantity(reach.LowHz, Unit.Hertz)} to {Say.Quantity(reach.HighHz, Unit.Hertz)}");
        foreach (DeadSpot spot in DeadSpot.Along(points))
        {
            sheet.Row("dead spot", $"{Say.Kilohertz(spot.FromHz)} to {Say.Kilohertz(spot.ToHz)} kHz: {Word(spot.Reason)}");
        }

        sheet.Gap();
        sheet.Table(
            ["dial kHz", "tuned pF", "tips over %", "effective Q", "bandwidth Hz", "gain dB", "pulled Hz"],
            [.. points.Select(Row)],
            wordsFirst: false);
        return sheet.Cautions(cautions).ToString();
    }

    private static string Word(DeadSpotReason reason) => reason switch
    {
        DeadSpotReason.OutOfReach => "out of reach",
        DeadSpotReason.AlwaysOscillates => "always oscillates",
        DeadSpotReason.OscillatesAtIdle => "oscillates at idle",
        DeadSpotReason.TipsOverBeyondTravel => "tips over beyond the travel",
        DeadSpotReason.NeverTipsOver => "never tips over",
        _ => "unsolved",
    };

    private static string[] Row(DialPoint point) => point.Reachable
        ?
        [
            Say.Kilohertz(point.DialHz),
            Say.Fixed(point.TuningFarad * 1e12, 2),
            TipsOver(point.TipOver),
            Say.Fixed(point.EffectiveQ, 1),
            Say.Fixed(point.BandwidthHz, 0),
            point.StageGainDb is { } gain ? Say.Signed(gain, "0.0") : Say.None,
            point.PulledHz is { } pulled ? Say.Signed(pulled, "0") : Say.None,
        ]
        : [Say.Kilohertz(point.DialHz), "no reach", Say.None, Say.None, Say.None, Say.None, Say.None];

    private static string TipsOver(TipOver? tipOver) => tipOver switch
    {
        { State: TipOverState.Never } => "never",
        { State: TipOverState.Always } => "always",
        { First: { } first } => first.TravelPercent.ToString("F2", CultureInfo.InvariantCulture)
            + (tipOver.State == TipOverState.Several ? " ..." : ""),
        { State: TipOverState.Several or TipOverState.Once } => "falls back",
        _ => Say.None,
    };
}
