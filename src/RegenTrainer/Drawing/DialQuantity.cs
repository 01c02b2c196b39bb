using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Drawing;

/// <summary>One figure that is followed along the dial.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Heading">What the curves show, in words.</param>
/// <param name="Value">Takes it from a point; null where it does not exist there.</param>
/// <param name="Write">Writes a value without its unit.</param>
/// <param name="Unit">Its unit as written behind values.</param>
/// <param name="Logarithmic">Whether its scale shall be logarithmic.</param>
internal sealed record DialQuantity(
    string Name, string Heading, Func<DialPoint, double?> Value, Func<double, string> Write, string Unit, bool Logarithmic)
{
    /// <summary>The figures there are, in the order the page goes through them.</summary>
    public static IReadOnlyList<DialQuantity> All { get; } =
    [
        new("tips over", "travel at tip-over, %", p => p.TipOver?.First?.TravelPercent, v => Figures.Fixed(v, "0.0"), "%", false),
        new("effective Q", "effective Q at this travel", p => p.EffectiveQ, v => Figures.Q(v), "", true),
        new("bandwidth", "bandwidth at this travel, kHz", p => p.BandwidthHz / 1e3, v => QuantityText.Write(v, Core.Quantities.Unit.None, 3), "kHz", true),
        new("stage gain", "stage gain at this travel, dB", p => p.StageGainDb, v => Figures.Signed(v, "0.0"), "dB", false),
        new("pulled", "pulled at this travel, kHz", p => p.PulledHz / 1e3, v => Figures.Signed(v, "0.00"), "kHz", false),
        new("capacitor", "tuning capacitor, pF", p => p.TuningFarad * 1e12, v => Figures.Fixed(v, "0.0"), "pF", false),
    ];

    /// <summary>The scale that holds the values of some points; travel always has the whole of it.</summary>
    public Axis AxisFor(IReadOnlyCollection<double> values) =>
        Unit == "%" ? new Axis(0, 100, false) : Axis.Holding(values.Count == 0 ? [1, 10] : values, Logarithmic);
}
