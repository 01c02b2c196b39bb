using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
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
        double[] volt = oracle.Run(new OracleRun(step, 250_000) { KickAmpere = CarrierLevelOracle.Burst(1.6e5, 1), Nodes = ["top"] }).Volt["top"];
        var crossings = new List<double>();
        for (int k = 190_000; k < volt.Length; k++)
        {
            if (volt[k - 1] < 0 && volt[k] >= 0)
            {
                crossings.Add(k - 1 + (volt[k - 1] / (volt[k - 1] - volt[k])));
            }
        }

        Assert.Equal(period, (crossings[^1] - crossings[0]) / (crossings.Count - 1) / 1000, period * 1e-6);
        Assert.Equal(amplitude, volt.Skip(190_000).Max(), 1e-5);
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

    /// <summary>
    /// Bias current held, the drive x in units of V_T settles where 2 I1(x)/(x I0(x)) = 1/loop gain [Clarke and Hess 1971];
    /// roots computed elsewhere.
    /// </summary>
    [Theory]
    [InlineData(1.1, 0.90945)]
    [InlineData(1.2, 1.30773)]
    public void An_oscillator_at_constant_current_settles_where_its_loop_gain_is_one(double loopGain, double drive)
    {
        // 40 mS (1 mA, 25 mV), a twentieth of the tank's voltage fed back in phase, 500 ohm x loop gain across 2 ohm of reactance.
        const double thermal = 0.025;
        const double henry = 2 / (2 * Math.PI * 1e6);
        var coils = new FixedWindings(new[,] { { henry, henry / 20 }, { henry / 20, henry / 100 } }, new double[2, 2], []);
        Part[] parts =
        [
            new Supply("plus", "plus", Part.Earth, 9, 0),
            new Supply("minus", "minus", Part.Earth, -1000.69077527789821368, 0),   // 1 mA through 1 megohm below V_BE = 25 mV ln 1e12
            new Resistor("tail", "minus", "emitter", 1e6),
            new Capacitor("bypass", "emitter", Part.Earth, 1e-6),
            new Capacitor("c", "collector", "plus", 1 / (2 * Math.PI * 1e6 * 2)) { Role = PartRole.Tuning },
            new Resistor("loss", "collector", "plus", 500 * loopGain),
            new Windings("coil", [("plus", "collector"), ("base", Part.Earth)], coils),
        ];
        OracleDevice device = new("q", "base", "collector", "emitter", 0, new ExponentialLaw(1e-15, thermal, 1e9));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [device]);
        Assert.Equal(1e-3, oracle.OperatingAmpere("minus"), 1e-9);
        double[] volt = oracle.Run(new OracleRun(1e-6 / 120, 4500 * 120) { KickAmpere = CarrierLevelOracle.Burst(1e6, 0.02), Nodes = ["base"] }).Volt["base"];
        double late = volt.Skip(4400 * 120).Max();
        Assert.Equal(volt.Skip(4000 * 120).Take(100 * 120).Max(), late, late * 1e-3);
        Assert.Equal(drive, late / thermal, drive * 0.01);
    }

    [Fact]
    public void A_saturating_oscillator_is_met_to_second_order_in_the_step()
    {
        const double henry = 20 / (2 * Math.PI * 1e6);
        var coils = new FixedWindings(
            new[,] { { henry, henry / 20 }, { henry / 20, henry / 100 } },
            new[,] { { 0.1, 0.0 }, { 0.0, 0.01 } },
            [new WindingSpan(0, 1, 5e-12, 1, 10)]);
        Part[] parts =
        [
            new Supply("plus", "plus", Part.Earth, 1.5, 1),
            new Capacitor("bypass", "plus", Part.Earth, 1e-7, 500),
            new Resistor("bias", "plus", "foot", 100e3),
            new Capacitor("decouple", "foot", Part.Earth, 1e-8, 500),
            new Capacitor("c", "collector", "plus", 1 / (2 * Math.PI * 1e6 * 20), 500) { Role = PartRole.Tuning },
            new Windings("coil", [("plus", "collector"), ("base", "foot")], coils),
        ];
        OracleDevice device = new("q", "base", "collector", Part.Earth, 30, new TwoJunctionLaw(0.5e-9, 20e-12, 4e-12));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [device]);
        Assert.True(oracle.SmallSignalRing("collector", 1e6, 100, 120).GrowthPerS > 0);
        double Amplitude(int perCycle)
        {
            const int cycles = 300;
            double[] volt = oracle.Run(new OracleRun(1e-6 / perCycle, cycles * perCycle)
            {
                KickAmpere = CarrierLevelOracle.Burst(1e6, 1e-4),
                Nodes = ["collector"],
            }).Volt["collector"];
            ReadOnlySpan<double> late = volt.AsSpan((cycles - 20) * perCycle);
            double sum = 0;
            foreach (double v in late)
            {
                sum += (v - oracle.OperatingVolt("plus")) * (v - oracle.OperatingVolt("plus"));
            }

            return Math.Sqrt(2 * sum / late.Length);
        }

        double[] found = [Amplitude(120), Amplitude(240), Amplitude(480)];
        Assert.InRange(found[2], 1.3, 1.65);   // the collector swings between the supply's double and a little below earth
        Assert.True(Math.Abs(found[1] - found[2]) < 1e-3 * found[2], string.Join(" ", found));
        Assert.True(Math.Abs(found[0] - found[1]) < 3e-3 * found[2], string.Join(" ", found));
    }
}
