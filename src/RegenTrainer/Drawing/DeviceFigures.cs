using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Drawing;

/// <summary>The spread of a type of device and how each figure is known.</summary>
internal static class DeviceFigures
{
    private const int NameWidth = 10;

    /// <summary>What the columns of <see cref="Row"/> are for a kind of device.</summary>
    public static string Heading(DeviceKind kind) =>
        $"{"device",-NameWidth}{(kind == DeviceKind.Diode ? "I_S in nA" : "gain"),-13}{(kind == DeviceKind.Diode ? "C in pF" : "f_T in MHz")}";

    /// <summary>A type in one row of a list: its name, and two telling figures of the least, the typical and the greatest.</summary>
    public static string Row(DeviceModel model)
    {
        (string first, string second) = model switch
        {
            BipolarModel bipolar => (Spread(bipolar.CurrentGain, 1), Spread(bipolar.TransitionFrequency, 1e6)),
            DiodeModel diode => (Spread(diode.SaturationCurrent, 1e-9), Spread(diode.Capacitance, 1e-12)),
            _ => ("", ""),
        };
        return $"{Printable.Fit(model.Name, NameWidth - 1),-NameWidth}{first,-13}{second}";
    }

    /// <summary>Draws the figures of a type, a row each.</summary>
    public static void Draw(Canvas canvas, Region region, DeviceModel model)
    {
        (string Label, string Spread, DeviceFigure Figure, Unit At)[] figures = model switch
        {
            BipolarModel bipolar => Bipolar(bipolar),
            DiodeModel diode => Diode(diode),
            _ => [],
        };
        for (int k = 0; k < figures.Length && k < region.Height; k++)
        {
            (string label, string spread, DeviceFigure figure, Unit unit) = figures[k];
            string at = figure.At is { } condition ? " at " + QuantityText.Write(condition, unit) : "";
            canvas.Put(region.Left, region.Top + k, label, Ink.Label, region.Right);
            canvas.Put(region.Left + NameWidth - 2, region.Top + k, $"{spread}{at}, {Known(figure)}", Ink.Text, region.Right);
        }
    }

    private static (string, string, DeviceFigure, Unit)[] Bipolar(BipolarModel model) =>
    [
        ("gain", Spread(model.CurrentGain, 1), model.CurrentGain, Unit.Ampere),
        ("f_T MHz", Spread(model.TransitionFrequency, 1e6), model.TransitionFrequency, Unit.Ampere),
        ("C_cb pF", Spread(model.OutputCapacitance, 1e-12), model.OutputCapacitance, Unit.Volt),
        ("C_eb pF", Spread(model.InputCapacitance, 1e-12), model.InputCapacitance, Unit.Volt),
        ("r_b \u03a9", Spread(model.BaseResistance, 1), model.BaseResistance, Unit.Ohm),
        ("V_Early", Spread(model.EarlyVoltage, 1), model.EarlyVoltage, Unit.Volt),
    ];

    private static (string, string, DeviceFigure, Unit)[] Diode(DiodeModel model) =>
    [
        ("I_S nA", Spread(model.SaturationCurrent, 1e-9), model.SaturationCurrent, Unit.Volt),
        ("n", Spread(model.EmissionCoefficient, 1), model.EmissionCoefficient, Unit.Volt),
        ("r_s \u03a9", Spread(model.SeriesResistance, 1), model.SeriesResistance, Unit.Ampere),
        ("C pF", Spread(model.Capacitance, 1e-12), model.Capacitance, Unit.Volt),
    ];

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
