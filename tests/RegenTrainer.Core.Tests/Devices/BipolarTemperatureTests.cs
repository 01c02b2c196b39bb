using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Tests.Stages;

namespace RegenTrainer.Core.Tests.Devices;

public class BipolarTemperatureTests
{
    // Common practice: the base voltage of a silicon transistor at constant current falls by about 2 mV/K.
    [Theory]
    [InlineData(-20)]
    [InlineData(25)]
    [InlineData(60)]
    public void Base_voltage_falls_about_2_millivolt_per_kelvin(double celsius)
    {
        double change = BiasedAt.BaseVolt(LawAt(celsius + 1), 1e-3, 5) - BiasedAt.BaseVolt(LawAt(celsius - 1), 1e-3, 5);
        Assert.InRange(1e3 * change / 2, -2.3, -1.7);
    }

    // Common practice: the gain of a silicon transistor rises by 0.5 to 0.7 % per kelvin near room temperature.
    [Theory]
    [InlineData(10e-6)]
    [InlineData(1e-3)]
    public void Gain_rises_about_0_6_percent_per_kelvin(double ampere)
    {
        double rise = (Gain(26) / Gain(24)) - 1;
        Assert.InRange(100 * rise / 2, 0.5, 0.7);

        double Gain(double celsius)
        {
            TwoPortPoint p = BiasedAt.Point(LawAt(celsius), ampere, 5);
            return p.I2 / p.I1;
        }
    }

    // Common practice: the leakage of a silicon junction doubles about every 5 to 10 K; that of the transport law alone, without
    // generation in the junction, does so faster than with it.
    [Fact]
    public void Leakage_doubles_within_some_kelvin()
    {
        double cold = LawAt(25).Evaluate(-1, 0).I2, warm = LawAt(35).Evaluate(-1, 0).I2;
        Assert.InRange(10 * Math.Log(2) / Math.Log(warm / cold), 3.5, 10);
    }

    [Theory]
    [InlineData(-101)]
    [InlineData(201)]
    [InlineData(double.NaN)]
    public void Temperatures_out_of_range_are_refused_with_the_range(double celsius)
    {
        ArgumentOutOfRangeException refusal = Assert.Throws<ArgumentOutOfRangeException>(() => LawAt(celsius));
        Assert.Contains("from -100 to 200", refusal.Message, StringComparison.Ordinal);
    }

    private static BipolarLaw LawAt(double celsius) => TestDevices.Bc547b.LawAt(Grade.Typical, celsius);
}
