using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Devices;

public class HybridPiTests
{
    // Gray and Meyer 1977, ch. 1: 1 mA at 300 K, gain 100, f_T 300 MHz: 38.682 mS, 2585.2 ohm, 20.522 pF. The gain is stated at
    // 25 °C and rises 0.5 to 0.7 %/K (common practice), so over the 1.85 K between the resistance is 0.9 to 1.3 % larger.
    [Fact]
    public void Hybrid_pi_of_the_textbook_transistor_at_300_kelvin()
    {
        TwoPortPoint p = BiasedAt.Point(SheetTypes.Textbook.LawAt(Grade.Typical, 26.85), 1e-3, 5);
        Assert.InRange(1e3 * p.G21, 38.681, 38.683);
        Assert.InRange(1 / p.G11 / 2585.2, 1.009, 1.013);
        Assert.InRange(1e12 * p.C11, 20.48, 20.56);
        Assert.True(p.C22 > 0 && p.C22 < p.C11 && p.C12 == -p.C22 && p.C21 == -p.C22);
    }

    // The same at 25 °C with kT/q = 25.692579 mV: 1 mA / 25.692579 mV = 38.9218 mS, 100 / 38.9218 mS = 2569.26 ohm and
    // 38.9218 mS / (2 pi 300 MHz) = 20.6486 pF.
    [Fact]
    public void Hybrid_pi_of_the_textbook_transistor_at_the_temperature_of_data_sheets()
    {
        TwoPortPoint p = BiasedAt.Point(SheetTypes.Textbook.LawAt(Grade.Typical, 25), 1e-3, 5);
        Assert.InRange(1e3 * p.G21, 38.9217, 38.9219);
        Assert.InRange(1 / p.G11, 2569.2, 2569.3);
        Assert.InRange(1e12 * p.C11, 20.648, 20.649);
        Assert.InRange(p.I2 / p.I1, 99.9999, 100.0001);
    }

    // Textbook single pole: 100/sqrt(1 + (100 x 1/300)^2) = 94.868.
    [Fact]
    public void Gain_at_1_MHz_falls_to_94_868()
    {
        TwoPortPoint p = BiasedAt.Point(SheetTypes.Textbook.LawAt(Grade.Typical, 25), 1e-3, 5);
        Assert.InRange(BiasedAt.ShortCircuitGain(p, 1e6), 94.867, 94.869);
    }

    // Nyquist 1928: 1 kohm at 290 K gives 4.00194 nV/sqrt(Hz); Schottky 1918: 1 mA gives 17.9007 pA/sqrt(Hz).
    [Fact]
    public void Constants_give_the_printed_thermal_and_shot_noise()
    {
        Assert.Equal(4.00194, 1e9 * Math.Sqrt(4 * PhysicalConstants.Boltzmann * 290 * 1000), 5);
        Assert.Equal(17.9007, 1e12 * Math.Sqrt(2 * PhysicalConstants.ElementaryCharge * 1e-3), 4);
    }

    // Early 1952: the output conductance is the collector current over Early's voltage and the collector voltage; the law counts
    // the latter from the base, 0.6 V of 75 V less.
    [Theory]
    [InlineData(1e-4, 5)]
    [InlineData(1e-3, 5)]
    [InlineData(2e-3, 12)]
    public void Output_conductance_is_that_of_the_early_voltage(double ampere, double volt)
    {
        TwoPortPoint p = BiasedAt.Point(SheetTypes.Bc547b.LawAt(Grade.Typical, 25), ampere, volt);
        Assert.InRange(p.G22 * (70 + volt) / ampere, 1.0, 1.012);
    }
}
