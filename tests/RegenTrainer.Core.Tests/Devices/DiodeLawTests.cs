using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Devices;

/// <summary>The law of the diode against the textbooks: each check names its source.</summary>
public sealed class DiodeLawTests
{
    // Zero-bias resistance n V_T/I_S: any textbook [Sze 1981]. V_T = 25.692579 mV at 25 °C with the exact constants of the SI of
    // 2019: 25 692.58 ohm for 1 uA, 33 400.35 ohm with n = 1.3, 642 314 ohm for 40 nA.
    [Theory]
    [InlineData(1e-6, 1, 25692.579)]
    [InlineData(1e-6, 1.3, 33400.353)]
    [InlineData(4e-8, 1, 642314.48)]
    public void Without_bias_it_has_the_resistance_of_the_textbook(double saturation, double emission, double ohm)
    {
        TwoPortPoint p = TestDiodes.Plain(saturation, emission).LawAt(Grade.Typical, 25).Evaluate(0, 0);
        Assert.Equal(ohm, 1 / p.G11, ohm * 1e-6);
        Assert.Equal(0, p.I1);
        Assert.Equal((0.0, 0.0, 0.0, 0.0), (p.I2, p.G12, p.G21, p.G22));
    }

    // Dynamic resistance n V_T/(I + I_S) at 1 mA: 25.7 ohm, the "26 mV over the current" of every textbook.
    [Fact]
    public void At_a_milliampere_it_has_26_ohm()
    {
        DiodeLaw law = TestDiodes.Plain(1e-6).LawAt(Grade.Typical, 25);
        ConductionPoint p = law.Conduct(0.0256925791 * Math.Log(1001), 0);
        Assert.Equal(1e-3, p.I1, 1e-9);
        Assert.Equal(25.667, 1 / p.G11, 0.001);
    }

    // Rectified current of a cosine of x thermal voltages, I_S (I0(x) - 1); I0(1) = 1.2660658778, I0(2) = 2.2795853023 [Abramowitz
    // and Stegun 1964, table 9.8]. The fundamental is 2 I_S I1(x); I1(1) = 0.5651591040, I1(2) = 1.5906368546.
    [Theory]
    [InlineData(1, 0.2660658778, 0.5651591040)]
    [InlineData(2, 1.2795853023, 1.5906368546)]
    public void It_rectifies_a_cosine_as_the_Bessel_functions_say(double x, double mean, double half)
    {
        DiodeLaw law = TestDiodes.Plain(1e-6).LawAt(Grade.Typical, 25);
        double direct = 0, fundamental = 0;
        for (int k = 0; k < 64; k++)
        {
            double cosine = Math.Cos(2 * Math.PI * k / 64), ampere = law.Conduct(x * 0.0256925791 * cosine, 0).I1;
            direct += ampere / 64;
            fundamental += ampere * cosine / 32;
        }

        Assert.Equal(mean, direct * 1e6, 1e-7);
        Assert.Equal(2 * half, fundamental * 1e6, 1e-7);
    }

    // Forward voltage of germanium at 0.2 V falls 2.1 mV/K near room temperature, its saturation current rises 11 %/K [Millman and
    // Halkias 1972, from memory].
    [Fact]
    public void Germanium_moves_with_temperature_as_the_textbook_says()
    {
        DiodeModel model = TestDiodes.Plain(1e-6);
        DiodeLaw cool = model.LawAt(Grade.Typical, 26), warm = model.LawAt(Grade.Typical, 28);
        double ampere = model.LawAt(Grade.Typical, 27).Conduct(0.2, 0).I1;
        Assert.Equal(-2.1, 1e3 * (VoltAt(warm, ampere) - VoltAt(cool, ampere)) / 2, 0.05);
        Assert.Equal(11, 100 * Math.Log(warm.Conduct(-1, 0).I1 / cool.Conduct(-1, 0).I1) / 2, 0.5);
    }

    // Thermionic emission: I_S goes as T^2 exp(-phi/V_T) [Sze 1981]; with phi = 0.69 V from 300 to 310 K 2.53 times (computed from
    // the printed law). The forward voltage of silicon falls about 2 mV/K: common practice.
    [Fact]
    public void So_do_the_other_materials()
    {
        DiodeModel schottky = TestDiodes.Plain(1e-8, material: JunctionMaterial.Schottky);
        Assert.Equal(2.53, schottky.LawAt(Grade.Typical, 36.85).Conduct(-1, 0).I1 / schottky.LawAt(Grade.Typical, 26.85).Conduct(-1, 0).I1, 0.01);
        DiodeModel silicon = TestDiodes.Plain(1e-14, material: JunctionMaterial.Silicon);
        double ampere = silicon.LawAt(Grade.Typical, 25).Conduct(0.6, 0).I1;
        double change = VoltAt(silicon.LawAt(Grade.Typical, 26), ampere) - VoltAt(silicon.LawAt(Grade.Typical, 24), ampere);
        Assert.InRange(1e3 * change / 2, -2.3, -1.7);
    }

    // The forward voltage falls at the rate of the material whatever the emission coefficient: a property of the law.
    [Fact]
    public void The_emission_coefficient_leaves_the_fall_with_temperature_alone()
    {
        double[] falls = [.. new[] { 1.0, 1.5, 2 }.Select(n =>
        {
            DiodeModel model = TestDiodes.Plain(1e-6, n);
            double ampere = model.LawAt(Grade.Typical, 25).Conduct(0.5, 0).I1;
            return VoltAt(model.LawAt(Grade.Typical, 26), ampere) - VoltAt(model.LawAt(Grade.Typical, 24), ampere);
        })];
        Assert.All(falls, fall => Assert.Equal(falls[0], fall, 1e-5));
    }

    // An abrupt junction has half its capacitance at three built-in voltages in reverse: C0/sqrt(1 + V/phi), any textbook [Sze
    // 1981]; phi = 0.6 V here.
    [Theory]
    [InlineData(-1.8, 5e-12)]
    [InlineData(0, 10e-12)]
    [InlineData(-4.8, 3.3333333e-12)]
    public void Its_capacitance_falls_with_reverse_voltage(double volt, double farad)
    {
        TwoPortPoint p = TestDiodes.Plain(1e-8, material: JunctionMaterial.Schottky, farad: 10e-12).LawAt(Grade.Typical, 25).Evaluate(volt, 0);
        Assert.Equal(farad, p.C11, 1e-18);
    }

    [Fact]
    public void A_capacitance_stated_at_a_reverse_voltage_is_met_there()
    {
        DiodeModel model = TestDiodes.Plain(1e-8) with { Capacitance = new DeviceFigure(null, 6e-12, null, 1, KnownBy.Memory, "") };
        Assert.Equal(6e-12, model.LawAt(Grade.Typical, 25).Evaluate(-1, 0).C11, 1e-20);
    }

    [Fact]
    public void Derivatives_are_those_of_currents_and_charges()
    {
        foreach (JunctionMaterial material in Enum.GetValues<JunctionMaterial>())
        {
            DiodeLaw law = TestDiodes.Plain(1e-7, 1.2, material, 3e-12).LawAt(Grade.Typical, 40);
            for (double volt = -3; volt < 0.6; volt += 0.037)
            {
                const double step = 1e-5;
                TwoPortPoint p = law.Evaluate(volt, 7), ahead = law.Evaluate(volt + step, 7), behind = law.Evaluate(volt - step, 7);
                Assert.Equal(p.G11, (ahead.I1 - behind.I1) / (2 * step), (1e-7 * p.G11) + 1e-16);
                Assert.Equal(p.C11, (ahead.Q1 - behind.Q1) / (2 * step), 1e-6 * p.C11);
            }
        }
    }

    [Fact]
    public void The_weak_one_loads_most_and_the_strong_one_least()
    {
        TwoPortPoint[] points = [.. new[] { Grade.Weak, Grade.Typical, Grade.Strong }.Select(g => TestDiodes.Spread.LawAt(g, 25).Evaluate(0, 0))];
        Assert.True(points[0].G11 > points[1].G11 && points[1].G11 > points[2].G11);
        Assert.True(points[0].C11 > points[1].C11 && points[1].C11 > points[2].C11);
        Assert.Equal((20.0, 10.0, 5.0), (TestDiodes.Spread.LeadOhm(Grade.Weak), TestDiodes.Spread.LeadOhm(Grade.Typical), TestDiodes.Spread.LeadOhm(Grade.Strong)));
    }

    [Theory]
    [InlineData(-101)]
    [InlineData(201)]
    [InlineData(double.NaN)]
    public void Temperatures_out_of_range_are_refused_with_the_range(double celsius)
    {
        ArgumentOutOfRangeException refusal = Assert.Throws<ArgumentOutOfRangeException>(() => TestDiodes.Spread.LawAt(Grade.Typical, celsius));
        Assert.Contains("from -100 to 200", refusal.Message, StringComparison.Ordinal);
    }

    /// <summary>The voltage of a current, by halving.</summary>
    private static double VoltAt(DiodeLaw law, double ampere)
    {
        (double low, double high) = (-0.1, 1.5);
        for (int k = 0; k < 60; k++)
        {
            double middle = (low + high) / 2;
            (low, high) = law.Conduct(middle, 0).I1 < ampere ? (middle, high) : (low, middle);
        }

        return (low + high) / 2;
    }
}
