using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

public sealed class LargeSignalTests
{
    /// <summary>Ratios 2 I1(x)/I0(x), 2 I2(x)/I0(x) and ln I0(x) of modified Bessel functions, computed to 20 digits elsewhere.</summary>
    [Theory]
    [InlineData(1, 0.892779931793069, 0.214440136413862, 1.26606587775200834)]
    [InlineData(2, 1.395549315928016, 0.604450684071984, 2.27958530233606727)]
    [InlineData(5, 1.786766274088170, 1.285293490364732, 27.2398718236044469)]
    [InlineData(10, 1.897199651909692, 1.620560069668062, 2815.71662846625447)]
    public void A_cosine_on_an_exponential_law_gives_its_bessel_ratios(int x, double first, double second, double mean)
    {
        const double thermal = 0.025;
        Part[] parts =
        [
            new Supply("bias", "bias", Part.Earth, thermal * 27.631021115928547, 0),   // ln 1e12: 1 mA at rest
            new Antenna("emf", "base", "bias"),
            new Supply("collector", "collector", Part.Earth, 5, 0),
        ];
        OracleDevice device = new("q", "base", "collector", Part.Earth, 0, new ExponentialLaw(1e-15, thermal, 100));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [device]);
        double[] current = oracle.Run(new OracleRun(1e-6 / 120, 120)
        {
            AntennaVolt = t => x * thermal * Math.Cos(2 * Math.PI * 1e6 * t),
            Branches = ["collector"],
        }).Ampere["collector"];
        double Harmonic(int order) => current.Select((i, k) => -i * Math.Cos(2 * Math.PI * order * (k + 1) / 120.0)).Average();
        Assert.Equal(mean, Harmonic(0) / 1e-3, mean * 1e-9);
        Assert.Equal(first, 2 * Harmonic(1) / Harmonic(0), 1e-9);
        Assert.Equal(second, 2 * Harmonic(2) / Harmonic(0), 1e-9);
    }

    /// <summary>Period (in 1/w0) and amplitude of x'' - mu (1 - x^2) x' + x = 0 [Andersen and Geer 1982, reference series].</summary>
    [Theory]
    [InlineData(0.1, 6.28711127, 2.000104)]
    [InlineData(1.0, 6.66328686, 2.0086199)]
    [InlineData(5.0, 11.61223067, 2.0215081)]
    public void A_saturating_negative_conductance_settles_on_van_der_pols_cycle(double mu, double period, double amplitude)
    {
        // 1 uH and 1 uF: w0 = 1e6/s, impedance 1 ohm, mu = conductance x impedance; the scale of the cubic is 1 V.
        Part[] parts = [new Capacitor("c", "top", Part.Earth, 1e-6) { Role = PartRole.Tuning }, new Inductor("l", "top", Part.Earth, 1e-6)];
        OracleDevice device = new("d", "top", "top", Part.Earth, 0, new CubicLaw(mu, 1));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1.6e5, [device]);
        const double step = 1e-6 / 1000;
        double[] volt = oracle.Run(new OracleRun(step, 400_000) { KickAmpere = CarrierLevelOracle.Burst(1.6e5, 1), Nodes = ["top"] }).Volt["top"];
        var crossings = new List<double>();
        for (int k = 250_000; k < volt.Length; k++)
        {
            if (volt[k - 1] < 0 && volt[k] >= 0)
            {
                crossings.Add(k - 1 + (volt[k - 1] / (volt[k - 1] - volt[k])));
            }
        }

        Assert.Equal(period, (crossings[^1] - crossings[0]) / (crossings.Count - 1) / 1000, period * 1e-6);
        Assert.Equal(amplitude, volt.Skip(250_000).Max(), 1e-5);
    }

    [Fact]
    public void A_weak_kick_grows_as_the_linearised_stage_says()
    {
        Part[] parts = [new Capacitor("c", "top", Part.Earth, 100e-12) { Role = PartRole.Tuning }, new Inductor("l", "top", Part.Earth, 250e-6, 2)];
        OracleDevice device = new("d", "top", "top", Part.Earth, 0, new CubicLaw(2e-6, 10));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [device]);
        RingReading linear = oracle.SmallSignalRing("top", 1e6, 400, 120);
        Assert.Equal(6000, linear.GrowthPerS, 10.0);   // G/2C - R/2L
        OracleSamples samples = oracle.Run(new OracleRun(1e-6 / 120, 400 * 120) { KickAmpere = CarrierLevelOracle.Burst(1e6, 1e-9), Nodes = ["top"] });
        DecayReading stepped = DecayFit.Fit(samples.Volt["top"].AsSpan(200 * 120), 1e6, 120);
        Assert.Equal(linear.GrowthPerS, stepped.GrowthPerS, 1e-3);
        Assert.Equal(linear.Hz, stepped.Hz, 1e-3);
    }
}
