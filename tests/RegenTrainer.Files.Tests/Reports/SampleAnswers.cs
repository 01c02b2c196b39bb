using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Files.Tests.Reports;

/// <summary>Answers made up by hand, so that a report is tested without a solver behind it.</summary>
internal static class SampleAnswers
{
    public static readonly SettingInForce Setting =
        new(1e6, 1.003e6, 61.9, 3, 20, Grade.Weak, "BC547B", DialMode.Locked);

    public static readonly Reading Full = new()
    {
        Setting = Setting,
        Cautions = [new Caution("coil-too-short", "the coil is shorter than the table")],
        Reachable = true,
        TuningFarad = 1.43e-10,
        TuningReachFarad = (1.2e-11, 3.65e-10),
        ControlUnit = Unit.Ohm,
        ControlValue = 1220,
        ControlDegrees = 186,
        TipOver = new TipOver(
            TipOverState.Several,
            [new Crossing(1400, 40, 120, false, 9.99e5, 1.42e-10), new Crossing(1130, 63.4, 190, true, 1e6, 1.43e-10)]),
        EffectiveQ = 1240,
        QRegenerationOff = 92,
        QAtIdleStop = 88,
        BandwidthHz = 806,
        BandEdgesHz = (999600, 1000406),
        TankHz = 1e6,
        GrowthPerSecond = -2533,
        StageGainDb = 31.2,
        RingTimeSeconds = 3.95e-4,
        MarginDb = 0.67,
        MarginPercent = 1.5,
        MarginDegrees = 4.5,
        DeviceMarginDb = 0.1,
        Regime = Regime.Edge,
        PulledHz = -1200,
        SpeechIndex = 0.592,
        AudioDownHz = (403, 698, null),
        BandwidthDialDegrees = 0.3,
        HandShiftHz = -300,
        Sidebands = [new Sideband(1000, -8.6, -8.5, -8.55)],
        StrayModes = [new StrayMode(9e6, 1e6, false)],
        Parasitic = false,
    };

    /// <summary>Above tip-over by a feedback factor: what does not exist is null.</summary>
    public static readonly Reading Bare = new()
    {
        Setting = Setting with { SupplyVolt = null, Device = null },
        Cautions = [],
        Reachable = false,
        TuningReachFarad = (1.2e-11, 3.65e-10),
        ControlUnit = Unit.None,
        ControlValue = 0.12,
        TipOver = new TipOver(TipOverState.Always, []),
    };

    public static readonly Interaction Interaction = new()
    {
        Approach = new ApproachToTipOver(53.4, 63.4, FromStop: false, -810, -2e-13, -0.1),
        BandwidthDialDegrees = 0.3,
        VernierRatio = 1.7,
        HandShiftHz = -300,
        Station = new StationFit(3000, -17, [new OffTuneAudio(1000, 4, 12)]),
        Cautions = [],
    };

    public static readonly BiasReading Bias = new(
        Setting,
        [],
        [new DeviceBias("main", "BC547B", 1.4e-3, 5e-6, 0.64, 1.9, 0.054, 280, 2.7e-3, false)],
        [("collector", 1.9)],
        1.6e-3,
        1e-17)
    {
        Battery = new BatteryLife(3.2, 2.2, 1.7e-3, 1.1e-3, 5e6),
        Diodes = [new DiodeBias("detector", "1N34A", 1e-6, 0.02, 2.6e4, 1e-12)],
        PerKelvin = new BiasDrift(2e-6, -0.02, 3, -1),
    };

    public static readonly HeadroomReading Headroom = new(
        [new DeviceHeadroom("main", null, new LimitLevel(0.1, 3, 0.25))],
        new FirstLimit("main", DeviceLimit.Saturation, new LimitLevel(0.1, 3, 0.25)),
        []);

    public static readonly CoilReading Coil = new(
        1e6,
        20,
        [new WindingReading("coil", 84, 2.4e-4, 6.2, 241, 2.3e-12, 13.3), new WindingReading("link", null, 1e-6, 0, null, null, null)],
        [[2.2e-4, 1e-5], [1e-5, 1e-6]],
        []);

    public static readonly DialPoint[] Points =
    [
        new(5.3e5, Reachable: false) { Dead = DeadSpotReason.OutOfReach },
        new(1e6, Reachable: true) { TuningFarad = 1.43e-10, TipOver = Full.TipOver, EffectiveQ = 1240, BandwidthHz = 806, StageGainDb = 31, PulledHz = -9 },
    ];
}
