using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Drawing;

/// <summary>One figure of a reading: its label, its value, and how value and difference are written.</summary>
/// <param name="Label">Label.</param>
/// <param name="Value">The value; null where there is none.</param>
/// <param name="Write">Writes the value.</param>
/// <param name="WriteDifference">Writes a difference of two values, with its sign.</param>
internal sealed record Readout(string Label, double? Value, Func<double?, string> Write, Func<double, string> WriteDifference)
{
    /// <summary>The figures of the opening page, in their order; the same labels whatever the reading.</summary>
    public static IReadOnlyList<Readout> Of(Reading reading) =>
    [
        new("effective Q", reading.EffectiveQ, Figures.Q, Figures.QDifference),
        new("  regeneration off", reading.QRegenerationOff, Figures.Q, Figures.QDifference),
        Quantity("bandwidth \u22123 dB", reading.BandwidthHz, Unit.Hertz),
        Level("stage gain", reading.StageGainDb),
        Level("1 kHz sideband", Sideband(reading, 1000)),
        Level("3 kHz sideband", Sideband(reading, 3000)),
        Quantity("ring time", reading.RingTimeSeconds, Unit.Second),
        new("speech index", reading.SpeechIndex, v => v is { } index ? Figures.Fixed(index, "0.00") : Figures.None, d => Figures.Signed(d, "0.00")),
        new("pulled", reading.PulledHz, Figures.Shift, d => Figures.Shift(d)),
        new("tank", reading.TankHz, Figures.Tank, d => Figures.Shift(d)),
        Quantity("tuning capacitor", reading.TuningFarad, Unit.Farad),
    ];

    /// <summary>The figures that tell most of a change of parts, in their order.</summary>
    public static IReadOnlyList<Readout> OfChange(Reading reading) =>
    [
        new("effective Q", reading.EffectiveQ, Figures.Q, Figures.QDifference),
        new(
            "tips over at",
            reading.TipOver?.Crossings is [{ TravelPercent: var travel }, ..] ? travel : null,
            v => v is { } percent ? Figures.Fixed(percent, "0.00") + " %" : Figures.None,
            d => Figures.Signed(d, "0.00") + " %"),
        Quantity("bandwidth \u22123 dB", reading.BandwidthHz, Unit.Hertz),
        Level("stage gain", reading.StageGainDb),
    ];

    private static Readout Quantity(string label, double? value, Unit unit) =>
        new(label, value, v => Figures.Quantity(v, unit), d => Figures.Difference(d, unit));

    private static Readout Level(string label, double? db) => new(label, db, Figures.Level, d => Figures.Level(d));

    private static double? Sideband(Reading reading, double audioHz) =>
        reading.Sidebands.Where(sideband => sideband.AudioHz == audioHz).Select(sideband => (double?)sideband.AudioDb).FirstOrDefault();
}
