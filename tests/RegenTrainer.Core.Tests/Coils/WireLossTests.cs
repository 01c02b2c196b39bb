using System.Numerics;
using MathNet.Numerics;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class WireLossTests
{
    /// <summary>x = d/(sqrt2 delta), R/R0 as in NBS Circular 74 (from memory), R/R0 exact by mpmath.</summary>
    public static TheoryData<double, double, double> SkinEffect { get; } = new()
    {
        { 0.5, 1.0003, 1.000325 }, { 0.6, 1.0007, 1.000675 }, { 0.8, 1.0021, 1.00213 }, { 1.0, 1.005, 1.005187 },
        { 1.2, 1.011, 1.010708 }, { 1.4, 1.02, 1.019694 }, { 1.5, 1.026, 1.025824 }, { 1.6, 1.033, 1.033229 },
        { 1.8, 1.052, 1.052394 }, { 2.0, 1.078, 1.078159 }, { 2.2, 1.111, 1.111258 }, { 2.4, 1.152, 1.152074 },
        { 2.6, 1.201, 1.200558 }, { 2.8, 1.256, 1.256201 }, { 3.0, 1.318, 1.318095 }, { 3.5, 1.492, 1.492019 },
        { 4.0, 1.678, 1.677869 }, { 4.5, 1.863, 1.862752 }, { 5.0, 2.043, 2.042725 }, { 6.0, 2.394, 2.39359 },
        { 7.0, 2.743, 2.74319 }, { 8.0, 3.094, 3.094446 }, { 9.0, 3.446, 3.446385 }, { 10.0, 3.799, 3.798576 },
        { 15.0, 5.562, 5.562079 }, { 20.0, 7.328, 7.327672 }, { 25.0, 9.094, 9.094126 }, { 30.0, 10.86, 10.861014 },
        { 40.0, 14.4, 14.395447 }, { 50.0, 17.93, 17.93032 }, { 60.0, 21.47, 21.465412 }, { 80.0, 28.54, 28.535928 },
        { 100.0, 35.61, 35.606665 },
    };

    [Theory]
    [MemberData(nameof(SkinEffect))]
    public void Straight_wire_has_the_tabulated_resistance(double x, double table, double exact)
    {
        double ratio = WireLoss.Ratio(x / 1.4142135623730951, 1.0);
        Assert.Equal(1.0, ratio / table, 4e-4);
        Assert.Equal(exact, ratio, 1e-6);
    }

    // Terman's handbook as quoted: No. 10 copper at 100 kHz has R_ac/R_dc = 3.35; exact 3.3610.
    [Fact]
    public void Gauge_ten_at_a_hundred_kilohertz()
    {
        double y = WireLoss.RadiusOverSkinDepth(0.5 * WireGauge.Diameter(10), 100e3, 20.0);
        Assert.Equal(3.35, WireLoss.Ratio(y, 1.0), 0.02);
        Assert.Equal(3.3610, WireLoss.Ratio(y, 1.0), 1e-4);
    }

    // [Wheeler 1942]: 66 um at 1 MHz (66.085 computed); 8.5 mm at 60 Hz.
    [Fact]
    public void Skin_depth_of_copper()
    {
        Assert.Equal(66.085e-6, WireLoss.SkinDepthMetre(1e6, 58.0e6), 0.5e-9);
        Assert.Equal(8.5e-3, WireLoss.SkinDepthMetre(60.0, 58.0e6), 0.05e-3);
    }

    // Bessel functions of complex argument from MathNet.Numerics (Amos's algorithms), where they do not overflow.
    [Theory]
    [InlineData(0.01)]
    [InlineData(0.3)]
    [InlineData(1.0)]
    [InlineData(3.0)]
    [InlineData(7.5)]
    [InlineData(19.9)]
    [InlineData(20.1)]
    [InlineData(60.0)]
    [InlineData(300.0)]
    public void Both_terms_agree_with_library_Bessel_functions(double y)
    {
        Complex k = new(y, -y);
        Complex zero = SpecialFunctions.BesselJ(0, k);
        Complex one = SpecialFunctions.BesselJ(1, k);
        (double skin, double transverse) = WireLoss.Terms(y);
        Assert.Equal(1.0, skin / (k * zero / (2.0 * one)).Real, 1e-11);
        Assert.Equal(1.0, transverse / -(k * one / zero).Real, 1e-6);
    }

    // ber and bei of 1 and 5 (Abramowitz and Stegun 1964, table 9.12, from memory): ln(ber² + bei²) is the integral of 2 W/x.
    [Theory]
    [InlineData(1.0, 0.984381781, 0.249566040)]
    [InlineData(5.0, -6.230082479, 0.116034382)]
    public void Transverse_term_integrates_to_the_Kelvin_functions(double x, double ber, double bei)
    {
        const int Steps = 2000;
        double sum = 0.0;
        for (int step = 1; step <= Steps; step++)
        {
            double place = x * step / Steps;
            double weight = step == Steps ? 1.0 : 2.0 + (2.0 * (step % 2));
            sum += weight * 2.0 * WireLoss.Terms(place / 1.4142135623730951).Transverse / place;
        }

        Assert.Equal(Math.Log((ber * ber) + (bei * bei)), sum * x / Steps / 3.0, 3e-9);
    }

    // First terms of the power series: H = 1 + y^4/48, W = y^4/4 [Butterworth 1925].
    [Theory]
    [InlineData(0.001)]
    [InlineData(0.01)]
    [InlineData(0.05)]
    public void Thin_wire_follows_the_power_series(double y)
    {
        (double skin, double transverse) = WireLoss.Terms(y);
        Assert.Equal(1.0 + (y * y * y * y / 48.0), skin, 1e-9);
        Assert.Equal(1.0, transverse * 4.0 / (y * y * y * y), 1e-5);
    }

    // Asymptote of the skin effect, y/2 + 1/4 + 3/(32 y) [Rosa and Grover 1912, from memory]; the other term tends to y - 1/2.
    [Theory]
    [InlineData(50.0)]
    [InlineData(1000.0)]
    [InlineData(1e6)]
    public void Thick_wire_follows_the_asymptote(double y)
    {
        (double skin, double transverse) = WireLoss.Terms(y);
        Assert.Equal(1.0, skin / ((0.5 * y) + 0.25 + (3.0 / (32.0 * y))), 1e-7);
        Assert.Equal(1.0, transverse / (y - 0.5), 1e-4);
    }

    [Fact]
    public void Resistance_tends_to_the_proximity_factor_times_the_straight_wire() =>
        Assert.Equal(1.93, WireLoss.Ratio(1000.0, 1.93) / WireLoss.Ratio(1000.0, 1.0), 1e-3);

    // Eddy currents in a thin cylinder, P = pi sigma w² B² a^4/8 for each metre, in the mean square field of 400 turns,
    // C = 2 pi² <H²> s²/I² = 3.225 at l = 2 D (field by elliptic integrals, computed independently): R/R_dc - 1 = C (d/s)² y^4/8.
    [Fact]
    public void Thin_wire_in_a_coil_loses_what_its_eddy_currents_do()
    {
        const double Y = 0.2;
        const double WireOverPitch = 0.2;
        double eddy = 3.225 * WireOverPitch * WireOverPitch * Math.Pow(Y, 4) / 8.0;
        double ratio = WireLoss.Ratio(Y, MedhurstTables.ProximityFactor(WireOverPitch, 2.0)) - WireLoss.Ratio(Y, 1.0);
        Assert.Equal(1.0, ratio / eddy, 0.03);
    }

    [Fact]
    public void Continued_fraction_and_asymptotic_series_meet()
    {
        double step = Math.BitIncrement(20.0) - 20.0;
        (double skinBelow, double transverseBelow) = WireLoss.Terms(20.0 - step);
        (double skinAbove, double transverseAbove) = WireLoss.Terms(20.0);
        Assert.Equal(1.0, skinAbove / skinBelow, 1e-13);
        Assert.Equal(1.0, transverseAbove / transverseBelow, 1e-13);
    }

    [Theory]
    [InlineData(-1.0, 1.0)]
    [InlineData(2e6, 1.0)]
    [InlineData(1.0, 0.9)]
    [InlineData(double.NaN, 1.0)]
    public void Impossible_wire_is_refused(double y, double phi) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => WireLoss.Ratio(y, phi));
}
