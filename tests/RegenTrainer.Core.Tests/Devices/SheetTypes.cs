using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Devices;

/// <summary>Transistor types by figures their makers print. What a sheet leaves out is filled in from memory and no check leans on it.</summary>
internal static class SheetTypes
{
    /// <summary>hFE 110 to 220, typically 180, at 5 V 2 mA and 90 at 10 µA (data sheet BC546 to BC550, group A).</summary>
    internal static BipolarModel Bc547a { get; } = Audio("BC547A", new DeviceFigure(110, 180, 220, 2e-3, KnownBy.Print, "sheet"), 90);

    /// <summary>hFE 200 to 450, typically 290, at 5 V 2 mA and 150 at 10 µA (group B of the same sheet).</summary>
    internal static BipolarModel Bc547b { get; } = Audio("BC547B", new DeviceFigure(200, 290, 450, 2e-3, KnownBy.Print, "sheet"), 150);

    /// <summary>hFE 420 to 800, typically 520, at 5 V 2 mA and 270 at 10 µA (group C of the same sheet).</summary>
    internal static BipolarModel Bc547c { get; } = Audio("BC547C", new DeviceFigure(420, 520, 800, 2e-3, KnownBy.Print, "sheet"), 270);

    /// <summary>Least gains of the data sheet, 350 at 5 V 1 mA and 300 at 0.1 mA; f_T 50 MHz at 0.5 mA, 4 pF at 5 V, 10 pF at 0.5 V.</summary>
    internal static BipolarModel LeastOf2N5088 { get; } =
        Plain("2N5088", 350, 1e-3, (300, 0.1e-3), (50e6, 0.5e-3), (4e-12, 5), (10e-12, 0.5), 10e-15);

    /// <summary>Least gains of the data sheet, 100 at 150 mA and 20 at 0.1 mA; f_T 250 MHz at 20 mA, 6.5 pF at 5 V, 30 pF at 0.5 V.</summary>
    internal static BipolarModel LeastOf2N4401 { get; } =
        Plain("2N4401", 100, 150e-3, (20, 0.1e-3), (250e6, 20e-3), (6.5e-12, 5), (30e-12, 0.5), 20e-15);

    /// <summary>Least gain of the data sheet, 65 at 1 mA; f_T 260 MHz at 5 V 10 mA, 1 pF at 10 V.</summary>
    internal static BipolarModel LeastOfBfs19 { get; } =
        Plain("BFS19", 65, 1e-3, null, (260e6, 10e-3), (1e-12, 10), (3e-12, 0.5), 2e-15);

    /// <summary>hFE typically 100 at 20 mA and 95 at 5 mA; f_T 800 MHz at 5 mA, 0.7 pF at 10 V.</summary>
    internal static BipolarModel Bf799 { get; } =
        Plain("BF799", 100, 20e-3, (95, 5e-3), (800e6, 5e-3), (0.7e-12, 10), (1.5e-12, 0.5), 1e-15);

    /// <summary>The textbook transistor of gain 100 and transition frequency 300 MHz at 1 mA, free of Early's effect.</summary>
    internal static BipolarModel Textbook { get; } =
        Plain("textbook", 100, 1e-3, null, (300e6, 1e-3), (0.5e-12, 5), (1e-12, 0.5), 10e-15, 1e9);

    /// <summary>The types whose gain at two currents is printed.</summary>
    internal static IReadOnlyList<BipolarModel> All { get; } = [Bc547a, Bc547b, Bc547c, LeastOf2N5088, LeastOf2N4401, LeastOfBfs19, Bf799];

    private static BipolarModel Audio(string name, DeviceFigure gain, double lowGain) =>
        new(
            name,
            Polarity.Npn,
            gain,
            new DeviceFigure(150e6, 300e6, null, 10e-3, KnownBy.Print, "sheet"),
            new DeviceFigure(null, 2.5e-12, 6e-12, 10, KnownBy.Print, "sheet"),
            new DeviceFigure(null, 9e-12, null, 0.5, KnownBy.Print, "sheet"),
            new DeviceFigure(null, 18e-15, null, null, KnownBy.Typical, "from 660 mV at 2 mA"),
            new DeviceFigure(null, 70, null, null, KnownBy.Memory, ""),
            new DeviceFigure(60, 120, 200, null, KnownBy.Memory, ""))
        {
            CurrentGainLow = new DeviceFigure(null, lowGain, null, 10e-6, KnownBy.Print, "sheet"),
        };

    private static BipolarModel Plain(
        string name, double gain, double gainAt, (double Gain, double At)? low, (double Hertz, double At) transition,
        (double Farad, double Volt) output, (double Farad, double Volt) input, double saturation, double early = 70) =>
        new(
            name,
            Polarity.Npn,
            new DeviceFigure(null, gain, null, gainAt, KnownBy.Print, "sheet"),
            new DeviceFigure(null, transition.Hertz, null, transition.At, KnownBy.Print, "sheet"),
            new DeviceFigure(null, output.Farad, null, output.Volt, KnownBy.Print, "sheet"),
            new DeviceFigure(null, input.Farad, null, input.Volt, KnownBy.Print, "sheet"),
            new DeviceFigure(null, saturation, null, null, KnownBy.Memory, ""),
            new DeviceFigure(null, early, null, null, KnownBy.Memory, ""),
            new DeviceFigure(null, 50, null, null, KnownBy.Memory, ""))
        {
            CurrentGainLow = low is { } point ? new DeviceFigure(null, point.Gain, null, point.At, KnownBy.Print, "sheet") : null,
        };
}
