using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Quantities;

public class PhysicalConstantsTests
{
    // kT/q in mV with the exact k and e of the SI of 2019, computed independently with the CODATA 2018 constants of scipy.
    [Theory]
    [InlineData(26.85, 25.851999786)]
    [InlineData(16.85, 24.990266)]
    [InlineData(25.0, 25.692579)]
    public void Thermal_voltage_follows_the_exact_constants(double celsius, double millivolts)
    {
        Assert.Equal(millivolts, 1e3 * PhysicalConstants.ThermalVoltage(celsius), 6);
    }

    // Vacuum: c, mu0 and eps0 of CODATA 2018; impedance of vacuum 376.730313668 ohm is listed there by itself.
    [Fact]
    public void Electric_and_magnetic_constants_agree_with_light_and_the_impedance_of_vacuum()
    {
        double light = 1.0 / Math.Sqrt(PhysicalConstants.VacuumPermeability * PhysicalConstants.VacuumPermittivity);
        Assert.Equal(1.0, light / PhysicalConstants.SpeedOfLight, 9);
        Assert.Equal(376.730313668, PhysicalConstants.VacuumPermeability * PhysicalConstants.SpeedOfLight, 6);
    }

    // The field of a coaxial loop far from it is 188.5 N I a^2/x^3 in V/m: IRE 1948, Standards on Radio Receivers, from memory.
    [Fact]
    public void Half_the_impedance_of_vacuum_is_the_factor_of_loop_injection() =>
        Assert.Equal(188.365, PhysicalConstants.VacuumPermeability * PhysicalConstants.SpeedOfLight / 2, 3);

    // IEC 60028:1925: resistivity 1/58 = 0.017241 ohm mm2/m at 20 °C, rising 0.00393 of that per kelvin.
    [Theory]
    [InlineData(20.0, 0.017241)]
    [InlineData(30.0, 0.017919)]
    [InlineData(0.0, 0.015886)]
    public void Copper_is_standard_annealed_copper(double celsius, double ohmSquareMillimetrePerMetre)
    {
        Assert.Equal(ohmSquareMillimetrePerMetre, 1e6 / PhysicalConstants.CopperConductivityAt(celsius), 6);
    }

    [Theory]
    [InlineData(-273.16)]
    [InlineData(double.NaN)]
    public void Temperatures_below_absolute_zero_are_refused(double celsius)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => PhysicalConstants.ThermalVoltage(celsius));
        Assert.Throws<ArgumentOutOfRangeException>(() => PhysicalConstants.CopperConductivityAt(celsius));
    }

    // Common table of voltage ratios: 20 dB is ten times, 6.0206 dB is twice, -3.0103 dB is 0.70711.
    [Theory]
    [InlineData(10.0, 20.0)]
    [InlineData(2.0, 6.0206)]
    [InlineData(0.707107, -3.0103)]
    [InlineData(1.0, 0.0)]
    public void Decibels_are_those_of_voltage_ratios(double ratio, double db)
    {
        Assert.Equal(db, Decibel.FromRatio(ratio), 4);
        Assert.Equal(ratio, Decibel.ToRatio(db), 4);
    }

    [Fact]
    public void No_voltage_is_infinitely_many_decibels_down()
    {
        Assert.Equal(double.NegativeInfinity, Decibel.FromRatio(0.0));
        Assert.Equal(0.0, Decibel.ToRatio(double.NegativeInfinity));
        Assert.Throws<ArgumentOutOfRangeException>(() => Decibel.FromRatio(-1.0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Decibel.ToRatio(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => Decibel.ToRatio(double.PositiveInfinity));
    }
}
