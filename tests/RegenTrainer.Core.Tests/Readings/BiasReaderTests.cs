using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Stages;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>Supply, battery and drift against single readings and hand calculation.</summary>
public sealed class BiasReaderTests
{
    [Theory]
    [InlineData(0)]
    [InlineData(50)]
    [InlineData(56)]
    public void One_kelvin_and_a_tenth_of_a_volt_do_what_two_readings_differ_by(double travel)
    {
        StageUnderTest stage = StageUnderTest.Default;
        var setting = new Setting(1e6, travel);
        BiasReading bias = BiasReader.Read(stage.Workspace, setting);
        Setting held = setting with { DialMode = DialMode.Locked, LockedFarad = stage.Read(setting).TuningFarad };
        Check(bias.PerKelvin!, held with { TemperatureCelsius = 19.5 }, held with { TemperatureCelsius = 20.5 });
        Check(bias.PerTenthVolt!, held with { SupplyVolt = 2.95 }, held with { SupplyVolt = 3.05 });

        void Check(BiasDrift drift, Setting below, Setting above)
        {
            (Reading low, Reading high) = (stage.Read(below), stage.Read(above));
            Assert.Equal(high.TankHz!.Value - low.TankHz!.Value, drift.TankHz!.Value, 1e-3);
            Assert.Equal(high.EffectiveQ!.Value - low.EffectiveQ!.Value, drift.EffectiveQ!.Value, 1e-4 * high.EffectiveQ.Value);
            double tips = high.TipOver!.First!.Value.TravelPercent - low.TipOver!.First!.Value.TravelPercent;
            Assert.Equal(tips, drift.TipOverPercent!.Value, 1e-6);
            double collector = BiasReader.Read(stage.Workspace, above).Devices[0].CollectorAmpere
                - BiasReader.Read(stage.Workspace, below).Devices[0].CollectorAmpere;
            Assert.Equal(collector, drift.CollectorAmpere!.Value, 1e-11);
            Assert.NotEqual(0, drift.CollectorAmpere.Value);
        }
    }

    [Fact]
    public void Above_tip_over_only_the_change_of_Q_is_unknown()
    {
        BiasDrift drift = BiasReader.Read(StageUnderTest.Default.Workspace, new Setting(1e6, 100)).PerKelvin!;
        Assert.Null(drift.EffectiveQ);
        Assert.NotNull(drift.TipOverPercent);
        Assert.NotNull(drift.TankHz);
    }

    [Fact]
    public void A_battery_lasts_its_charge_over_the_current()
    {
        var setting = new Setting(1e6, 50);
        Assert.Null(BiasReader.Read(StageUnderTest.Default.Workspace, setting).Battery!.LifeSeconds);
        var stage = new StageUnderTest(DefaultStage.With("bias.battery_capacity", 2.0));
        BatteryLife battery = BiasReader.Read(stage.Workspace, setting).Battery!;
        Assert.Equal((3.2, 2.2), (battery.FreshVolt, battery.TiredVolt));
        Assert.Equal(BiasReader.Read(stage.Workspace, setting with { SupplyVolt = 3.2 }).SupplyAmpere!.Value, battery.FreshAmpere, 1e-12);
        Assert.Equal(BiasReader.Read(stage.Workspace, setting with { SupplyVolt = 2.2 }).SupplyAmpere!.Value, battery.TiredAmpere, 1e-12);

        // Charge drawn in a hundred equal shares, each at the current of its own voltage, the trapezoidal rule.
        double seconds = 0;
        for (int k = 0; k <= 100; k++)
        {
            double ampere = BiasReader.Read(stage.Workspace, setting with { SupplyVolt = 3.2 - (0.01 * k) }).SupplyAmpere!.Value;
            seconds += 2.0 * 3600 / 100 / ampere * (k is 0 or 100 ? 0.5 : 1);
        }

        Assert.Equal(seconds, battery.LifeSeconds!.Value, 2e-3 * seconds);
    }

    [Fact]
    public void A_stage_without_a_supply_has_no_battery()
    {
        BiasReading plain = BiasReader.Read(new StageUnderTest(PlainStage.Design).Workspace, new Setting(1e6, 0));
        Assert.Null(plain.Battery);
        Assert.Null(plain.PerTenthVolt);
        Assert.Null(plain.PerKelvin!.CollectorAmpere);
    }
}
