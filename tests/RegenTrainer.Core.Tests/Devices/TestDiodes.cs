using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Devices;

/// <summary>Diodes of round figures.</summary>
internal static class TestDiodes
{
    /// <summary>A diode of one saturation current in ampere and one emission coefficient, 0.001 pF and 0.01 ohm.</summary>
    internal static DiodeModel Plain(
        double saturation, double emission = 1, JunctionMaterial material = JunctionMaterial.Germanium, double farad = 1e-15, double ohm = 0.01) =>
        new("plain", material, Figure(saturation), Figure(emission), Figure(ohm), Figure(farad));

    /// <summary>A diode with a spread in every figure.</summary>
    internal static DiodeModel Spread { get; } = new(
        "spread",
        JunctionMaterial.Schottky,
        new DeviceFigure(1e-8, 1e-7, 1e-6, null, KnownBy.Typical, ""),
        new DeviceFigure(1.05, 1.1, 1.2, null, KnownBy.Typical, ""),
        new DeviceFigure(5, 10, 20, null, KnownBy.Typical, ""),
        new DeviceFigure(1e-12, 2e-12, 4e-12, null, KnownBy.Typical, ""));

    private static DeviceFigure Figure(double value) => new(null, value, null, null, KnownBy.Typical, "");
}
