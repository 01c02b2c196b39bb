using System.Globalization;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;

namespace RegenTrainer.Drawing;

/// <summary>How figures are written on the screen; what there is not is a dash.</summary>
internal static class Figures
{
    /// <summary>Stands where a figure does not exist.</summary>
    public const string None = "\u2014";

    private const double WholeFrom = 100;

    private const double MegahertzFrom = 10e6;

    /// <summary>A Q: whole from 100, thousands set apart.</summary>
    public static string Q(double? q) => q switch
    {
        null => None,
        < WholeFrom => Fixed(q.Value, "0.0"),
        < 1e9 => Fixed(q.Value, "#,0").Replace(',', ' '),
        _ => QuantityText.Write(q.Value, Unit.None),
    };

    /// <summary>A difference of two Qs, with its sign.</summary>
    public static string QDifference(double difference) => Math.Abs(difference) < WholeFrom
        ? Signed(difference, "0.0")
        : (difference > 0 ? "+" : "\u2212") + Q(Math.Abs(difference));

    /// <summary>A difference of two quantities, with its sign.</summary>
    public static string Difference(double difference, Unit unit) =>
        (difference > 0 ? "+" : "") + QuantityText.Write(difference, unit).Replace('-', '\u2212');

    public static string Quantity(double? value, Unit unit, int figures = 3) =>
        value is { } v ? QuantityText.Write(v, unit, figures).Replace('-', '\u2212') : None;

    /// <summary>A level against another, always with its sign.</summary>
    public static string Level(double? db) => db is { } v && double.IsFinite(v) ? Signed(v, "0.0") + " dB" : None;

    /// <summary>A shift of frequency, always with its sign.</summary>
    public static string Shift(double? hz) =>
        hz is { } v ? (v > 0 ? "+" : "") + QuantityText.Write(v, Unit.Hertz).Replace('-', '\u2212') : None;

    /// <summary>A shift of frequency in two figures.</summary>
    public static string ShiftShort(double hz) => (hz > 0 ? "+" : "") + QuantityText.Write(hz, Unit.Hertz, 2).Replace('-', '\u2212');

    /// <summary>A frequency as a dial shows it: in kHz, with so many decimals at most.</summary>
    public static string Dial(double hz, int decimals = 3)
    {
        string format = "0." + new string('#', decimals);
        return hz < MegahertzFrom ? Fixed(hz / 1e3, format) + " kHz" : Fixed(hz / 1e6, format + "###") + " MHz";
    }

    /// <summary>A frequency with two decimals of its kHz.</summary>
    public static string Tank(double? hz) => hz is { } v ? Fixed(v / 1e3, "0.00") + " kHz" : None;

    /// <summary>A number with a sign in front, unless it is zero as written.</summary>
    public static string Signed(double value, string format) => value.ToString($"+{format};\u2212{format};{format}", CultureInfo.InvariantCulture);

    public static string Fixed(double value, string format) => value.ToString(format, CultureInfo.InvariantCulture).Replace('-', '\u2212');

    /// <summary>The control element's value in its own unit: 1k22, 143 pF, k 0.12.</summary>
    public static string ControlValue(double value, Unit unit) => unit switch
    {
        Unit.Ohm => QuantityText.WriteCode(value, unit),
        Unit.None => "k " + QuantityText.Write(value, unit),
        _ => QuantityText.Write(value, unit),
    };

    public static string Word(Regime regime) => regime switch
    {
        Regime.Damped => "damped",
        Regime.Idle => "idle",
        Regime.Working => "working",
        Regime.Edge => "edge",
        _ => "oscillating",
    };

    public static Ink InkOf(Regime regime) => regime switch
    {
        Regime.Damped or Regime.Idle => Ink.Idle,
        Regime.Working => Ink.Working,
        Regime.Edge => Ink.Edge,
        _ => Ink.Oscillating,
    };
}
