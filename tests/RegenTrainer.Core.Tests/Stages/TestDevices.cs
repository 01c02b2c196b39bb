using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Stages;

/// <summary>Devices of the test stages, as their makers print them; figures that no sheet prints are from memory.</summary>
internal static class TestDevices
{
    private const string Sheet = "maker's data sheet BC546 to BC550";

    /// <summary>An NPN small-signal type of gain group B.</summary>
    public static BipolarModel Bc547b { get; } = new(
        "BC547B",
        Polarity.Npn,
        CurrentGain: new DeviceFigure(200, 290, 450, 2e-3, KnownBy.Print, Sheet),
        TransitionFrequency: new DeviceFigure(150e6, 300e6, null, 10e-3, KnownBy.Print, Sheet),
        OutputCapacitance: new DeviceFigure(null, 2.5e-12, 6e-12, 10, KnownBy.Print, Sheet),
        InputCapacitance: new DeviceFigure(null, 9e-12, null, 0.5, KnownBy.Print, Sheet),
        SaturationCurrent: new DeviceFigure(null, 18e-15, null, null, KnownBy.Typical, "from 660 mV base to emitter at 2 mA"),
        EarlyVoltage: new DeviceFigure(null, 70, null, null, KnownBy.Memory, ""),
        BaseResistance: new DeviceFigure(null, 120, null, null, KnownBy.Memory, ""))
    {
        CurrentGainLow = new DeviceFigure(null, 150, null, 10e-6, KnownBy.Print, Sheet),
        Rating = new DeviceRating(45, 0.1, 0.5),
    };
}
