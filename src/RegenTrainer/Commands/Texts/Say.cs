using System.Globalization;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;

namespace RegenTrainer.Commands.Texts;

/// <summary>Figures in words; what there is not is a dash.</summary>
internal static class Say
{
    /// <summary>Stands where a figure does not exist.</summary>
    public const string None = "-";

    public static string Quantity(double? value, Unit unit, int figures = 4) =>
        value is { } v ? QuantityText.Write(v, unit, figures) : None;

    public static string Level(double? db) => db is { } v ? Signed(v, "0.0") + " dB" : None;

    /// <summary>A number without a unit, with so many decimals.</summary>
    public static string Fixed(double? value, int decimals) =>
        value is { } v ? v.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture) : None;

    public static string Signed(double value, string format)
    {
        string text = value.ToString($"+{format};-{format};{format}", CultureInfo.InvariantCulture);
        return text;
    }

    public static string SignedHertz(double? hz) =>
        hz is { } v ? (v > 0 ? "+" : "") + QuantityText.Write(v, Unit.Hertz) : None;

    public static string Kilohertz(double? hz) => hz is { } v ? (v / 1e3).ToString("0.###", CultureInfo.InvariantCulture) : None;

    public static string Regime(Regime regime) => regime switch
    {
        Core.Regeneration.Regime.Damped => "damped: the device takes more than it gives",
        Core.Regeneration.Regime.Idle => "idle",
        Core.Regeneration.Regime.Working => "working",
        Core.Regeneration.Regime.Edge => "edge",
        _ => "oscillating",
    };

    /// <summary>A place on the control's travel: percent, angle, value.</summary>
    public static string Place(double percent, double? degrees, double? value, Unit unit)
    {
        string text = $"{Fixed(percent, 2)} %";
        text += degrees is { } angle ? $", {Fixed(angle, 1)}°" : "";
        return text + (value is { } v ? unit == Unit.None ? $", factor {Quantity(v, unit)}" : $", {Quantity(v, unit)}" : "");
    }
}
