using System.Collections.Immutable;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Oracles;
using RegenTrainer.Core.Tests.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>Headroom against the stage integrated in time at carrier level, which knows nothing of harmonics or settled cycles.</summary>
public sealed class HeadroomReaderTests
{
    /// <summary>Cycles after which the stage has settled: the slowest bias, 1 Mohm with 220 pF, takes 220 us.</summary>
    private const int Cycles = 1600;

    /// <summary>A follower whose load takes more current than it has.</summary>
    private static StageDesign HeavyLoad => DefaultStage.With("output.emitter_resistor", 10e3).With("output.load.resistance", FieldValue.Of(500));

    [Theory]
    [InlineData(1e6, 30, DeviceLimit.Saturation)]
    [InlineData(1e6, 50, DeviceLimit.CutOff)]
    [InlineData(600e3, 60, DeviceLimit.CutOff)]
    public void The_main_device_reaches_its_limit_where_the_stage_in_time_does(double hz, double travel, DeviceLimit limit) =>
        CheckFirst(StageUnderTest.Default, hz, travel, "main", limit);

    [Fact]
    public void The_follower_cuts_off_where_the_stage_in_time_does() =>
        CheckFirst(new StageUnderTest(HeavyLoad), 1e6, 40, "follower", DeviceLimit.CutOff);

    /// <summary>The classic headroom of a class-A follower: a load current as large as that at rest, I (R_E || R_L) [Gray and Meyer 1977].</summary>
    [Fact]
    public void The_follower_gives_its_current_at_rest_into_its_resistances()
    {
        // 9 V and 150 ohm: the follower's own 8 ohm and the shift of its bias by a part of V_T are small against its swing.
        var stage = new StageUnderTest(DefaultStage.With("output.load.resistance", 150));
        var setting = new Setting(1e6, 40) { SupplyVolt = 9 };
        double rest = BiasReader.Read(stage.Workspace, setting).Devices[1].CollectorAmpere;
        FirstLimit first = HeadroomReader.Read(stage.Workspace, setting).First!;
        Assert.Equal(("follower", DeviceLimit.CutOff), (first.Device, first.Limit));
        Assert.Equal(rest * 140.4, first.Level.OutputVolt, 0.05 * first.Level.OutputVolt);   // 2.2 kohm beside 150 ohm
    }

    [Fact]
    public void A_weak_drive_is_amplified_as_the_response_says()
    {
        StageUnderTest stage = StageUnderTest.Default;
        double gain = Math.Pow(10, stage.Read(1e6, 50).StageGainDb!.Value / 20);
        Assert.True(Position.Solve(stage.Workspace, new Setting(1e6, 50), TankHint.None).State.Found);
        DrivenCycle cycle = DrivenCycle.TryPrepare(stage.Workspace.Circuit, stage.Model.OutputIndex, 1e6)!;
        Assert.True(cycle.TrySolve(1e-5));
        Assert.Equal(gain, cycle.Amplitudes().Output / 1e-5, 1e-5 * gain);
    }

    [Fact]
    public void A_pnp_stage_has_the_headroom_of_its_mirror()
    {
        BipolarModel pnp = DefaultStage.Bc547b with { Name = "mirror", Polarity = Polarity.Pnp };
        ImmutableSortedDictionary<string, DeviceModel> devices =
            DefaultStage.Design.Devices.SetItem("devices.main", pnp).SetItem("devices.follower", pnp);
        FirstLimit npn = HeadroomReader.Read(StageUnderTest.Default.Workspace, new Setting(1e6, 45)).First!;
        FirstLimit mirror = HeadroomReader.Read(new StageUnderTest(DefaultStage.Design with { Devices = devices }).Workspace, new Setting(1e6, 45)).First!;
        Assert.Equal((npn.Device, npn.Limit), (mirror.Device, mirror.Limit));
        Assert.Equal(npn.Level.AntennaVolt, mirror.Level.AntennaVolt, 1e-3 * npn.Level.AntennaVolt);
        Assert.Equal(npn.Level.OutputVolt, mirror.Level.OutputVolt, 1e-3 * npn.Level.OutputVolt);
    }

    [Fact]
    public void A_device_saturated_at_rest_has_no_headroom()
    {
        // A resistor from the rail to the base drives the collector down to its emitter.
        var stage = new StageUnderTest(DefaultStage.Design with { ExtraParts = [new Resistor("pull", "supply rail", "base feed", 10e3)] });
        Assert.True(BiasReader.Read(stage.Workspace, new Setting(1e6, 50)).Devices[0].Saturated);
        FirstLimit first = HeadroomReader.Read(stage.Workspace, new Setting(1e6, 50)).First!;
        Assert.Equal(("main", DeviceLimit.Saturation, default(LimitLevel)), (first.Device, first.Limit, first.Level));
    }

    [Fact]
    public void Above_tip_over_and_without_devices_there_is_none()
    {
        HeadroomReading above = HeadroomReader.Read(StageUnderTest.Default.Workspace, new Setting(1e6, 100));
        Assert.Empty(above.Devices);
        Assert.Null(above.First);
        Assert.Equal("no-headroom", Assert.Single(above.Cautions).Code);
        HeadroomReading plain = HeadroomReader.Read(new StageUnderTest(PlainStage.Design).Workspace, new Setting(1e6, 0));
        Assert.Empty(plain.Devices);
        Assert.Empty(plain.Cautions);
    }

    /// <summary>The limit lies within 2 % of the drive: not reached 2 % below it, passed 2 % above it, and all amplitudes as predicted.</summary>
    private static void CheckFirst(StageUnderTest stage, double hz, double travel, string device, DeviceLimit limit)
    {
        var setting = new Setting(hz, travel);
        FirstLimit first = HeadroomReader.Read(stage.Workspace, setting).First!;
        Assert.Equal((device, limit), (first.Device, first.Limit));
        Reading reading = stage.Read(setting);
        Assert.InRange(reading.EffectiveQ!.Value, 100, 1000);
        var truth = new DrivenStage(stage, reading.TuningFarad!.Value, reading.ControlValue!.Value, hz);
        DrivenCycleTruth below = truth.Settle(0.98 * first.Level.AntennaVolt, Cycles), above = truth.Settle(1.02 * first.Level.AntennaVolt, Cycles);
        (double least, double most) = limit == DeviceLimit.CutOff
            ? (above.Least[device].Share - 0.05, below.Least[device].Share - 0.05)
            : (above.Least[device].Volt - 0.2, below.Least[device].Volt - 0.2);
        Assert.True(least < 0 && most > 0, $"at the limit between {most} and {least}");
        Assert.Equal(0.5 * (below.TankVolt + above.TankVolt), first.Level.TankVolt, 0.01 * first.Level.TankVolt);
        Assert.Equal(0.5 * (below.OutputVolt + above.OutputVolt), first.Level.OutputVolt, 0.01 * first.Level.OutputVolt);
    }
}
