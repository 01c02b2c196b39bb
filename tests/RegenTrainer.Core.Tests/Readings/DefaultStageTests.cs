using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Stages;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>The default stage does what its builder was promised, on the whole dial, with any device and battery.</summary>
public sealed class DefaultStageTests
{
    private static readonly double[] _dial = [530e3, 700e3, 1000e3, 1350e3, 1700e3];

    [Fact]
    public void Tips_over_once_inside_the_travel_with_every_device_and_battery()
    {
        StageUnderTest stage = StageUnderTest.Default;
        foreach (Grade grade in Enum.GetValues<Grade>())
        {
            foreach (double volt in new[] { 2.2, 3.2 })
            {
                foreach (double dial in _dial)
                {
                    Reading reading = stage.Read(new Setting(dial, 30) { Grade = grade, SupplyVolt = volt });
                    Assert.True(reading.Reachable, $"{dial} {grade} {volt}");
                    Assert.Equal(TipOverState.Once, reading.TipOver!.State);
                    Assert.InRange(reading.TipOver.First!.Value.TravelPercent, 10, 90);
                }
            }
        }
    }

    [Fact]
    public void No_stray_mode_grows_with_leads_of_0_to_20_picofarad()
    {
        foreach (double lead in new[] { 0, 5e-12, 10e-12, 15e-12, 20e-12 })
        {
            var stage = new StageUnderTest(DefaultStage.With("layout.control_lead", lead));
            foreach (double dial in _dial)
            {
                foreach (double travel in new[] { 0.0, 50, 100 })
                {
                    Reading reading = stage.Read(dial, travel);
                    Assert.False(reading.Parasitic, $"{lead} {dial} {travel}");
                    Assert.NotEmpty(reading.StrayModes);
                }
            }
        }
    }

    [Fact]
    public void Pulls_less_than_2_kilohertz_from_idle_stop_to_tip_over()
    {
        StageUnderTest stage = StageUnderTest.Default;
        foreach (double dial in _dial)
        {
            Reading idle = stage.Read(dial, 0);
            double farad = idle.TuningFarad!.Value;
            Reading tip = stage.Read(new Setting(dial, idle.TipOver!.First!.Value.TravelPercent) { DialMode = DialMode.Locked, LockedFarad = farad });
            Assert.InRange(Math.Abs(tip.TankHz!.Value - idle.TankHz!.Value), 1, 2000);
        }
    }

    [Fact]
    public void A_dial_point_beyond_the_capacitor_is_an_answer_with_limits()
    {
        Reading reading = StageUnderTest.Default.Read(2e6, 50);
        Assert.False(reading.Reachable);
        Assert.Null(reading.EffectiveQ);
        Assert.Null(reading.TipOver);
        Assert.Contains(reading.Cautions, c => c.Code == "out-of-reach" && c.Text.Contains("12 pF", StringComparison.Ordinal));
    }

    [Fact]
    public void Every_point_along_the_dial_equals_a_reading_there()
    {
        StageUnderTest stage = StageUnderTest.Default;
        double[] dial = [.. Enumerable.Range(0, 25).Select(k => 500e3 + (k * 60e3))];
        IReadOnlyList<DialPoint> points = StageReader.AlongDial(stage.Workspace, new Setting(1e6, 45), dial);
        foreach (DialPoint point in points)
        {
            Reading reading = stage.Read(point.DialHz, 45);
            Assert.Equal(reading.Reachable, point.Reachable);
            AssertSame(reading.TuningFarad, point.TuningFarad);
            AssertSame(reading.EffectiveQ, point.EffectiveQ);
            AssertSame(reading.BandwidthHz, point.BandwidthHz);
            AssertSame(reading.StageGainDb, point.StageGainDb);
            AssertSame(reading.PulledHz, point.PulledHz);
            AssertSame(reading.TipOver?.First?.TravelPercent, point.TipOver?.First?.TravelPercent);
        }
    }

    [Fact]
    public void A_locked_dial_keeps_the_capacitor_and_lets_regeneration_pull()
    {
        StageUnderTest stage = StageUnderTest.Default;
        Reading idle = stage.Read(new Setting(1e6, 0) { DialMode = DialMode.Locked });
        Reading turned = stage.Read(new Setting(1e6, 55) { DialMode = DialMode.Locked });
        AssertSame(idle.TuningFarad, turned.TuningFarad);
        Assert.Equal(1e6, idle.TankHz!.Value, 1e-3);
        Assert.InRange(turned.TankHz!.Value, 999e3, 999.9e3);
        Reading given = stage.Read(new Setting(5e5, 55) { DialMode = DialMode.Locked, LockedFarad = idle.TuningFarad });
        AssertSame(turned.EffectiveQ, given.EffectiveQ);
        Assert.Equal(1e6, given.Setting.DialHz, 1e-3);
    }

    [Fact]
    public void The_bias_obeys_kirchhoff_and_the_data_sheet_gain()
    {
        BiasReading bias = BiasReader.Read(StageUnderTest.Default.Workspace, new Setting(1e6, 50));
        Assert.True(bias.ResidualAmpere < 1e-12);
        DeviceBias main = bias.Devices[0];
        Assert.InRange(main.CurrentGain, 150, 290);   // between the data sheet's points at 10 uA and 2 mA
        double volt = bias.NodeVolts.Single(n => n.Node == "collector").Volt;
        double rail = bias.NodeVolts.Single(n => n.Node == "supply rail").Volt;
        Assert.Equal((rail - volt) / 680, main.CollectorAmpere + bias.Devices[1].BaseAmpere + main.BaseAmpere, 1e-12);
        Assert.Equal((3.0 - rail) / 2, bias.SupplyAmpere!.Value, 1e-12);
    }

    internal static void AssertSame(double? expected, double? actual, double relative = 1e-9)
    {
        Assert.Equal(expected.HasValue, actual.HasValue);
        if (expected is { } e)
        {
            Assert.True(Math.Abs(e - actual!.Value) <= relative * Math.Max(Math.Abs(e), 1e-30), $"{actual} for {e}");
        }
    }
}
