using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Drawing;

/// <summary>The spread of a type of device and how each figure is known.</summary>
internal static class DeviceFigures
{
    private const int NameWidth = 10;

    /// <summary>What the columns of <see cref="Row"/> are.</summary>
    public static string Heading => $"{"device",-NameWidth}{"gain",-13}f_T in MHz";

    /// <summary>A type in one row of a list: its name, and gain and transition frequency of the least, the typical and the greatest.</summary>
    public static string Row(BipolarModel model) =>
        $"{Printable.Fit(model.Name, NameWidth - 1),-NameWidth}{Spread(model.CurrentGain, 1),-13}{Spread(model.TransitionFrequency, 1e6)}";

    /// <summary>Draws the figures of a type, a row each.</summary>
    public static void Draw(Canvas canvas, Region region, BipolarModel model)
    {
        (string Label, string Spread, DeviceFigure Figure, Unit At)[] figures =
        [
            ("gain", Spread(model.CurrentGain, 1), model.CurrentGain, Unit.Ampere),
            ("f_T MHz", Spread(model.TransitionFrequency, 1e6), model.TransitionFrequency, Unit.Ampere),
            ("C_cb pF", Spread(model.OutputCapacitance, 1e-12), model.OutputCapacitance, Unit.Volt),
            ("C_eb pF", Spread(model.InputCapacitance, 1e-12), model.InputCapacitance, Unit.Volt),
            ("r_b \u03a9", Spread(model.BaseResistance, 1), model.BaseResistance, Unit.Ohm),
            ("V_Early", Spread(model.EarlyVoltage, 1), model.EarlyVoltage, Unit.Volt),
        ];
        for (int k = 0; k < figures.Length && k < region.Height; k++)
        {
            (string label, string spread, DeviceFigure figure, Unit unit) = figures[k];
            string at = figure.At is { } condition ? " at " + QuantityText.Write(condition, unit) : "";
            canvas.Put(region.Left, region.Top + k, label, Ink.Label, region.Right);
            canvas.Put(region.Left + NameWidth - 2, region.Top + k, $"{spread}{at}, {Known(figure)}", Ink.Text, region.Right);
        }
    }

    private static string Known(DeviceFigure figure) => figure.Known switch
    {
        KnownBy.Print => "print",
        KnownBy.Memory => "memory",
        _ => "usual",
    };

    /// <summary>Least, typical and greatest; a dash where one is not stated.</summary>
    private static string Spread(DeviceFigure figure, double unit)
    {
        string Of(double? value) => value is { } v ? Figures.Fixed(v / unit, v / unit < 10 ? "0.##" : "0") : Figures.None;
        return $"{Of(figure.Minimum)}/{Of(figure.Typical)}/{Of(figure.Maximum)}";
    }
}
